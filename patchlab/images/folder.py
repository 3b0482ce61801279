"""A folder of photographs: found, checked, and read again frame by frame.

``list_photos`` walks the folder once. ``take_in`` decodes every file once, puts
what cannot serve on a list, and decides which pixels the folder holds.
``iterate`` then reads the good frames, one by one, as often as it is asked.
Nothing is ever written under the folder.
"""

from __future__ import annotations

from collections.abc import Callable, Iterable, Iterator
from dataclasses import dataclass, replace
from typing import NoReturn

from patchlab.errors import InputError
from patchlab.images import pfnc
from patchlab.images.address import Place
from patchlab.images.decode import SUFFIXES, decode
from patchlab.images.develop import ReadOptions, conform
from patchlab.images.listing import Listing
from patchlab.progress import Progress, silent
from patchlab.store import sha256
from patchlab.types import Frame, InputContract, Quarantined
from patchlab.workers import map_ordered

Missed = Callable[[Quarantined], None]
"""Told of a file that could be read before and cannot any more."""


TOLD = 10  # unusable files that a refusal names; the others are counted
Task = tuple[Place, str, str, ReadOptions, InputContract]
"""A file to read again: root, relative path, SHA-256, options, the folder's contract."""


def ignore(missed: Quarantined) -> None:
    """Pass over a lost file without a word: the default."""


# ---------------------------------------------------------------- taking in


@dataclass(frozen=True)
class FrameRecord:
    """What is kept of a frame without its pixels.

    Parameters
    ----------
    path : the frame's name, its file's path with ``#k`` for page k of several
    file, page : where it is
    sha256, pixels_sha256 : of the file's bytes, and of the decoded codes
    shape : (height, width)
    contract : of this frame alone, before it is brought to the folder's
    invalid : share of pixels that must not be used
    notes : what the reader did
    """

    path: str
    file: str
    page: int
    sha256: str
    pixels_sha256: str
    shape: tuple[int, int]
    contract: InputContract
    invalid: float
    notes: tuple[str, ...]


@dataclass(frozen=True)
class Intake:
    """A folder that was taken in.

    Parameters
    ----------
    listing : Listing
    options : ReadOptions
    contract : which pixels the folder's frames are (after scaling, where depths are mixed)
    frames : one record a frame, sorted by path
    quarantined : files that could not serve
    copies : files left out because they equal another byte for byte, with that other's path
    """

    listing: Listing
    options: ReadOptions
    contract: InputContract
    frames: tuple[FrameRecord, ...]
    quarantined: tuple[Quarantined, ...] = ()
    copies: tuple[tuple[str, str], ...] = ()

    @property
    def root(self) -> Place:
        """The photo folder."""
        return self.listing.root

    @property
    def inputs(self) -> dict[str, str]:
        """Relative path to SHA-256 of every file used, in order: what a manifest keeps."""
        return {record.file: record.sha256 for record in self.frames}

    @property
    def tasks(self) -> tuple[Task, ...]:
        """One task a file for :func:`reread`, in order."""
        return tuple(
            (self.root, file, digest, self.options, self.contract)
            for file, digest in self.inputs.items()
        )

    @property
    def names(self) -> frozenset[str]:
        """The frames' paths."""
        return frozenset(record.path for record in self.frames)

    def without(self, paths: Iterable[str]) -> Intake:
        """The same folder with some frames left out."""
        left_out = frozenset(paths)
        return replace(self, frames=tuple(r for r in self.frames if r.path not in left_out))

    def thinned(self, count: int) -> Intake:
        """The same folder with at most ``count`` frames, evenly spread."""
        if len(self.frames) <= count:
            return self
        step = len(self.frames) / count
        return replace(self, frames=tuple(self.frames[int(k * step)] for k in range(count)))

    @property
    def largest(self) -> int:
        """Pixels of the largest frame."""
        return max(h * w for h, w in (record.shape for record in self.frames))


def read_file(root: Place, file: str, options: ReadOptions) -> tuple[Frame, ...]:
    """Read and decode one file below ``root``.

    Raises
    ------
    InputError : it cannot be read or decoded.
    """
    return decode(_bytes(root, file), file, _with_sidecar(root, file, options))


def _with_sidecar(root: Place, file: str, options: ReadOptions) -> ReadOptions:
    """The options for one file: a raw buffer's sidecar goes before what was given."""
    if not file.lower().endswith(pfnc.SUFFIX):
        return options
    layout = pfnc.sidecar(root / file)
    return options if layout is None else replace(options, raw=layout)


def _bytes(root: Place, file: str) -> bytes:
    try:
        return (root / file).read_bytes()
    except FileNotFoundError:
        raise InputError("the file has vanished", where=file) from None
    except OSError as error:
        raise InputError(f"cannot be read ({error.strerror})", where=file) from None


