"""One picture in, its edges out: the calibrated chain with a threshold from a promised rate."""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping
from dataclasses import dataclass
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.edges import thin
from patchlab.edges.locate import edgels
from patchlab.edges.threshold import strength_for
from patchlab.errors import InputError, UsageError
from patchlab.types import F32, Bank, EdgeMap, Thresholds

RATE = 10.0
"""Default promise, false edge elements per megapixel of flat picture."""

What = Literal["step", "line", "both"]
"""What a person asks for: steps, lines, or both, each with its own promise."""
Respond = Callable[[NDArray[Any]], F32]
Place = Callable[[NDArray[Any]], NDArray[np.void]]


def threshold_of(
    bank: Bank,
    *,
    rate: float | None = None,
    threshold: float | None = None,
    thresholds: Thresholds | None = None,
) -> tuple[float, float]:
    """The high threshold and the hysteresis ratio that a request means.

    Parameters
    ----------
    bank : Bank
    rate : false elements per megapixel; None means :data:`RATE` unless a threshold is given
    threshold : a strength in place of a rate
    thresholds : table to use instead of the bank's own (for lines, say)

    Raises
    ------
    UsageError : both a rate and a threshold, no table for a rate, a rate outside the table.
    """
    table = thresholds if thresholds is not None else bank.thresholds
    ratio = table.hysteresis if table is not None else thin.HYSTERESIS
    if threshold is not None:
        if rate is not None:
            raise UsageError("give a false-alarm rate or a strength threshold, not both")
        if not 0 < threshold < math.inf:
            raise UsageError(
                f"the strength threshold must be positive and finite, not {threshold:g}"
            )
        return float(threshold), ratio
    if rate is not None and not math.isfinite(rate):
        raise UsageError(f"the rate of false edges must be a finite number, not {rate:g}")
    if table is None:
        raise UsageError(
            "this bank has no thresholds",
            where=bank.name,
            remedy="give a strength threshold instead of a false-alarm rate",
        )
    return strength_for(table, RATE if rate is None else rate), ratio


def _checked(bank: Bank, pixels: NDArray[Any], respond: Respond) -> F32:
    if pixels.ndim != 2:
        raise InputError(f"a picture is one plane (h, w), not an array of shape {pixels.shape}")
    if min(pixels.shape) < bank.size:
        raise InputError(
            f"a picture of shape {pixels.shape} is too small for kernels of {bank.size} px",
            remedy=f"give one plane of at least {bank.size} x {bank.size} pixels",
        )
    responses = respond(pixels)
    if responses.shape != (len(bank), *pixels.shape):
        raise UsageError(f"the engine answered {responses.shape} for {len(bank)} kernels")
    return responses


def detect(
    bank: Bank,
    pixels: NDArray[Any],
    respond: Respond,
    *,
    rate: float | None = None,
    threshold: float | None = None,
    thresholds: Thresholds | None = None,
    kind: thin.Kind | None = None,
    invalid: NDArray[np.bool_] | None = None,
) -> EdgeMap:
    """Find the edges of one picture.

    Elements nearer to the frame's border than the kernels of their scale reach are left
    out: there the border rule would show the same noise twice and break the promise.

    Parameters
    ----------
    bank : Bank with kernels on an orientation lattice
    pixels : ndarray (h, w) of the bank's pixel format
    respond : the engine, pixels -> float32 responses (n, h, w)
    rate, threshold, thresholds : as :func:`threshold_of`
    kind : step, line or energy; None means ``bank.strength``
    invalid : bool ndarray (h, w); elements whose kernel touches such a pixel are dropped

    Returns
    -------
    EdgeMap

    Raises
    ------
    UsageError : as :func:`threshold_of`; no kernels for this kind of edge.
    InputError : the picture is smaller than a kernel.
    """
    high, ratio = threshold_of(bank, rate=rate, threshold=threshold, thresholds=thresholds)
    responses = _checked(bank, pixels, respond)
    return thin.edge_map(bank, responses, high, hysteresis_ratio=ratio, kind=kind, invalid=invalid)


def detect_edgels(
    bank: Bank,
    pixels: NDArray[Any],
    respond: Respond,
    *,
    rate: float | None = None,
    threshold: float | None = None,
    thresholds: Thresholds | None = None,
    kind: thin.Kind | None = None,
    invalid: NDArray[np.bool_] | None = None,
    blur_px: float | None = None,
) -> tuple[EdgeMap, NDArray[np.void]]:
    """Find the edges of one picture and place them below the pixel.

    Parameters are those of :func:`detect`; ``blur_px`` is the camera's blur (one standard
    deviation, pixels), None when it is not known.

    Returns
    -------
    EdgeMap, and a structured array of :data:`patchlab.types.EDGEL` in row order
    """
    high, ratio = threshold_of(bank, rate=rate, threshold=threshold, thresholds=thresholds)
    responses = _checked(bank, pixels, respond)
    found = thin.edge_map(bank, responses, high, hysteresis_ratio=ratio, kind=kind, invalid=invalid)
    values = bank.table.apply(pixels)
    where = edgels(bank, values, found, responses, blur_px=blur_px, kind=kind, invalid=invalid)
    return found, where


