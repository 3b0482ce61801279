"""Results as plain data: what a command prints, with ``--json`` word for word."""

from __future__ import annotations

from collections import Counter
from typing import TYPE_CHECKING, Any

import numpy as np

from patchlab import learn
from patchlab.types import F64, Bank, Dictionary, KernelFits, PatchSet, Survey

if TYPE_CHECKING:
    from patchlab.images import Intake
    from patchlab.pipeline.bundle import Written
    from patchlab.pipeline.desk import Desk


def photos(intake: Intake) -> dict[str, Any]:
    """What was read and what was not."""
    return {
        "used": len(intake.frames),
        "quarantined": [
            {"path": q.path, "reason": q.reason, "sha256": q.sha256} for q in intake.quarantined
        ],
        "hidden": intake.listing.hidden,
        "other": intake.listing.other,
        "pixels": intake.contract.pixels,
        "transfer": intake.contract.transfer,
        "notes": dict(sorted(Counter(n for f in intake.frames for n in f.notes).items())),
    }


def _rounded(value: float | None, digits: int = 5) -> float | None:
    return None if value is None else float(f"{value:.{digits}g}")


def survey(found: Survey, head: dict[str, Any]) -> dict[str, Any]:
    """The camera's survey."""
    noise = found.noise
    return {
        "frames": _frames(head["photos"]),
        "pixels": found.contract.pixels,
        "noise": {
            "measurable": noise.measurable,
            "reason": noise.reason,
            "gain_dn_per_electron": _rounded(noise.gain),
            "gain_standard_error": _rounded(noise.gain_error),
            "read_noise_dn": _rounded(noise.read_noise),
            "read_noise_standard_error": _rounded(noise.read_noise_error),
            "white": noise.autocovariance is None,
            "kept_fraction": _rounded(noise.kept_fraction),
        },
        "blur": {"sigma_px": _rounded(found.blur_sigma_px), "note": found.blur_note},
        "spectrum": {
            "exponent": _rounded(found.spectrum_exponent),
            "spread": _rounded(found.spectrum_spread),
        },
        "table": found.table.kind,
        "marks": [
            {
                "name": m.name,
                "found": m.found,
                "value": _rounded(m.value),
                "threshold": _rounded(m.threshold),
                "effect": m.effect,
                "remedy": m.remedy,
            }
            for m in found.marks
        ],
    }


def _frames(photos: dict[str, Any]) -> dict[str, int]:
    return {"used": photos["used"], "quarantined": len(photos["quarantined"])}


def learned(dictionary: Dictionary, patches: PatchSet, desk: Desk) -> dict[str, Any]:
    """What learning ended with."""
    return {
        "patches": len(patches),
        "patch_size": patches.size,
        "components": len(dictionary),
        "converged": dictionary.converged,
        "iterations": dictionary.iterations,
        "identified": int(dictionary.identified.sum()),
        "log_likelihood": _rounded(dictionary.log_likelihood, 8),
        "sure": sure(dictionary),
        "choice": choice(dictionary),
        "warnings": list(dictionary.warnings),
        "seconds": dict(desk.seconds),
    }


def sure(dictionary: Dictionary) -> dict[str, Any]:
    """How well components, and their shapes as a crowd, are found again."""

    def found(values: F64) -> dict[str, float | None] | None:
        if not np.isfinite(values).any():
            return None
        share, middle = float(np.mean(values > 0.9)), float(np.median(values))
        return {"share_above_0.9": _rounded(share), "median_cos": _rounded(middle)}

    return {
        "over_restarts": found(dictionary.over_restarts),
        "over_halves": found(dictionary.over_resamples),
        "shapes_over_restarts": {
            name: {k: _rounded(v) for k, v in s.items()}
            for name, s in learn.shape_spread(dictionary).items()
        },
    }


def choice(dictionary: Dictionary) -> dict[str, Any] | None:
    """How the number of components was chosen from the data, where it was."""
    made = dictionary.choice
    if made is None:
        return None
    return {
        "chosen": made.chosen,
        "reason": made.reason,
        "counts": made.counts.tolist(),
        "gain_nats_per_pixel": [_rounded(v) for v in made.gain],
        "standard_error": [_rounded(v) for v in made.error],
        "found_again_median_cos": [_rounded(v) for v in made.found_again],
    }


def fits(found: KernelFits) -> dict[str, Any]:
    """How well the shapes describe the components."""
    return {
        "good": found.count("good"),
        "poor": found.count("poor"),
        "failed": found.count("failed"),
        "median_r2": _rounded(found.median_r2),
        "families": dict(sorted(Counter(f.family for f in found.fits).items())),
    }


def _at_budget(made: Bank) -> float:
    """Best coverage that a bank of this many kernels reaches on the same atoms."""
    coverage = made.coverage
    assert coverage is not None
    known = dict(zip(coverage.budget.tolist(), coverage.curve.tolist(), strict=True))
    return max(float(known.get(len(made), 0.0)), coverage.learned)


def bank(written: Written) -> dict[str, Any]:
    """An exported bank."""
    made = written.bank
    coverage = made.coverage
    return {
        "path": str(written.folder),
        "id": written.head["id"],
        "name": made.name,
        "kernels": len(made),
        "size": made.size,
        "pixels": made.contract.pixels,
        "coverage": _rounded(coverage.learned) if coverage else None,
        "coverage_best": _rounded(_at_budget(made)) if coverage else None,
        "coverage_rotated": _rounded(coverage.rotated) if coverage else None,
        "coverage_untrained": _rounded(coverage.untrained) if coverage else None,
        "multiplies_per_pixel": written.plan.multiplies,
        "worst_error": _rounded(written.worst_error),
        "error_bound": _rounded(written.error_bound),
        "library": written.library,
        "onnx": written.onnx,
        "warnings": list(made.warnings),
    }


def run(
    intake: Intake,
    found: Survey,
    patches: PatchSet,
    dictionary: Dictionary,
    atom_fits: KernelFits,
    written: Written,
    desk: Desk,
) -> dict[str, Any]:
    """The whole job."""
    return {
        "frames": {"used": len(intake.frames), "quarantined": len(intake.quarantined)},
        "patches": len(patches),
        "patch_size": patches.size,
        "components": len(dictionary),
        "converged": dictionary.converged,
        "noise_measurable": found.noise.measurable,
        "table": found.table.kind,
        "fits": fits(atom_fits),
        "bank": bank(written),
        "warnings": [*dictionary.warnings, *written.bank.warnings],
        "seconds": dict(desk.seconds),
    }
