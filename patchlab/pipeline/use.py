"""What is done with a bank or a run that stands: verify, reopen.

Nothing here needs the learner: a bank runs where numba and scikit-learn are absent.
"""

from __future__ import annotations

import io
import json
from collections import Counter
from collections.abc import Callable, Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import edges, images, store
from patchlab.errors import PatchlabError, UsageError
from patchlab.pipeline.bundle import open_native, prove
from patchlab.pipeline.loaded import bank_folder
from patchlab.progress import Progress, silent
from patchlab.types import (
    Bank,
    Dictionary,
    EdgeMap,
    Frame,
    KernelFits,
    Parts,
    PatchSet,
    Plan,
    Survey,
)

SHOWN_WITHOUT_PROMISE = 0.98
"""Quantile of the responses that serves the page's example where noise is not known."""

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


# ---------------------------------------------------------------- running a bank


def responder(folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any]) -> Any:
    """The fastest engine at hand: the compiled library of this machine, else numpy."""
    return engine_of(folder, bank, plan, head).respond


@dataclass(frozen=True)
class Engine:
    """What computes a bank: its responses, and the compiled library where there is one."""

    respond: Callable[[Any], Any]
    native: banks.NativeBank | None = None


def engine_of(folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any]) -> Engine:
    """The compiled library of this machine, else numpy."""
    native = open_native(folder, bank, plan, head)
    if native is not None:
        return Engine(native.responses, native)
    return Engine(lambda pixels: banks.responses(bank, pixels, plan))


def orientation_count(bank: Bank) -> int:
    """Directions on the bank's lattice."""
    return 1 + max((k.orientation or 0 for k in bank.kernels), default=0)


# ---------------------------------------------------------------- scenes


NOTES = {"views": b"# Sample images", "brackets": b"# Pictures for inspection"}
"""How the note begins that lies with rendered pictures."""


def scenes(
    out: Path, count: int, progress: Progress = silent, *, kind: str = "views"
) -> dict[str, Any]:
    """Render the frames of the invented camera: views of a tile works, or stamped brackets.

    Raises
    ------
    UsageError : the folder holds something else, which would be mixed up or replaced.
    """
    ours = out / "NOTE.md"
    known = ours.is_file() and ours.read_bytes().startswith(NOTES[kind])
    if out.is_dir() and any(out.iterdir()) and not known:
        raise UsageError(
            "the folder holds something else", where=str(out), remedy="name a new folder"
        )
    make = images.make_sample_images if kind == "views" else images.make_brackets
    make(out, count, progress=progress)
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
    assessed: Mapping[str, Any] | None = None
    parts: tuple[Parts, Parts] | None = None

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
    def frames_left_out(self) -> Mapping[str, int]:
        """Frames that were not learned from, by reason."""
        used = set(self.patches.frames)
        gone = [reason for path, reason in self.survey.distrusted if path not in used]
        return dict(sorted(Counter(gone).items()))

    @property
    def marked(self) -> str:
        """Components that describe a mark of the camera, in words."""
        known = self.bank.provenance.get("marked_components", ())
        names = Counter(name.replace("_", " ") for _, name, _ in known)
        return ", ".join(f"{count} by the {name}" for name, count in names.most_common())

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
    patches, patches_head = store.load(out / "patches", "patches")
    (dictionary, baseline), dictionary_head = store.load(out / "dictionary", "dictionary")
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
        settings={
            **survey_head["settings"],
            **patches_head["settings"],
            **dictionary_head["settings"],
            **head["settings"],
            "seed": head["seed"],
        },
        frame=frame,
        found=found,
        rate=rate,
        no_edges=reason,
        assessed=_assessed(out, head["id"]),
        parts=_parts(out),
    )


def _parts(out: Path) -> tuple[Parts, Parts] | None:
    """Independent and principal components of aligned pictures, where they stand in the folder."""
    if not (out / "parts" / "manifest.json").is_file():
        return None
    independent, principal = store.load(out / "parts", "parts")[0]
    return independent, principal


def _assessed(out: Path, bank_id: str) -> dict[str, Any] | None:
    """What an assessment of this very bank found, where one stands in the run's folder."""
    if not (out / "assess" / "manifest.json").is_file():
        return None
    head = store.read_manifest(out / "assess", "assess")
    found: dict[str, Any] = json.loads(store.read_file(out / "assess", head, "assess.json"))
    return found if found["id"] == bank_id else None


def _example(out: Path, survey: Survey, head: Mapping[str, Any]) -> Frame | None:
    if "example.npy" not in head["files"]:
        return None
    data = store.read_file(out / "survey", head, "example.npy")
    pixels = np.load(io.BytesIO(data), allow_pickle=False)
    return Frame(head["example"], pixels, survey.contract)


def _example_edges(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any], frame: Frame, rate: float
) -> tuple[EdgeMap | None, str]:
    respond = responder(folder, bank, plan, head)
    try:
        if bank.thresholds is not None:
            return edges.detect(bank, frame.pixels, respond, rate=rate), ""
        level = float(np.quantile(np.abs(respond(frame.pixels)), SHOWN_WITHOUT_PROMISE))
        return edges.detect(bank, frame.pixels, respond, threshold=max(level, 1e-6)), ""
    except PatchlabError as error:
        return None, str(error)
