"""The straight or bent law of variance against level, and the pixels that are flat under it.

The law is the linear one of EMVA 1288 (and of Foi et al. 2008, IEEE Transactions
on Image Processing 17:1737-1754), or a free curve where processing has bent it.
The law needs the flat pixels and the flat pixels need the law: the two are iterated
until they agree.
"""

from __future__ import annotations

from dataclasses import dataclass, replace
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy.special import ndtr

from patchlab.camera.pixels import clip_codes
from patchlab.types import F32, F64, InputContract, NoiseModel

CLIP = 3.5
KEEP_RULE = 1.25
EFFECTIVE = 0.35
MIN_KEPT = 500
ROUNDS = 25

MAX_READ_ERROR = 0.02
"""Largest relative standard error of a read noise that is told; the law holds without it."""
COLOUR_NOTE = "the noise is not white, so its size does not tell the gain in electrons"
NO_ELECTRONS: dict[str, Any] = {
    "gain": None,
    "gain_error": None,
    "read_noise": None,
    "read_noise_error": None,
    "reason": COLOUR_NOTE,
}


@dataclass(frozen=True, eq=False)
class Samples:
    """Pixels that were looked at: noise band squared, level above black, structure band."""

    band: F32
    level: F32
    structure: F32

    def __len__(self) -> int:
        return int(self.band.size)

    def at(self, index: NDArray[np.bool_]) -> Samples:
        """Some of the samples."""
        return Samples(self.band[index], self.level[index], self.structure[index])

    def scaled(self, gains: tuple[float, float]) -> Samples:
        """Both bands divided by what unit noise of this colour gives in them."""
        return Samples(
            self.band / np.float32(gains[0]), self.level, self.structure / np.float32(gains[1])
        )


def unit_scale(contract: InputContract) -> float:
    """Floats are measured as if they were 12-bit codes, so that one set of floors serves."""
    return 1.0 if contract.format.integer else 4095 / (contract.white - contract.black)


def _quantum(contract: InputContract) -> float:
    return 1 / 12 if contract.format.integer else 0.0


@dataclass(frozen=True, eq=False)
class Fit:
    """A variance law: a line (slope, offset) or a curve (levels, variance)."""

    levels: F64
    variance: F64
    slope: float = 0.0
    offset: float = 0.0
    slope_error: float = 0.0
    offset_error: float = 0.0
    bent: bool = False
    count: int = 0
    share: float = 0.0

    def at(self, level: NDArray[np.floating]) -> F64:
        """Variance at levels above black."""
        if self.bent:
            return np.asarray(np.interp(level, self.levels, self.variance), np.float64)
        line = self.slope * np.maximum(level, 0) + self.offset
        return np.asarray(np.maximum(line, 0.02), np.float64)


def _clipped_power(clip: float) -> float:
    """Mean of min(x^2, clip^2) for a standard Gaussian x."""
    if not np.isfinite(clip):
        return 1.0
    density = float(np.exp(-(clip**2) / 2) / np.sqrt(2 * np.pi))
    return 1 - 2 * clip * density + 2 * (clip**2 - 1) * float(ndtr(-clip))


def bin_means(
    samples: Samples, law: F64, bins: int, *, clip: float = CLIP
) -> tuple[F64, F64, F64, F64]:
    """Mean level, mean power (clipped at ``clip`` sd), mean law and count in equal-count bins."""
    order = np.argsort(samples.level, kind="stable")
    clipped = np.minimum(samples.band, clip**2 * law) / _clipped_power(clip)
    parts = [p for p in np.array_split(order, bins) if p.size]
    means = [
        np.array([v[p].mean(dtype=np.float64) for p in parts])
        for v in (samples.level, clipped, law)
    ]
    return means[0], means[1], means[2], np.array([float(p.size) for p in parts])


def line(level: F64, power: F64, count: F64, law: F64, *, effective: float = EFFECTIVE) -> Fit:
    """Weighted non-negative line through bin means; the covariance is its own standard error."""
    weight = effective * count / (2 * law**2)
    design = np.stack([level, np.ones_like(level)], axis=1)
    normal = design.T @ (weight[:, None] * design)
    right = design.T @ (weight * power)
    slope, offset = np.linalg.solve(normal + 1e-12 * np.diag(np.diag(normal)), right)
    if slope < 0:
        slope, offset = 0.0, right[1] / normal[1, 1]
    if offset < 0.02:
        slope, offset = max((right[0] - 0.02 * normal[0, 1]) / normal[0, 0], 0.0), 0.02
    errors = np.sqrt(np.diag(np.linalg.inv(normal + 1e-12 * np.diag(np.diag(normal)))))
    return Fit(level, power, float(slope), float(offset), float(errors[0]), float(errors[1]))


