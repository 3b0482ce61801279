"""The law of the noise from static scenes or dark frames, where scene texture cancels.

Temporal variance from differences of two frames, as EMVA 1288 (release 4.0 Linear,
2021) does; the straight line is weighted, because an unweighted intercept is useless.
Pixels are grouped by what their neighbours say: a group then is independent of its own
pixels' noise, so texture and noise in the level bias neither gain nor read noise.
"""

from __future__ import annotations

from collections.abc import Iterable, Iterator, Sequence
from dataclasses import replace

import numpy as np
from scipy import ndimage
from scipy.optimize import brentq
from scipy.special import ndtr

from patchlab.camera.flat import BLOCK, LAG, lagged_products
from patchlab.camera.law import MIN_KEPT, NO_ELECTRONS, Fit, Samples, line, model, refused
from patchlab.camera.law import unit_scale as _scale
from patchlab.camera.pixels import MAX_SAMPLES, clip_codes, diagonal_band, limited, windows
from patchlab.conventions import rng
from patchlab.errors import InputError
from patchlab.types import F32, F64, Frame, InputContract, NoiseModel

LEVEL_LIMIT = 0.8
LOWEST = 4.0
SPAN = 0.2
WHITE = 0.02
EMVA_FLOOR = 0.24
PAIRS = 16
BINS = 40
CURVE_BINS = 24
READ_ERROR = 0.05
"""Largest relative standard error of the read noise that static scenes tell."""

_NEIGHBOURS = np.array([[1, 1, 1], [1, 0, 1], [1, 1, 1]], np.float32) / 8


def _same_size(first: Frame, second: Frame) -> None:
    if first.pixels.shape != second.pixels.shape:
        raise InputError(
            f"this frame is {second.pixels.shape[1]} x {second.pixels.shape[0]} pixels, "
            f"the one before it {first.pixels.shape[1]} x {first.pixels.shape[0]}",
            where=second.path,
            remedy="static and dark frames must come from one camera setting",
        )


def _pairs(frames: list[Frame]) -> Iterator[tuple[Frame, Frame]]:
    """Disjoint pairs, so that every difference has noise of its own."""
    for first, second in zip(frames[::2], frames[1::2], strict=False):
        _same_size(first, second)
        yield first, second


def _pair(first: Frame, second: Frame) -> Iterator[tuple[Samples, F32]]:
    """Half the squared difference, the mean level and the neighbours' level; the difference."""
    contract = first.contract
    scale = _scale(contract)
    for rows, cols in windows(first.pixels.shape):
        one, two = (
            (f.pixels[rows, cols].astype(np.float32) - np.float32(contract.black)) * scale
            for f in (first, second)
        )
        good = np.isfinite(one) & np.isfinite(two)
        for frame in (first, second):
            if frame.invalid is not None:
                good &= ~frame.invalid[rows, cols]
        if min(one.shape) < 3 or not good.any():
            continue
        level = np.asarray((one + two) / 2, np.float32)
        good &= level < LEVEL_LIMIT * (contract.white - contract.black) * scale
        difference = np.asarray((one - two) / np.float32(np.sqrt(2)), np.float32)
        if good.any():  # the lamp may have flickered between the two
            difference -= difference[good].mean(dtype=np.float64)
        around = np.asarray(ndimage.correlate(level, _NEIGHBOURS), np.float32)
        at = np.flatnonzero(good)
        if at.size > MAX_SAMPLES:
            chosen = rng(0, "survey", first.path).choice(at.size, MAX_SAMPLES, replace=False)
            at = at[np.sort(chosen)]
        power = difference.flat[at] ** 2
        yield Samples(power, level.flat[at], around.flat[at]), difference / np.float32(scale)