@dataclass(frozen=True, eq=False)
class Found:
    """Everything found in one picture.

    Parameters
    ----------
    maps : EdgeMap of each kind that was looked for, "step" or "line"
    edgels : structured array of :data:`patchlab.types.EDGEL`, in row order
    """

    maps: Mapping[str, EdgeMap]
    edgels: NDArray[np.void]

    @property
    def shown(self) -> EdgeMap:
        """One map for pictures: where both kinds were looked for, elements of either."""
        maps = list(self.maps.values())
        if len(maps) == 1:
            return maps[0]
        steps, lines = maps
        louder = lines.strength > steps.strength
        use = np.where(steps.edges == lines.edges, louder, lines.edges)
        return EdgeMap(
            np.where(use, lines.strength, steps.strength),
            np.where(use, lines.orientation, steps.orientation),
            np.where(use, lines.scale, steps.scale),
            steps.edges | lines.edges,
            steps.threshold,
        )


def kinds_of(bank: Bank, what: What | None) -> dict[thin.Kind, Thresholds | None]:
    """The kinds of edges that a request means, each with its table of thresholds.

    Parameters
    ----------
    bank : Bank
    what : step, line or both; None means the bank's own kind

    Raises
    ------
    UsageError : the bank has no kernels for that.
    """
    if what is None:
        return {bank.strength: bank.thresholds}
    own: dict[thin.Kind, Thresholds | None] = {
        "step": bank.thresholds if bank.strength == "step" else None,
        "line": bank.thresholds if bank.strength == "line" else bank.line_thresholds,
    }
    kinds: tuple[thin.Kind, ...] = ("step", "line") if what == "both" else (what,)
    for kind in kinds:
        thin.shapes_of(bank, kind)
    return {kind: own[kind] for kind in kinds}


def levels_of(
    bank: Bank, what: What | None, rate: float | None, threshold: float | None
) -> dict[thin.Kind, tuple[float, float]]:
    """High threshold and hysteresis ratio for each kind of edge that a request means.

    Raises
    ------
    UsageError : as :func:`threshold_of` and :func:`kinds_of`; no thresholds for that kind.
    """
    out = {}
    for kind, table in kinds_of(bank, what).items():
        if table is None and threshold is None and bank.thresholds is not None:
            raise UsageError(
                f"this bank has no thresholds for {kind} edges",
                where=bank.name,
                remedy="give a strength threshold, or export the bank again",
            )
        out[kind] = threshold_of(bank, rate=rate, threshold=threshold, thresholds=table)
    return out


def find(
    bank: Bank,
    pixels: NDArray[Any],
    respond: Respond,
    *,
    what: What | None = None,
    rate: float | None = None,
    threshold: float | None = None,
    invalid: NDArray[np.bool_] | None = None,
    blur_px: float | None = None,
    place: Place | None = None,
) -> Found:
    """Find steps, lines or both in one picture, each kind at its own promised rate.

    Looking for both, a step stands only where no larger line response is near: the flanks of
    a line are not told as steps. That can only lower the number of false steps.

    Parameters
    ----------
    what : step, line or both; None means the bank's own kind
    place : gives the edgels of the picture in place of Python's own, such as compiled code
    others : as :func:`detect_edgels`

    Raises
    ------
    UsageError, InputError : as :func:`levels_of` and :func:`detect`.
    """
    levels = levels_of(bank, what, rate, threshold)
    responses = _checked(bank, pixels, respond)
    return find_on(bank, pixels, responses, levels, invalid=invalid, blur_px=blur_px, place=place)


def find_on(
    bank: Bank,
    pixels: NDArray[Any],
    responses: F32,
    levels: Mapping[thin.Kind, tuple[float, float]],
    *,
    invalid: NDArray[np.bool_] | None = None,
    blur_px: float | None = None,
    place: Place | None = None,
) -> Found:
    """As :func:`find`, from responses that stand and thresholds that are known.

    Parameters
    ----------
    responses : float32 ndarray (n, h, w)
    levels : as :func:`levels_of` gives them
    place : as for :func:`find`
    others : as :func:`detect_edgels`
    """
    values = bank.table.apply(pixels)
    maps, parts = {}, []
    for kind, (high, ratio) in levels.items():
        maps[str(kind)] = found = thin.edge_map(
            bank,
            responses,
            high,
            hysteresis_ratio=ratio,
            kind=kind,
            invalid=invalid,
            no_flanks=len(levels) > 1,
        )
        if place is None:
            parts.append(
                edgels(bank, values, found, responses, blur_px=blur_px, kind=kind, invalid=invalid)
            )
    if place is not None:
        return Found(maps, place(pixels))
    both = np.concatenate(parts)
    if len(parts) > 1:
        both = both[np.lexsort((both["x"], np.rint(both["y"])))]
    return Found(maps, both)
