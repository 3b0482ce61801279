"""Drawing patches from frames, so that the draw depends on nothing but the frame and the seed.

Each frame owns an endless fixed sequence of positions, keyed by (seed, relative
path). Positions whose patch cannot serve are passed over, and the first ones
that can are taken. How many are asked moves only the end of that prefix: file
order, other frames, workers and chunks change nothing before it.

The stated rules, in order:

1. *invalid*: a pixel of the patch must not be used (transparent, not a number, ...).
2. *saturated*: a code outside the input table's trusted range; for integer formats also
   code 0, and codes at or above the white level.
3. *flat*: all pixels are equal (in every plane by itself, where pixels have colours).
4. *below the noise*: where the camera's noise is known, a standard deviation under twice the
   noise's: such a patch would teach the learner the noise.
5. *on the block grid*: where the grid of block compression is known, the mean step between
   pixels on either side of a block's boundary is more than twice the mean step inside blocks:
   such a patch would teach the learner the grid. (Patches that straddle no boundary hardly
   exist, and a dictionary of those that do not would be locked to the grid.)
6. The DC (mean of the working values, float64) is subtracted, of each plane its own. A plane's
   mean follows the light and its colour; without it a filter is blind to a flat field of any
   colour, which is what a promise of false edges on flat fields needs.
7. *flattest*: of all frames' candidates together, the stated share of lowest standard
   deviation is dropped (ties: by path, then by place in the frame's sequence).
8. The rest is divided by its contrast, the patch's standard deviation.
"""

from __future__ import annotations

import math
from collections.abc import Iterable, Iterator, Mapping
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.lib.stride_tricks import sliding_window_view
from numpy.typing import NDArray

from patchlab.conventions import rng
from patchlab.errors import InputError, UsageError
from patchlab.images.folder import Intake, Missed, Task, ignore, reread
from patchlab.progress import Progress, silent
from patchlab.types import F32, F64, Frame, InputTable, PatchSet, Quarantined
from patchlab.workers import map_ordered

_BLOCK = 1024  # positions drawn at a time: part of the sequence's definition
_PATIENCE = 20  # positions drawn at most for each patch asked
SMALL = "frame smaller than a patch"
REASONS = ("invalid", "saturated", "flat", "below the noise", "on the block grid")
BLOCK = 8
"""Side of a block of compression, pixels."""
GRID_MULTIPLE = 2.0
"""Steps across the boundaries of blocks over steps inside them that a patch may have."""
NOISE_MULTIPLE = 2.0
"""Contrast that a patch must have, in standard deviations of the camera's noise."""


@dataclass(frozen=True)
class SampleSettings:
    """How patches are drawn.

    Parameters
    ----------
    size : patch side, 8 to 32 pixels
    patches : patches in all, at most
    per_frame : patches from one frame, at most; None shares ``patches`` out evenly
    seed : of every draw
    flat_fraction : share of the candidates that is dropped for lowest contrast, 0 to 0.9
    normalise : divide each patch by its contrast
    grid : row and column, 0 to 7, where the blocks of compression begin, to leave out patches
        that show them; None where there are none, or for all patches

    Raises
    ------
    UsageError : a value outside its range.
    """

    size: int = 12
    patches: int = 100_000
    per_frame: int | None = None
    seed: int = 0
    flat_fraction: float = 0.3
    normalise: bool = True
    grid: tuple[int, int] | None = None

    def __post_init__(self) -> None:
        if not 8 <= self.size <= 32:
            raise UsageError(f"patch size {self.size} is outside 8 to 32 pixels")
        if self.patches < 1 or (self.per_frame is not None and self.per_frame < 1):
            raise UsageError("the number of patches must be at least 1")
        if self.seed < 0:
            raise UsageError("the seed must not be negative")
        if not 0 <= self.flat_fraction <= 0.9:
            raise UsageError(f"flat fraction {self.flat_fraction} is outside 0 to 0.9")


@dataclass(frozen=True, eq=False)
class Part:
    """Candidates of one frame, in the order of its sequence.

    Parameters
    ----------
    path : the frame's
    origin : int32 ndarray (n, 2)
    patches : float32 ndarray (n, d), DC removed and, if asked, normalised
    dc : float32 ndarray (n,), mean; of colour pixels (n, samples)
    sd, contrast : float32 ndarray (n,), standard deviation, divisor
    rejected : count by reason
    """

    path: str
    origin: NDArray[np.int32]
    patches: F32
    dc: F32
    sd: F32
    contrast: F32
    rejected: Mapping[str, int]


def quota(settings: SampleSettings, frames: int) -> int:
    """Candidates to draw from each of ``frames`` frames, the flattest still among them."""
    share = math.ceil(settings.patches / max(frames, 1))
    if settings.per_frame is not None:
        share = min(share, settings.per_frame)
    return math.ceil(share / (1 - settings.flat_fraction))


