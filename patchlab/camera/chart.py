"""Sharpness from a slanted edge, by the method of ISO 12233."""

from __future__ import annotations

import numpy as np

from patchlab.errors import InputError
from patchlab.types import F64, Frame, SlantedEdge

OVERSAMPLING = 4
STRAIGHT = 0.7
"""Pixels that a row may lie off the edge's line, in the median; noise moves it by 0.3 or less."""


def _upright(light: F64) -> F64:
    """Turn the plane so that the edge runs down it, dark on the left."""
    across = np.abs(np.diff(light, axis=1)).sum()
    down = np.abs(np.diff(light, axis=0)).sum()
    if down > across:
        light = light.T
    quarter = max(light.shape[1] // 4, 1)
    rising = light[:, -quarter:].mean() > light[:, :quarter].mean()
    return light if rising else light[:, ::-1]


def _row_positions(light: F64, near: F64 | None) -> F64:
    """Where each row crosses the edge: centroid of its derivative under a Hamming window."""
    slope = np.diff(light, axis=1)
    x = np.arange(slope.shape[1]) + 0.5
    if near is None:
        centre = (np.maximum(slope, 0) @ x) / np.maximum(np.maximum(slope, 0).sum(axis=1), 1e-12)
        centre = np.full(len(slope), np.median(centre))
        half = slope.shape[1] / 2
    else:
        centre, half = near, 8.0
    u = (x[None, :] - centre[:, None]) / half
    window = np.where(np.abs(u) <= 1, 0.54 + 0.46 * np.cos(np.pi * u), 0.0)
    weight = slope * window
    total = weight.sum(axis=1)
    return np.asarray((weight @ x) / np.where(np.abs(total) > 1e-12, total, np.inf))


def _edge_line(light: F64) -> tuple[float, float]:
    """x = a y + b of the edge."""
    y = np.arange(light.shape[0], dtype=np.float64)
    line = None
    for _ in range(3):
        at = _row_positions(
            light, None if line is None else np.asarray(np.polyval(line, y), np.float64)
        )
        good = np.abs(at - np.median(at)) < light.shape[1] / 2
        if good.sum() < light.shape[0] / 2:
            raise InputError("no edge runs through this picture from end to end")
        line = np.polyfit(y[good], at[good], 1)
    assert line is not None
    if float(np.median(np.abs(at - np.polyval(line, y)))) > STRAIGHT:
        raise InputError(
            "no single straight edge runs through this picture", remedy="crop the edge of a chart"
        )
    return float(line[0]), float(line[1])


def _spread_function(light: F64, slope: float, offset: float) -> tuple[F64, F64]:
    """Mean light in quarter-pixel bins of the distance from the edge."""
    h, w = light.shape
    y, x = np.mgrid[:h, :w]
    distance = (x - slope * y - offset) / np.hypot(1, slope)
    reach = min(32.0, offset, w - 1 - offset, slope * (h - 1) + offset,
                w - 1 - slope * (h - 1) - offset)  # fmt: skip
    if reach < 6:
        raise InputError(
            "the edge runs too near the rim", remedy="crop with 6 pixels and more on both sides"
        )
    half = int(reach * OVERSAMPLING)
    index = np.floor(distance * OVERSAMPLING + 0.5).astype(np.int64) + half
    inside = (index >= 0) & (index <= 2 * half)
    count = np.bincount(index[inside], minlength=2 * half + 1)
    total = np.bincount(index[inside], light[inside], minlength=2 * half + 1)
    at = (np.arange(2 * half + 1) - half) / OVERSAMPLING
    filled = count > 0
    return at, np.interp(at, at[filled], total[filled] / count[filled])


def slanted_edge(frame: Frame) -> SlantedEdge:
    """Modulation transfer function from a picture of one slanted edge.

    The light is binned to quarter pixels across the fitted edge, differentiated by
    central differences, windowed (Hamming) and transformed. Two corrections are made:
    for the central difference, ``w / sin(w)`` with ``w = 2 pi f / 4``, and for the bins'
    width, ``1 / sinc(f / 4)``. The edge should lean 2 to 10 degrees.

    Parameters
    ----------
    frame : a crop that holds the edge and nothing else

    Raises
    ------
    InputError : no edge, an edge along an axis, or one too near the rim.
    """
    light = _upright(frame.contract.light(frame.pixels))
    if np.ptp(light) < 0.05:
        raise InputError("there is no edge in this picture", where=frame.path)
    try:
        slope, offset = _edge_line(light)
        at, spread = _spread_function(light, slope, offset)
    except InputError as error:
        raise InputError(error.what, where=frame.path, remedy=error.remedy) from None
    if abs(slope) * light.shape[0] < 1:
        raise InputError(
            "the edge runs along the pixels", where=frame.path, remedy="tilt it by about 5 degrees"
        )
    line = (spread[2:] - spread[:-2]) / 2
    line = line * np.hamming(line.size)
    frequency = np.fft.rfftfreq(line.size, 1 / OVERSAMPLING).astype(np.float64)
    transfer = np.abs(np.fft.rfft(line)).astype(np.float64)
    shown = frequency <= 1.0
    frequency, transfer = frequency[shown], transfer[shown] / transfer[0]
    w = 2 * np.pi * frequency / OVERSAMPLING
    transfer = transfer / np.sinc(w / np.pi) / np.sinc(frequency / OVERSAMPLING)
    half = _half_crossing(frequency, transfer)
    sigma = float(np.sqrt(np.log(2) / 2) / (np.pi * half)) if half > 0 else float("nan")
    angle = float(np.degrees(np.arctan(slope)))
    return SlantedEdge(angle, frequency, transfer, half, sigma, at, spread)


def _half_crossing(frequency: F64, transfer: F64) -> float:
    below = np.flatnonzero(transfer < 0.5)
    if not below.size:
        return float("nan")
    i = int(below[0])
    share = (transfer[i - 1] - 0.5) / (transfer[i - 1] - transfer[i])
    return float(frequency[i - 1] + share * (frequency[i] - frequency[i - 1]))
