"""Whether a camera still is the one that a bank was made for.

A bank's thresholds hold for the noise that its input table brings to one size, and its
widths for the blur that was measured. New photographs are surveyed as the first ones
were, and each quantity is held against what the bank was made with: changed when it is
beyond a limit that matters *and* beyond what the survey's own errors explain.
"""

from __future__ import annotations

import math
from collections.abc import Sequence
from dataclasses import dataclass, replace
from typing import Literal

import numpy as np

from patchlab.camera.noise import KEEP_RULE, MIN_KEPT, Samples, mask_gains, noise_bands
from patchlab.camera.pixels import draw, regions, windows
from patchlab.types import F64, Frame, InputTable, Mark, NoiseModel, Survey

Verdict = Literal["steady", "drifted", "cannot tell"]

NOISE_LIMIT = math.log(1.06)
"""Change of the noise's standard deviation that matters: at a strength of 5 units,
6 per cent more noise makes four times as many false edges."""
BLUR_LIMIT = math.log(1.2)
"""Change of the blur that matters; what a folder's scenes alone change stays below it."""
COLOUR_LIMIT = 0.1
"""Change of a neighbour's correlation that matters."""
SURE = 2.0
"""Standard errors from which a change is not an accident."""
DOUBT = math.log(1.15)
"""Largest error at which steadiness can still be told."""
GREYS = ("dark", "middle", "bright")
CLEAR = 4.0
"""Noise units between a level and the last trusted ones."""
FLAT = 2.0
"""Structure, in noise variances, below which a pixel's level counts as one of flat areas."""
SAMPLES = 100_000
START = 16.0
ROUNDS = 30
LEAST = 0.01
OF_THE_FOLDER = ("near_duplicates", "blurred_frames", "clipped_levels")
"""Marks that follow from what was photographed and not from the camera."""


@dataclass(frozen=True)
class Change:
    """One quantity, then and now.

    Parameters
    ----------
    name : what
    unit : of ``before`` and ``now``
    before, now : values, None where not known
    limit : largest value of ``now / before`` (or difference, for a correlation) that is let pass
    error : standard error of the logarithm of ``now``, None where not known
    verdict : steady, drifted or cannot tell
    note : why, or what it does
    """

    name: str
    unit: str
    before: float | None
    now: float | None
    limit: float
    error: float | None
    verdict: Verdict
    note: str = ""


