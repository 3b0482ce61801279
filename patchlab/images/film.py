"""Videos frame by frame: every frame, in parts that workers can read apart, in constant memory."""

from __future__ import annotations

from collections.abc import Iterator
from dataclasses import dataclass
from pathlib import Path, PurePosixPath

from patchlab.errors import InputError, PatchlabError
from patchlab.images import extras
from patchlab.images.develop import ReadOptions, develop
from patchlab.types import Frame

PART_FRAMES = 16
"""Frames of one part: the work that one worker does at a time, and the most that a stop loses."""


@dataclass(frozen=True)
class FilmPart:
    """Some frames of a video, one after the other.

    Parameters
    ----------
    first : number of its first frame, from 0
    total : frames of the whole video
    times : when its frames are shown, in units of the stream, rising
    seeks : whether a reader may jump there by time; else it decodes from the start
    """

    first: int
    total: int
    times: tuple[int, ...]
    seeks: bool


def is_film(file: str) -> bool:
    """Whether a file's name ends as a video's does.

    >>> is_film("a/b.MP4"), is_film("a.png")
    (True, False)
    """
    return PurePosixPath(file).suffix.lower() in extras.VIDEO_SUFFIXES


def film_parts(root: Path, file: str) -> tuple[FilmPart, ...]:
    """The parts of a video below ``root``, found without decoding it.

    Raises
    ------
    InputError : it cannot be read, holds no frame, or the package for videos is missing.
    """
    with _named(file):
        times, seeks = extras.film_times(root / file)
    return tuple(
        FilmPart(first, len(times), times[first : first + PART_FRAMES], seeks)
        for first in range(0, len(times), PART_FRAMES)
    )


def read_part(
    root: Path, file: str, part: FilmPart, options: ReadOptions
) -> Iterator[tuple[str, Frame | str]]:
    """The frames of a part, each as ``file#number`` with its frame, or why it cannot serve.

    One decoded frame is held at a time. Frames have no SHA-256: the file is not read whole.

    Raises
    ------
    InputError : the file cannot be read any more.
    """
    with _named(file):
        found = extras.film_frames(
            root / file, part.times, part.first, part.total, part.seeks, options
        )
        for number, picture in found:
            name = f"{file}#{number}"
            if isinstance(picture, str):
                yield name, picture
                continue
            try:
                yield name, develop(picture, name, "", options)
            except PatchlabError as error:
                yield name, error.what


class _named:  # noqa: N801  # read as a statement
    """Failures inside carry the file's name."""

    def __init__(self, file: str) -> None:
        self.file = file

    def __enter__(self) -> None:
        pass

    def __exit__(self, kind: object, error: BaseException | None, trace: object) -> None:
        if isinstance(error, PatchlabError):
            raise InputError(error.what, where=self.file, remedy=error.remedy) from None
        if isinstance(error, OSError | ValueError):  # what the decoders raise
            raise InputError(f"the video cannot be read ({error})", where=self.file) from None
