"""The noise of each sample of colour pixels, as the input table leaves it."""

from __future__ import annotations

from collections.abc import Iterable, Mapping

import numpy as np

from patchlab.camera.noise import NoiseMeter
from patchlab.camera.pixels import MAX_FRAMES
from patchlab.camera.table import noise_of_table
from patchlab.types import F64, Frame, InputTable, NoiseModel

UNEQUAL = 0.25
"""How far the noise of a sample may change over the levels before one number is a poor tale."""


def sample_noise(
    frames: Iterable[Mapping[int, Frame]], table: InputTable, samples: int
) -> tuple[F64, str]:
    """Standard deviation of the noise in the working values of every sample of a pixel.

    One table serves all samples. Where a colour is amplified (a white balance by gains), the
    noise of its samples after the table is larger by the same factor at every level, as long as
    photon noise rules; so one number a sample is enough to scale kernels by.

    Parameters
    ----------
    frames : of each picture, sample number to its monochrome frame; at most 64 are used
    table : InputTable of monochrome frames
    samples : of a pixel

    Returns
    -------
    ndarray (samples,), median over the levels; empty where one could not be measured; and a
    sentence, "" where there is nothing to say
    """
    meters: dict[int, NoiseMeter] = {}
    for count, planes in enumerate(frames, 1):
        for sample, frame in planes.items():
            meters.setdefault(sample, NoiseMeter()).add(frame)
        if count == MAX_FRAMES:
            break
    found, uneven = np.empty(samples), False
    for sample in range(samples):
        law = meters[sample].result() if sample in meters else NoiseModel(False, "no frame")
        if not law.measurable:
            return np.empty(0), f"the noise of sample {sample + 1} of the pixels is {law.reason}"
        sds = _after(table, law)
        found[sample] = np.median(sds)
        uneven |= float(np.ptp(sds)) > UNEQUAL * float(found[sample])
    note = "the noise of the colours follows different laws: the promises hold at middle levels"
    return found, note if uneven else ""


def _after(table: InputTable, law: NoiseModel) -> F64:
    """Noise of the working values from 5 to 85 % of the range."""
    contract = table.contract
    span = contract.white - contract.black
    return noise_of_table(table, law, contract.black + span * np.linspace(0.05, 0.85, 17))