def _tiles(plane: F64) -> F64:
    h, w = (n // BLOCK for n in plane.shape)
    cut = plane[: h * BLOCK, : w * BLOCK].reshape(h, BLOCK, w, BLOCK)
    return cut.swapaxes(1, 2).reshape(-1, BLOCK, BLOCK)


def _autocovariance(differences: list[F32]) -> F64 | None:
    """Autocovariance of the noise of frame differences, None when white."""
    blocks = np.concatenate([_tiles(np.asarray(d, np.float64)) for d in differences])
    sd = blocks.std(axis=(1, 2))
    blocks = blocks[sd > 0] / sd[sd > 0, None, None]
    if not len(blocks):
        return None
    mean = lagged_products(blocks).mean(axis=0)
    acov = mean / mean[LAG, LAG]
    off = np.abs(acov)
    off[LAG, LAG] = 0
    return acov if off.max() > WHITE else None


def measure_noise_static(scenes: Iterable[Sequence[Frame]]) -> NoiseModel:
    """The noise of a camera from static scenes.

    Parameters
    ----------
    scenes : for each scene two or more frames of one size, taken without moving anything;
        the frames of a scene are differenced in pairs

    Returns
    -------
    NoiseModel : for linear contracts gain (DN per electron), read noise (DN, quantisation taken
        out) and standard errors; where the noise is not white or the codes are not linear the
        curve ``levels``, ``sd`` alone; the autocovariance unless white; or ``measurable=False``
        when the scenes do not span levels enough. ``source`` is "static".

    Raises
    ------
    InputError : a scene of one frame, frames of different sizes or contracts, or no scene.
    """
    contract: InputContract | None = None
    samples: list[Samples] = []
    differences: list[F32] = []
    for scene in scenes:
        frames = list(limited(scene, contract))
        if len(frames) < 2:
            raise InputError(
                "a static scene needs two frames",
                where=frames[0].path,
                remedy="take every scene at least twice",
            )
        contract = frames[0].contract
        for first, second in _pairs(frames):
            for found, difference in _pair(first, second):
                samples.append(found)
                if len(differences) < PAIRS:
                    differences.append(difference)
    if contract is None:
        raise InputError("there is no static scene", remedy="give a folder for each scene")
    empty = [Samples(*(np.empty(0, np.float32),) * 3)]
    joined = Samples(
        *(
            np.concatenate([getattr(s, name) for s in samples or empty])
            for name in ("band", "level", "structure")
        )
    )
    return replace(_static_law(contract, joined, differences), source="static")


def _bins(samples: Samples, count: int) -> tuple[F64, F64, F64]:
    """Mean level, mean power and count of groups of pixels with alike neighbours."""
    order = np.argsort(samples.structure, kind="stable")
    parts = [p for p in np.array_split(order, count) if p.size]
    level, power = (
        np.array([v[p].mean(dtype=np.float64) for p in parts])
        for v in (samples.level, samples.band)
    )
    return level, power, np.array([float(p.size) for p in parts])


def _unclipped(contract: InputContract, samples: Samples, fit: Fit) -> Samples:
    """Pixels whose neighbours lie four standard deviations above the lowest code."""
    lowest = (clip_codes(contract)[0] - contract.black) * _scale(contract)
    around = samples.structure.astype(np.float64)
    return samples.at(around - LOWEST * np.sqrt(fit.at(around)) >= lowest)


def _static_law(contract: InputContract, samples: Samples, differences: list[F32]) -> NoiseModel:
    if len(samples) < MIN_KEPT:
        return refused("there are too few unclipped pixels", 0.0)
    acov = _autocovariance(differences)
    effective = 1.0 if acov is None else 1 / float((acov**2).sum())
    fit, kept = Fit(np.zeros(1), np.zeros(1), 0.0, float(samples.band.mean())), samples
    for _ in range(5):
        level, power, count = _bins(kept, BINS)
        fit = line(level, power, count, fit.at(level), effective=effective)
        kept = _unclipped(contract, samples, fit)
        if len(kept) < MIN_KEPT:
            return refused("there are too few unclipped pixels", 0.0)
    if contract.transfer != "linear":
        return _static_curve(contract, kept, acov)
    if fit.slope_error > 0.05 * fit.slope:
        return refused("the scenes do not span enough grey levels", 1.0)
    found = replace(
        model(contract, replace(fit, share=1.0), read_error=READ_ERROR), autocovariance=acov
    )
    return found if acov is None else replace(found, **NO_ELECTRONS)


def _static_curve(contract: InputContract, samples: Samples, acov: F64 | None) -> NoiseModel:
    """Variance by level where codes do not follow light."""
    level, power, _ = _bins(samples, CURVE_BINS)
    order = np.argsort(level, kind="stable")
    level, power = level[order], power[order]
    if np.ptp(level) < SPAN * (contract.white - contract.black) * _scale(contract):
        return refused("the scenes do not span enough grey levels", 1.0)
    found = model(contract, Fit(level, np.maximum(power, 0.02), bent=True, share=1.0))
    return replace(found, autocovariance=acov)


def measure_noise_dark(frames: Iterable[Frame]) -> NoiseModel:
    """The read noise of a camera from dark frames.

    Parameters
    ----------
    frames : taken in darkness at the exposure of the photographs; with two and more the
        differences of neighbours are used (fixed pattern cancels), a single one is
        measured by its diagonal band

    Returns
    -------
    NoiseModel : read noise (DN, quantisation taken out) and its standard error; ``gain`` None;
        ``levels`` holds the mean dark level. ``source`` is "dark". Not measurable when the
        frames are clipped at code 0 or quieter than quantisation lets us see (EMVA 1288:
        a variance below 0.24).

    Raises
    ------
    InputError : no frame, or frames of different sizes or contracts.
    """
    before: Frame | None = None
    powers: list[float] = []
    counts: list[int] = []
    means: list[float] = []
    spreads: list[float] = []
    floor = 0.0
    single = 0.0
    for frame in limited(frames):
        codes = frame.pixels.astype(np.float64)
        means.append(float(codes.mean()))
        spreads.append(float(codes.var()))
        floor = max(floor, float((frame.pixels <= 0).mean()))
        single = float((diagonal_band(codes.astype(np.float32)) ** 2)[1:-1, 1:-1].mean())
        if before is not None:
            _same_size(before, frame)
            powers.append(float(np.var(codes - before.pixels)) / 2)
            counts.append(codes.size)
        before = frame
    assert before is not None
    if before.contract.format.integer and floor > 0.001:
        why = "the dark frames are clipped at code 0; raise the camera's black level"
        return replace(refused(why, 0.0), source="dark")
    variance = float(np.mean(powers)) if powers else single
    n = float(sum(counts)) if powers else 0.35 * before.pixels.size
    pattern = max(float(np.mean(spreads)) - variance, 0.0) if powers else 0.0
    return _dark_law(before.contract, variance, n, float(np.mean(means)), float(np.sqrt(pattern)))


def _rounded_variance(sd: float, means: F64, weights: F64) -> float:
    """Variance of a rounded Gaussian, exactly, averaged over the pixels' means."""
    reach = int(np.ceil(8 * sd + 2))
    code = np.rint(means)[:, None] + np.arange(-reach, reach + 1)
    below = ndtr((code + 0.5 - means[:, None]) / sd)
    chance = np.diff(below, axis=1, prepend=0.0)
    mean = (chance * code).sum(axis=1)
    return float(weights @ (chance * (code - mean[:, None]) ** 2).sum(axis=1))


def _dark_law(
    contract: InputContract, variance: float, count: float, level: float, pattern: float
) -> NoiseModel:
    """The noise whose rounding gives this variance.

    1/12 for the rounding is right only where noise or fixed pattern spreads over the codes:
    at 0.45 codes about a whole code it is wrong by 4 % of the read noise.
    """
    integer = contract.format.integer
    if integer and variance < EMVA_FLOOR:
        why = f"the dark noise, {np.sqrt(variance):.2f} codes, is below the quantisation step"
        return replace(refused(why, 1.0), source="dark")
    read, slope = float(np.sqrt(variance)), 2 * float(np.sqrt(variance))
    if integer:
        nodes, weights = np.polynomial.hermite_e.hermegauss(9)
        about, weights = level + pattern * nodes, weights / weights.sum()
        read = float(
            brentq(
                lambda sd: _rounded_variance(sd, about, weights) - variance,
                0.02,
                read + 1,
                xtol=1e-6,
            )
        )
        near = [_rounded_variance(f * read, about, weights) for f in (0.99, 1.01)]
        slope = (near[1] - near[0]) / (0.02 * read)
    return NoiseModel(
        True,
        read_noise=read,
        read_noise_error=variance * float(np.sqrt(2 / count)) / slope,
        levels=np.array([level]),
        sd=np.array([np.sqrt(variance)]),
        kept_fraction=1.0,
        source="dark",
    )
