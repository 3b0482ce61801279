"""Thresholds from a promised number of false edge elements per megapixel.

The whole chain (strongest orientation, thinning, hysteresis, cascade over scales)
runs on synthetic noise with the camera's own autocovariance. The rates found
between fifty and a few thousand per megapixel are fitted by the tail law of a smooth
Gaussian field and carried on from there: connected groups fall as ``T exp(-T^2 / 2)``,
and the elements in a group vary slowly.
Rice's formula for level crossings stands beside it as an independent check.

The promise is for flat areas: near strong edges, and in texture, further elements
are structure and not noise.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Sequence
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.edges import thin
from patchlab.edges.noise import TILE, Torus, noise_tiles, spectral_moments
from patchlab.errors import UsageError
from patchlab.families import noise_gain
from patchlab.progress import Progress, silent
from patchlab.types import F32, F64, Bank, Thresholds

RATES = (0.1, 1.0, 10.0, 100.0, 1000.0)
"""False edge elements per megapixel that a bank's table promises."""
LEVELS = np.round(np.arange(2.6, 4.85, 0.1), 3)
"""Thresholds that are tried on the noise, noise units."""
FIT_RANGE = (50.0, 5000.0)
"""Rates per megapixel that enter the fit of the tail."""
SLOPE_PRIOR = 0.01
"""Standard deviation of the tail's slope about that of a Gaussian field."""

Correlate = Callable[[F32], F32]


# ---------------------------------------------------------------- counting


@dataclass(frozen=True, eq=False)
class Counts:
    """What the chain finds on pure noise.

    Parameters
    ----------
    level : ndarray (t,), high thresholds
    elements : ndarray (t,), final elements
    groups : ndarray (t,), connected groups of final elements (8 neighbours)
    maxima : ndarray (t,), thinned elements at or above the level, all scales, before
        hysteresis and cascade: what Rice's formula speaks about
    megapixels : noise looked at
    """

    level: F64
    elements: NDArray[np.int64]
    groups: NDArray[np.int64]
    maxima: NDArray[np.int64]
    megapixels: float


def _count(
    planes: Sequence[F32], level: F64, ratio: float, apart: Sequence[int]
) -> NDArray[np.int64]:
    """Elements, groups and maxima, (3, t), of one tile's candidates."""
    out = np.zeros((3, level.size), np.int64)
    for k, high in enumerate(level):
        edges, _ = thin.cascade(planes, ratio * high, high, apart)
        out[0, k] = np.count_nonzero(edges)
        out[1, k] = ndimage.label(edges, structure=np.ones((3, 3)))[1]
        out[2, k] = sum(np.count_nonzero(p >= high) for p in planes)
    return out


def count_on_noise(
    bank: Bank,
    *,
    level: Sequence[float] | F64 = LEVELS,
    hysteresis: float = thin.HYSTERESIS,
    kind: thin.Kind | None = None,
    seed: int = 0,
    key: str = "noise",
    megapixels: float = 4.0,
    correlate: Correlate | None = None,
    progress: Progress = silent,
) -> Counts:
    """Run the chain on synthetic noise with the bank's autocovariance, at many thresholds.

    Parameters
    ----------
    bank : Bank of unit noise gain; the noise has ``bank.table.noise_sd``
    level : high thresholds, noise units
    hysteresis : low threshold over high threshold, in (0, 1]
    kind : step, line or energy; None means ``bank.strength``
    seed, key : what the noise is drawn from
    megapixels : how much noise, rounded up to whole tiles
    correlate : float32 working values (h, w) -> float32 responses (n, h, w), to run another
        engine of one plane; None means transforms on periodic tiles, which have no border
    progress : told after each tile

    Returns
    -------
    Counts
    """
    if not 0 < hysteresis <= 1:
        raise UsageError(f"the hysteresis ratio must be in (0, 1], not {hysteresis:g}")
    levels = np.asarray(level, dtype=np.float64)
    wanted = kind or bank.strength
    shapes = thin.shapes_of(bank, wanted)
    tiles = max(1, math.ceil(megapixels * 1e6 / TILE**2))
    torus = Torus(bank, TILE) if correlate is None else None
    cut = 0 if correlate is None else bank.radius  # a border rule changes the noise near it
    total = np.zeros((3, levels.size), np.int64)
    keys = [key, *(f"{key}, plane {m}" for m in range(1, bank.planes))]
    noise = zip(
        *(noise_tiles(bank.noise_autocovariance, tiles, seed=seed, key=k) for k in keys),
        strict=True,
    )
    sd = np.float32(bank.table.noise_sd or 1.0)
    for done, units in enumerate(noise, 1):
        own = [sd * unit for unit in units]
        plane: Any
        if torus is not None:
            plane = torus.responses(*own)
        else:
            assert correlate is not None
            plane = correlate(own[0])[:, cut : TILE - cut, cut : TILE - cut].__getitem__
        maps = thin.scale_maps(shapes, plane, wanted)
        floor = hysteresis * float(levels.min())
        planes = [thin.candidates(m, floor, margin=0) for m in maps]
        total += _count(planes, levels, hysteresis, [s.apart_px for s in shapes])
        progress("thresholds", done, tiles)
    area = tiles * (TILE - 2 * cut - 2) ** 2 / 1e6
    return Counts(levels, total[0], total[1], total[2], area)