def memory_needed(
    settings: SampleSettings,
    *,
    pixels: int = 12_000_000,
    frames: int = 1,
    jobs: int = 1,
    planes: int = 1,
) -> int:
    """Upper estimate of the memory that sampling takes, in bytes.

    Parameters
    ----------
    settings : SampleSettings
    pixels : of the largest frame (``Intake.largest``)
    frames : how many there are
    jobs : workers
    planes : samples of a pixel

    Returns
    -------
    int : kept patches and candidates as if side by side, the candidates in flight, the frames
        being decoded (24 bytes a pixel: file, decoded colour, codes and mask).
    """
    row = 4 * planes * settings.size**2 + 20 + 4 * planes
    drawn = quota(settings, frames)
    kept = min(settings.patches, frames * (settings.per_frame or settings.patches))
    held = (kept + drawn * frames) * row
    flight = (2 * jobs if jobs > 1 else 1) * drawn * row
    return held + flight + max(jobs, 1) * (16 + 8 * planes) * pixels


# ---------------------------------------------------------------- one frame


def sample_frame(frame: Frame, table: InputTable, settings: SampleSettings, budget: int) -> Part:
    """Draw a frame's first ``budget`` patches that can serve.

    Parameters
    ----------
    frame : Frame
    table : InputTable of the frame's contract
    settings : SampleSettings
    budget : candidates wanted; fewer come back when the frame does not have them

    Returns
    -------
    Part : a prefix of the part that any larger budget gives.

    Raises
    ------
    InputError : the frame's pixels are not those of the table.
    """
    form = frame.contract.format
    if min(frame.shape) < settings.size:
        return _part(frame.path, settings.size, form.planes, [], {SMALL: 1})
    samples = form.split(frame.pixels)
    taken: list[_Block] = []
    rejected = dict.fromkeys(REASONS, 0)
    missing = budget
    for origin in _positions(frame, settings, budget):
        codes = _gather(samples, origin, settings.size)
        reason = _judge(frame, codes, origin, table, settings.grid)
        good = np.flatnonzero(reason == 0)[:missing]
        end = len(reason) if len(good) < missing else int(good[-1]) + 1
        for k, name in enumerate(rejected, 1):
            rejected[name] += int((reason[:end] == k).sum())
        taken.append(_prepare(codes[good], origin[good], table, settings.normalise))
        missing -= len(good)
        if not missing:
            break
    return _part(frame.path, settings.size, form.planes, taken, rejected)


_Block = tuple[NDArray[np.int32], F32, F32, F32, F32]


def _part(
    path: str, size: int, planes: int, blocks: list[_Block], rejected: Mapping[str, int]
) -> Part:
    one = np.zeros(0, np.float32)
    dc = one if planes == 1 else np.zeros((0, planes), np.float32)
    rows = np.zeros((0, planes * size**2), np.float32)
    empty: _Block = (np.zeros((0, 2), np.int32), rows, dc, one, one)
    origin, patches, dc, sd, contrast = (
        np.concatenate(column) for column in zip(empty, *blocks, strict=True)
    )
    return Part(path, origin, patches, dc, sd, contrast, rejected)


