"""Edge detectors of general libraries, over grids of settings: the yardstick of an assessment.

Each detector gets a picture and gives the pixels it calls edges for every setting of its
grid. Gradient thresholds stand in units of the picture, so that one grid serves a picture
whose noise is 1 and one whose camera gives at most 100. scikit-image gives Canny, Scharr
and the parts of a Laplacian of Gaussian; it gives no thinning for the last two, so they get
this package's own, and zero crossings.
"""

from __future__ import annotations

import itertools
from collections.abc import Callable, Iterator, Mapping
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.edges import thin
from patchlab.types import F32, F64

Mask = NDArray[np.bool_]
Runs = Iterator[tuple[str, Mask]]
Detector = Callable[[F32, "Grid"], Runs]

SLOPE = 0.2
"""Grids of detectors whose gradient is a slope for each pixel stand so much lower than that of
scikit-image's Canny, whose gradient comes from sums over a neighbourhood."""
TURNS = 16
"""Directions that gradients are rounded to before they are thinned."""


class Grid:
    """Blurs and thresholds that a detector is tried with.

    Parameters
    ----------
    quick : every other threshold and blur only
    """

    def __init__(self, quick: bool = False) -> None:
        self.sigmas = (1.0, 2.0) if quick else (1.0, 1.5, 2.0, 2.8)
        self.highs = tuple(float(f"{0.4 * 1.6**k:.3g}") for k in range(10))[:: 2 if quick else 1]
        self.ratios = (0.7,) if quick else (0.4, 0.7)

    def __iter__(self) -> Iterator[tuple[float, float, float]]:
        """Blur, high threshold, low over high."""
        return itertools.product(self.sigmas, self.highs, self.ratios)


def _named(sigma: float, high: float, ratio: float) -> str:
    return f"blur {sigma:g} px, threshold {high:.3g}, low {ratio:g} of it"


def _canny(picture: F32, grid: Grid) -> Runs:
    from skimage.feature import canny

    for s, high, ratio in grid:
        found = canny(
            picture.astype(np.float64), s, low_threshold=ratio * high, high_threshold=high
        )
        yield _named(s, high, ratio), found


def _thinned(magnitude: F32, gx: F64, gy: F64) -> F32:
    angles = np.pi * np.arange(TURNS) / TURNS
    turn = np.rint(np.arctan2(gy, gx) % np.pi * TURNS / np.pi).astype(np.int64) % TURNS
    keep = thin.thin(magnitude, turn.astype(np.uint8), angles)
    return np.where(keep, magnitude, np.float32(0))


def _scharr(picture: F32, grid: Grid) -> Runs:
    from skimage import filters

    for s in grid.sigmas:
        smooth = filters.gaussian(picture.astype(np.float64), s)
        gy, gx = filters.scharr_h(smooth), filters.scharr_v(smooth)
        plane = _thinned(np.hypot(gx, gy).astype(np.float32), gx, gy)
        for high, ratio in itertools.product(grid.highs, grid.ratios):
            level = SLOPE * high
            yield _named(s, level, ratio), thin.hysteresis(plane, ratio * level, level)


def _laplacian(picture: F32, grid: Grid) -> Runs:
    for s in grid.sigmas:
        bump = ndimage.gaussian_laplace(picture.astype(np.float64), s)
        slope = ndimage.gaussian_gradient_magnitude(picture.astype(np.float64), s)
        plane = np.where(_crossings(bump), slope, 0.0).astype(np.float32)
        for high, ratio in itertools.product(grid.highs, grid.ratios):
            level = SLOPE * high
            yield _named(s, level, ratio), thin.hysteresis(plane, ratio * level, level)


def _crossings(bump: F64) -> Mask:
    """The pixel nearer to zero of each pair of neighbours between which the sign changes."""
    cross = np.zeros(bump.shape, bool)
    for axis in (0, 1):
        a = [slice(None), slice(None)]
        b = [slice(None), slice(None)]
        a[axis], b[axis] = slice(None, -1), slice(1, None)
        one, two = bump[tuple(a)], bump[tuple(b)]
        change = one * two < 0
        first = np.abs(one) <= np.abs(two)
        cross[tuple(a)] |= change & first
        cross[tuple(b)] |= change & ~first
    return cross


def by_gradients(
    canny: Callable[[NDArray[Any], NDArray[Any], float, float], Mask],
) -> Detector:
    """A detector from a Canny that takes 16-bit gradients (x, y) and two thresholds."""

    def runs(picture: F32, grid: Grid) -> Runs:
        for s in grid.sigmas:
            gy, gx = np.gradient(ndimage.gaussian_filter(picture.astype(np.float64), s))
            steps = 20000 / max(1e-9, float(np.abs([gx, gy]).max()))
            x, y = (np.rint(steps * g).astype(np.int16) for g in (gx, gy))
            for high, ratio in itertools.product(grid.highs, grid.ratios):
                level = SLOPE * high
                found = canny(x, y, ratio * level * steps, level * steps)
                yield _named(s, level, ratio), found

    return runs


DETECTORS: Mapping[str, Detector] = {
    "Canny, scikit-image": _canny,
    "Scharr, scikit-image": _scharr,
    "Laplacian of Gaussian": _laplacian,
}
"""The detectors of libraries that are always there."""