# ---------------------------------------------------------------- the tail


@dataclass(frozen=True)
class Tail:
    """Rates on pure noise against the high threshold T.

    Groups per megapixel are ``T^power exp(a - b T^2 / 2)``, elements in a group
    ``exp(c + d T)``.
    """

    a: float
    b: float
    c: float
    d: float
    power: int = 1

    def groups(self, strength: float) -> float:
        """Connected groups of false elements per megapixel at a high threshold."""
        return strength**self.power * math.exp(self.a - self.b * strength**2 / 2)

    def rate(self, strength: float) -> float:
        """False elements per megapixel at a high threshold."""
        return self.groups(strength) * math.exp(self.c + self.d * strength)

    def strength(self, rate: float) -> float:
        """The high threshold that gives a rate per megapixel."""
        low, high = 1.5, 40.0  # the law falls everywhere in between
        for _ in range(80):
            middle = (low + high) / 2
            low, high = (middle, high) if self.rate(middle) > rate else (low, middle)
        return (low + high) / 2


def fit_tail(counts: Counts, *, power: int = 1) -> Tail:
    """Fit the tail to counts from noise.

    Only levels whose rate of elements lies in :data:`FIT_RANGE` take part. The slope b is 1
    for every smooth Gaussian field, and groups are nearly independent, so it is held near
    that value (:data:`SLOPE_PRIOR`): that steadies the extrapolation. The power is 1 for an
    absolute response and 2 for the envelope of a pair, which has one freedom more; pixels
    and a lattice of orientations blunt it by about one from the law of a continuous field.

    Raises
    ------
    UsageError : fewer than three levels lie in the range.
    """
    rate = counts.elements / counts.megapixels
    use = (rate >= FIT_RANGE[0]) & (rate <= FIT_RANGE[1]) & (counts.groups >= 10)
    if use.sum() < 3:
        raise UsageError(
            "the noise did not reach the rates that the tail is fitted to",
            remedy="give more megapixels of noise, and a bank of unit noise gain",
        )
    level, groups = counts.level[use], counts.groups[use].astype(np.float64)
    size = counts.elements[use] / groups
    d, c = np.polyfit(level, np.log(size), 1, w=np.sqrt(groups))
    y = np.log(groups / counts.megapixels / level**power) + level**2 / 2
    # counts at several levels are nested: together they weigh about as much as the largest
    weight = np.sqrt(groups * groups.max() / groups.sum())
    design = np.column_stack([np.ones_like(level), -(level**2) / 2]) * weight[:, None]
    design = np.vstack([design, [0, 1 / SLOPE_PRIOR]])
    a, extra = np.linalg.lstsq(design, np.append(y * weight, 0.0), rcond=None)[0]
    return Tail(float(a), 1 + float(extra), float(c), float(d), power)


def rice_rate(
    taps: F32 | F64, angles: F64, autocovariance: F64 | None, strength: float, *, parity: str
) -> float:
    """Rice's expected number of maxima above a level along the normal, per megapixel.

    The sum over orientations of the rate at which each response crosses the level upwards
    along its own normal. It leaves out that orientations overlap (too many) and that pixels
    sample the field (too few).

    Parameters
    ----------
    taps : ndarray (n, h, h), kernels of one scale, unit noise gain
    angles : ndarray (n,), their normals
    autocovariance : of the noise, centre 1; None means white
    strength : level, noise units
    parity : "odd" or "even" for the absolute response, "pair" for the envelope of a
        quadrature pair (give either member's taps)

    Returns
    -------
    float

    Notes
    -----
    Rice 1945, Bell System Technical Journal 24:46-156, sections 3.3 (zero and level
    crossings) and 3.7 (envelopes).
    """
    fall = math.exp(-(strength**2) / 2)
    total = 0.0
    for kernel, theta in zip(taps, angles, strict=True):
        mean, square = spectral_moments(kernel, float(theta), autocovariance)
        if parity == "pair":
            total += math.sqrt((square - mean**2) / (2 * math.pi)) * strength * fall
        else:
            total += math.sqrt(square) / math.pi * fall
    return total * 1e6


def _rice_bank(bank: Bank, kind: thin.Kind, strength: float) -> float:
    parity = {"step": "odd", "line": "even", "energy": "pair"}[kind]
    return sum(
        rice_rate(
            bank.taps[list(s.even if kind == "line" else s.odd)],
            s.angles,
            bank.noise_autocovariance,
            strength,
            parity=parity,
        )
        for s in thin.shapes_of(bank, kind)
    )


