"""The order of the stages: photographs to a bank. Nothing else knows it."""

from __future__ import annotations

import functools
import shutil
from dataclasses import replace
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import camera, cluster, edges, images, learn, shapes, store
from patchlab.errors import InputError, UsageError
from patchlab.export import parse_targets
from patchlab.pipeline import colour, tell
from patchlab.pipeline.bundle import write_bundle
from patchlab.pipeline.calibrate import chosen_costs
from patchlab.pipeline.desk import RECIPE, Desk, bank_name, clear_after
from patchlab.pipeline.detect import raw_layout
from patchlab.pipeline.keep import Keeper
from patchlab.pipeline.measure import take_in_extras
from patchlab.types import (
    Bank,
    Dictionary,
    Frame,
    KernelFits,
    PatchSet,
    Quarantined,
    Survey,
    TableKind,
)

Head = dict[str, Any]
EXAMPLE = (960, 1280)
"""Largest height and width of the example frame that a run keeps for its page."""

SAME = 0.9
"""Cosine from which an atom of another start counts as the same as a flagged one."""

# ---------------------------------------------------------------- one stage after another


def take_in(photos: images.Place, desk: Desk) -> images.Intake:
    """Walk the folder, decode every file once, quarantine what cannot serve."""
    s = desk.settings
    options = images.ReadOptions(
        white=s.white,
        black=s.black,
        transfer=s.transfer,  # type: ignore[arg-type]  # checked by the settings
        pixels=s.pixels,
        pixel_limit=s.pixel_limit,
        raw=raw_layout(s.raw_format, s.raw_width, s.raw_height),
        bayer=s.bayer,  # type: ignore[arg-type]  # checked by the settings
        planes=s.planes,  # type: ignore[arg-type]  # checked by the settings
        cache=str(desk.cache),
    )
    with desk.timed("reading"):
        intake = images.take_in(
            images.list_photos(photos),
            options,
            max_bad=s.max_bad,
            mixed_depths=s.mixed_depths,
            jobs=desk.jobs,
            progress=desk.progress,
        )
    desk.tell(f"  {len(intake.frames)} frames, {len(intake.quarantined)} quarantined")
    if intake.listing.outside:
        desk.tell(f"  {intake.listing.outside} links that lead out of the folder, passed over")
    return intake


def survey(intake: images.Intake, desk: Desk) -> tuple[Survey, Head]:
    """Measure the camera on the frames and make the input table."""
    wanted = desk.settings.table
    kind: TableKind | None = None if wanted == "auto" else wanted  # type: ignore[assignment]
    about = {
        "settings": desk.settings.plain("photos", "survey"),
        "inputs": intake.inputs,
        "body": {"recipe": RECIPE, "photos": tell.photos(intake)},
    }
    extras = take_in_extras(intake, desk)
    about["body"]["measured_on"] = extras.inputs

    some = intake.thinned(camera.MAX_FRAMES)

    def make() -> Survey:
        found = colour.survey(
            functools.partial(images.iterate, some),
            intake.contract,
            extras,
            kind=kind,
            mixed=desk.settings.mixed_cameras,
            progress=desk.progress,
        )
        if len(some.frames) == len(intake.frames):
            return found
        every = map(images.one_plane, images.iterate(intake, jobs=desk.jobs))
        return camera.judge_rest(found, every, some.names, desk.progress)

    example = _example(intake)
    about["body"]["example"] = example.path
    pixels = store.npy_bytes(example.pixels)

    def beside(found: Survey) -> dict[str, bytes]:
        plain = store.canonical_json(tell.survey(found, about["body"]))
        return {"example.npy": pixels, "survey.json": plain}

    return desk.stage("survey", about, make, beside)


