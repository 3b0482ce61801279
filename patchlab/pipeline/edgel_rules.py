"""What the compiled code must know to find and place edgels as :mod:`patchlab.edges` does."""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import bank as banks
from patchlab import edges, export
from patchlab.edges import locate, model, thin
from patchlab.edges.noise import spectral_moments
from patchlab.errors import UsageError
from patchlab.types import F32, F64, Bank, Plan, Thresholds


def edgel_rules(bank: Bank) -> export.EdgelRules | None:
    """The rules of a bank's edgels; None for a bank that finds no edges, or of colours.

    Edgels of colour stand at the pixel: the model of an edge is one of one plane.
    """
    if bank.planes > 1:
        return None
    try:
        own = thin.shapes_of(bank)
    except UsageError:
        return None
    lines = _lines(bank)
    curve = model.curve_of(bank.table)
    known, of_lines = bank.thresholds, bank.line_thresholds
    return export.EdgelRules(
        own=_scales(bank, own, bank.strength),
        lines=_scales(bank, lines, "line"),
        hysteresis=thin.HYSTERESIS if known is None else known.hysteresis,
        line_hysteresis=thin.HYSTERESIS if of_lines is None else of_lines.hysteresis,
        light=curve.light,
        value=curve.value,
        clipped=curve.clipped,
        noise_sd=bank.table.noise_sd,
        autocovariance=bank.noise_autocovariance,
        blur_px=bank.provenance.get("blur_sigma_px"),
        start_blur_px=locate.BLUR_PX,
        misfit=locate.MISFIT,
        leash_px=locate.LEASH_PX,
        runaway_px=model.RUNAWAY_PX,
        soft_noise=thin.SOFT_NOISE,
        iterations=model.ITERATIONS,
        settled=model.SETTLED,
        damping=model.DAMPING,
        kept=model.KEPT,
        careful=model.CAREFUL,
        level_rounding=model.LEVEL_ROUNDING,
        asks=model.ASKS,
        largest_step=model.LARGEST_STEP,
        prior=model.PRIOR,
    )


def edgel_finder(bank: Bank) -> export.EdgelFinder:
    """Python's own edgels on responses that stand: what compiled ones are compared with."""
    ratios = {
        kind: thin.HYSTERESIS if table is None else table.hysteresis
        for kind, table in ((bank.strength, bank.thresholds), ("line", bank.line_thresholds))
        if kind == bank.strength or bank.strength == "step"
    }

    def find(
        pixels: NDArray[Any], responses: F32, threshold: float, line_threshold: float
    ) -> NDArray[np.void]:
        asked: dict[thin.Kind, float] = {bank.strength: threshold, "line": line_threshold}
        if bank.strength == "line":
            asked = {"line": threshold}
        levels = {kind: (high, ratios[kind]) for kind, high in asked.items() if high}
        blur = bank.provenance.get("blur_sigma_px")
        return edges.find_on(bank, pixels, responses, levels, blur_px=blur).edgels

    return find


def compiled_edgels(
    bank: Bank, native: banks.NativeBank | None, levels: Mapping[thin.Kind, tuple[float, float]]
) -> Callable[[NDArray[Any]], NDArray[np.void]] | None:
    """The compiled library's edgels at some thresholds; None where it has not these kinds.

    They are those that Python finds on the library's responses, several times as fast.
    """
    kinds = {bank.strength, "line"} if bank.strength == "step" else {bank.strength}
    if native is None or not native.has_edgels or not set(levels) <= kinds:
        return None
    high = {kind: level for kind, (level, _) in levels.items()}
    own = high.get(bank.strength, 0.0)
    lines = high.get("line", 0.0) if bank.strength == "step" else 0.0
    return lambda pixels: native.edgels(pixels, own, lines)


def edgel_cases(bank: Bank, plan: Plan, crop: Any = None) -> tuple[export.EdgelCase, ...]:
    """Pictures with the edgels that the bank finds; none for a bank that finds no edges."""
    rules = edgel_rules(bank)
    if rules is None:
        return ()
    return export.make_edgel_cases(
        bank,
        plan,
        banks.exact_responses,
        edgel_finder(bank),
        threshold=_middle(bank.thresholds),
        line_threshold=_middle(bank.line_thresholds) if rules.lines else 0.0,
        crop=crop,
    )


def _middle(table: Thresholds | None) -> float | None:
    """The threshold in the middle of a table."""
    return None if table is None else float(table.strength[len(table.strength) // 2])


def _lines(bank: Bank) -> tuple[thin.ScaleShape, ...]:
    """The scales that find lines beside the bank's own steps."""
    if bank.strength != "step":
        return ()
    try:
        return thin.shapes_of(bank, "line")
    except UsageError:
        return ()


def _scales(
    bank: Bank, shapes: tuple[thin.ScaleShape, ...], kind: thin.Kind
) -> tuple[export.EdgelScale, ...]:
    softer = thin.softer_of(shapes, kind)
    around = [s and (s[0], math.ceil(shapes[s[0]].sigma_px), s[1]) for s in softer]
    return tuple(_scale(bank, s, kind, a) for s, a in zip(shapes, around, strict=True))


def _scale(
    bank: Bank, shape: thin.ScaleShape, kind: thin.Kind, softer: tuple[int, int, float] | None
) -> export.EdgelScale:
    disk = locate.disk_of(shape, locate.RADIUS_PX)
    odd = shape.odd if kind != "line" else ()
    even = shape.even if kind != "step" else ()
    own = thin.RELATIVE_FLOOR if shape.scale > 0 else 0.0
    rival: tuple[int, ...] = ()
    other = 0.0
    if kind == "line":
        own, rival, other = thin.LINE_FLOOR, shape.odd, thin.LINE_OVER_STEP
    elif kind == "step":
        rival, other = shape.even, 1 / thin.LINE_OVER_STEP
    return export.EdgelScale(
        scale=shape.scale,
        odd=odd,
        even=even,
        angles=shape.angles,
        reach_px=shape.reach_px,
        around_px=math.ceil(thin.WINDOW_SIGMAS * shape.sigma_px),
        own=own,
        other=other,
        rival=rival,
        rival_of_lines=kind == "step",
        slope_odd=_slopes(bank, odd, shape.angles),
        slope_even=_slopes(bank, even, shape.angles),
        apart_px=shape.apart_px,
        radii=(disk.radius, disk.narrow),
        blur_px=disk.blur_px,
        slack=disk.slack,
        softer=softer,
    )


def _slopes(bank: Bank, members: tuple[int, ...], angles: F64) -> F64:
    """Root mean square slope along the normal of each kernel's response to noise."""
    return np.array(
        [
            math.sqrt(spectral_moments(bank.taps[i], float(a), bank.noise_autocovariance)[1])
            for i, a in zip(members, angles[: len(members)], strict=True)
        ]
    )
