"""The 8 x 8 grid of block compression, seen where compression set coefficients to zero."""

from __future__ import annotations

import numpy as np
from scipy import ndimage

from patchlab.camera.pixels import Region
from patchlab.types import F64

GRID_THRESHOLD = 1.05

# the highest frequency of the 8-point cosine transform (ITU-T T.81, A.3.3)
_TOP = np.sqrt(2 / 8) * np.cos((2 * np.arange(8) + 1) * 7 * np.pi / 16)


class GridMeter:
    """Sums the size of the highest 8 x 8 cosine coefficient for each of the 64 grid phases.

    On the grid that a file was compressed on, that coefficient was rounded to a
    coarse step, mostly to zero; on every other grid it was not. The ratio of the
    median phase to the smallest one is 1 for pictures never compressed.
    """

    def __init__(self) -> None:
        self._sum = np.zeros((8, 8))
        self._count = np.zeros((8, 8))

    def add(self, region: Region) -> None:
        """Look at one region."""
        size = np.abs(
            ndimage.correlate1d(ndimage.correlate1d(region.codes, _TOP, 0), _TOP, 1)
        ).astype(np.float64)
        weight = region.usable.astype(np.float64)
        if not region.usable.any():
            return
        # strong edges say nothing about rounding: they are capped
        cap = 4 * float(np.median(size[region.usable])) + 1e-12
        size = np.minimum(size, cap) / cap * weight
        h, w = (n // 8 * 8 for n in size.shape)
        for total, plane in ((self._sum, size), (self._count, weight)):
            total += plane[:h, :w].reshape(h // 8, 8, w // 8, 8).sum(axis=(0, 2))

    def join(self, other: GridMeter) -> None:
        """Take over what another meter collected."""
        self._sum += other._sum
        self._count += other._count

    @property
    def phases(self) -> F64:
        """Mean size for each phase, (8, 8), by the (row, column) where a block begins."""
        mean = self._sum / np.maximum(self._count, 1)
        return np.roll(mean, (-4, -4), axis=(0, 1))

    @property
    def place(self) -> tuple[int, int]:
        """Row and column, 0 to 7, where blocks begin."""
        y, x = np.unravel_index(int(self.phases.argmin()), (8, 8))
        return int(y), int(x)

    @property
    def value(self) -> float:
        """Median over smallest of the 64 phases; 1 where there is no grid."""
        phases = self.phases
        lowest = float(phases.min())
        return float(np.median(phases)) / lowest if lowest > 0 else 1.0
