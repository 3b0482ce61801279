"""What every measurement needs of a frame: bounded regions, usable pixels, two filters."""

from __future__ import annotations

from collections.abc import Iterable, Iterator
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.conventions import rng
from patchlab.errors import InputError
from patchlab.types import F32, Frame, InputContract

MAX_FRAMES = 64
MAX_SAMPLES = 100_000
MAX_PIXELS = 1 << 21
TILE = 512
BORDER = 8
FARTHEST = 16.0
"""Ranges from black to white beyond which floats, all clipped there, are cut."""
SMALLEST = 32
"""Least height and width of a frame that noise, blur and marks can be measured in."""
TOO_SMALL = f"every frame is smaller than {SMALLEST} x {SMALLEST} pixels"


@dataclass(frozen=True, eq=False)
class Region:
    """A rectangle of a frame; its origin keeps the phase of 2- and 8-pixel lattices.

    Parameters
    ----------
    path : of the frame
    codes : float32 ndarray (h, w)
    usable : bool ndarray (h, w): neither invalid nor within 4 px of a clipped or invalid pixel,
        nor within 8 px of the region's rim
    """

    path: str
    codes: F32
    usable: NDArray[np.bool_]


def clip_codes(contract: InputContract) -> tuple[float, float]:
    """Codes at and beyond which a pixel may be clipped: the lowest and the highest.

    The lowest is code 0 for integers (noise may fall below the black level without
    being clipped there) and the black level for float32.
    """
    if contract.format.integer:
        return 0.0, float(min(contract.white, contract.format.full_scale))
    return contract.black, contract.white


def limited(frames: Iterable[Frame], contract: InputContract | None = None) -> Iterator[Frame]:
    """At most 64 frames, all of one contract.

    Raises
    ------
    InputError : a frame is of another camera setting than the first, or there is none.
    """
    count = 0
    for frame in frames:
        contract = contract or frame.contract
        if frame.contract != contract:
            raise InputError(
                f"the frame takes {frame.contract.pixels} pixels with levels "
                f"{frame.contract.black:g} to {frame.contract.white:g}, the others "
                f"{contract.pixels} with {contract.black:g} to {contract.white:g}",
                where=frame.path,
                remedy="survey each camera setting on its own",
            )
        yield frame
        count += 1
        if count == MAX_FRAMES:
            return
    if not count:
        raise InputError("there is no frame to measure", remedy="give a folder of photographs")


def windows(shape: tuple[int, ...]) -> Iterator[tuple[slice, slice]]:
    """The whole frame, or eight tiles spread over a large one."""
    height, width = shape
    if height * width <= MAX_PIXELS:
        yield slice(0, height), slice(0, width)
        return
    rows, cols = (2, 4) if width >= height else (4, 2)
    for i in range(rows):
        for j in range(cols):
            y = max(0, int((i + 0.5) * height / rows - TILE / 2)) // 8 * 8
            x = max(0, int((j + 0.5) * width / cols - TILE / 2)) // 8 * 8
            yield slice(y, min(y + TILE, height)), slice(x, min(x + TILE, width))


def regions(frame: Frame) -> Iterator[Region]:
    """The frame's pixels that are measured, about two million at most; none of a small frame."""
    low, high = clip_codes(frame.contract)
    for rows, cols in windows(frame.pixels.shape):
        codes = frame.pixels[rows, cols].astype(np.float32)
        if min(codes.shape) < SMALLEST:
            continue
        bad = (codes <= low) | (codes >= high) | ~np.isfinite(codes)
        if frame.invalid is not None:
            bad |= frame.invalid[rows, cols]
        codes = np.nan_to_num(codes, copy=False, posinf=high, neginf=low)
        if not frame.contract.format.integer:  # else the square of a wild value overflows
            reach = FARTHEST * (high - low)
            codes = np.clip(codes, np.float32(low - reach), np.float32(high + reach))
        usable = ~ndimage.maximum_filter(bad, 9)
        usable[:BORDER] = usable[-BORDER:] = False
        usable[:, :BORDER] = usable[:, -BORDER:] = False
        yield Region(frame.path, codes, usable)


def draw(region: Region, where: NDArray[np.bool_], limit: int) -> NDArray[Any]:
    """Flat indices of at most ``limit`` pixels of a mask, keyed by the frame's path."""
    found = np.flatnonzero(where)
    if found.size <= limit:
        return found
    chosen = rng(0, "survey", region.path).choice(found.size, limit, replace=False)
    return found[np.sort(chosen)]


def second_difference(plane: F32, axis: int) -> F32:
    """Correlation with [1, -2, 1] along one axis."""
    return np.asarray(
        ndimage.correlate1d(plane, np.array([1.0, -2.0, 1.0]), axis, mode="mirror"), np.float32
    )


def diagonal_band(plane: F32) -> F32:
    """Correlation with [1 -2 1]' [1 -2 1] / 6: unit gain for white noise, blind to planes.

    The mask of Immerkaer 1996, Computer Vision and Image Understanding 64:300-302.
    """
    return second_difference(second_difference(plane, 0), 1) / np.float32(6)
