"""Synthetic noise with a camera's autocovariance, and what kernels make of it."""

from __future__ import annotations

import math
from collections.abc import Callable, Iterator

import numpy as np
from numpy.typing import NDArray
from scipy import fft

from patchlab.conventions import rng
from patchlab.errors import UsageError
from patchlab.types import F32, F64, Bank

TILE = 512
"""Side of one tile of synthetic noise, pixels."""


def noise_spectrum(autocovariance: F64 | None, size: int) -> F64 | None:
    """Power at each frequency of a ``size`` x ``size`` periodic tile, mean 1; None when white.

    A measured autocovariance need not be positive definite: negative powers become 0.
    """
    if autocovariance is None:
        return None
    m = autocovariance.shape[0] // 2
    plane = np.zeros((size, size))
    plane[: 2 * m + 1, : 2 * m + 1] = autocovariance
    power = np.maximum(fft.fft2(np.roll(plane, (-m, -m), (0, 1))).real, 0.0)
    return np.asarray(power / power.mean())


def noise_tiles(
    autocovariance: F64 | None, count: int, *, seed: int, key: str = "noise", size: int = TILE
) -> Iterator[F32]:
    """Periodic tiles of Gaussian noise of variance 1 with an autocovariance.

    Parameters
    ----------
    autocovariance : ndarray (2m + 1, 2m + 1), centre 1; None means white
    count : number of tiles
    seed, key : what the noise is drawn from
    size : side of a tile, pixels

    Yields
    ------
    float32 ndarray (size, size)
    """
    power = noise_spectrum(autocovariance, size)
    root = None if power is None else np.sqrt(power[:, : size // 2 + 1]).astype(np.float32)
    for k in range(count):
        tile = rng(seed, key, str(k)).standard_normal((size, size), dtype=np.float32)
        if root is not None:
            tile = np.asarray(fft.irfft2(fft.rfft2(tile) * root, s=tile.shape))
        yield tile


class Torus:
    """Responses of a bank on periodic tiles, one kernel at a time."""

    def __init__(self, bank: Bank, size: int) -> None:
        if bank.size > size:
            raise UsageError(f"kernels of {bank.size} px do not fit in noise tiles of {size} px")
        self.size = size
        self.kernels = []
        for taps in bank.taps.reshape(len(bank), bank.size, bank.size, bank.planes):
            self.kernels.append([self._transformed(taps[..., m]) for m in range(bank.planes)])

    def _transformed(self, taps: F32) -> NDArray[np.complex64] | None:
        """A kernel's part in one plane; None where it reads nothing of it."""
        if not taps.any():
            return None
        plane = np.zeros((self.size, self.size), np.float32)
        plane[: taps.shape[0], : taps.shape[0]] = taps
        return np.asarray(fft.rfft2(np.roll(plane, (-(taps.shape[0] // 2),) * 2, (0, 1))).conj())

    def responses(self, *tiles: F32) -> Callable[[int], F32]:
        """Kernel index to its response plane, from a tile of each working plane."""
        spectra = [fft.rfft2(tile) for tile in tiles]

        def response(i: int) -> F32:
            pairs = zip(spectra, self.kernels[i], strict=True)
            parts = [s * k for s, k in pairs if k is not None]
            return np.asarray(fft.irfft2(sum(parts[1:], parts[0]), s=tiles[0].shape))

        return response


def spectral_moments(
    kernel: F32 | F64, theta: float, autocovariance: F64 | None
) -> tuple[float, float]:
    """Mean and mean square of ``2 pi |f|`` along theta under a kernel's noise power spectrum.

    Parameters
    ----------
    kernel : ndarray (h, h), or (h, h, planes) with the same noise in each plane, independent
    theta : direction, radians
    autocovariance : of the noise, centre 1; None means white

    Returns
    -------
    mean (1 / px), mean square (1 / px^2)
    """
    size = max(64, 2 * kernel.shape[0])
    f = fft.fftfreq(size)
    fy, fx = np.meshgrid(f, f, indexing="ij")
    planes = np.asarray(kernel, np.float64).reshape(*kernel.shape[:2], -1)
    power = np.sum(np.abs(fft.fft2(planes, (size, size), axes=(0, 1))) ** 2, axis=2)
    noise = noise_spectrum(autocovariance, size)
    power = power if noise is None else power * noise
    along = 2 * np.pi * np.abs(fx * math.cos(theta) + fy * math.sin(theta))
    total = float(power.sum())
    return float((power * along).sum()) / total, float((power * along**2).sum()) / total
