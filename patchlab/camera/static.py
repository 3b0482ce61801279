"""The law of the noise from static scenes or dark frames, where scene texture cancels.

Temporal variance from differences of two frames, as EMVA 1288 (release 4.0 Linear,
2021) does; the straight line is weighted, because an unweighted intercept is useless.
"""

from __future__ import annotations

from collections.abc import Iterable, Sequence
from dataclasses import replace
from itertools import pairwise

import numpy as np
from scipy import ndimage

from patchlab.camera.flat import BLOCK, LAG, lagged_products
from patchlab.camera.noise import MIN_KEPT, Fit, Samples, bin_means, line, model, refused
from patchlab.camera.pixels import MAX_SAMPLES, Region, diagonal_band, draw, limited, regions
from patchlab.errors import InputError
from patchlab.types import F32, F64, Frame, InputContract, NoiseModel

LEVEL_LIMIT = 0.8
WHITE = 0.02
EMVA_FLOOR = 0.24
PAIRS = 16


def _same_size(first: Frame, second: Frame) -> None:
    if first.pixels.shape != second.pixels.shape:
        raise InputError(
            f"this frame is {second.pixels.shape[1]} x {second.pixels.shape[0]} pixels, "
            f"the one before it {first.pixels.shape[1]} x {first.pixels.shape[0]}",
            where=second.path,
            remedy="static and dark frames must come from one camera setting",
        )


def _pair(first: Region, second: Region, black: float) -> tuple[Samples, F32]:
    """Half the squared difference against the level; and the difference itself."""
    both = first.usable & second.usable
    difference = (first.codes - second.codes) / np.float32(np.sqrt(2))
    # the lamp may have flickered between the two
    difference = difference - difference[both].mean() if both.any() else difference
    level = ndimage.gaussian_filter((first.codes + second.codes) / 2, 1.0) - np.float32(black)
    at = draw(first, both, MAX_SAMPLES)
    power = np.asarray((difference**2).flat[at], np.float32)
    samples = Samples(power, np.asarray(level.flat[at], np.float32), np.zeros_like(power))
    return samples, np.asarray(difference, np.float32)


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
        frames of a scene are differenced in turn

    Returns
    -------
    NoiseModel : gain (DN per electron), read noise (DN, quantisation taken out), standard
        errors, autocovariance unless white; or ``measurable=False`` when the scenes do not
        span levels enough. ``source`` is "static".

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
        for first, second in pairwise(frames):
            _same_size(first, second)
            for a, b in zip(regions(first), regions(second), strict=True):
                found, difference = _pair(a, b, contract.black)
                samples.append(found)
                if len(differences) < PAIRS:
                    differences.append(difference)
    if contract is None:
        raise InputError("there is no static scene", remedy="give a folder for each scene")
    joined = Samples(
        *(
            np.concatenate([getattr(s, name) for s in samples])
            for name in ("band", "level", "structure")
        )
    )
    return _static_law(contract, joined, differences)


def _static_law(contract: InputContract, samples: Samples, differences: list[F32]) -> NoiseModel:
    span = contract.white - contract.black
    samples = samples.at(samples.level < LEVEL_LIMIT * span)
    if len(samples) < MIN_KEPT:
        return replace(refused("there are too few unclipped pixels", 0.0), source="static")
    fit = Fit(np.zeros(1), np.zeros(1), 0.0, float(samples.band.mean()))
    for _ in range(5):
        level, power, law, count = bin_means(samples, fit.at(samples.level), 40, clip=np.inf)
        fit = line(level, power, count, law, effective=1.0)
    if fit.slope_error > 0.05 * fit.slope:
        return replace(refused("the scenes do not span enough grey levels", 1.0), source="static")
    found = model(contract, replace(fit, share=1.0))
    return replace(found, source="static", autocovariance=_autocovariance(differences))


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
    floor = 0.0
    single = 0.0
    for frame in limited(frames):
        codes = frame.pixels.astype(np.float64)
        means.append(float(codes.mean()))
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
    return _dark_law(before.contract, variance, n, float(np.mean(means)))


def _dark_law(contract: InputContract, variance: float, count: float, level: float) -> NoiseModel:
    integer = contract.format.integer
    if integer and variance < EMVA_FLOOR:
        why = f"the dark noise, {np.sqrt(variance):.2f} codes, is below the quantisation step"
        return replace(refused(why, 1.0), source="dark")
    read = float(np.sqrt(variance - (1 / 12 if integer else 0.0)))
    return NoiseModel(
        True,
        read_noise=read,
        read_noise_error=variance * float(np.sqrt(2 / count)) / (2 * read),
        levels=np.array([level]),
        sd=np.array([np.sqrt(variance)]),
        kept_fraction=1.0,
        source="dark",
    )
