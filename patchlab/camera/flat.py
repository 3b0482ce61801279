"""The flattest blocks of a folder: the autocovariance of the noise, and its law when coloured.

A photograph's flat blocks are found by the ratio of slow structure (the variance
of cell means) to fast power in the same block. The ratio is essential: a score of
slow structure alone picks blocks whose noise happens to be small.
"""

from __future__ import annotations

from dataclasses import dataclass, field, replace

import numpy as np
from numpy.typing import NDArray

from patchlab.camera.pixels import Region
from patchlab.types import F64

BLOCK = 24
CELL = 6
LAG = 3
KEEP = 0.2
STRATA = 6
MIN_BLOCKS = 40

_GRID = np.arange(BLOCK) - (BLOCK - 1) / 2
_PLANE = np.linalg.qr(
    np.stack([np.ones(BLOCK**2), np.tile(_GRID, BLOCK), np.repeat(_GRID, BLOCK)], axis=1)
)[0]
_OVERLAP = BLOCK - np.abs(np.arange(-LAG, LAG + 1.0))


@dataclass(frozen=True, eq=False)
class Blocks:
    """Blocks with their plane removed.

    Parameters
    ----------
    level, variance : ndarray (n,), codes and codes squared
    score : ndarray (n,), slow structure over the power of the diagonal band
    products : ndarray (n, 7, 7), mean lagged products
    """

    level: F64
    variance: F64
    score: F64
    products: F64

    def __len__(self) -> int:
        return int(self.level.size)

    def at(self, index: NDArray[np.bool_] | NDArray[np.intp]) -> Blocks:
        """Some of the blocks."""
        return Blocks(*(getattr(self, name)[index] for name in self.__dataclass_fields__))


def join(parts: list[Blocks]) -> Blocks:
    """All blocks of several frames."""
    if not parts:
        none = np.empty(0)
        return Blocks(none, none, none, np.empty((0, 2 * LAG + 1, 2 * LAG + 1)))
    names = Blocks.__dataclass_fields__
    return Blocks(*(np.concatenate([getattr(p, name) for p in parts]) for name in names))