def _positions(frame: Frame, settings: SampleSettings, budget: int) -> Iterator[NDArray[np.int32]]:
    """A frame's sequence of top-left corners, (n, 2) at a time, none twice."""
    draw = rng(settings.seed, frame.path)
    step = frame.contract.lattice
    height, width = ((side - settings.size) // step + 1 for side in frame.shape)
    seen = np.zeros(0, np.int64)
    for _ in range(max(4, math.ceil(_PATIENCE * budget / _BLOCK))):
        block = draw.integers(0, height * width, size=_BLOCK)
        first = np.sort(np.unique(block, return_index=True)[1])
        fresh = block[first][~np.isin(block[first], seen)]
        if len(fresh):
            yield step * np.stack(np.divmod(fresh, width), axis=1).astype(np.int32)
        seen = np.concatenate([seen, fresh])
        if len(seen) == height * width:
            return


def _gather(
    samples: NDArray[np.generic], origin: NDArray[np.int32], size: int
) -> NDArray[np.generic]:
    """Patches (n, size * size * samples) of (h, w, samples) at top-left corners (n, 2)."""
    windows = sliding_window_view(samples, (size, size), axis=(0, 1))
    tiles = windows[origin[:, 0], origin[:, 1]]  # (n, samples, size, size)
    return np.moveaxis(tiles, 1, -1).reshape(len(origin), -1)


def _by_plane(rows: NDArray[Any], planes: int) -> NDArray[Any]:
    """Patches (n, d) as (n, pixels, samples); one plane stays as it is."""
    return rows if planes == 1 else rows.reshape(len(rows), rows.shape[1] // planes, planes)


def _judge(
    frame: Frame,
    codes: NDArray[np.generic],
    origin: NDArray[np.int32],
    table: InputTable,
    grid: tuple[int, int] | None = None,
) -> NDArray[np.uint8]:
    """0 for a patch that can serve, else 1 + its place in :data:`REASONS`."""
    low, high = trusted_codes(table)
    planes = frame.contract.format.planes
    darkest, brightest = codes.min(axis=1), codes.max(axis=1)
    reason = np.where(_flat(codes, planes), 3, 0).astype(np.uint8)
    if table.noise_sd is not None:
        sd = _by_plane(table.apply(codes), planes).std(axis=1, dtype=np.float64)
        sd = sd if planes == 1 else np.sqrt((sd**2).mean(axis=1))
        reason[(reason == 0) & (sd < NOISE_MULTIPLE * table.noise_sd)] = 4
    if grid is not None and frame.contract.format.cell == 1:
        grey = codes if planes == 1 else _by_plane(codes, planes).mean(axis=2)
        reason[(reason == 0) & (grid_steps(grey, origin, grid) > GRID_MULTIPLE)] = 5
    reason[(darkest < low) | (brightest > high)] = 2
    if frame.invalid is not None:
        size = math.isqrt(codes.shape[1] // planes)
        reason[_gather(frame.invalid[..., None], origin, size).any(axis=1)] = 1
    return reason


def _flat(codes: NDArray[np.generic], planes: int) -> NDArray[np.bool_]:
    """Patches whose pixels are all equal, in every plane by itself."""
    own = _by_plane(codes, planes)
    equal = own.min(axis=1) == own.max(axis=1)
    return np.asarray(equal if planes == 1 else equal.all(axis=1))


def grid_steps(codes: NDArray[np.generic], origin: NDArray[np.int32], grid: tuple[int, int]) -> F64:
    """Mean step across the boundaries of blocks over the mean step inside them, by patch.

    Parameters
    ----------
    codes : ndarray (n, size * size)
    origin : int32 ndarray (n, 2), top-left (row, column) of each patch in its frame
    grid : row and column where blocks begin
    """
    size = math.isqrt(codes.shape[1])
    planes = codes.reshape(-1, size, size).astype(np.float32)
    sums, counts = np.zeros((2, len(codes))), np.zeros((2, len(codes)))
    for axis in (0, 1):
        steps = np.abs(np.diff(planes, axis=1 + axis)).mean(axis=2 - axis)  # (n, size - 1)
        first = origin[:, axis, None] + np.arange(1, size)
        on = (first - grid[axis]) % BLOCK == 0
        for k, where in enumerate((on, ~on)):
            sums[k] += (steps * where).sum(axis=1)
            counts[k] += where.sum(axis=1)
    means = sums / np.maximum(counts, 1)
    return np.asarray(means[0] / np.maximum(means[1], 1e-12))


def trusted_codes(table: InputTable) -> tuple[float, float]:
    """First and last code that is not taken for clipped."""
    low, high = table.valid_codes
    if table.contract.format.integer:
        low, high = max(low, 1), min(high, math.ceil(table.contract.white) - 1)
    return low, high


def _prepare(
    codes: NDArray[np.generic], origin: NDArray[np.int32], table: InputTable, normalise: bool
) -> _Block:
    """Working values with the DC out, and divided by the contrast."""
    values: F64 = table.apply(codes).astype(np.float64)
    own = _by_plane(values, table.contract.format.planes)  # a view
    dc = own.mean(axis=1)
    own -= dc[:, None]
    sd = np.sqrt(np.einsum("ij,ij->i", values, values) / values.shape[1])
    contrast = sd if normalise else np.ones_like(sd)
    values /= contrast[:, None]
    return (
        origin,
        values.astype(np.float32),
        dc.astype(np.float32),
        sd.astype(np.float32),
        contrast.astype(np.float32),
    )


# ---------------------------------------------------------------- a folder


def sample(
    frames: Iterable[Frame],
    table: InputTable,
    settings: SampleSettings,
    *,
    count_frames: int,
    progress: Progress = silent,
) -> PatchSet:
    """Draw patches from frames in memory, or as they come.

    Parameters
    ----------
    frames : Frame, in any order
    table : InputTable of their contract
    settings : SampleSettings
    count_frames : how many frames the budget is shared among

    Returns
    -------
    PatchSet : sorted by path, then by place in the frame's sequence.

    Raises
    ------
    InputError : every frame is smaller than a patch, or nothing in them can serve.
    """
    budget, parts = quota(settings, count_frames), []
    for done, frame in enumerate(frames, 1):
        parts.append(sample_frame(frame, table, settings, budget))
        progress("sampling", done, count_frames)
    return assemble(parts, settings)


def sample_folder(
    intake: Intake,
    table: InputTable,
    settings: SampleSettings,
    *,
    jobs: int = 1,
    missed: Missed = ignore,
    progress: Progress = silent,
) -> PatchSet:
    """Draw patches from a folder that was taken in: :func:`sample` in several processes.

    Every worker reads its own files, and only patches travel. The result has the same bytes
    whatever ``jobs``. ``missed`` is told of files that vanished or changed; they are passed over.
    """
    budget, names = quota(settings, len(intake.frames)), intake.names
    tasks = [(task, table, settings, budget) for task in intake.tasks]
    parts: list[Part] = []
    for result in map_ordered(_sample_file, tasks, jobs=jobs, stage="sampling", progress=progress):
        if isinstance(result, Quarantined):
            missed(result)
        else:
            parts.extend(part for part in result if part.path in names)
    return assemble(parts, settings)


def _sample_file(
    task: tuple[Task, InputTable, SampleSettings, int],
) -> list[Part] | Quarantined:
    file, table, settings, budget = task
    frames = reread(file)
    if isinstance(frames, Quarantined):
        return frames
    return [sample_frame(frame, table, settings, budget) for frame in frames]


def assemble(parts: list[Part], settings: SampleSettings) -> PatchSet:
    """Join the candidates of all frames: drop the flattest, keep to the budget.

    The list is used up, so that candidates and patches need not stand side by side.

    Raises
    ------
    InputError : nothing is left.
    """
    parts.sort(key=lambda part: part.path)
    counts = _counts(parts)
    sd = np.concatenate([np.zeros(0, np.float32), *(part.sd for part in parts)])
    if not len(sd):
        raise _nothing(counts, settings, len(parts))
    rank = np.concatenate([np.arange(len(part.sd)) for part in parts])
    keep = np.ones(len(sd), dtype=bool)
    dull = int(settings.flat_fraction * len(sd))
    keep[np.argsort(sd, kind="stable")[:dull]] = False
    surplus = int(keep.sum()) - settings.patches
    if surplus > 0:  # the latest of each frame's sequence go first
        kept = np.flatnonzero(keep)
        keep[kept[np.argsort(rank[kept], kind="stable")[-surplus:]]] = False
    counts |= {"flattest": dull, "beyond the budget": max(surplus, 0)}
    return _pack(parts, keep, settings.size, counts)


def _counts(parts: list[Part]) -> dict[str, int]:
    counts: dict[str, int] = dict.fromkeys((*REASONS, SMALL), 0)
    for part in parts:
        for reason, count in part.rejected.items():
            counts[reason] += count
    return counts


def _nothing(counts: Mapping[str, int], settings: SampleSettings, frames: int) -> InputError:
    if not frames:
        return InputError("there is no frame to draw patches from")
    if counts[SMALL] == frames:
        return InputError(
            f"every frame is smaller than a patch of {settings.size} x {settings.size} pixels",
            remedy="give larger pictures, or a smaller patch size",
        )
    if not counts["saturated"] and not counts["invalid"]:
        return InputError(
            "the pictures are flat: no patch has any contrast above the camera's noise",
            remedy="give pictures of a scene",
        )
    told = ", ".join(f"{count} {reason}" for reason, count in counts.items() if count)
    remedies = []
    if counts["invalid"]:
        remedies.append("give pictures with fewer transparent or NaN pixels")
    if counts["saturated"]:
        remedies.append("check the exposure, and the white level")
    return InputError(f"no patch can serve ({told})", remedy=", and ".join(remedies))


def _pack(
    parts: list[Part], keep: NDArray[np.bool_], size: int, counts: Mapping[str, int]
) -> PatchSet:
    total = int(keep.sum())
    wide, planes = parts[0].patches.shape[1], parts[0].dc.shape[1:]
    patches = np.empty((total, wide), dtype=np.float32)
    small = [np.empty(total, np.int32), np.empty((total, 2), np.int32)]
    told = [np.empty((total, *planes), np.float32), np.empty(total, np.float32)]
    paths = tuple(part.path for part in parts)
    at = seen = 0
    parts.reverse()
    for index in range(len(paths)):
        part = parts.pop()
        mask = keep[seen : seen + len(part.sd)]
        seen += len(part.sd)
        rows = slice(at, at + int(mask.sum()))
        at = rows.stop
        patches[rows] = part.patches[mask]
        small[0][rows], small[1][rows] = index, part.origin[mask]
        told[0][rows], told[1][rows] = part.dc[mask], part.contrast[mask]
    return PatchSet(patches, size, small[0], small[1], told[0], told[1], paths, dict(counts))
