"""One picture in, its edges out: the calibrated chain with a threshold from a promised rate."""

from __future__ import annotations

from collections.abc import Callable
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.edges import thin
from patchlab.edges.locate import edgels
from patchlab.edges.threshold import strength_for
from patchlab.errors import InputError, UsageError
from patchlab.types import F32, Bank, EdgeMap, Thresholds

RATE = 10.0
"""Default promise, false edge elements per megapixel of flat picture."""

Respond = Callable[[NDArray[Any]], F32]


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
        if not threshold > 0:
            raise UsageError(f"the strength threshold must be positive, not {threshold:g}")
        return float(threshold), ratio
    if table is None:
        raise UsageError(
            "this bank has no thresholds, because its camera's noise is not known",
            where=bank.name,
            remedy="give a strength threshold instead of a false-alarm rate",
        )
    return strength_for(table, RATE if rate is None else rate), ratio


def _checked(bank: Bank, pixels: NDArray[Any], respond: Respond) -> F32:
    if pixels.ndim != 2 or min(pixels.shape) < bank.size:
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