def take_in(
    listing: Listing,
    options: ReadOptions | None = None,
    *,
    max_bad: float = 0.1,
    mixed_depths: bool = False,
    keep_copies: bool = False,
    jobs: int = 1,
    progress: Progress = silent,
) -> Intake:
    """Decode every file once and decide which pixels the folder holds.

    Parameters
    ----------
    listing : Listing
    options : ReadOptions
    max_bad : largest share of the files that may be unusable
    mixed_depths : allow several depths; codes are then scaled, black to black and white to
        white, to the deepest
    keep_copies : use a file again that equals another byte for byte
    jobs, progress : as everywhere

    Returns
    -------
    Intake

    Raises
    ------
    InputError : no picture, none readable, too many bad ones (the text lists ten), or frames
        of several depths or transfers.
    """
    options = options or ReadOptions()
    if not listing.files and not listing.unreadable:
        raise InputError(
            "there is no picture in this folder",
            where=str(listing.root),
            remedy=f"known endings are {', '.join(sorted(SUFFIXES))}",
        )
    tasks = [(listing.root, file, options) for file in listing.files]
    found = list(map_ordered(_inspect, tasks, jobs=jobs, stage="reading", progress=progress))
    bad = (*listing.unreadable, *(r for r in found if isinstance(r, Quarantined)))
    good = [r for r in found if not isinstance(r, Quarantined)]
    total = len(found) + len(listing.unreadable)
    if not good or len(bad) > max_bad * total:
        _refuse(listing, bad, total, max_bad)
    copies = {} if keep_copies else _copies(good)
    records = tuple(r for pages in good for r in pages if r.file not in copies)
    contract = _common(records, mixed_depths, listing.root)
    return Intake(listing, options, contract, records, bad, tuple(sorted(copies.items())))


def _inspect(task: tuple[Place, str, ReadOptions]) -> tuple[FrameRecord, ...] | Quarantined:
    root, file, options = task
    digest = ""
    try:
        data = _bytes(root, file)
        digest = sha256(data)
        options = _with_sidecar(root, file, options)
        return tuple(_record(f, file, k) for k, f in enumerate(decode(data, file, options)))
    except InputError as error:
        reason = f"{error.what}; {error.remedy}" if error.remedy else error.what
        return Quarantined(file, reason, digest)


def _record(frame: Frame, file: str, page: int) -> FrameRecord:
    return FrameRecord(
        frame.path,
        file,
        page,
        frame.sha256,
        sha256(frame.pixels.tobytes()),
        frame.shape,
        frame.contract,
        0.0 if frame.invalid is None else float(frame.invalid.mean()),
        frame.notes,
    )


def _refuse(listing: Listing, bad: tuple[Quarantined, ...], total: int, max_bad: float) -> NoReturn:
    lines = "".join(f"\n  {q.path}: {q.reason}" for q in bad[:TOLD])
    if len(bad) > TOLD:
        lines += f"\n  and {len(bad) - TOLD} more"
    if len(bad) == total:
        what = "none of the pictures can be read; give a folder with pictures that can"
    else:
        what = f"{len(bad)} of {total} files cannot be used, above the {max_bad:.0%} allowed; "
        what += "remove them, or raise --max-bad"
    raise InputError(what + lines, where=str(listing.root))


def _copies(good: list[tuple[FrameRecord, ...]]) -> dict[str, str]:
    """Files that equal an earlier one byte for byte: they would only count it twice."""
    first: dict[str, str] = {}
    copies: dict[str, str] = {}
    for pages in good:
        kept = first.setdefault(pages[0].sha256, pages[0].file)
        if kept != pages[0].file:
            copies[pages[0].file] = kept
    return copies


def _common(records: tuple[FrameRecord, ...], mixed_depths: bool, root: Place) -> InputContract:
    """The contract of a folder: the one its frames share, or the deepest of several."""
    groups: dict[InputContract, list[str]] = {}
    for record in records:
        groups.setdefault(record.contract, []).append(record.path)
    if len(groups) == 1:
        return records[0].contract
    lines = "".join(
        f"\n  {len(paths)} of {c.pixels}{c.plane and ', ' + c.plane}, {c.black:g} to {c.white:g}, "
        f"{c.transfer}: {paths[0]}"
        for c, paths in groups.items()
    )
    if len({(c.plane, c.format.colours) for c in groups}) > 1:
        raise InputError(
            f"the frames are of several colour patterns{lines}\n",
            where=str(root),
            remedy="split the folder",
        )
    if len({c.transfer for c in groups}) > 1:
        raise InputError(
            f"some frames are taken as sRGB-coded (colour or JPEG) and some as linear (grey)"
            f"{lines}\n",
            where=str(root),
            remedy="say what they all are with --transfer srgb or --transfer linear, or split "
            "the folder",
        )
    if not mixed_depths:
        raise InputError(
            f"the frames differ in depth or levels{lines}\n",
            where=str(root),
            remedy="split the folder, give --white, or allow it with --mixed-depths",
        )
    return max(groups, key=lambda c: (c.format.bits, c.white, -c.black))


# ---------------------------------------------------------------- reading again


def iterate(
    intake: Intake,
    *,
    jobs: int = 1,
    missed: Missed = ignore,
    stage: str = "reading",
    progress: Progress = silent,
) -> Iterator[Frame]:
    """Read the good frames again, in order, brought to the folder's contract.

    Parameters
    ----------
    intake : Intake
    jobs, stage, progress : as everywhere; at most ``2 * jobs`` files are in memory
    missed : told of a file that vanished or changed since it was taken in; it is passed over

    Yields
    ------
    Frame
    """
    names = intake.names
    for result in map_ordered(reread, intake.tasks, jobs=jobs, stage=stage, progress=progress):
        if isinstance(result, Quarantined):
            missed(result)
        else:
            yield from (frame for frame in result if frame.path in names)


def reread(task: Task) -> tuple[Frame, ...] | Quarantined:
    """Frames of one file that was taken in, or why it can no longer serve.

    A top-level function of plain data, so that it can run in another process.
    """
    root, file, digest, options, contract = task
    try:
        data = _bytes(root, file)
        if sha256(data) != digest:
            return Quarantined(file, "the file changed while it was in use", sha256(data))
        options = _with_sidecar(root, file, options)
        return tuple(conform(frame, contract) for frame in decode(data, file, options))
    except InputError as error:
        return Quarantined(file, error.what)
