"""What is done with a bank or a run that stands: verify, detect, compare, reopen.

Nothing here needs the learner: a bank runs where numba and scikit-learn are absent.
"""

from __future__ import annotations

import io
from collections import Counter
from collections.abc import Callable, Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import edges, images, store
from patchlab.conventions import shift_cosine
from patchlab.errors import InputError, PatchlabError, UsageError
from patchlab.pipeline.bundle import open_native, prove
from patchlab.pipeline.desk import may_write
from patchlab.progress import Progress, silent
from patchlab.types import (
    Bank,
    Dictionary,
    EdgeMap,
    Frame,
    KernelFits,
    PatchSet,
    Plan,
    Quarantined,
    Survey,
)

Draw = Callable[[Frame, EdgeMap, int], Mapping[str, bytes]]


def bank_folder(path: Path) -> Path:
    """The bank at a path: the folder itself, or the bank inside a run's folder."""
    if not (path / "bank.json").is_file() and (path / "bank" / "bank.json").is_file():
        return path / "bank"
    return path


# ---------------------------------------------------------------- verify


def verify(path: Path, progress: Progress = silent) -> dict[str, Any]:
    """Run every target of a bank; plain data, with ``passed`` for all."""
    folder = bank_folder(path)
    bank, plan, head = banks.read_bank(folder)
    proof = prove(folder, bank, plan, head, progress)

    def number(value: float, ran: bool | None) -> float | None:
        return float(value) if ran is not None and np.isfinite(value) else None

    return {
        "bank": bank.name,
        "id": head["id"],
        "passed": proof.passed,
        "checks": [
            {
                "target": c.target,
                "what": c.what,
                "worst_error": number(c.worst_error, c.passed),
                "bound": number(c.bound, c.passed),
                "passed": c.passed,
                "note": c.note,
            }
            for c in proof.checks
        ],
    }


# ---------------------------------------------------------------- detect


def responder(folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any]) -> Any:
    """The fastest engine at hand: the compiled library of this machine, else numpy."""
    native = open_native(folder, bank, plan, head)
    if native is not None:
        return native.responses
    return lambda pixels: banks.responses(bank, pixels, plan)


def detect(
    path: Path,
    pictures: Path,
    out: Path,
    *,
    rate: float | None,
    threshold: float | None,
    max_bad: float,
    force: bool,
    draw: Draw,
    progress: Progress = silent,
) -> dict[str, Any]:
    """Edges of every picture: maps and edgels as files, counts as plain data.

    Raises
    ------
    InputError : more than ``max_bad`` of the pictures cannot serve (exit 3).
    UsageError : the output exists, or the bank has no promise to set a threshold from.
    """
    folder = bank_folder(path)
    bank, plan, head = banks.read_bank(folder)
    level, _ = edges.threshold_of(bank, rate=rate, threshold=threshold)
    may_write(out, force)
    listing = images.list_photos(pictures)
    if not listing.files:
        raise InputError("there are no pictures here", where=str(pictures))
    respond = responder(folder, bank, plan, head)
    found: list[dict[str, Any]] = []
    bad: list[Quarantined] = []
    for done, name in enumerate(listing.files, 1):
        try:
            for frame in images.read_file(listing.root, name, _options(bank)):
                found.append(_detect_one(bank, frame, respond, level, out, draw))
        except PatchlabError as error:
            bad.append(Quarantined(name, str(error)))
        progress("detect", done, len(listing.files), name)
    if len(bad) > max_bad * len(listing.files):
        raise InputError(
            f"{len(bad)} of {len(listing.files)} pictures cannot serve",
            where=str(pictures),
            remedy=f"the first: {bad[0].path}: {bad[0].reason}",
        )
    result = {
        "bank": head["id"],
        "images": found,
        "quarantined": [{"path": q.path, "reason": q.reason} for q in bad],
    }
    store.write_file(out / "detect.json", store.canonical_json(result))
    return result


def _options(bank: Bank) -> images.ReadOptions:
    c = bank.contract
    return images.ReadOptions(white=c.white, black=c.black, transfer=c.transfer, pixels=c.pixels)


def _detect_one(
    bank: Bank, frame: Frame, respond: Any, level: float, out: Path, draw: Draw
) -> dict[str, Any]:
    found, edgels = edges.detect_edgels(
        bank,
        frame.pixels,
        respond,
        threshold=level,
        invalid=frame.invalid,
        blur_px=bank.provenance.get("blur_sigma_px"),
    )
    stem = frame.path.replace("#", "_page")
    store.write_file(out / "edgels" / f"{stem}.csv", edges.edgels_csv(edgels))
    for name, data in draw(frame, found, orientation_count(bank)).items():
        store.write_file(out / name / f"{stem}.png", data)
    return {"path": frame.path, "edgels": len(edgels), "strength_threshold": float(level)}


def orientation_count(bank: Bank) -> int:
    """Directions on the bank's lattice."""
    return 1 + max((k.orientation or 0 for k in bank.kernels), default=0)


# ---------------------------------------------------------------- compare


