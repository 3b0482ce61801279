"""The order of the stages: photographs to a bank. Nothing else knows it."""

from __future__ import annotations

import functools
from pathlib import Path
from typing import Any

from patchlab import bank as banks
from patchlab import camera, edges, images, learn, shapes, store
from patchlab.errors import UsageError
from patchlab.pipeline import tell
from patchlab.pipeline.bundle import write_bundle
from patchlab.pipeline.desk import RECIPE, Desk, bank_name
from patchlab.types import (
    Bank,
    Dictionary,
    KernelFits,
    PatchSet,
    Survey,
    TableKind,
)

Head = dict[str, Any]

# ---------------------------------------------------------------- one stage after another


def take_in(photos: Path, desk: Desk) -> images.Intake:
    """Walk the folder, decode every file once, quarantine what cannot serve."""
    s = desk.settings
    options = images.ReadOptions(
        white=s.white,
        black=s.black,
        transfer=s.transfer,  # type: ignore[arg-type]  # checked by the settings
        pixels=s.pixels,
        pixel_limit=s.pixel_limit,
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
    return intake


def survey(intake: images.Intake, desk: Desk) -> tuple[Survey, Head]:
    """Measure the camera on the frames and make the input table."""
    wanted = desk.settings.table
    kind: TableKind | None = None if wanted == "auto" else wanted  # type: ignore[assignment]
    about = {
        "settings": desk.settings.plain("photos", "survey"),
        "inputs": {f.path: f.sha256 for f in intake.frames},
        "body": {"recipe": RECIPE, "photos": tell.photos(intake)},
    }

    def make() -> Survey:
        frames = functools.partial(images.iterate, intake)
        return camera.survey(frames, intake.contract, kind=kind, progress=desk.progress)

    return desk.stage("survey", about, make)


def sample(intake: images.Intake, found: Survey, parent: Head, desk: Desk) -> tuple[PatchSet, Head]:
    """Draw patches, after saying what memory that and learning will take."""
    s = desk.settings
    settings = images.SampleSettings(
        size=s.patch_size,
        patches=s.patches,
        per_frame=s.per_frame,
        seed=s.seed,
        flat_fraction=s.flat_fraction,
        normalise=s.normalise,
    )
    need = images.memory_needed(settings) / 2**30 + 0.3  # the libraries themselves
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
        return images.sample(intake, found.table, settings, jobs=desk.jobs, progress=desk.progress)

    return desk.stage("patches", about, make)


def learn_basis(
    patches: PatchSet, parent: Head, desk: Desk
) -> tuple[tuple[Dictionary, Dictionary], Head]:
    """Whiten and learn; principal components come along to be looked at beside."""
    s = desk.settings
    about = {"settings": s.plain("learn"), "parents": {"patches": parent["id"]}}

    def make() -> tuple[Dictionary, Dictionary]:
        whitening = learn.whiten(patches, retain=s.retain)
        if s.method == "sparse":
            learned = learn.learn_sparse(
                patches, whitening, atoms=s.components, seed=s.seed, progress=desk.progress
            )
        else:
            learned = learn.learn_ica(
                patches,
                whitening,
                components=s.components,
                seed=s.seed,
                orthogonal=s.orthogonal,
                restarts=s.restarts,
                max_iterations=s.max_iterations,
                progress=desk.progress,
            )
        return learned, learn.learn_pca(patches, whitening)

    (learned, baseline), head = desk.stage("dictionary", about, make)
    return (learned, baseline), head


def fit(dictionary: Dictionary, parent: Head, desk: Desk) -> tuple[tuple[KernelFits, ...], Head]:
    """Describe atoms and filters by parametric kernels."""
    about = {"settings": {}, "parents": {"dictionary": parent["id"]}}

    def make() -> tuple[KernelFits, ...]:
        return (
            shapes.fit_kernels(dictionary.atoms, "atoms", progress=desk.progress),
            shapes.fit_kernels(dictionary.filters, "filters", progress=desk.progress),
        )

    def tables(fits: tuple[KernelFits, ...]) -> dict[str, bytes]:
        made = {f"fits_{f.of}.csv": shapes.fits_csv(f) for f in fits}
        return made | {f"fits_{f.of}.json": store.canonical_json(shapes.fits_json(f)) for f in fits}

    return desk.stage("fits", about, make, extra=tables)


def choose(dictionary: Dictionary, fits: KernelFits, found: Survey, name: str, desk: Desk) -> Bank:
    """Choose the kernels and calibrate their thresholds on noise."""
    s = desk.settings
    if s.as_learned:
        bank = banks.bank_as_learned(dictionary, found, name=name, border=s.border)
    else:
        settings = banks.BankSettings(
            kernels=s.kernels,
            purpose=s.purpose,  # type: ignore[arg-type]  # checked by the settings
            lines=s.lines,
            false_edges=s.false_edges,
            border=s.border,
            name=name,
            seed=s.seed,
        )
        bank = banks.choose_bank(dictionary, fits, found, settings)
    return calibrated(bank, desk)


def calibrated(bank: Bank, desk: Desk) -> Bank:
    """The bank with its table of thresholds, where its strength has a noise unit."""
    from dataclasses import replace

    if bank.table.noise_sd is None or bank.as_learned or not bank.scales:
        return bank
    with desk.timed("thresholds"):
        found = edges.calibrate(bank, seed=desk.settings.seed, progress=desk.progress)
    return replace(bank, thresholds=found)


# ---------------------------------------------------------------- commands


def foresee(photos: Path, desk: Desk) -> dict[str, Any]:
    """What a run would do, without opening a picture or writing a file."""
    listing = images.list_photos(photos)
    return {
        "photos": str(photos),
        "files": len(listing.files),
        "hidden": listing.hidden,
        "other": listing.other,
        "out": str(desk.out),
        "settings": desk.settings.plain(),
    }


def work(photos: Path, desk: Desk, until: str = "run") -> dict[str, Any]:
    """Fill a run's folder from photographs, up to ``survey``, ``learn`` or the whole ``run``.

    Returns
    -------
    dict : plain data, the command's result

    Raises
    ------
    InputError, UsageError, Interrupted : finished stages are kept.
    """
    intake = take_in(photos, desk)
    found, survey_head = survey(intake, desk)
    if until == "survey":
        return tell.survey(found, survey_head)
    patches, patches_head = sample(intake, found, survey_head, desk)
    (dictionary, _), dictionary_head = learn_basis(patches, patches_head, desk)
    if until == "learn":
        return tell.learned(dictionary, patches, desk)
    (atom_fits, _), fits_head = fit(dictionary, dictionary_head, desk)
    with desk.timed("bank"):
        bank = choose(dictionary, atom_fits, found, bank_name(desk.out, desk.settings), desk)
        crop = next(images.iterate(intake)).pixels
        written = write_bundle(
            desk.out / "bank",
            bank,
            desk,
            parents={"fits": fits_head["id"], "survey": survey_head["id"]},
            inputs={f.path: f.sha256 for f in intake.frames},
            crop=crop,
        )
    result = tell.run(intake, found, patches, dictionary, atom_fits, written, desk)
    store.write_file(desk.out / "run.json", store.canonical_json(result))
    return result
