"""Several cameras in one folder, told by the noise of their frames."""

from __future__ import annotations

from collections.abc import Mapping, Sequence
from itertools import combinations

import numpy as np

from patchlab.camera.law import KEEP_RULE, MIN_KEPT, unit_scale
from patchlab.camera.noise import NoiseMeter
from patchlab.camera.table import read_of
from patchlab.errors import InputError
from patchlab.types import NoiseModel

OTHER_NOISE = float(np.log(4 / 3))
"""Logarithm of the ratio of standard deviations from which two laws are two cameras'."""
FEWEST = 2
LEAST = 0.01
ROUNDS = 12

_REMEDY = "survey each camera setting on its own, or allow it with --mixed-cameras"

Meters = Sequence[tuple[tuple[int, ...], str, NoiseMeter]]
"""Size, path and meter of every frame."""


def joined(meters: Meters) -> NoiseMeter:
    """One meter of all frames."""
    whole = NoiseMeter()
    for _, _, meter in meters:
        whole.join(meter)
    return whole


def one_camera(meters: Meters, noise: NoiseModel) -> None:
    """Refuse frames whose noise differs as that of one camera setting never does.

    Frames of several sizes are compared by their laws; frames of one size by how far each
    one's flat pixels lie from the folder's law (those of one camera within a twentieth).

    Raises
    ------
    InputError : two sizes whose standard deviations differ by a third at every level, or two
        groups of two frames and more, parted at the widest gap, whose medians differ by as much.
    """
    by_size: dict[tuple[int, ...], list[tuple[tuple[int, ...], str, NoiseMeter]]] = {}
    for entry in meters:
        by_size.setdefault(entry[0], []).append(entry)
    if len(by_size) > 1:
        _compare_sizes({s: (m[0][1], joined(m).result()) for s, m in by_size.items()})
    _compare_frames([(path, meter) for _, path, meter in meters], noise)


def _compare_sizes(laws: Mapping[tuple[int, ...], tuple[str, NoiseModel]]) -> None:
    known = [(size, *law) for size, law in laws.items() if law[1].measurable]
    for one, two in combinations(known, 2):
        low = max(one[2].levels.min(), two[2].levels.min())
        high = min(one[2].levels.max(), two[2].levels.max())
        if high <= low:
            continue
        at = np.linspace(low, high, 16)
        ratio = np.log(np.interp(at, one[2].levels, one[2].sd))
        ratio = ratio - np.log(np.interp(at, two[2].levels, two[2].sd))
        if np.abs(ratio).min() > OTHER_NOISE and abs(np.sign(ratio).sum()) == at.size:
            names = ["{1} x {0} ({2})".format(*law[0], law[1]) for law in (one, two)]
            raise InputError(
                f"the frames of {names[0]} and those of {names[1]} are of different cameras: their "
                f"noise differs by a factor of {float(np.exp(np.abs(np.median(ratio)))):.1f}",
                remedy=_REMEDY,
            )


def _compare_frames(frames: list[tuple[str, NoiseMeter]], noise: NoiseModel) -> None:
    if noise.gain is None or noise.source != "photos":
        return
    scales = {path: frame_scale(meter, noise) for path, meter in frames}
    known = sorted((float(np.log(s)) / 2, path) for path, s in scales.items() if s is not None)
    sizes = np.array([size for size, _ in known])
    if len(known) < 2 * FEWEST:
        return
    cut = FEWEST + int(np.argmax(np.diff(sizes)[FEWEST - 1 : len(sizes) - FEWEST]))
    apart = float(np.median(sizes[cut:]) - np.median(sizes[:cut]))
    if apart > OTHER_NOISE:
        raise InputError(
            f"{cut} frames (as {known[0][1]}) and {len(known) - cut} others (as {known[-1][1]}) "
            f"are of different cameras or settings: their noise differs by a factor of "
            f"{np.exp(apart):.1f}",
            remedy=_REMEDY,
        )


def frame_scale(meter: NoiseMeter, noise: NoiseModel) -> float | None:
    """Variance of a frame's noise over the folder's law, None where too little is flat.

    The keep rule of the law, with the law's shape held and its size free.
    """
    assert meter.contract is not None
    assert noise.gain is not None
    read = read_of(noise, meter.contract)
    assert read is not None
    samples, unit = meter.samples, unit_scale(meter.contract)
    quantum = 1 / 12 if meter.contract.format.integer else 0.0
    law = noise.gain * unit * np.maximum(samples.level, 0) + (read * unit) ** 2
    law = np.maximum(law + quantum, 0.02)
    size = 16.0
    for _ in range(ROUNDS):
        kept = samples.structure < KEEP_RULE * size * law
        if kept.sum() < MIN_KEPT or kept.mean() < LEAST:
            return None
        fresh = float(np.mean(np.minimum(samples.band[kept] / law[kept], 12 * size)))
        if abs(fresh - size) < 1e-3 * size:
            return fresh
        size = fresh
    return size
