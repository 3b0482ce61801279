"""Marks that are seen over the whole frame and the whole folder: shading and lost depth."""

from __future__ import annotations

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.types import F64, Frame

SHADE_BLOCK = 16
SHADE_THRESHOLD = 0.3
SHADE_UNSURE = 0.2
MIN_SHADED = 6

DEPTH_THRESHOLD = 0.5

# ---------------------------------------------------------------- shading


def falloff(frame: Frame) -> float:
    """Slope of the logarithm of light over the squared distance from the middle.

    Distance is 1 at the corners. Adjacent blocks of 16 pixels mostly lie on one surface, so the
    weighted median of their differences, each over the model's, is the lens's and not the
    scene's: an edge is an outlier. NaN where the frame is too small or too dark.
    """
    light = frame.contract.light(frame.pixels)
    h, w = (n // SHADE_BLOCK for n in light.shape)
    if min(h, w) < 4:
        return float("nan")
    cut = light[: h * SHADE_BLOCK, : w * SHADE_BLOCK]
    blocks = cut.reshape(h, SHADE_BLOCK, w, SHADE_BLOCK).mean(axis=(1, 3))
    good = (blocks > 0.02) & (blocks < 0.95)
    level = np.log(np.maximum(blocks, 1e-3))
    y, x = np.mgrid[:h, :w].astype(np.float64)
    cy, cx = (h - 1) / 2, (w - 1) / 2
    squared = ((y - cy) ** 2 + (x - cx) ** 2) / (cy**2 + cx**2)
    ratios, weights = [], []
    for axis in (0, 1):
        step = np.diff(squared, axis=axis)
        both = np.take(good, range(good.shape[axis] - 1), axis) & np.take(
            good, range(1, good.shape[axis]), axis
        )
        both &= np.abs(step) > 1e-6
        ratios.append((np.diff(level, axis=axis)[both] / step[both]).ravel())
        weights.append(np.abs(step[both]).ravel())
    ratio, weight = np.concatenate(ratios), np.concatenate(weights)
    return _weighted_median(ratio, weight) if ratio.size >= 50 else float("nan")


def _weighted_median(values: F64, weights: F64) -> float:
    order = np.argsort(values, kind="stable")
    reached = np.cumsum(weights[order])
    return float(values[order][np.searchsorted(reached, reached[-1] / 2)])


def shading(slopes: F64) -> tuple[float, bool | None]:
    """Light lost in the corners by the frames' slopes, and the verdict.

    The scenes' own slopes spread by a third and more, their median over ten scenes by 0.11, and
    photographs lean to bright middles by 0.08: a little below the threshold the verdict is None.
    """
    known = slopes[np.isfinite(slopes)]
    if not known.size:
        return 0.0, None
    lost = 1 - float(np.exp(np.median(known)))
    if known.size < MIN_SHADED or SHADE_UNSURE < lost <= SHADE_THRESHOLD:
        return lost, None
    return lost, lost > SHADE_THRESHOLD


# ---------------------------------------------------------------- depth


def lost_bits(histogram: NDArray[np.int64] | None) -> float:
    """Bits of depth that the codes do not use: log2 of the codes due over the codes met.

    A code is due between two codes that were met, where those around were met often enough:
    30 times and more for each code within 32 on average.
    """
    if histogram is None:
        return 0.0
    counts = histogram[1:-1].astype(np.float64)
    due = ndimage.uniform_filter1d(counts, 65) > 30
    met = np.flatnonzero(counts)
    if met.size < 2:
        return 0.0
    due[: met[0]] = due[met[-1] + 1 :] = False
    used = int((counts[due] > 0).sum())
    return float(np.log2(due.sum() / used)) if due.sum() >= 16 and used else 0.0
