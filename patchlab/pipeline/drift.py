"""Hold new photographs of a camera against the bank that was made for it."""

from __future__ import annotations

import dataclasses
import functools
import math
from collections.abc import Callable, Iterable, Sequence
from pathlib import Path
from typing import Any

import numpy as np

from patchlab import bank as banks
from patchlab import camera, edges, images
from patchlab.errors import InputError
from patchlab.pipeline.detect import read_options
from patchlab.pipeline.loaded import bank_folder, need_one_plane
from patchlab.progress import Progress, silent
from patchlab.types import Bank, Frame, Survey, Thresholds


def drift(
    path: Path,
    photos: Path,
    *,
    rate: float = 10.0,
    max_bad: float = 0.1,
    jobs: int = 1,
    progress: Progress = silent,
) -> dict[str, Any]:
    """Survey new photographs and compare them with what a bank was made for.

    Parameters
    ----------
    path : the bank's folder, or its run's
    photos : folder of new frames, ten or more for a sure answer
    rate : false edges per megapixel that production asks for
    max_bad : share of unreadable files that is let pass
    jobs : worker processes for reading
    progress : as everywhere

    Returns
    -------
    dict of plain data : ``verdict`` (steady, drifted, cannot tell), ``changes`` (a list, one a
        quantity: name, unit, before, now, limit, error, verdict, note), ``false_edges`` (``asked``
        and ``now``, the rate that the bank's threshold gives on the new noise at its worst grey;
        None where not known), ``frames`` and ``bank``.

    Raises
    ------
    InputError : the bank knows nothing of its camera, or the photographs are not of its format.
    UsageError : the rate is outside the bank's thresholds.
    """
    bank, _, head = banks.read_bank(bank_folder(path))
    need_one_plane(bank.contract, "drift")
    before = bank.provenance.get("blur_sigma_px")
    if not stabilised(bank) and before is None:
        raise InputError(
            "this bank knows neither its camera's noise nor its blur, so nothing can be compared",
            where=bank.name,
            remedy="make the bank with patchlab run on photographs that tell them",
        )
    if bank.thresholds is not None:
        edges.strength_for(bank.thresholds, rate)  # refused before the work, not after
    intake = images.take_in(
        images.list_photos(photos), read_options(bank), max_bad=max_bad, jobs=jobs,
        progress=progress,
    )  # fmt: skip
    frames = functools.partial(images.iterate, intake.thinned(camera.MAX_FRAMES))
    found = camera.survey(
        frames,
        intake.contract,
        kind="linear" if intake.contract.format.integer else "identity",
        progress=progress,
    )
    noise = noise_changes(bank, frames)
    changes = (
        *noise,
        *colour_changes(bank, found),
        *([] if before is None else [camera.blur_change(before, found)]),
        *camera.new_marks(bank.provenance.get("marks", ()), found.marks),
    )
    return {
        "bank": {"name": bank.name, "id": head["id"]},
        "frames": {
            "used": len(intake.frames),
            "quarantined": [
                {"path": q.path, "reason": q.reason} for q in intake.quarantined
            ],
        },
        "verdict": camera.verdict_of(changes),
        "changes": [dataclasses.asdict(c) for c in changes],
        "false_edges": {"asked": rate, "now": rate_now(bank.thresholds, rate, noise)},
    }  # fmt: skip


def noise_changes(bank: Bank, frames: Callable[[], Iterable[Frame]]) -> tuple[camera.Change, ...]:
    """The noise behind the bank's table, where that brings it to one size."""
    if not stabilised(bank):
        return ()
    keeper = camera.NoiseKeeper(bank.table, bank.noise_autocovariance)
    for frame in frames():
        keeper.add(frame)
    return keeper.changes()


def colour_changes(bank: Bank, found: Survey) -> tuple[camera.Change, ...]:
    """The noise's colour, where the bank knows it and the survey can tell it."""
    if not (stabilised(bank) and found.noise.measurable):
        return ()
    return (camera.colour_change(bank.noise_autocovariance, found.noise),)


def stabilised(bank: Bank) -> bool:
    """Whether the bank's table gives its camera's noise a standard deviation of 1."""
    return bank.table.kind == "stabilised" and bank.table.noise_sd is not None


def rate_now(
    thresholds: Thresholds | None, rate: float, noise: Sequence[camera.Change]
) -> float | None:
    """False edges per megapixel at the old threshold on the new noise, at its worst grey.

    Responses grow with the noise, so a threshold acts as if it were lower by as much. The
    logarithm of the rate goes straight with the squared threshold (a Gaussian tail), beyond
    the calibrated table too.
    """
    grown = [c.now / c.before for c in noise if c.now is not None and c.before]
    if thresholds is None or not grown:
        return None
    strength = edges.strength_for(thresholds, rate) / max(grown)
    square, rates = thresholds.strength[::-1] ** 2, np.log(thresholds.rate[::-1])
    if square[0] <= strength**2 <= square[-1]:
        return math.exp(float(np.interp(strength**2, square, rates)))
    end = slice(None, 2) if strength**2 < square[0] else slice(-2, None)
    slope = float(np.diff(rates[end])[0] / np.diff(square[end])[0])
    return math.exp(float(rates[end][0]) + slope * (strength**2 - float(square[end][0])))
