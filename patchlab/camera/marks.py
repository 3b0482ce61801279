"""Marks that a camera or its file format leaves in pictures, judged over a folder.

A single picture can always be odd; a folder pools the evidence. With fewer than
eight frames every mark's ``found`` is None: cannot tell.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass, field, replace

import numpy as np
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.camera.alike import DUPLICATE_THRESHOLD, likeness, near_duplicates, small_copy
from patchlab.camera.grid import GRID_THRESHOLD, GridMeter
from patchlab.camera.law import unit_scale
from patchlab.camera.pixels import Region, clip_codes, diagonal_band, limited, regions
from patchlab.camera.sharp import SHARP_THRESHOLD, SharpMeter
from patchlab.camera.sharp import verdict as sharp_verdict
from patchlab.camera.spots import SPOT_THRESHOLD, SpotMeter
from patchlab.camera.table import sd_of
from patchlab.camera.wide import (
    DEPTH_THRESHOLD,
    SHADE_THRESHOLD,
    falloff,
    lost_bits,
    shading,
)
from patchlab.errors import InputError
from patchlab.types import F64, Frame, InputContract, Mark, NoiseModel

MIN_FRAMES = 8
SEGMENTS = 8

STRIPE_THRESHOLD = 0.1
LATTICE_THRESHOLD = 1.03
CLIPPED_THRESHOLD = 0.01
MISSING_THRESHOLD = 0.05
BLURRED_THRESHOLD = 0.68
MOSTLY_CLIPPED = 0.2


@dataclass(frozen=True)
class _About:
    effect: str
    remedy: str


_ABOUT = {
    "block_grid": _About(
        "filters along the axes with a wavelength of 8 pixels, and noise that was rounded away",
        "patches start at random offsets, and those in which the grid is stronger than the scene "
        "are left out; save frames uncompressed",
    ),
    "row_noise": _About(
        "filters of long horizontal lines one pixel high",
        "subtract each row's offset in the camera, or leave out filters locked to rows",
    ),
    "column_noise": _About(
        "filters of long vertical lines one pixel wide",
        "subtract a flat field in the camera, or leave out filters locked to columns",
    ),
    "interpolation_lattice": _About(
        "checkerboard filters, and noise that is not white",
        "work on raw pixels of one colour, or halve the picture before learning",
    ),
    "clipped_levels": _About(
        "flat plateaus with false edges around them",
        "patches that touch clipped codes are left out; expose shorter",
    ),
    "missing_levels": _About(
        "false steps in smooth areas; noise looks smaller than it is",
        "declare the true depth with --white, and turn off tone curves in the camera",
    ),
    "sharpening": _About(
        "filters with overshoot at their edges, and noise that is not white",
        "turn sharpening off in the camera",
    ),
    "posterised_depth": _About(
        "false steps in smooth areas, and flat patches where there was shading",
        "save the camera's full depth, and turn tone curves and colour tables off",
    ),
    "fixed_spots": _About(
        "small centre-surround filters, and the same false edges in every frame",
        "map the sensor's defective pixels in the camera, or clean the cover glass",
    ),
    "vignetting": _About(
        "none on filters; noise and contrast change from the middle to the corners",
        "correct the shading with a flat field before the depth is cut, or close the iris a stop",
    ),
    "near_duplicates": _About(
        "one scene weighs more than the others",
        "all but the first of each group are left out",
    ),
    "blurred_frames": _About(
        "coarse filters that the sharp frames do not show",
        "blurred frames are left out",
    ),
}


_THRESHOLDS = {
    "block_grid": GRID_THRESHOLD,
    "row_noise": STRIPE_THRESHOLD,
    "column_noise": STRIPE_THRESHOLD,
    "interpolation_lattice": LATTICE_THRESHOLD,
    "clipped_levels": CLIPPED_THRESHOLD,
    "missing_levels": MISSING_THRESHOLD,
    "sharpening": SHARP_THRESHOLD,
    "fixed_spots": SPOT_THRESHOLD,
    "vignetting": SHADE_THRESHOLD,
    "posterised_depth": DEPTH_THRESHOLD,
    "near_duplicates": 0.0,
    "blurred_frames": 0.0,
}
"""Threshold of every mark, in the order in which they are told."""


@dataclass(frozen=True, eq=False)
class _FrameFacts:
    """What one frame says."""

    path: str
    row: float
    column: float
    clipped: float
    falloff: float
    sharpness: float
    copy: F64


@dataclass(frozen=True)
class Marks:
    """The marks, the frames that the survey distrusts with the reason for each, and where the
    blocks of compression begin, if they were found."""

    marks: tuple[Mark, ...]
    distrusted: tuple[tuple[str, str], ...] = ()
    grid: tuple[int, int] | None = None


# ---------------------------------------------------------------- one frame


def _stripes(codes: F64, usable: NDArray[np.bool_]) -> float:
    """Standard deviation of a row's common offset, as a share of the pixels' own noise.

    Means of far-apart segments of one row share the row's offset and little else.
    """
    bend = codes - (np.roll(codes, 1, 0) + np.roll(codes, -1, 0)) / 2
    inside = bend[usable]
    if inside.size < 1000:
        return 0.0
    scale = 1.4826 * float(np.median(np.abs(inside))) + 0.3
    bend = np.where(usable, np.clip(bend, -3 * scale, 3 * scale), 0.0)
    parts = np.array_split(np.arange(codes.shape[1]), SEGMENTS)
    count = np.stack([usable[:, p].sum(axis=1) for p in parts])
    mean = np.stack([bend[:, p].sum(axis=1) for p in parts]) / np.maximum(count, 1)
    enough = count > codes.shape[1] / SEGMENTS / 4
    total = pairs = 0.0
    for a in range(SEGMENTS):
        for b in range(a + 2, SEGMENTS):
            both = enough[a] & enough[b]
            total += float((mean[a] * mean[b] * both).sum())
            pairs += float(both.sum())
    own = float((bend[usable] ** 2).mean())
    return float(np.sqrt(max(total / pairs, 0.0) / own)) if pairs > 50 and own > 0 else 0.0


def _slope(codes: F64, sigma: float) -> F64:
    """Size of the gradient at one scale."""
    across, down = (ndimage.gaussian_filter(codes, sigma, order=o) for o in ([0, 1], [1, 0]))
    return np.asarray(np.hypot(across, down))


def _sharpness(codes: F64, usable: NDArray[np.bool_], noise: float) -> float:
    """Fine over coarse gradient on the sharpest of the strongest edges.

    A step of width s gives sqrt((s^2 + 2.4^2) / (s^2 + 0.8^2)), so blur lowers it
    whatever the scene's spectrum is.
    """
    if usable.sum() < 1000:
        return np.nan
    coarse = _slope(codes, 2.4)
    strong = usable & (coarse >= np.quantile(coarse[usable], 0.98)) & (coarse > 0)
    fine = ndimage.maximum_filter(_slope(codes, 0.8), 3)
    # a Gaussian derivative of white noise has variance 1 / (8 pi sigma^4) on each axis;
    # the maximum of nine takes about four times the mean power of both
    power = fine[strong] ** 2 - 8 * noise / (8 * np.pi * 0.8**4)
    ratios = np.sqrt(np.maximum(power, 0)) / coarse[strong]
    return float(np.quantile(ratios, 0.9)) if ratios.size else np.nan


# ---------------------------------------------------------------- the folder


@dataclass
class _Pool:
    """Sums over all frames."""

    grid: GridMeter = field(default_factory=GridMeter)
    spots: SpotMeter = field(default_factory=SpotMeter)
    sharp: SharpMeter = field(default_factory=SharpMeter)
    parity: F64 = field(default_factory=lambda: np.zeros(2))
    parity_count: F64 = field(default_factory=lambda: np.zeros(2))
    histogram: NDArray[np.int64] | None = None
    facts: list[_FrameFacts] = field(default_factory=list)


class MarkMeter:
    """Collects the evidence for marks, frame by frame."""

    def __init__(self, noise: NoiseModel | None) -> None:
        self.noise = noise if noise is not None and noise.measurable else None
        self.contract: InputContract | None = None
        self._pool = _Pool()

    def add(self, frame: Frame) -> None:
        """Look at one frame."""
        self.contract = frame.contract
        found = list(regions(frame))
        for region in found:
            self._pool.grid.add(region)
            self._lattice(region)
        self._count_codes(frame)
        if not found:
            return
        contract, black, unit = frame.contract, frame.contract.black, unit_scale(frame.contract)
        above = [replace(r, codes=(r.codes - black) * np.float32(unit)) for r in found]
        for region in above:
            self._pool.sharp.add(region)
        copy = small_copy(frame)
        if not any(likeness(copy, f.copy) > DUPLICATE_THRESHOLD for f in self._pool.facts):
            self._pool.spots.add(above, frame.pixels.shape, (contract.white - black) * unit)
        self._pool.facts.append(self._facts(frame, found[len(found) // 2], copy))

    def _facts(self, frame: Frame, region: Region, copy: F64) -> _FrameFacts:
        codes = region.codes.astype(np.float64)
        low, high = clip_codes(frame.contract)
        pixels = frame.pixels
        if frame.contract.black > low:  # a pedestal: code 0 is clipped as well
            clipped = float(((pixels >= high) | (pixels <= low)).mean())
        else:
            clipped = float((pixels >= high).mean())
        variance = 0.0
        if self.noise is not None:
            level = np.array([codes[region.usable].mean() if region.usable.any() else high / 2])
            variance = float(sd_of(self.noise, frame.contract, level)[0]) ** 2
        return _FrameFacts(
            frame.path,
            _stripes(codes, region.usable),
            _stripes(codes.T, region.usable.T),
            clipped,
            falloff(frame),
            _sharpness(codes, region.usable, variance),
            copy,
        )

    def _lattice(self, region: Region) -> None:
        """Power of the diagonal band on the two colours of a checkerboard."""
        band = diagonal_band(region.codes).astype(np.float64) ** 2
        if not region.usable.any():
            return
        cap = 9 * float(np.median(band[region.usable])) + 1e-12
        band = np.minimum(band, cap) / cap
        odd = np.add.outer(*(np.arange(n) for n in band.shape)) % 2 == 1
        for k, where in enumerate((~odd, odd)):
            here = where & region.usable
            self._pool.parity[k] += float(band[here].sum())
            self._pool.parity_count[k] += float(here.sum())

    def _count_codes(self, frame: Frame) -> None:
        if frame.contract.format.integer:
            full = 1 << frame.contract.format.bits
            counts = np.bincount(frame.pixels.ravel(), minlength=full)[:full]
            pool = self._pool
            pool.histogram = counts if pool.histogram is None else pool.histogram + counts

    def result(self) -> Marks:
        """All marks, in a fixed order."""
        facts = self._pool.facts
        if self.contract is None:
            raise InputError("there is no frame to look at", remedy="give a folder of photographs")
        if not facts:  # every frame is too small to be measured in
            return Marks(tuple(_mark(name, None, 0.0, t) for name, t in _THRESHOLDS.items()))
        few = len(facts) < MIN_FRAMES
        odd, doubles, blurred = self._odd_frames()
        parity = self._pool.parity / np.maximum(self._pool.parity_count, 1)
        rows = float(np.median([f.row for f in facts]))
        columns = float(np.median([f.column for f in facts]))
        lattice = float(parity.max() / parity.min()) if parity.min() > 0 else 1.0
        measured = [
            ("block_grid", self._pool.grid.value),
            ("row_noise", rows),
            ("column_noise", columns),
            ("interpolation_lattice", lattice),
            ("clipped_levels", float(np.mean([f.clipped for f in facts]))),
            ("missing_levels", missing_levels(self._pool.histogram)),
            ("posterised_depth", lost_bits(self._pool.histogram)),
            ("near_duplicates", doubles),
            ("blurred_frames", blurred),
        ]
        verdicts = {name: (None if few else v > _THRESHOLDS[name], v) for name, v in measured}
        shade, shaded = shading(np.array([f.falloff for f in facts]))
        spots, spotted = self._pool.spots.result(MIN_FRAMES)
        verdicts["fixed_spots"] = spotted, spots
        verdicts["vignetting"] = None if few else shaded, shade
        sharp = self._pool.sharp.result()
        colours = ("block_grid", "missing_levels", "posterised_depth")
        sharpened = sharp_verdict(sharp, coloured=any(verdicts[c][0] for c in colours))
        verdicts["sharpening"] = None if few else sharpened, sharp.ratio if sharp else 0.0
        told = tuple(_mark(n, *verdicts[n], t) for n, t in _THRESHOLDS.items())
        return Marks(told, odd, self._pool.grid.place if verdicts["block_grid"][0] else None)

    def _odd_frames(self) -> tuple[tuple[tuple[str, str], ...], float, float]:
        """Frames better left out, with the reason, and the shares of copies and soft frames.

        The rules: fine light and shade of a small copy that correlate above 0.9 with an earlier
        frame's, at some small shift; more than a fifth of the pixels clipped, where that is not
        the rule in the folder; edges less than 0.68 as sharp as the folder's median (eight frames
        and more).
        """
        facts = self._pool.facts
        copies = near_duplicates([f.copy for f in facts])
        sharp = np.array([f.sharpness for f in facts])
        usual = float(np.nanmedian(sharp)) if np.isfinite(sharp).any() else 0.0
        soft = sharp < BLURRED_THRESHOLD * usual
        burnt = np.array([f.clipped > MOSTLY_CLIPPED for f in facts])
        burnt &= burnt.mean() < 0.5  # else it is how this folder was taken
        reasons = {"near duplicate": copies, "clipped": burnt}
        if len(facts) >= MIN_FRAMES:
            reasons["blurred"] = soft
        odd = [
            (f.path, next(reason for reason, hit in reasons.items() if hit[i]))
            for i, f in enumerate(facts)
            if any(hit[i] for hit in reasons.values())
        ]
        return tuple(odd), float(copies.mean()), float(soft.mean())


def _mark(name: str, found: bool | None, value: float, threshold: float) -> Mark:
    about = _ABOUT[name]
    verdict = None if found is None else bool(found)
    return Mark(name, verdict, float(value), float(threshold), about.effect, about.remedy)


def missing_levels(histogram: NDArray[np.int64] | None) -> float:
    """Share of codes that never occur where their neighbours say they should.

    A code is due when the codes within 8 of it were met 30 times or more on average and
    some within 16 on either side were met. Where all codes are multiples of one step
    (12 bits stored in 16, say), the share is ``1 - 1 / step``.
    """
    if histogram is None or not histogram[1:-1].any():
        return 0.0
    counts = histogram.astype(np.float64)
    counts[0] = counts[-1] = 0  # clipped ends
    step = int(np.gcd.reduce(np.diff(np.flatnonzero(counts)))) if (counts > 0).sum() > 16 else 1
    due = ndimage.uniform_filter1d(counts, 17) > 30
    due[:2] = due[-2:] = False
    for side in (8, -8):
        due &= ndimage.maximum_filter1d(counts, 17, origin=side) > 0
    share = float((counts[due] == 0).mean()) if due.sum() > 16 else 0.0
    return max(share, 1 - 1 / step)


def find_marks(frames: Iterable[Frame], noise: NoiseModel | None) -> tuple[Mark, ...]:
    """Marks of the camera and the file format, judged over a folder.

    Parameters
    ----------
    frames : at most 64 are used; consumed once
    noise : the measured law, or None

    Returns
    -------
    tuple of Mark : each with value, threshold, effect on learned filters and remedy;
        ``found`` is None where the folder cannot tell, as with fewer than eight frames.

    Raises
    ------
    InputError : no frame, or frames of different contracts.
    """
    meter = MarkMeter(noise)
    for frame in limited(frames):
        meter.add(frame)
    return meter.result().marks
