"""Marks that are seen over the whole frame and the whole folder: shading, spots, lost depth."""

from __future__ import annotations

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.camera.pixels import Region
from patchlab.types import F32, F64, Frame

SHADE_BLOCK = 16
SHADE_THRESHOLD = 0.15
SHADE_UNSURE = (0.12, 0.2)
MIN_SHADED = 6

SPOT_SIZE = 5
SPOT_MULTIPLE = 5.0
SPOT_SHARE = 0.8
SPOT_THRESHOLD = 5.0

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

    The scenes' own slopes spread by a third and more, their median over ten scenes by 0.05:
    close to the threshold the verdict is None.
    """
    known = slopes[np.isfinite(slopes)]
    if not known.size:
        return 0.0, None
    lost = 1 - float(np.exp(np.median(known)))
    if known.size < MIN_SHADED or SHADE_UNSURE[0] < lost < SHADE_UNSURE[1]:
        return lost, None
    return lost, lost > SHADE_THRESHOLD


# ---------------------------------------------------------------- fixed spots


class SpotMeter:
    """Pixels that stand out from their neighbours in frame after frame, at one place."""

    def __init__(self) -> None:
        self._bright: dict[tuple[tuple[int, int], int], NDArray[np.int32]] = {}
        self._dark: dict[tuple[tuple[int, int], int], NDArray[np.int32]] = {}
        self._frames: dict[tuple[tuple[int, int], int], int] = {}

    def add(self, frame: Frame, found: list[Region]) -> None:
        """Look at one frame's regions."""
        for k, region in enumerate(found):
            out = _standing_out(region.codes)
            key = ((frame.pixels.shape[0], frame.pixels.shape[1]), k)
            nothing = np.zeros(out.shape, np.int32)
            self._frames[key] = self._frames.get(key, 0) + 1
            self._bright[key] = self._bright.get(key, nothing) + (out > 0)
            self._dark[key] = self._dark.get(key, nothing) + (out < 0)

    def result(self, few: int) -> tuple[float, bool | None]:
        """Spots in a megapixel, and the verdict; None where no place was seen ``few`` times."""
        spots = area = 0
        for key, frames in self._frames.items():
            if frames < few:
                continue
            needed = SPOT_SHARE * frames
            fixed = (self._bright[key] >= needed) | (self._dark[key] >= needed)
            spots += int(ndimage.label(fixed, np.ones((3, 3)))[1])
            area += fixed.size
        if not area:
            return 0.0, None
        rate = spots / area * 1e6
        return rate, spots > 1 and rate > SPOT_THRESHOLD


def _standing_out(codes: F32) -> NDArray[np.int8]:
    """1 for pixels far above the median of 5 x 5 around them, -1 far below, else 0."""
    rest = codes - ndimage.median_filter(codes, SPOT_SIZE)
    size = np.abs(rest)
    usual = ndimage.uniform_filter(np.minimum(size, 4 * size.mean() + 1), 15)
    limit = SPOT_MULTIPLE * 1.2533 * usual + 2
    return np.asarray(np.sign(rest) * (size > limit), np.int8)


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
