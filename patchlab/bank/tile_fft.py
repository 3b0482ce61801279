"""Arbitrary kernels by Fourier transforms of column tiles.

A block of ``N = 64`` picture rows gives ``V = N - h + 1`` rows of output. Every column of the
block is transformed along y once; a kernel's response at column x is then the inverse transform
of ``R[f] = sum_i conj(K_i[f]) X_{x+i}[f]``, K_i the transform of the kernel's column i: along x the
correlation stays direct. That costs ``4 h (N/2 + 1) / V`` multiply-adds a pixel and kernel in
place of ``h^2``, and neighbouring columns lie side by side in a vector throughout.

Blocks start at whole multiples of V rows of the picture, so a band gives the bits of the whole.

The error bound. Let u be the unit roundoff, ``t = log2 N`` and ``e = (1 + eta)^t - 1`` with
``eta = u + gamma_4 (sqrt 2 + u)``: a radix-2 transform with rounded weights errs, in the 2-norm and
relative to its exact output, by at most e (Higham 2002, theorem 24.2; a real transform is the
half of the complex one that is not redundant, and the inverse's stages, a sum and then a
product, err no more than the forward ones). Every column has a 2-norm of at most
``sqrt(N) X``, X the largest absolute working value, and the forward transform multiplies norms
by ``sqrt(N)``. The sum over i has ``2 h`` real products a component and rounded coefficients, so
it errs by at most ``g = sqrt(2) gamma_(2h+2)`` relative to ``sum_i |K_i| |X_i|``. With
``M_i = max_f |K_i[f]|`` and the largest entry of a vector at most its 2-norm, a response errs by
at most

    sum_i M_i sqrt(N) X ((1 + e) (e + g (1 + e)) + e).

It holds barring underflow.
"""

from __future__ import annotations

import math
from dataclasses import dataclass

import numpy as np

from patchlab.conventions import UNIT_ROUNDOFF, gamma
from patchlab.types import F32, F64

LENGTH = 64
"""Rows of a block."""
LARGEST = 33
"""Largest kernel side: beyond, more than half of a block is overlap."""


@dataclass(frozen=True, eq=False)
class TileFFT:
    """The kernels of a bank that compiled code evaluates by tile transforms.

    Parameters
    ----------
    kernels : their indices
    size : side of the part that is not zero, odd
    spectra : float32 (kernels, N/2 + 1, size, 2), real and imaginary part of conj(K_i[f]) / N
    """

    kernels: tuple[int, ...]
    size: int
    spectra: F32

    @property
    def rows(self) -> int:
        """Rows of output of a block."""
        return LENGTH - self.size + 1


def work(size: int, kernels: int) -> tuple[float, float]:
    """Multiplies and additions a pixel, counted: forward, products, backward.

    A real transform of n rows is two of n / 2 with ``n / 4 - 1`` rotations, of 4 multiplies and 2
    additions, and their sums and differences. Backward counts as full; rows that are not wanted
    make it cheaper.
    """
    multiplies, forward, backward, n = 0, 0, 0, 1
    while n < LENGTH:
        n *= 2
        turns = max(n // 4 - 1, 0)
        multiplies = 2 * multiplies + 4 * turns
        forward = 2 * forward + 2 + 6 * turns
        backward = 2 * backward + 2 + 6 * turns + 2 * (n >= 4)
    rows = LENGTH - size + 1
    product = 4 * size * (LENGTH // 2 + 1)
    return (
        (multiplies + kernels * (product + multiplies)) / rows,
        (forward + kernels * (product + backward)) / rows,
    )


def tile_fft(taps: F32, kernels: tuple[int, ...]) -> TileFFT | None:
    """Transform some kernels; None where there are none, or they are too large.

    Parameters
    ----------
    taps : float32 (n, h, h), of the whole bank
    kernels : which of them
    """
    if not kernels or taps.shape[1] > LARGEST:
        return None
    size = taps.shape[1]
    columns = np.fft.rfft(taps[list(kernels)].astype(np.float64), LENGTH, axis=1)
    conjugate = np.conj(columns) / LENGTH
    spectra = np.stack([conjugate.real, conjugate.imag], axis=-1).astype(np.float32)
    return TileFFT(kernels, size, spectra)


def bound(kernel: F64, span: float) -> float:
    """Largest error of a response; see the top of this file.

    Parameters
    ----------
    kernel : float64 ndarray (h, h)
    span : largest absolute working value
    """
    u = UNIT_ROUNDOFF
    eta = u + gamma(4) * (math.sqrt(2) + u)
    e = (1 + eta) ** int(math.log2(LENGTH)) - 1
    g = math.sqrt(2) * gamma(2 * kernel.shape[1] + 2)
    largest = np.abs(np.fft.rfft(kernel, LENGTH, axis=0)).max(axis=0).sum()
    return float(largest * math.sqrt(LENGTH) * span * ((1 + e) * (e + g * (1 + e)) + e))
