"""Fixed spots: pixels and small patches that stand out at one place in frame after frame.

One frame's odd pixel may be the scene's. Over frames of different scenes what stands out at a
place, in units of what is usual around it, averages to nothing unless the sensor or the cover
glass put it there.
"""

from __future__ import annotations

from dataclasses import dataclass

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.camera.pixels import Region
from patchlab.types import F32

ASIDE = 2
"""Distance of the four pixels that a single one is held against."""
RIM = 4
DUST = (2.0, 5.0)
"""Scales, in pixels, of the difference of Gaussians that shows a soft shadow."""
AROUND = (31, 21)
"""Windows that tell what is usual, for single pixels and for shadows."""
CUT = 3.0
"""Deviation, in usual ones, at which one frame's say is cut."""
STEADY, SPREAD = 1.8, 6.0
"""Mean deviation over frames from which a pixel is a spot: 1.8, or 6 / sqrt(frames) if more."""
SHADOW = 4.7
"""Standard deviations from which a shadow is a spot."""
EVERYWHERE = 0.005
"""Share of the places from which on it is the scene that stays, not spots."""
SPOT_THRESHOLD = 5.0
DARK = 0.02


@dataclass
class _Place:
    """Sums over the frames of one size and one region of them.

    A frame's say on shadows weighs by one over its usual contrast there: a shadow takes the
    same share of the light in every frame, and is seen best where the scene is calm.
    """

    fine: F32
    soft: F32
    weight: F32
    frames: int = 0


class SpotMeter:
    """Sums what stands out, frame by frame; near duplicates must not be shown to it."""

    def __init__(self) -> None:
        self._places: dict[tuple[tuple[int, ...], int], _Place] = {}

    def add(self, found: list[Region], shape: tuple[int, ...], scale: float) -> None:
        """Look at one frame's regions.

        Parameters
        ----------
        found : the frame's regions, levels above black
        shape : the frame's
        scale : white level above black
        """
        for k, region in enumerate(found):
            if (shape, k) not in self._places:
                none = np.zeros_like(region.codes)
                self._places[shape, k] = _Place(none, none.copy(), none.copy())
            place = self._places[shape, k]
            place.fine += _deviation(*_fine(region.codes))
            rest, usual = _soft(region.codes, scale)
            place.soft += _deviation(rest, usual) / usual
            place.weight += 1 / usual**2
            place.frames += 1

    def result(self, few: int) -> tuple[float, bool | None]:
        """Spots in a megapixel, and the verdict.

        None where no place was seen ``few`` times, or where so much stays that it is a scene.
        """
        spots = area = covered = 0
        for place in self._places.values():
            if place.frames < few:
                continue
            limit = max(STEADY, SPREAD / np.sqrt(place.frames))
            fixed = np.abs(_without_lines(place.fine / place.frames)) > limit
            fixed |= np.abs(_without_lines(place.soft / np.sqrt(place.weight))) > SHADOW
            spots += int(ndimage.label(fixed, np.ones((3, 3)))[1])
            covered += int(fixed.sum())
            area += fixed.size
        if not area:
            return 0.0, None
        rate = spots / area * 1e6
        if covered > EVERYWHERE * area:
            return rate, None
        return rate, spots > 1 and rate > SPOT_THRESHOLD


def _usual(rest: F32, around: int, least: float) -> F32:
    """Usual deviation around each pixel, the largest ones cut."""
    size = np.abs(rest)
    mean = ndimage.uniform_filter(np.minimum(size, 4 * size.mean()), around)
    return np.asarray(1.2533 * mean + least, np.float32)  # sqrt(pi / 2): of Gaussian noise


def _deviation(rest: F32, usual: F32) -> F32:
    """What stands out, in usual deviations, cut at three."""
    return np.asarray(np.clip(rest / usual, -CUT, CUT), np.float32)


def _fine(codes: F32) -> tuple[F32, F32]:
    """Single pixels against the middle two of four beside them."""
    beside = np.stack([np.roll(codes, by, axis) for axis in (0, 1) for by in (-ASIDE, ASIDE)])
    middle = (beside.sum(axis=0) - beside.min(axis=0) - beside.max(axis=0)) / 2
    rest = codes - middle
    rest[:RIM] = rest[-RIM:] = rest[:, :RIM] = rest[:, -RIM:] = 0  # the roll came round
    return rest, _usual(rest, AROUND[0], 0.5)


def _soft(codes: F32, scale: float) -> tuple[F32, F32]:
    """Soft shadows and bright blobs, as contrast: they take a share of the light."""
    inner, outer = (ndimage.gaussian_filter(codes, s) for s in DUST)
    rest = np.asarray((inner - outer) / np.maximum(outer, DARK * scale), np.float32)
    return rest, _usual(rest, AROUND[1], 0.002)


def _without_lines(mean: NDArray[np.floating]) -> NDArray[np.floating]:
    """Less what whole rows and columns share: they have marks of their own."""
    mean = mean - np.median(mean, axis=0, keepdims=True)
    return np.asarray(mean - np.median(mean, axis=1, keepdims=True))