def _check_gain(bank: Bank, kind: thin.Kind) -> None:
    """Refuse banks whose strength is not in units of a known noise."""
    sd = bank.table.noise_sd
    if sd is None:
        raise UsageError(
            "the camera's noise is not known, so no false-alarm rate can be promised",
            where=bank.name,
            remedy="survey flat or static frames, or detect with a strength threshold",
        )
    for s in thin.shapes_of(bank, kind):
        for i in s.even if kind == "line" else s.odd:
            taps = np.asarray(bank.taps[i], np.float64)
            gain = sd * noise_gain(taps, bank.noise_autocovariance)
            if not 0.98 < gain < 1.02:
                raise UsageError(
                    f"its response to the camera's noise has standard deviation {gain:.3g}, not 1",
                    where=f"{bank.name}, kernel {bank.kernels[i].name}",
                    remedy="scale the kernels to unit noise gain before thresholds are set",
                )


def _useful_levels(pilot: Counts) -> F64:
    """Levels of a short run that are likely to lie in the range of the fit."""
    rate = pilot.elements / pilot.megapixels
    near = (rate >= 0.4 * FIT_RANGE[0]) & (rate <= 1.5 * FIT_RANGE[1])
    return pilot.level[near] if near.sum() >= 3 else pilot.level


def calibrate(
    bank: Bank,
    *,
    rates: Sequence[float] = RATES,
    hysteresis: float = thin.HYSTERESIS,
    kind: thin.Kind | None = None,
    seed: int = 0,
    megapixels: float = 12.0,
    correlate: Correlate | None = None,
    progress: Progress = silent,
) -> Thresholds:
    """Strength thresholds that give promised numbers of false edge elements per megapixel.

    Parameters
    ----------
    bank : Bank of unit noise gain; ``table.noise_sd`` and ``noise_autocovariance`` are the noise
    rates : false elements per megapixel on the final edge map
    hysteresis : low threshold over high threshold, inside the promise
    kind : step, line or energy; None means ``bank.strength``
    seed : of the synthetic noise
    megapixels : how much of it (about a second each for 16 kernels)
    correlate, progress : as :func:`count_on_noise`

    Returns
    -------
    Thresholds; ``rice`` is Rice's rate of maxima at each strength, before hysteresis and
    without the overlap of orientations: the same order of size, not the same number.

    Raises
    ------
    UsageError : rates that are not positive, no oriented kernels, noise that is not known,
        gains that are not 1, too few megapixels.
    """
    wanted = np.asarray(sorted(rates), dtype=np.float64)
    if not wanted.size or not (wanted > 0).all():
        raise UsageError("false-alarm rates must be positive numbers per megapixel")
    what = kind or bank.strength
    _check_gain(bank, what)
    settings: dict[str, Any] = {
        "hysteresis": hysteresis, "kind": kind, "seed": seed, "correlate": correlate
    }  # fmt: skip
    level = _useful_levels(count_on_noise(bank, megapixels=0.25, key="pilot", **settings))
    counts = count_on_noise(bank, level=level, megapixels=megapixels, progress=progress, **settings)
    tail = fit_tail(counts, power=2 if what == "energy" else 1)
    strength = np.array([tail.strength(r) for r in wanted])
    return Thresholds(
        rate=wanted,
        strength=strength,
        rice=np.array([_rice_bank(bank, what, t) for t in strength]),
        hysteresis=hysteresis,
        megapixels=counts.megapixels,
        noise="white" if bank.noise_autocovariance is None else "coloured",
        groups=np.array([tail.groups(t) for t in strength]),
    )


# ---------------------------------------------------------------- asking


def strength_for(thresholds: Thresholds, rate: float) -> float:
    """The strength threshold for a false-alarm rate, by ``ln rate`` against ``strength^2``.

    Raises
    ------
    UsageError : the rate lies outside the calibrated table.
    """
    known = thresholds.rate
    if not known[0] <= rate <= known[-1]:
        raise UsageError(
            f"{rate:g} false edges per megapixel is outside this bank's thresholds",
            remedy=f"ask for {known[0]:g} to {known[-1]:g}",
        )
    square = np.interp(math.log(rate), np.log(known), thresholds.strength**2)
    return math.sqrt(float(square))


def rate_for(thresholds: Thresholds, strength: float) -> float:
    """The false-alarm rate per megapixel at a strength threshold: :func:`strength_for` backwards.

    Raises
    ------
    UsageError : the strength lies outside the calibrated table.
    """
    known = thresholds.strength[::-1]
    slack = 1e-9 * known[-1]
    if not known[0] - slack <= strength <= known[-1] + slack:
        raise UsageError(
            f"strength {strength:g} is outside this bank's thresholds",
            remedy=f"ask for {known[0]:.3f} to {known[-1]:.3f}",
        )
    return math.exp(float(np.interp(strength**2, known**2, np.log(thresholds.rate[::-1]))))
