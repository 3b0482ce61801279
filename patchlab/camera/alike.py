"""Frames that nearly repeat another: small copies, compared over small shifts."""

from __future__ import annotations

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.types import F64, Frame

COPY = 32
"""Side of a small copy."""
BROAD = 4.0
"""Standard deviation, in pixels of the copy, of the light and shade that is taken out of it:
photographs of one kind of place have that in common."""
SHIFTS = np.arange(-1.5, 1.51, 0.25)
"""Shifts over which two copies are compared, pixels of the copy."""
DUPLICATE_THRESHOLD = 0.9
DARKEST = 0.03

_EDGE = np.hanning(COPY + 2)[1:-1]
_TURN = np.exp(2j * np.pi * np.outer(SHIFTS, np.fft.fftfreq(COPY)))


def small_copy(frame: Frame) -> F64:
    """Spectrum (32, 32) of a small copy's contrast, windowed, of norm 1."""
    light = frame.contract.light(np.nan_to_num(frame.pixels))
    h, w = (n // COPY * COPY for n in light.shape)
    cells = light[:h, :w].reshape(COPY, h // COPY, COPY, w // COPY).mean(axis=(1, 3))
    tone = np.log(np.maximum(cells, 0) + DARKEST)
    tone = tone - ndimage.gaussian_filter(tone, BROAD, mode="nearest")
    tone = (tone - tone.mean()) * np.outer(_EDGE, _EDGE)
    norm = float(np.linalg.norm(tone))
    return np.asarray(np.fft.fft2(tone / norm if norm > 0 else tone))


def likeness(one: F64, other: F64) -> float:
    """Largest correlation of two small copies over shifts of up to 1.5 of their pixels."""
    cross = one * np.conj(other)
    return float((_TURN @ cross @ _TURN.T).real.max()) / COPY**2


def near_duplicates(copies: list[F64]) -> NDArray[np.bool_]:
    """True for each frame that nearly repeats an earlier one.

    Parameters
    ----------
    copies : of :func:`small_copy`, in the frames' order
    """
    return np.array(
        [
            any(likeness(copy, other) > DUPLICATE_THRESHOLD for other in copies[:i])
            for i, copy in enumerate(copies)
        ],
        dtype=bool,
    )