def _smooth(values: F64, weight: F64) -> F64:
    """Weighted mean with the neighbours on either side."""

    def reach(v: F64) -> F64:
        padded = np.pad(v, 1)
        return padded[:-2] + padded[1:-1] + padded[2:]

    return np.asarray(reach(values * weight) / reach(weight))


def _refit(samples: Samples, law: F64, bent: bool) -> Fit:
    level, power, before, count = bin_means(samples, law, 24 if bent else 40)
    if bent:
        return Fit(level, np.maximum(_smooth(power, count), 0.02), bent=True)
    return line(level, power, count, before)


def consistent(samples: Samples, limits: tuple[float, float], bent: bool) -> Fit:
    """Iterate the keep rule and the law until they agree.

    Levels within four standard deviations of a clip are left out by their level:
    leaving out single clipped pixels would favour the calm ones.
    """
    law = np.full(len(samples), 10 * float(samples.band.mean()) + 0.02)
    fit = _refit(samples, law, bent)
    kept = np.ones(len(samples), bool)
    for _ in range(ROUNDS):
        law = fit.at(samples.level)
        reach = 4 * np.sqrt(law)
        fresh = (samples.structure < KEEP_RULE * law) & (samples.level + reach < limits[1])
        fresh &= samples.level - reach > limits[0]
        same = bool((fresh == kept).all())
        kept = fresh
        if kept.sum() < MIN_KEPT or same:
            break
        fit = _refit(samples.at(kept), law[kept], bent)
    return replace(fit, count=int(kept.sum()), share=float(kept.mean()))


# ---------------------------------------------------------------- as the noun


def refused(reason: str, kept: float) -> NoiseModel:
    """No number, and why."""
    return NoiseModel(False, f"not measurable here: {reason}", kept_fraction=kept)


def limits(contract: InputContract) -> tuple[float, float]:
    """Clip codes above black, in the units of measurement."""
    low, high = clip_codes(contract)
    scale = unit_scale(contract)
    return (low - contract.black) * scale, (high - contract.black) * scale


def line_levels(contract: InputContract) -> F64:
    """Where a line is sampled: 0 to 95 % of the range, codes."""
    return contract.black + (contract.white - contract.black) * np.linspace(0.0, 0.95, 39)


def model(contract: InputContract, fit: Fit, *, read_error: float = MAX_READ_ERROR) -> NoiseModel:
    """A fit as the noun, in codes.

    The read noise is told only where its relative standard error stays below ``read_error``;
    else ``reason`` says why not, and the curve holds the variance at the black level.
    """
    scale = unit_scale(contract)
    at = fit.levels / scale + contract.black
    points = np.stack([at, np.sqrt(fit.variance) / scale], axis=1)
    if fit.bent:
        return NoiseModel(True, levels=at, sd=points[:, 1], kept_fraction=fit.share, points=points)
    read = float(np.sqrt(max(fit.offset - _quantum(contract), 0.0)))
    error = fit.offset_error / (2 * max(read, 0.1))
    if contract.format.integer:
        error = float(np.hypot(error, _rounding_doubt(read)))
    told = error <= read_error * read
    levels = line_levels(contract)
    return NoiseModel(
        True,
        reason="" if told else _untold(contract, read, error),
        gain=fit.slope / scale,
        gain_error=fit.slope_error / scale,
        read_noise=read / scale if told else None,
        read_noise_error=error / scale if told else None,
        levels=levels,
        sd=np.sqrt(fit.at((levels - contract.black) * scale)) / scale,
        kept_fraction=fit.share,
        points=points,
    )


def _rounding_doubt(read: float) -> float:
    """How far rounding may shift the read noise where all dark pixels lie about one code.

    The first harmonic of the variance of a rounded Gaussian, at its largest.
    """
    return float((4 * read**2 + 0.1) * np.exp(-2 * np.pi**2 * read**2) / (2 * max(read, 0.1)))


def _untold(contract: InputContract, read: float, error: float) -> str:
    """Why the read noise is not told."""
    clipped = contract.format.integer and contract.black == 0
    why = "the black level is 0, which cuts dark noise off" if clipped else "too little is dark"
    share = error / read if read > 0 else np.inf
    return f"read noise not measurable here: {why} (standard error {min(share, 9.99):.0%})"
