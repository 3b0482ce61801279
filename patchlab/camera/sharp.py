"""Sharpening, told by the colour of the noise in the calmest places of a folder.

An unsharp mask lifts fine noise above coarse noise; a scene, seen through a lens, does the
opposite. So the ratio of fine to middling power where there is hardly any scene is 1 for white
noise, less where the scene remains or noise was smoothed, and above 1 only after sharpening.

Choosing the calmest places by the very power that is measured would favour a high ratio. So the
coefficients of every block are halved like a checkerboard: one half chooses the blocks, the
other is measured, and the halves change places. White noise then gives 1 whatever is chosen.
"""

from __future__ import annotations

from dataclasses import dataclass

import numpy as np
from numpy.lib.stride_tricks import sliding_window_view
from numpy.typing import NDArray
from scipy.fft import dctn

from patchlab.camera.pixels import Region
from patchlab.types import F32, F64

SHARP_THRESHOLD = 1.05
SURE = 0.5
"""Standard errors above 1 that the ratio must have."""
SIDE = 8
STRIDE = 4
COARSE = (0.13, 0.27)
"""Cycles per pixel between which power counts as middling; below it chooses blocks only."""
FINE = 0.42
SHARE = 0.02
"""Least share of the blocks that is measured."""
CALM = 0.5
"""Middling over fine power below which a block is measured too, up to MOST of them."""
MOST = 0.1
HELD = 0.2
"""Share of a region's blocks that each half keeps until the folder is known."""
LEAST = 60
FAINT = 0.5
"""Noise, in codes, below which a block is passed over, for rounding colours it."""
PLAIN = (0.93, 1.02)
"""Ratios that only noise as the sensor gave it has."""


@dataclass(frozen=True)
class Sharpness:
    """Fine over middling power of so many calm blocks, its standard error, the noise in codes."""

    ratio: float
    error: float
    noise: float
    blocks: int


_F = np.arange(SIDE) / (2 * SIDE)
_RADIUS = np.hypot(_F[:, None], _F[None, :])
_INNER = np.outer(_F > 0, _F > 0)  # rows and columns have marks of their own
_ODD = np.add.outer(np.arange(SIDE), np.arange(SIDE)) % 2 == 1
_LOW = (_RADIUS > 0) & (COARSE[0] > _RADIUS)
_MIDDLE = (COARSE[0] <= _RADIUS) & (COARSE[1] > _RADIUS) & _INNER
_FINE = (_RADIUS >= FINE) & _INNER


class SharpMeter:
    """Collects blocks, region by region."""

    def __init__(self) -> None:
        self._kept: tuple[list[F32], list[F32]] = ([], [])
        self._seen = [0, 0]

    def add(self, region: Region) -> None:
        """Look at one region: the five mean powers of its calmer blocks."""
        flat = _powers(region)
        held = max(LEAST, int(HELD * len(flat)))
        for half in (0, 1):  # each half keeps its own, or the other's would choose with it
            seen = flat[flat[:, 3 + half] > FAINT**2]
            self._seen[half] += len(seen)
            order = np.argsort(_score(seen, half), kind="stable")[:held]
            self._kept[half].append(seen[order])

    def result(self) -> Sharpness | None:
        """What the folder says; None where hardly a block is usable."""
        fine, middle, errors, noise = [], [], [], []
        for half in (0, 1):
            powers = np.concatenate([*self._kept[half], np.empty((0, 5))]).astype(np.float64)
            if len(powers) < LEAST:
                return None
            h, m, level = _measured(powers, half, self._seen[half])
            fine.append(h.mean())
            middle.append(m.mean())
            noise.append((h * level).mean())
            # half-overlapping blocks: about a quarter of them are independent
            errors.append(4 / h.size * (h.var() / h.mean() ** 2 + m.var() / m.mean() ** 2))
        ratio, error = sum(fine) / sum(middle), float(np.sqrt(sum(errors))) / 2
        return Sharpness(float(ratio), error, float(np.sqrt(np.mean(noise))), h.size)


def _powers(region: Region) -> F32:
    """Mean power (n, 5) of usable blocks: low, middling and fine by half (0, 1)."""
    cut = (slice(None, None, STRIDE),) * 2
    whole = sliding_window_view(region.usable, (SIDE, SIDE))[cut].all(axis=(2, 3))
    blocks = sliding_window_view(region.codes, (SIDE, SIDE))[cut][whole]
    power = dctn(blocks, axes=(1, 2), norm="ortho") ** 2
    parts = [_LOW, *(band & side for band in (_MIDDLE, _FINE) for side in (~_ODD, _ODD))]
    return np.stack([power[:, p].mean(axis=1) for p in parts], axis=1).astype(np.float32)


def _score(powers: NDArray[np.floating], half: int) -> F64:
    """How much scene a block holds by one half of its coefficients: coarse over fine power."""
    low, middle = int(_LOW.sum()), int((_MIDDLE & (bool(half) == _ODD)).sum())
    coarse = (low * powers[:, 0] + middle * powers[:, 1 + half]) / (low + middle)
    return np.asarray(coarse / (powers[:, 3 + half] + 1e-3), np.float64)


def _measured(powers: F64, half: int, seen: int) -> tuple[F64, F64, F64]:
    """Fine and middling power of the other half in calm blocks, over this one's level; that."""
    score = _score(powers, half)
    calm = min(int((score < CALM).sum()), int(MOST * seen))
    count = min(max(LEAST, int(SHARE * seen), calm), len(score))
    chosen = powers[np.argsort(score, kind="stable")[:count]]
    level = (chosen[:, 1 + half] + chosen[:, 3 + half]) / 2 + 1e-3
    other = 1 - half
    return chosen[:, 3 + other] / level, chosen[:, 1 + other] / level, level


def verdict(found: Sharpness | None, *, coloured: bool) -> bool | None:
    """True, False, or None where the noise cannot tell.

    None: hardly a place with noise above half a code; noise that is ``coloured`` by block
    compression or by codes that are missing; or a ratio below what plain noise gives, where
    scene or smoothing may hide the mark. A mask much wider than a pixel lifts fine and middling
    noise alike and is not seen.
    """
    if found is None or found.noise < FAINT or coloured:
        return None
    if found.ratio > SHARP_THRESHOLD and found.ratio > 1 + SURE * found.error:
        return True
    return False if PLAIN[0] < found.ratio < PLAIN[1] and found.error < 0.05 else None
