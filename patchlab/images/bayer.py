"""One plane of a Bayer mosaic: its green lattice, its luminance, or the mosaic itself.

A pattern is named by the first two pixels of row 0, as PFNC does: RG is R G over G B.
"""

from __future__ import annotations

from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.types import F32

Plane = Literal["green", "luminance", "mosaic"]
PLANES: tuple[Plane, ...] = ("green", "luminance", "mosaic")

_CROSS = np.array([[0, 1, 0], [1, 4, 1], [0, 1, 0]], np.float32) / 4
_SQUARE = np.array([[1, 2, 1], [2, 4, 2], [1, 2, 1]], np.float32) / 4


def green(mosaic: NDArray[Any], pattern: str) -> NDArray[Any]:
    """The green pixels of the rows that hold red: half as wide and high, nothing interpolated.

    Those of the other rows show the same scene again, so one of the two lattices serves. Its
    pixels are two sensor pixels apart.

    Parameters
    ----------
    mosaic : ndarray (h, w)
    pattern : "RG", "GR", "GB" or "BG"

    Returns
    -------
    ndarray like the mosaic, of the pixels (row, column), (row, column + 2), ...
    """
    row, column = {"RG": (0, 1), "GR": (0, 0), "GB": (1, 1), "BG": (1, 0)}[pattern]
    return np.ascontiguousarray(mosaic[row::2, column::2])


def colours(mosaic: NDArray[Any], pattern: str) -> NDArray[Any]:
    """Red, green and blue by bilinear interpolation, mirrored at the rim.

    Parameters
    ----------
    mosaic : unsigned ndarray (h, w)
    pattern : "RG", "GR", "GB" or "BG"

    Returns
    -------
    ndarray (h, w, 3) of the mosaic's dtype, halves rounded up
    """
    out = np.empty((*mosaic.shape, 3), mosaic.dtype)
    sites = _sites(pattern)
    for channel, name in enumerate("RGB"):
        plane: F32 = np.zeros(mosaic.shape, np.float32)
        for row, column in (at for at, colour in sites.items() if colour == name):
            plane[row::2, column::2] = mosaic[row::2, column::2]
        kernel = _CROSS if name == "G" else _SQUARE
        smooth = ndimage.correlate(plane, kernel, mode="mirror")
        out[..., channel] = np.floor(smooth + np.float32(0.5))
    return out


def _sites(pattern: str) -> dict[tuple[int, int], str]:
    """Colour of each of the four places."""
    other = {"RG": "GB", "GR": "BG", "GB": "RG", "BG": "GR"}[pattern]
    return {
        (0, 0): pattern[0], (0, 1): pattern[1],
        (1, 0): other[0], (1, 1): other[1],
    }  # fmt: skip
