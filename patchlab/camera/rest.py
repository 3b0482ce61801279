"""Frames that the survey did not look at: a cheap judgement of each, for long folders.

The survey measures 64 frames. Near duplicates, blurred and mostly clipped frames among the
others would be learned from unseen; here every frame passes once, and three numbers of each
are enough: a small copy, the sharpness of its strongest edges, the share of clipped pixels.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass, replace

import numpy as np
from scipy import ndimage

from patchlab.camera.marks import BLURRED_THRESHOLD, MOSTLY_CLIPPED
from patchlab.camera.pixels import clip_codes
from patchlab.camera.table import sd_of
from patchlab.progress import Progress, silent
from patchlab.types import F64, Frame, NoiseModel, Survey

TILE = 512
COPY = 24
ALIKE = 0.995
"""Correlation of two small copies from which the frames are near duplicates."""
STRONGEST = 0.98
FINE, COARSE = 0.8, 2.4


@dataclass(frozen=True, eq=False)
class _Look:
    """What one frame says at a glance."""

    path: str
    copy: F64
    sharpness: float
    clipped: float


def _middle(frame: Frame) -> F64:
    """The middle of a frame, codes, numbers only."""
    low, high = clip_codes(frame.contract)
    cut = []
    for n in frame.pixels.shape:
        start = max(0, (n - TILE) // 2)
        cut.append(slice(start, start + TILE))
    codes = frame.pixels[cut[0], cut[1]].astype(np.float64)
    return np.clip(np.nan_to_num(codes, posinf=high, neginf=low), low, high)


def _copy(frame: Frame) -> F64:
    """A small copy of the whole frame with mean 0 and norm 1."""
    h, w = (n // COPY * COPY for n in frame.pixels.shape)
    if not h or not w:
        return np.zeros(COPY * COPY)
    low, high = clip_codes(frame.contract)
    codes = np.nan_to_num(frame.pixels[:h, :w].astype(np.float32), posinf=high, neginf=low)
    small = codes.reshape(COPY, h // COPY, COPY, w // COPY).mean(axis=(1, 3), dtype=np.float64)
    small = small - small.mean()
    norm = float(np.linalg.norm(small))
    return np.asarray(small / norm if norm > 0 else small).ravel()


def _sharpness(codes: F64, variance: float) -> float:
    """Fine over coarse gradient on the strongest edges, noise taken off: blur lowers it."""
    sizes = [
        np.hypot(*(ndimage.gaussian_filter(codes, s, order=o) for o in ([0, 1], [1, 0])))
        for s in (FINE, COARSE)
    ]
    strong = sizes[1] >= np.quantile(sizes[1], STRONGEST)
    strong &= sizes[1] > 0
    if not strong.any():
        return float("nan")
    near = ndimage.maximum_filter(sizes[0], 3)[strong]
    # on each axis a Gaussian derivative of white noise has variance 1 / (8 pi sigma^4);
    # the maximum of nine takes about four times the mean power of both
    fine = np.maximum(near**2 - 8 * variance / (8 * np.pi * FINE**4), 0)
    return float(np.quantile(np.sqrt(fine) / sizes[1][strong], 0.9))


def _look(frame: Frame, noise: NoiseModel) -> _Look:
    low, high = clip_codes(frame.contract)
    over = frame.pixels >= high
    if frame.contract.black > low:  # a pedestal: code 0 is clipped as well
        over |= frame.pixels <= low
    middle, variance = _middle(frame), 0.0
    if noise.measurable:
        variance = float(sd_of(noise, frame.contract, middle.mean(keepdims=True))[0, 0]) ** 2
    return _Look(frame.path, _copy(frame), _sharpness(middle, variance), float(over.mean()))


def judge_rest(
    found: Survey, frames: Iterable[Frame], surveyed: frozenset[str], progress: Progress = silent
) -> Survey:
    """The survey with those frames added to the distrusted that it did not look at itself.

    The rules are the survey's: a frame that nearly repeats a surveyed or an earlier one; edges
    far less sharp than the median of all frames; more than a fifth of the pixels clipped
    where that is not the rule in the folder.

    Parameters
    ----------
    found : of some of the folder's frames
    frames : all of them, consumed once
    surveyed : paths of those that the survey looked at; its verdict on them stands
    """
    looks = []
    for done, frame in enumerate(frames, 1):
        looks.append(_look(frame, found.noise))
        progress("survey", done, 0, "the other frames")
    odd = _odd([look for look in looks if look.path in surveyed], looks, surveyed)
    told = f"{len(looks)} frames were judged at a glance, {len(odd)} more are distrusted"
    distrusted = tuple(sorted((*found.distrusted, *odd)))
    return replace(found, distrusted=distrusted, notes=(*found.notes, told))


def _odd(known: list[_Look], looks: list[_Look], surveyed: frozenset[str]) -> list[tuple[str, str]]:
    """Frames beyond the surveyed ones that are better left out, with the reason."""
    sharp = np.array([look.sharpness for look in looks])
    usual = float(np.nanmedian(sharp)) if np.isfinite(sharp).any() else 0.0
    burnt = np.mean([look.clipped > MOSTLY_CLIPPED for look in looks]) < 0.5
    copies = np.empty((len(looks), COPY * COPY))
    count = len(known)
    copies[:count] = [look.copy for look in known] if known else copies[:0]
    odd = []
    for look in looks:
        if look.path in surveyed:
            continue
        if count and float((copies[:count] @ look.copy).max()) > ALIKE:
            odd.append((look.path, "near duplicate"))
        elif burnt and look.clipped > MOSTLY_CLIPPED:
            odd.append((look.path, "clipped"))
        elif look.sharpness < BLURRED_THRESHOLD * usual:
            odd.append((look.path, "blurred"))
        copies[count] = look.copy
        count += 1
    return odd