class NoiseKeeper:
    """Collects the noise of new photographs behind the table that a bank was made with.

    There the noise had one size at every level, so its law is known but for that size: far
    fewer flat pixels tell it than a law that is measured from nothing.

    Parameters
    ----------
    table : the bank's, stabilised
    autocovariance : of the bank's noise in working values, None for white
    """

    def __init__(self, table: InputTable, autocovariance: F64 | None) -> None:
        self.table = table
        self._gains = (1.0, 1.0) if autocovariance is None else mask_gains(autocovariance)
        self._frames: list[Samples] = []
        contract = table.contract
        ends = np.clip(table.valid_codes, min(contract.black, 0.0), contract.white)
        self._trusted = table.apply(ends.astype(contract.format.dtype))

    def add(self, frame: Frame) -> None:
        """Look at one frame."""
        values = self.table.apply(frame.pixels)
        low, high = self._trusted
        parts = []
        found = list(regions(frame))
        for region, (rows, cols) in zip(found, windows(frame.pixels.shape), strict=False):
            region = replace(region, codes=values[rows, cols])
            band, level, structure = noise_bands(region)
            where = region.usable & (level > low + CLEAR) & (level < high - CLEAR)
            at = draw(region, where, SAMPLES // len(found))
            parts.append(Samples(band.flat[at], level.flat[at], structure.flat[at]))
        self._frames.append(_joined(parts).scaled(self._gains))

    def changes(self) -> tuple[Change, ...]:
        """The noise's size in thirds of the levels of flat areas: 1 when nothing changed.

        The standard error is the jackknife's over frames (Efron and Stein 1981, Annals of
        Statistics 9:586-596).
        """
        whole = _joined(self._frames)
        flat = whole.level[whole.structure < FLAT]
        if flat.size < MIN_KEPT:
            return tuple(_unknown_noise(grey) for grey in GREYS)
        ends = np.quantile(flat, [0, 1 / 3, 2 / 3, 1])
        return tuple(self._change(*third) for third in zip(GREYS, ends, ends[1:], strict=False))

    def _change(self, grey: str, low: float, high: float) -> Change:
        thirds = [s.at((s.level >= low) & (s.level <= high)) for s in self._frames]
        size = _size(_joined(thirds))
        if size is None:
            return _unknown_noise(grey)
        without = [
            _size(_joined(thirds[:k] + thirds[k + 1 :])) for k in range(len(thirds))
        ]  # fmt: skip
        left = np.log([w for w in without if w is not None])
        if left.size < 3:
            return _unknown_noise(grey)
        error = math.sqrt((left.size - 1) * float(np.var(left))) / 2
        now = math.sqrt(size)
        return _compared(f"noise, {grey}", "noise units", 1.0, now, NOISE_LIMIT, error)


def _joined(parts: Sequence[Samples]) -> Samples:
    names = ("band", "level", "structure")
    return Samples(
        *(
            np.concatenate([getattr(p, name) for p in parts] or [np.empty(0, np.float32)])
            for name in names
        )
    )


def _unknown_noise(grey: str) -> Change:
    note = "hardly an area is flat"
    limit = math.exp(NOISE_LIMIT)
    return Change(f"noise, {grey}", "noise units", 1.0, None, limit, None, "cannot tell", note)


def _size(samples: Samples) -> float | None:
    """Variance of the noise where its law is flat, None where too little is flat.

    The keep rule of the survey's law, iterated with one free number.
    """
    size = START
    for _ in range(ROUNDS):
        kept = samples.structure < KEEP_RULE * size
        if kept.sum() < MIN_KEPT or kept.mean() < LEAST:
            return None
        fresh = float(np.mean(np.minimum(samples.band[kept], 12 * size)))
        if abs(fresh - size) < 1e-3 * size:
            return fresh
        size = fresh
    return size


def _compared(
    name: str, unit: str, before: float, now: float, limit: float, error: float
) -> Change:
    away = abs(math.log(max(now, 1e-12) / before))
    verdict: Verdict = "steady"
    if away > max(limit, SURE * error):
        verdict = "drifted"
    elif SURE * error > DOUBT:
        verdict = "cannot tell"
    return Change(name, unit, before, now, math.exp(limit), error, verdict)


def blur_change(before: float | None, found: Survey) -> Change:
    """The blur then and now, in pixels."""
    now, limit = found.blur_sigma_px, math.exp(BLUR_LIMIT)
    if before is None:
        note = "the blur was not known when the bank was made"
        return Change("blur", "px", None, now, limit, None, "cannot tell", note)
    if now is None:
        return Change("blur", "px", before, None, limit, None, "cannot tell", found.blur_note)
    return _compared("blur", "px", before, now, BLUR_LIMIT, 0.0)


def colour_change(before: F64 | None, noise: NoiseModel) -> Change:
    """Largest change of the noise's autocovariance at lags up to 2; ``noise`` was measurable."""
    one, two = (_window(a) for a in (before, noise.autocovariance))
    away = float(np.abs(one - two).max())
    verdict: Verdict = "drifted" if away > COLOUR_LIMIT else "steady"
    return Change("noise colour", "correlation", 0.0, away, COLOUR_LIMIT, None, verdict)


def _window(autocovariance: F64 | None) -> F64:
    """Lags up to 2, white where None."""
    if autocovariance is None:
        white = np.zeros((5, 5))
        white[2, 2] = 1.0
        return white
    c = autocovariance.shape[0] // 2
    grown = np.pad(autocovariance, 2)
    return grown[c : c + 5, c : c + 5]


def new_marks(before: Sequence[str], marks: Sequence[Mark]) -> tuple[Change, ...]:
    """A change for every mark of the camera that is found now and was not before."""
    return tuple(
        Change(
            f"mark: {m.name.replace('_', ' ')}", "", None, m.value, m.threshold, None, "drifted",
            m.effect,
        )
        for m in marks
        if m.found and m.name not in before and m.name not in OF_THE_FOLDER
    )  # fmt: skip


def verdict_of(changes: Sequence[Change]) -> Verdict:
    """Drifted if anything drifted; steady if nothing did and something could be told."""
    found = {c.verdict for c in changes}
    if "drifted" in found:
        return "drifted"
    return "cannot tell" if "cannot tell" in found else "steady"
