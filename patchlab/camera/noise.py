"""The law of the noise, from ordinary photographs, static scenes or dark frames.

From photographs: a pixel's high diagonal band holds noise and hardly any scene,
its gradients at a coarser scale hold both. Where the gradients are no stronger
than noise alone would make them, the pixel is flat and its diagonal band is
noise. The threshold needs the law and the law needs the threshold, so the two
are iterated until they agree; a folder without enough flat pixels is refused.
The law is the linear one of EMVA 1288 (and of Foi et al. 2008, IEEE Transactions
on Image Processing 17:1737-1754), or a free curve where processing has bent it.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass, replace
from typing import Any

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage
from scipy.special import ndtr

from patchlab.camera.flat import Blocks, FlatLaw, flat_blocks, flat_law, join
from patchlab.camera.grid import GRID_THRESHOLD, GridMeter
from patchlab.camera.pixels import (
    MAX_SAMPLES,
    TOO_SMALL,
    Region,
    clip_codes,
    diagonal_band,
    draw,
    limited,
    regions,
)
from patchlab.errors import InputError
from patchlab.types import F32, F64, Frame, InputContract, NoiseModel

CLIP = 3.5
KEEP_RULE = 1.25
EFFECTIVE = 0.35
MIN_KEPT = 500
MIN_FRACTION = 0.04
MAX_GAIN_ERROR = 0.05
MIN_VARIANCE = 0.24
JPEG_SD = 5.0
SHARP = -0.03
SMOOTH = 0.1
AGREEING = 0.85
ROUNDS = 25

FAR = 0.03
"""Largest mean autocovariance at the rim that is still taken for noise and not for texture."""
_COLOUR_NOTE = "the noise is not white, so its size does not tell the gain in electrons"
NO_ELECTRONS: dict[str, Any] = {
    "gain": None,
    "gain_error": None,
    "read_noise": None,
    "read_noise_error": None,
    "reason": _COLOUR_NOTE,
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


def noise_bands(region: Region) -> tuple[F32, F32, F32]:
    """Diagonal band squared, level, and structure power (noise variance in white noise)."""
    codes = region.codes
    power = np.zeros_like(codes)
    for axis in (0, 1):
        order = [1 - axis, axis]
        slope = ndimage.gaussian_filter(codes, 1.5, order=order, truncate=4.0)
        power += slope**2
    unit = np.zeros((25, 25), np.float32)
    unit[12, 12] = 1
    norm = float((ndimage.gaussian_filter(unit, 1.5, order=[0, 1], truncate=4.0) ** 2).sum())
    structure = ndimage.uniform_filter(power / np.float32(2 * norm), 9)
    level = ndimage.gaussian_filter(codes, 2.0)
    return diagonal_band(codes) ** 2, level, structure


def mask_gains(acov: F64) -> tuple[float, float]:
    """Mean square of the diagonal band and of the structure band for noise of unit variance."""
    size = 64
    spectrum = np.zeros((size, size))
    lag = acov.shape[0] // 2
    at = np.arange(-lag, lag + 1) % size
    spectrum[np.ix_(at, at)] = acov
    power = np.fft.fft2(spectrum).real
    f = 2 * np.pi * np.fft.fftfreq(size)
    band = np.multiply.outer((2 - 2 * np.cos(f)) ** 2, (2 - 2 * np.cos(f)) ** 2) / 36
    envelope = np.exp(-(1.5**2) * f**2)
    slope = np.multiply.outer(f**2 * envelope, envelope)
    slope = slope + slope.T
    return float((power * band).mean()), float((power * slope).sum() / slope.sum())


# ---------------------------------------------------------------- one pass over the frames


class NoiseMeter:
    """Collects what the law needs, frame by frame."""

    def __init__(self) -> None:
        self.contract: InputContract | None = None
        self._samples: list[Samples] = []
        self._blocks: list[Blocks] = []
        self._total_blocks = 0
        self._grid = GridMeter()

    def add(self, frame: Frame) -> None:
        """Look at one frame."""
        self.contract = frame.contract
        scale = unit_scale(frame.contract)
        found = list(regions(frame))
        for region in found:
            region = replace(region, codes=(region.codes - frame.contract.black) * scale)
            band, level, structure = noise_bands(region)
            at = draw(region, region.usable, MAX_SAMPLES // len(found))
            self._samples.append(Samples(band.flat[at], level.flat[at], structure.flat[at]))
            blocks, looked = flat_blocks(region)
            self._blocks.append(blocks)
            self._total_blocks += looked
            self._grid.add(region)

    def join(self, other: NoiseMeter) -> None:
        """Take over what another meter collected."""
        self.contract = self.contract or other.contract
        self._samples += other._samples
        self._blocks += other._blocks
        self._total_blocks += other._total_blocks
        self._grid.join(other._grid)

    @property
    def samples(self) -> Samples:
        """Every pixel that was looked at."""
        return Samples(
            *(
                np.concatenate([getattr(s, name) for s in self._samples] or [np.empty(0, "f4")])
                for name in ("band", "level", "structure")
            )
        )

    def result(self) -> NoiseModel:
        """The law, or why there is none."""
        if self.contract is None:
            raise InputError("there is no frame to measure", remedy="give a folder of photographs")
        if not self._samples:
            return refused(TOO_SMALL, 0.0)
        blocks = join(self._blocks)
        return _law(self.contract, self.samples, blocks, self._total_blocks, self._grid.value)


def measure_noise(frames: Iterable[Frame]) -> NoiseModel:
    """The noise of a camera from its ordinary photographs.

    Parameters
    ----------
    frames : at most 64 are used, all of one contract; consumed once

    Returns
    -------
    NoiseModel : for linear contracts gain (DN per electron), read noise (DN, quantisation
        taken out) and standard errors; for sRGB-coded pixels the free curve ``levels``
        (codes), ``sd`` (codes, quantisation included); the autocovariance unless it is
        white; or ``measurable=False`` with the reason.

    Raises
    ------
    InputError : no frame, or frames of different contracts.
    """
    meter = NoiseMeter()
    for frame in limited(frames):
        meter.add(frame)
    return meter.result()


# ---------------------------------------------------------------- the two-band law


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


def _consistent(samples: Samples, limits: tuple[float, float], bent: bool) -> Fit:
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


# ---------------------------------------------------------------- the verdict


def _law(
    contract: InputContract, samples: Samples, blocks: Blocks, looked: int, grid: float
) -> NoiseModel:
    """Choose the law by the noise's colour, and refuse what cannot be told.

    The keep rule is itself a test of whiteness: smoothed noise has more power in the
    structure band than in the noise band, so nothing is kept. Scene structure pushes
    an autocovariance up only, so negative neighbours are the noise's own.
    """
    bent = contract.transfer != "linear"
    flat = flat_law(blocks, looked, bent=bent)
    if len(samples) < MIN_KEPT:
        return refused("there is hardly an area that is not clipped", 0.0)
    fit = _consistent(samples, _limits(contract), bent)
    acov = flat.autocovariance
    if acov is not None and _neighbours(acov) < SHARP:
        fit = _consistent(samples.scaled(mask_gains(acov)), _limits(contract), bent)
        reason = _doubt(contract, fit, grid)
        if not reason:
            return replace(model(contract, fit), autocovariance=acov, **NO_ELECTRONS)
    else:
        reason = _doubt(contract, fit, grid)
        if not reason:
            return model(contract, fit)
        short = acov is not None and _reach(acov) < FAR  # structure reaches further than noise
        if acov is not None and short and _colour(acov) > SMOOTH and flat.agreeing >= AGREEING:
            return _coloured(contract, flat, grid)
    return refused(reason, fit.share)


def _neighbours(acov: F64) -> float:
    """Mean of the four nearest lags plus mean of the four diagonal ones."""
    c = acov.shape[0] // 2
    near = (acov[c, c - 1] + acov[c, c + 1] + acov[c - 1, c] + acov[c + 1, c]) / 4
    return float(near + acov[c - 1 : c + 2 : 2, c - 1 : c + 2 : 2].mean())


def _reach(acov: F64) -> float:
    """Mean autocovariance along the rim of the window, at lags of three pixels."""
    rim = np.ones(acov.shape, dtype=bool)
    rim[1:-1, 1:-1] = False
    return float(acov[rim].mean())


def _colour(acov: F64) -> float:
    """Largest |autocovariance| away from the centre."""
    off = np.abs(acov)
    off[acov.shape[0] // 2, acov.shape[1] // 2] = 0
    return float(off.max())


def refused(reason: str, kept: float) -> NoiseModel:
    """No number, and why."""
    return NoiseModel(False, f"not measurable here: {reason}", kept_fraction=kept)


def _limits(contract: InputContract) -> tuple[float, float]:
    """Clip codes above black, in the units of measurement."""
    low, high = clip_codes(contract)
    scale = unit_scale(contract)
    return (low - contract.black) * scale, (high - contract.black) * scale


def _too_small(contract: InputContract, sd: float, grid: float) -> str:
    """Why noise of this size cannot be told, or nothing."""
    if grid > GRID_THRESHOLD and sd < JPEG_SD:
        return (
            f"block compression has removed noise (grid ratio {grid:.2f}), and the rest, "
            f"{sd:.1f} codes, is below {JPEG_SD:g}"
        )
    if sd**2 < MIN_VARIANCE and contract.format.integer:
        return f"the noise, {sd:.2f} codes, is below the quantisation step"
    return ""


def _doubt(contract: InputContract, fit: Fit, grid: float) -> str:
    """Why this law must not be told, or nothing."""
    if fit.count < MIN_KEPT or fit.share < MIN_FRACTION:
        return (
            f"texture is stronger than the noise almost everywhere "
            f"({fit.share:.1%} of the pixels are flat; {MIN_FRACTION:.0%} are needed)"
        )
    small = _too_small(contract, float(np.sqrt(np.median(fit.at(fit.levels)))), grid)
    if small or fit.bent:
        return small
    error = fit.slope_error / max(fit.slope, 1e-12)
    if error > MAX_GAIN_ERROR:
        return (
            f"the flat pixels cannot tell how the noise grows with level (standard error of "
            f"the gain {min(error, 9.99):.0%}; at most {MAX_GAIN_ERROR:.0%} is accepted)"
        )
    return ""


def _line_levels(contract: InputContract) -> F64:
    """Where a line is sampled: 0 to 95 % of the range, codes."""
    return contract.black + (contract.white - contract.black) * np.linspace(0.0, 0.95, 39)


def model(contract: InputContract, fit: Fit) -> NoiseModel:
    """A fit as the noun, in codes."""
    scale = unit_scale(contract)
    at = fit.levels / scale + contract.black
    points = np.stack([at, np.sqrt(fit.variance) / scale], axis=1)
    if fit.bent:
        return NoiseModel(True, levels=at, sd=points[:, 1], kept_fraction=fit.share, points=points)
    read = float(np.sqrt(max(fit.offset - _quantum(contract), 0.0)))
    levels = _line_levels(contract)
    return NoiseModel(
        True,
        gain=fit.slope / scale,
        gain_error=fit.slope_error / scale,
        read_noise=read / scale,
        read_noise_error=fit.offset_error / (2 * max(read, 0.1)) / scale,
        levels=levels,
        sd=np.sqrt(fit.at((levels - contract.black) * scale)) / scale,
        kept_fraction=fit.share,
        points=points,
    )


def _coloured(contract: InputContract, flat: FlatLaw, grid: float) -> NoiseModel:
    """The law of smoothed noise, from the variance of the flattest blocks."""
    scale = unit_scale(contract)
    small = _too_small(contract, float(np.sqrt(np.median(flat.variance))), grid)
    if small:
        return refused(small, flat.agreeing)
    levels, variance = flat.levels, flat.variance
    at = levels / scale + contract.black
    points = np.stack([at, np.sqrt(variance) / scale], axis=1)
    if contract.transfer == "linear":
        levels = (_line_levels(contract) - contract.black) * scale
        variance = np.maximum(flat.line[0] * levels + flat.line[1], 0.05 * variance.min())
    return NoiseModel(
        True,
        reason=_COLOUR_NOTE,
        levels=levels / scale + contract.black,
        sd=np.sqrt(variance) / scale,
        autocovariance=flat.autocovariance,
        kept_fraction=flat.blocks / max(flat.looked, 1),
        points=points,
    )