def _example(intake: images.Intake) -> Frame:
    """The frame in the middle of the folder, its middle where it is large: for the page."""
    middle = intake.frames[len(intake.frames) // 2]
    pages = images.reread(next(task for task in intake.tasks if task[1] == middle.file))
    if isinstance(pages, Quarantined):
        raise InputError(pages.reason, where=pages.path)
    frame = pages[middle.page]
    top, left = (max(0, (n - limit) // 2) for n, limit in zip(frame.shape, EXAMPLE, strict=True))
    rows, cols = slice(top, top + EXAMPLE[0]), slice(left, left + EXAMPLE[1])
    mask = None if frame.invalid is None else frame.invalid[rows, cols]
    form = frame.contract.format
    part = form.joined(form.split(frame.pixels)[rows, cols])
    return replace(frame, pixels=part.copy(), invalid=mask)


def trusted(intake: images.Intake, found: Survey, desk: Desk) -> images.Intake:
    """The frames to learn from: all but those that the survey distrusts, unless asked."""
    if desk.settings.all_frames or not found.distrusted:
        return intake
    left_out = tell.left_out(found)
    told = ", ".join(f"{count} {reason}" for reason, count in left_out.items())
    desk.tell(f"  frames left out of learning: {told}")
    return intake.without(path for path, _ in found.distrusted)


def sample(intake: images.Intake, found: Survey, parent: Head, desk: Desk) -> tuple[PatchSet, Head]:
    """Draw patches, after saying what memory that and learning will take."""
    s = desk.settings
    intake = trusted(intake, found, desk)
    settings = images.SampleSettings(
        size=s.patch_size,
        patches=s.patches,
        per_frame=s.per_frame,
        seed=s.seed,
        flat_fraction=s.flat_fraction,
        normalise=s.normalise,
        grid=None if s.grid_patches else found.grid,
    )
    taken = images.memory_needed(
        settings,
        pixels=intake.largest,
        frames=len(intake.frames),
        jobs=desk.jobs,
        planes=intake.contract.format.planes,
    )
    need = taken / 2**30 + 0.3  # the libraries themselves
    desk.tell(f"  at most {need:.1f} GiB of memory will be used")
    if need > s.max_memory:
        raise UsageError(
            f"these settings need about {need:.1f} GiB, above --max-memory {s.max_memory:g}",
            remedy="lower --patches or --patch-size, or raise --max-memory",
        )
    about = {
        "settings": s.plain("patches"),
        "parents": {"survey": parent["id"]},
    }

    def make() -> PatchSet:
        return images.sample_folder(
            intake, found.table, settings, jobs=desk.jobs, progress=desk.progress
        )

    return desk.stage("patches", about, make)


def learn_basis(
    patches: PatchSet, found: Survey, parent: Head, desk: Desk
) -> tuple[tuple[Dictionary, Dictionary], Head]:
    """Whiten and learn; principal components come along to be looked at beside."""
    s = desk.settings
    about = {"settings": s.plain("learn"), "parents": {"patches": parent["id"]}}

    keeper = Keeper.of(desk.out, {**about, "seed": s.seed, "recipe": RECIPE})
    sparse = s.method == "sparse"
    rebuild: Any = learn.SparseState.from_arrays if sparse else learn.Checkpoint.from_arrays

    def make() -> tuple[Dictionary, Dictionary]:
        noise = None
        if found.table.noise_sd is not None:
            coloured = found.noise.autocovariance
            noise = learn.noise_covariance(
                patches, found.table.noise_sd, coloured, found.sample_noise
            )
        whitening = learn.whiten(patches, retain=s.retain, noise=noise, held_out=s.seed)
        choice, components = None, None if s.components == "auto" else s.components
        if s.components == "auto" and not sparse:
            choice = learn.choose_components(
                patches, whitening, seed=s.seed, jobs=desk.jobs, progress=desk.progress
            )
            components = choice.chosen
            desk.tell(f"  {choice.reason}")
        assert not isinstance(components, str)  # the settings allow no other word
        left = keeper.find(rebuild) if desk.resume else None
        if left is not None:
            desk.tell("  dictionary: goes on where learning was left")
        if sparse:
            atoms, penalty = components or whitening.rank, s.penalty
            if penalty is None and noise is not None:
                penalty = learn.penalty_from_noise(whitening, noise, atoms)
                desk.tell(f"  penalty {penalty:.3g}, from the noise")
            learned = learn.learn_sparse(
                patches,
                whitening,
                atoms=atoms,
                penalty=penalty,
                seed=s.seed,
                jobs=desk.jobs,
                progress=desk.progress,
                checkpoint=keeper.keep,
                resume=left,
            )
        else:
            learned = learn.learn_ica(
                patches,
                whitening,
                components=components,
                seed=s.seed,
                orthogonal=s.orthogonal,
                restarts=s.restarts,
                resamples=s.resamples,
                max_iterations=s.max_iterations,
                jobs=desk.jobs,
                progress=desk.progress,
                checkpoint=keeper.keep,
                resume=left,
            )
        return replace(learned, choice=choice), learn.learn_pca(patches, whitening)

    (learned, baseline), head = desk.stage("dictionary", about, make)
    keeper.drop()
    return (learned, baseline), head


def fit(
    dictionary: Dictionary, parent: Head, desk: Desk, colours: str = ""
) -> tuple[tuple[KernelFits, ...], Head]:
    """Describe atoms and filters by parametric kernels."""
    about = {"settings": {}, "parents": {"dictionary": parent["id"]}}

    def make() -> tuple[KernelFits, ...]:
        return colour.fit(dictionary, colours, desk.progress)

    def tables(fits: tuple[KernelFits, ...]) -> dict[str, bytes]:
        made = {f"fits_{f.of}.csv": shapes.fits_csv(f) for f in fits}
        return made | {f"fits_{f.of}.json": store.canonical_json(shapes.fits_json(f)) for f in fits}

    return desk.stage("fits", about, make, extra=tables)


def choose(
    dictionary: Dictionary,
    fits: tuple[KernelFits, ...],
    found: Survey,
    patches: PatchSet,
    name: str,
    desk: Desk,
) -> Bank:
    """Choose the kernels and calibrate their thresholds on noise."""
    s = desk.settings
    flagged = marked(dictionary, found, patches)
    seen_as = {i: camera.looks(dictionary.filters[i]) for i, _ in flagged}
    if flagged and not s.keep_marked:
        dictionary, fits = _unmarked(dictionary, fits, flagged)
        desk.tell(f"  {len(flagged)} components that describe a mark are kept out of the bank")
    with desk.timed("bank"):
        if s.as_learned:
            as_learned = banks.bank_as_learned
            if dictionary.planes > 1:
                as_learned = banks.colour_bank_as_learned
            bank = as_learned(dictionary, found, name, s.border, fits[1])
        else:
            settings = banks.BankSettings(
                kernels=s.kernels,
                purpose=s.purpose,  # type: ignore[arg-type]  # checked by the settings
                lines=s.lines,
                octaves=s.octaves,
                false_edges=s.false_edges,
                border=s.border,
                name=name,
                seed=s.seed,
            )
            bank = banks.choose_bank(
                colour.profiles(dictionary),
                fits[0],
                banks.one_plane(found),
                settings,
                patch_contrast=patches.contrast,
            )
            if dictionary.planes > 1:
                cells = found.contract.format.cell > 1
                bank = (banks.mosaic_bank if cells else banks.colour_bank)(bank, found)
    known = {
        **bank.provenance,
        "blur_sigma_px": found.blur_sigma_px,
        "marks": [m.name for m in found.marks if m.found],
    }
    if found.contract.lattice > 1:
        told = (
            "learned on a Bayer mosaic: a kernel sees the colours as it learned them only where "
            "its patch begins on an even row and column (--planes colour learns on whole cells, "
            "and its filters keep the phase)"
        )
        bank = replace(bank, warnings=(*bank.warnings, told))
    if flagged:
        known["marked_components"] = [
            [i + 1, name, s.keep_marked, seen_as[i]] for i, name in flagged
        ]
    return calibrated(replace(bank, provenance=known), desk)


def marked(dictionary: Dictionary, found: Survey, patches: PatchSet) -> tuple[tuple[int, str], ...]:
    """Components that describe a mark of the camera rather than the scene."""
    return camera.flag_components(
        colour.profiles(dictionary).atoms,
        dictionary.filters,
        patches.patches,
        patches.origin,
        found.marks,
    )


def _unmarked(
    dictionary: Dictionary, fits: tuple[KernelFits, ...], flagged: tuple[tuple[int, str], ...]
) -> tuple[Dictionary, tuple[KernelFits, ...]]:
    """Dictionary and fits without the flagged components."""
    kept = np.setdiff1d(np.arange(len(dictionary)), [i for i, _ in flagged])
    if not len(kept):
        raise InputError(
            "every learned component describes a mark of the camera",
            remedy="see the survey's remedies, or add --keep-marked",
        )
    own = np.array([dictionary.atoms[i].ravel() for i, _ in flagged])
    own /= np.linalg.norm(own, axis=1, keepdims=True)
    pooled = dictionary.pooled_atoms
    alike = np.abs(pooled.reshape(len(pooled), -1) @ own.T).max(axis=1) > SAME
    less = replace(
        dictionary,
        filters=dictionary.filters[kept],
        atoms=dictionary.atoms[kept],
        contribution=dictionary.contribution[kept],
        kurtosis=dictionary.kurtosis[kept],
        identified=dictionary.identified[kept],
        pooled_atoms=pooled[~alike],
    )
    return less, tuple(replace(f, fits=tuple(f.fits[i] for i in kept)) for f in fits)


def calibrated(bank: Bank, desk: Desk) -> Bank:
    """The bank with its table of thresholds, where its strength has a noise unit."""
    if bank.table.noise_sd is None or bank.purpose not in ("edges", "features"):
        return bank
    with desk.timed("thresholds"):
        seed, progress = desk.settings.seed, desk.progress
        found = edges.calibrate(bank, seed=seed, progress=progress)
        lines = None
        if bank.strength == "step" and any(bank.members(s, "even") for s in bank.scales):
            lines = edges.calibrate(bank, kind="line", seed=seed, progress=progress)
    return replace(bank, thresholds=found, line_thresholds=lines)


# ---------------------------------------------------------------- commands


def foresee(photos: images.Place, desk: Desk) -> dict[str, Any]:
    """What a run would do, without opening a picture or writing a file."""
    listing = images.list_photos(photos)
    return {
        "photos": str(photos),
        "files": len(listing.files),
        "hidden": listing.hidden,
        "other": listing.other,
        "outside": listing.outside,
        "out": str(desk.out),
        "settings": desk.settings.plain(),
    }


def work(photos: images.Place, desk: Desk, until: str = "run") -> dict[str, Any]:
    """Fill a run's folder from photographs, up to ``survey``, ``learn`` or the whole ``run``.

    Returns
    -------
    dict : plain data, the command's result

    Raises
    ------
    InputError, UsageError, Interrupted : finished stages are kept.
    """
    if until == "run":
        parse_targets(desk.settings.target)  # what cannot be built is said before the work
        chosen_costs(desk.settings)
    stood = desk.out.exists()
    try:
        with cluster.using(desk.settings.cluster, desk.jobs):
            return _work(photos, desk, until)
    finally:
        shutil.rmtree(desk.cache, ignore_errors=True)
        if not stood and desk.out.is_dir() and not any(desk.out.iterdir()):
            desk.out.rmdir()


def _work(photos: images.Place, desk: Desk, until: str) -> dict[str, Any]:
    intake = take_in(photos, desk)
    if until == "run":
        colour.check(intake.contract, desk.settings)
    found, survey_head = survey(intake, desk)
    if not desk.resume:
        clear_after(desk.out, "survey")
    if until == "survey":
        return tell.survey(found, survey_head)
    for note in found.notes:
        desk.tell(f"  note: {note}")
    patches, patches_head = sample(intake, found, survey_head, desk)
    (dictionary, _), dictionary_head = learn_basis(patches, found, patches_head, desk)
    if until == "learn":
        return tell.learned(dictionary, patches, desk)
    fits, fits_head = fit(dictionary, dictionary_head, desk, found.contract.format.colours)
    name = bank_name(desk.out, desk.settings)
    bank = choose(dictionary, fits, found, patches, name, desk)
    with desk.timed("export"):
        written = write_bundle(
            desk.out / "bank",
            bank,
            desk,
            parents={"fits": fits_head["id"], "survey": survey_head["id"]},
            inputs=intake.inputs,
            crop=next(iter(images.iterate(intake))).pixels,
        )
    result = tell.run(intake, found, patches, dictionary, fits[0], written, desk)
    store.write_file(desk.out / "run.json", store.canonical_json(result))
    return result


# ---------------------------------------------------------------- a run's later stages


def standing_dictionary(desk: Desk) -> tuple[Dictionary, dict[str, Any]]:
    """The dictionary of a run that stands, and its manifest."""
    (dictionary, _), head = store.load(desk.out / "dictionary", "dictionary")
    return dictionary, head


def fit_run(desk: Desk) -> dict[str, Any]:
    """Fit the components of a run's dictionary."""
    dictionary, head = standing_dictionary(desk)
    found, _ = store.load(desk.out / "survey", "survey")
    (atom_fits, filter_fits), _ = fit(dictionary, head, desk, found.contract.format.colours)
    return {"atoms": tell.fits(atom_fits), "filters": tell.fits(filter_fits)}
