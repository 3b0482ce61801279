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
        "outside": intake.listing.outside,
        "pixels": intake.contract.pixels,
        "plane": intake.contract.plane,
        "transfer": intake.contract.transfer,
        "notes": dict(sorted(Counter(n for f in intake.frames for n in f.notes).items())),
    }


def _rounded(value: float | None, digits: int = 5) -> float | None:
    return None if value is None else float(f"{value:.{digits}g}")


def survey(found: Survey, head: dict[str, Any]) -> dict[str, Any]:
    """The camera's survey."""
    return {
        "frames": _frames(head["photos"]),
        "pixels": found.contract.pixels,
        "plane": found.contract.plane,
        "noise": _noise(found),
        "blur": _blur(found),
        "spectrum": {
            "exponent": _rounded(found.spectrum_exponent),
            "spread": _rounded(found.spectrum_spread),
            "anisotropy": _rounded(found.spectrum_anisotropy),
            "noise_overtakes_cpp": _rounded(found.noise_overtakes_cpp),
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
        "distrusted": [{"path": path, "reason": reason} for path, reason in found.distrusted],
        "block_grid_begins": None if found.grid is None else list(found.grid),
        "notes": list(found.notes),
    }


def left_out(found: Survey) -> dict[str, int]:
    """How many frames the survey distrusts, by reason."""
    return dict(sorted(Counter(reason for _, reason in found.distrusted).items()))


def flagged(made: Bank) -> list[dict[str, Any]]:
    """Components that describe a mark, numbered from 1 as on the page."""
    known = made.provenance.get("marked_components", ())
    return [
        {"component": n, "mark": name, "kept": kept, "looks": looks[0] if looks else ""}
        for n, name, kept, *looks in known
    ]


def _noise(found: Survey) -> dict[str, Any]:
    noise = found.noise
    acov = noise.autocovariance
    return {
        "measurable": noise.measurable,
        "reason": noise.reason,
        "source": noise.source,
        "gain_dn_per_electron": _rounded(noise.gain),
        "gain_standard_error": _rounded(noise.gain_error),
        "read_noise_dn": _rounded(noise.read_noise),
        "read_noise_standard_error": _rounded(noise.read_noise_error),
        "levels_dn": [_rounded(v) for v in noise.levels.tolist()],
        "sd_dn": [_rounded(v) for v in noise.sd.tolist()],
        "white": acov is None,
        "autocovariance": None if acov is None else [[_rounded(v) for v in r] for r in acov],
        "kept_fraction": _rounded(noise.kept_fraction),
    }


def _blur(found: Survey) -> dict[str, Any]:
    told: dict[str, Any] = {"sigma_px": _rounded(found.blur_sigma_px), "note": found.blur_note}
    edge = found.slanted_edge
    if edge is not None:
        told["slanted_edge"] = {
            "angle_deg": _rounded(edge.angle_deg),
            "mtf50_cpp": _finite(edge.mtf50_cpp),
            "sigma_px": _finite(edge.sigma_px),
            "frequency_cpp": [_rounded(v) for v in edge.frequency_cpp.tolist()],
            "mtf": [_rounded(v) for v in edge.mtf.tolist()],
        }
    return told


def _finite(value: float) -> float | None:
    return _rounded(value) if value == value else None


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
        "stopped_at": dictionary.stopped_at,
        "held_out_curve": [[int(s), _rounded(v, 8)] for s, v in dictionary.held_out_curve],
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
        "frames": {"used": len(patches.frames), "quarantined": len(intake.quarantined)},
        "frames_left_out": {} if desk.settings.all_frames else left_out(found),
        "patches_left_out": dict(patches.rejected),
        "marked_components": flagged(written.bank),
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