def _cut(region: Region) -> F64:
    """Usable 24 x 24 blocks of two half-shifted grids, (n, 24, 24)."""
    found = []
    for shift in (0, BLOCK // 2):
        h, w = ((n - shift) // BLOCK for n in region.codes.shape)
        area = slice(shift, shift + h * BLOCK), slice(shift, shift + w * BLOCK)

        def blocks(plane: NDArray[np.generic]) -> NDArray[np.generic]:
            split = plane[area].reshape(h, BLOCK, w, BLOCK)  # noqa: B023 - used at once
            return split.swapaxes(1, 2).reshape(-1, BLOCK, BLOCK)

        good = blocks(region.usable).all(axis=(1, 2))
        found.append(blocks(region.codes)[good])
    return np.concatenate(found).astype(np.float64)


def lagged_products(blocks: F64) -> F64:
    """Mean products of each block with itself at lags -3..3, (n, 7, 7), unbiased divisor."""
    size = BLOCK + 2 * LAG + 2
    power = np.abs(np.fft.rfft2(blocks, (size, size))) ** 2
    full = np.fft.irfft2(power, (size, size))
    lags = np.arange(-LAG, LAG + 1) % size
    return np.asarray(full[:, lags[:, None], lags[None, :]] / np.outer(_OVERLAP, _OVERLAP))


def flat_blocks(region: Region) -> tuple[Blocks, int]:
    """The flattest fifth of a region's blocks, and how many there were."""
    raw = _cut(region)
    if not len(raw):
        return join([]), 0
    flat = raw.reshape(len(raw), -1)
    level = flat.mean(axis=1)
    rest = (flat - (flat @ _PLANE) @ _PLANE.T).reshape(raw.shape)
    variance = (rest**2).sum(axis=(1, 2)) / (BLOCK**2 - 3)
    cells = rest.reshape(-1, BLOCK // CELL, CELL, BLOCK // CELL, CELL).mean(axis=(2, 4))
    slow = cells.reshape(len(raw), -1).var(axis=1)
    tiny = 1e-12 + 1e-9 * variance
    bend = rest[:, 2:] - 2 * rest[:, 1:-1] + rest[:, :-2]
    bend = bend[:, :, 2:] - 2 * bend[:, :, 1:-1] + bend[:, :, :-2]
    score = slow / ((bend**2).mean(axis=(1, 2)) / 36 + tiny)
    best = np.sort(np.argsort(score, kind="stable")[: max(1, int(KEEP * len(raw)))])
    best = best[variance[best] > 0]
    products = lagged_products(rest[best])
    return Blocks(level[best], variance[best], score[best], products), len(raw)


@dataclass(frozen=True, eq=False)
class FlatLaw:
    """What the flat blocks say.

    Parameters
    ----------
    autocovariance : ndarray (7, 7), centre 1, or None when too few blocks remain
    levels, variance : the blocks' own noise law, sampled at the strata's medians
    blocks : blocks it rests on
    agreeing : share of the chosen blocks within 30 % of the law: noise has one size at one
        level, texture has not
    line : slope and offset of variance over level
    looked : blocks that were looked at
    """

    autocovariance: F64 | None
    levels: F64 = field(default_factory=lambda: np.empty(0))
    variance: F64 = field(default_factory=lambda: np.empty(0))
    blocks: int = 0
    agreeing: float = 0.0
    line: tuple[float, float] = (0.0, 0.0)
    looked: int = 0


def _choose(score: F64, level: F64, total: int, share: float) -> NDArray[np.bool_]:
    """Lowest scores of all, and of each level stratum below a cut at 2.5 times the share."""
    # scores were kept for the flattest fifth only, so quantiles count from the total
    order = np.sort(score)
    lowest = order[min(len(order) - 1, int(share * total))]
    cut = order[min(len(order) - 1, int(2.5 * share * total))]
    chosen = score <= lowest
    for part in np.array_split(np.argsort(level, kind="stable"), STRATA):
        if part.size:
            own = np.sort(score[part])[min(part.size - 1, int(share * total / STRATA))]
            chosen[part] |= score[part] <= min(own, cut)
    return np.asarray(chosen)


def _robust_line(level: F64, variance: F64) -> tuple[float, float]:
    """``variance = slope * level + offset`` with blocks above 1.35 of the law weighed down."""
    model = np.full_like(variance, np.median(variance))
    slope, offset = 0.0, float(model[0])
    for _ in range(30):
        weight = np.where(variance > 1.35 * model, 0.05, 1.0) / model**2
        centre = np.average(level, weights=weight)
        spread = np.average((level - centre) ** 2, weights=weight)
        mean = np.average(variance, weights=weight)
        slope = np.average((level - centre) * variance, weights=weight) / max(spread, 1e-12)
        slope = max(float(slope), 0.0)
        offset = float(mean - slope * centre)
        model = np.maximum(slope * level + offset, 0.05 * mean)
    return slope, offset


def _strata_curve(level: F64, variance: F64) -> tuple[F64, F64]:
    """Medians over a dozen equal-count strata."""
    order = np.argsort(level, kind="stable")
    parts = [p for p in np.array_split(order, 2 * STRATA) if p.size]
    return (
        np.array([np.median(level[p]) for p in parts]),
        np.array([np.median(variance[p]) for p in parts]),
    )


def flat_law(blocks: Blocks, total: int, *, share: float = 0.05, bent: bool = False) -> FlatLaw:
    """Autocovariance and level law of the noise from a folder's flat blocks.

    Parameters
    ----------
    blocks : the flattest fifth of every frame, joined
    total : blocks that were looked at, all frames
    share : of the blocks to rest on
    bent : follow a curve over levels instead of a line
    """
    if len(blocks) < MIN_BLOCKS:
        return FlatLaw(None, blocks=len(blocks))
    chosen = blocks.at(_choose(blocks.score, blocks.level, total, share))
    levels, curve = _strata_curve(chosen.level, chosen.variance)
    slope, offset = _robust_line(chosen.level, chosen.variance)
    if bent:
        model = np.interp(chosen.level, levels, curve)
    else:
        model = np.maximum(slope * chosen.level + offset, 0.05 * np.median(chosen.variance))
    near = np.abs(chosen.variance / model - 1) < 0.3
    law = FlatLaw(None, levels, curve, int(near.sum()), float(near.mean()), (slope, offset), total)
    if law.blocks < MIN_BLOCKS:
        return law
    mean = (chosen.products[near] / model[near, None, None]).mean(axis=0)
    mean += 3 / BLOCK**2  # what removing the plane took from every lag
    return replace(law, autocovariance=mean / mean[LAG, LAG])
