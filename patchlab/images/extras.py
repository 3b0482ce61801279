"""Camera raw files and videos: readers that need a package of an extra.

``[raw]`` brings rawpy (LibRaw), ``[video]`` brings av (FFmpeg). Without the package a file of
that kind is put aside with the words that say what to install.
"""

from __future__ import annotations

import importlib
import io
from bisect import bisect_left
from collections.abc import Iterator
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError
from patchlab.images.develop import Picture, ReadOptions, check_size
from patchlab.images.pfnc import PATTERNS

RAW_SUFFIXES = frozenset((".dng", ".nef", ".cr2", ".cr3", ".arw", ".raf", ".orf", ".rw2", ".pef"))
VIDEO_SUFFIXES = frozenset((".mp4", ".avi", ".mov", ".mkv", ".webm"))
VIDEO_FRAMES = 32
"""Most frames of one video that are used, evenly spread."""


def _package(name: str, extra: str) -> Any:
    try:
        return importlib.import_module(name)
    except ImportError:
        raise InputError(
            f"files of this kind need the extra [{extra}]",
            remedy=f'install it: pip install "patchlab-bank[{extra}]"',
        ) from None


# ---------------------------------------------------------------- camera raw


def read_camera_raw(data: bytes, options: ReadOptions) -> list[Picture]:
    """The sensor's codes of a camera raw file or DNG, neither developed nor turned.

    Black and white level are the file's; where the colours' black levels differ, the codes are
    moved to the lowest one.
    """
    rawpy = _package("rawpy", "raw")
    with rawpy.imread(io.BytesIO(data)) as raw:
        codes = np.array(raw.raw_image_visible)
        if codes.ndim != 2:
            raise InputError("the raw file holds colours, not a sensor's mosaic")
        check_size(codes.shape[1], codes.shape[0], options)
        white = int(raw.white_level)
        black = np.array(raw.black_level_per_channel, np.float64)
        if raw.num_colors == 1:
            return [Picture(codes, white, notes=("camera raw",), black=float(black[0]))]
        sites = np.array(raw.raw_colors_visible[:2, :2])
        pattern = "".join(chr(raw.color_desc[i]) for i in sites[0])
    if pattern not in PATTERNS:
        raise InputError(f"the sensor's colour pattern {pattern!r} is not a Bayer pattern")
    lowest, notes = float(black.min()), ["camera raw"]
    if np.ptp(black) > 0:
        notes.append("black levels of the colours made equal")
        codes = _level(codes, sites, black - lowest)
    return [Picture(codes, white, notes=tuple(notes), mosaic=pattern, black=lowest)]


def _level(codes: NDArray[Any], sites: NDArray[Any], excess: NDArray[np.float64]) -> NDArray[Any]:
    """Take each colour's surplus of black off its pixels."""
    out = codes.astype(np.int64)
    for (row, column), colour in np.ndenumerate(sites):
        out[row::2, column::2] -= int(np.rint(excess[colour]))
    return np.maximum(out, 0).astype(codes.dtype)


# ---------------------------------------------------------------- video

_GREY = {"gray": 255, "gray10le": 1023, "gray12le": 4095, "gray16le": 65535}


def read_video(data: bytes, options: ReadOptions) -> list[Picture]:
    """At most 32 frames of a video's first stream, evenly spread.

    Grey streams keep their codes and are linear; colour streams come as 8-bit sRGB.
    """
    av = _package("av", "video")
    with av.open(io.BytesIO(data)) as film:
        if not film.streams.video:
            raise InputError("the file holds no video")
        total = sum(1 for _ in film.decode(video=0))
    if not total:
        raise InputError("the video holds no frame")
    kept = {int(k * max(total / VIDEO_FRAMES, 1)) for k in range(min(total, VIDEO_FRAMES))}
    with av.open(io.BytesIO(data)) as film:
        return [
            _video_frame(frame, k, total, options)
            for k, frame in enumerate(film.decode(video=0))
            if k in kept
        ]


def _video_frame(frame: Any, number: int, total: int, options: ReadOptions) -> Picture:
    check_size(frame.width, frame.height, options)
    kind = frame.format.name
    notes: tuple[str, ...] = (f"frame {number + 1} of {total} of a video",)
    if kind in _GREY:
        return Picture(np.array(frame.to_ndarray()), _GREY[kind], notes=notes)
    notes += (f"{kind} brought to 8-bit RGB",)
    return Picture(np.array(frame.to_ndarray(format="rgb24")), 255, coded=True, notes=notes)


def film_times(path: Path) -> tuple[tuple[int, ...], bool]:
    """When the frames of a video's first stream are shown, rising, and whether one can seek there.

    Nothing is decoded. Where the file does not tell the times, they are the frames' numbers.
    """
    av = _package("av", "video")
    with av.open(str(path)) as film:
        if not film.streams.video:
            raise InputError("the file holds no video")
        times = [packet.pts for packet in film.demux(video=0) if packet.size]
    if not times:
        raise InputError("the video holds no frame")
    known = None not in times and len(set(times)) == len(times)
    return tuple(sorted(times) if known else range(len(times))), known


def film_frames(
    path: Path,
    times: tuple[int, ...],
    first: int,
    total: int,
    seeks: bool,
    options: ReadOptions,
) -> Iterator[tuple[int, Picture | str]]:
    """Some frames of a video by number, or why one cannot be decoded; one is held at a time.

    Parameters
    ----------
    times, seeks : of the frames wanted, from :func:`film_times`
    first, total : number of the first of them, and of frames in all
    """
    av = _package("av", "video")
    with av.open(str(path)) as film:
        stream = film.streams.video[0]
        stream.codec_context.thread_count = 1  # whoever reads parts in parallel has the cores
        # damage is told, not painted over
        stream.codec_context.options = {"err_detect": "crccheck+bitstream+buffer+explode"}
        if seeks and first:
            film.seek(times[0], stream=stream, backward=True)
        counted = 0
        for packet in film.demux(stream):
            try:
                frames = packet.decode()
            except av.FFmpegError as error:
                if packet.pts is not None and times[0] <= packet.pts <= times[-1] and seeks:
                    number = first + bisect_left(times, packet.pts)
                    yield number, f"the frame cannot be decoded ({error.strerror})"
                continue
            for frame in frames:
                time = frame.pts if seeks else counted
                counted += 1
                if time is None or time < times[0]:
                    continue
                if time > times[-1]:
                    return
                number = first + bisect_left(times, time)
                if frame.is_corrupt:
                    yield number, "the frame is damaged"
                else:
                    yield number, _video_frame(frame, number, total, options)
