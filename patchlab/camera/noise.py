"""The law of the noise, from ordinary photographs, static scenes or dark frames.

From photographs: a pixel's high diagonal band holds noise and hardly any scene,
its gradients at a coarser scale hold both. Where the gradients are no stronger
than noise alone would make them, the pixel is flat and its diagonal band is
noise. The threshold needs the law and the law needs the threshold, so the two
are iterated until they agree; a folder without enough flat pixels is refused.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import replace

import numpy as np
from scipy import ndimage

from patchlab.camera.flat import Blocks, FlatLaw, flat_blocks, flat_law, join
from patchlab.camera.grid import GRID_THRESHOLD, GridMeter
from patchlab.camera.law import (
    COLOUR_NOTE,
    MIN_KEPT,
    NO_ELECTRONS,
    Fit,
    Samples,
    consistent,
    limits,
    line_levels,
    model,
    refused,
    unit_scale,
)
from patchlab.camera.pixels import (
    MAX_SAMPLES,
    TOO_SMALL,
    Region,
    diagonal_band,
    draw,
    limited,
    regions,
)
from patchlab.errors import InputError
from patchlab.types import F32, F64, Frame, InputContract, NoiseModel

MIN_FRACTION = 0.04
MAX_GAIN_ERROR = 0.05
MIN_VARIANCE = 0.24
JPEG_SD = 5.0
SHARP = -0.03
SMOOTH = 0.1
AGREEING = 0.85


FAR = 0.03
"""Largest mean autocovariance at the rim that is still taken for noise and not for texture."""


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
    fit = consistent(samples, limits(contract), bent)
    acov = flat.autocovariance
    if acov is not None and _neighbours(acov) < SHARP:
        fit = consistent(samples.scaled(mask_gains(acov)), limits(contract), bent)
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
        levels = (line_levels(contract) - contract.black) * scale
        variance = np.maximum(flat.line[0] * levels + flat.line[1], 0.05 * variance.min())
    return NoiseModel(
        True,
        reason=COLOUR_NOTE,
        levels=levels / scale + contract.black,
        sd=np.sqrt(variance) / scale,
        autocovariance=flat.autocovariance,
        kept_fraction=flat.blocks / max(flat.looked, 1),
        points=points,
    )