def compare(first: Path, second: Path) -> dict[str, Any]:
    """Match two dictionaries or two banks: bit-equal, equivalent (|cos| >= 0.999) or different."""
    kind, a, one = _comparable(first)
    other, b, two = _comparable(second)
    if kind != other:
        raise UsageError(f"cannot compare a {kind} with a {other}")
    if kind == "dictionary":
        from patchlab import learn  # only here: a bank runs without the learner

        _, signed = learn.match(*sorted((a, b), key=len))
        cosines = np.abs(signed)
    else:
        cosines = np.array([max(shift_cosine(k, m) for m in b) for k in a])
    same_bytes = one == two
    equal = a.shape == b.shape and bool((cosines >= 0.999).all())
    return {
        "kind": kind,
        "verdict": "bit-equal" if same_bytes else "equivalent" if equal else "different",
        "first": len(a),
        "second": len(b),
        "worst_cosine": round(float(cosines.min()), 6),
        "median_cosine": round(float(np.median(cosines)), 6),
        "matched_at_0.95": round(float((cosines >= 0.95).mean()), 4),
    }


def _comparable(path: Path) -> tuple[str, Any, Any]:
    folder = bank_folder(path)
    if (folder / "bank.json").is_file():
        bank, _, head = banks.read_bank(folder)
        return "bank", bank.taps.astype(np.float64), head["files"]["kernels.npy"]
    if (path / "dictionary").is_dir():
        path = path / "dictionary"
    (dictionary, _), head = store.load(path, "dictionary")
    return "dictionary", dictionary.atoms, head["files"]["0.atoms.npy"]


# ---------------------------------------------------------------- scenes


def scenes(out: Path, count: int, progress: Progress = silent) -> dict[str, Any]:
    """Render the frames of the invented camera."""
    images.make_sample_images(out, count)
    return {"folder": str(out), "frames": count}


# ---------------------------------------------------------------- a run, reopened for its page


@dataclass(frozen=True, eq=False)
class RunContent:
    """Everything a finished run holds, for its page."""

    photos: Mapping[str, Any]
    survey: Survey
    patches: PatchSet
    dictionary: Dictionary
    baseline: Dictionary
    atom_fits: KernelFits
    filter_fits: KernelFits
    bank: Bank
    plan: Plan
    bank_head: Mapping[str, Any]
    settings: Mapping[str, Any]
    frame: Frame | None
    found: EdgeMap | None
    rate: float
    no_edges: str = ""

    @property
    def orientations(self) -> int:
        """Directions on the bank's lattice."""
        return orientation_count(self.bank)

    @property
    def purpose(self) -> str:
        """What the bank is for, as an adjective."""
        return {"edges": "edge", "features": "feature"}.get(self.bank.purpose, self.bank.purpose)

    @property
    def about_bank(self) -> str:
        """Sizes and units of the kernels, in a sentence or two."""
        sizes = {
            (p["sigma_u_px"], p["sigma_v_px"])
            for p in (k.parameters for k in self.bank.kernels)
            if "sigma_u_px" in p
        }
        text = ""
        if sizes:
            told = " and ".join(f"{u:.2f} by {v:.2f}" for u, v in sorted(sizes))
            text = f"Widths across and along the edge, px: {told}. "
        if self.bank.table.noise_sd is not None:
            return text + "Every response is in units of the camera's noise."
        return text + "The noise is not known, so kernels have unit norm instead."

    @property
    def families(self) -> str:
        """How many atoms each family describes, in words."""
        counts = Counter(f.family for f in self.atom_fits.fits)
        return ", ".join(f"{n} {name.replace('_', '-')}" for name, n in counts.most_common())

    @property
    def warnings(self) -> tuple[str, ...]:
        """Everything that a person should know first."""
        return (*self.dictionary.warnings, *self.bank.warnings)


def open_run(out: Path) -> RunContent:
    """Read every artefact of a finished run, and find the edges of its example frame.

    Raises
    ------
    InputError : a stage is missing; VerificationError : a file was changed.
    """
    survey, survey_head = store.load(out / "survey", "survey")
    patches, _ = store.load(out / "patches", "patches")
    (dictionary, baseline), _ = store.load(out / "dictionary", "dictionary")
    (atom_fits, filter_fits), _ = store.load(out / "fits", "fits")
    bank, plan, head = banks.read_bank(out / "bank")
    frame = _example(out, survey, survey_head)
    rate = float(head["settings"].get("false_edges", 10.0))
    found, reason = None, "the survey kept no example frame"
    if frame is not None:
        found, reason = _example_edges(out / "bank", bank, plan, head, frame, rate)
    return RunContent(
        photos=survey_head["photos"],
        survey=survey,
        patches=patches,
        dictionary=dictionary,
        baseline=baseline,
        atom_fits=atom_fits,
        filter_fits=filter_fits,
        bank=bank,
        plan=plan,
        bank_head=head,
        settings={**survey_head["settings"], **head["settings"], "seed": head["seed"]},
        frame=frame,
        found=found,
        rate=rate,
        no_edges=reason,
    )


def _example(out: Path, survey: Survey, head: Mapping[str, Any]) -> Frame | None:
    if "example.npy" not in head["files"]:
        return None
    data = store.read_file(out / "survey", head, "example.npy")
    pixels = np.load(io.BytesIO(data), allow_pickle=False)
    return Frame(head["example"], pixels, survey.contract)


def _example_edges(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any], frame: Frame, rate: float
) -> tuple[EdgeMap | None, str]:
    if bank.thresholds is None:
        return None, "this bank has no threshold in noise units"
    respond = responder(folder, bank, plan, head)
    try:
        return edges.detect(bank, frame.pixels, respond, rate=rate), ""
    except PatchlabError as error:
        return None, str(error)
