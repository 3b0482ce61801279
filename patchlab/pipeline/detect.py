"""Edges of a folder of pictures and videos: in parallel, each kept as it is done.

Each picture's files are written by the worker that found them, and a line of the journal says
that they stand; so an interrupted job goes on where it was, and memory does not grow with the
number of pictures. Videos are taken in parts of a few frames, which are read apart. At the end,
or where it stopped, all edgels stand in one table too.
"""

from __future__ import annotations

import functools
import json
import os
import re
from collections.abc import Callable, Iterable, Iterator, Mapping
from dataclasses import dataclass, replace
from pathlib import Path
from typing import Any, get_args

from patchlab import bank as banks
from patchlab import edges, images, store
from patchlab.errors import InputError, PatchlabError, UsageError
from patchlab.pipeline.desk import may_write
from patchlab.pipeline.edgel_rules import compiled_edgels
from patchlab.pipeline.edgel_table import (
    Part,
    TableFormat,
    require_format,
    table_name,
    write_table,
)
from patchlab.pipeline.loaded import bank_folder
from patchlab.pipeline.use import Engine, engine_of, orientation_count
from patchlab.progress import Progress, silent
from patchlab.types import Bank, EdgeMap, Frame
from patchlab.workers import map_ordered

Draw = Callable[[Frame, EdgeMap, int], Mapping[str, bytes]]
JOURNAL = "journal.jsonl"
RESULT = "detect.json"
PLACES = ("edgels", "strength", "orientation", "edges", "overlay")
"""Folders with files of single pictures: the edgels', and those that a drawing fills."""


@dataclass(frozen=True)
class Request:
    """What is looked for, the same for every picture.

    Parameters
    ----------
    what : step, line, both; None means the bank's own kind
    rate : false elements per megapixel of flat picture, for each kind
    threshold : a strength instead
    """

    what: edges.What | None = None
    rate: float | None = None
    threshold: float | None = None


@dataclass(frozen=True)
class _Unit:
    """What one worker does at a time: a file of pictures, or a part of a video."""

    file: str
    part: images.FilmPart | None = None
    reason: str = ""

    @property
    def key(self) -> str:
        """Its name in the journal."""
        return self.file if self.part is None else f"{self.file}#{self.part.first}"


def _units(root: Path, file: str) -> list[_Unit]:
    """The pieces of one file; for a video that cannot be read one that says why."""
    if not images.is_film(file):
        return [_Unit(file)]
    try:
        return [_Unit(file, part) for part in images.film_parts(root, file)]
    except PatchlabError as error:
        return [_Unit(file, reason=str(error))]


@dataclass(frozen=True)
class _Task:
    bank: str
    bank_id: str
    root: str
    unit: _Unit
    out: str
    request: Request
    draw: Draw | None


@functools.lru_cache(maxsize=2)
def _opened(folder: str, bank_id: str) -> tuple[Bank, Engine]:
    path = Path(folder)
    bank, plan, head = banks.read_bank(path)
    return bank, engine_of(path, bank, plan, head)


def _stamp(path: Path) -> list[int]:
    """Size and time of a file: whether it is still the one that was read."""
    try:
        about = path.stat()
    except OSError:
        return [0, 0]
    return [about.st_size, about.st_mtime_ns]


def _work(task: _Task) -> dict[str, Any]:
    """Find the edges of one unit, write them, and give its line of the journal."""
    bank, engine = _opened(task.bank, task.bank_id)
    unit, root = task.unit, Path(task.root)
    line: dict[str, Any] = {
        "key": unit.key,
        "file": unit.file,
        "stamp": _stamp(root / unit.file),
        "frames": [],
        "bad": [],
    }
    try:
        if unit.reason:
            line["reason"] = unit.reason
        elif unit.part is None:
            for frame in images.read_file(root, unit.file, read_options(bank)):
                line["frames"].append(_one(bank, frame, engine, task))
        else:
            _film(bank, images.read_part(root, unit.file, unit.part, read_options(bank)), engine,
                  task, line)  # fmt: skip
    except PatchlabError as error:
        line["reason"] = str(error)
    return line


def _film(
    bank: Bank,
    frames: Iterable[tuple[str, Frame | str]],
    engine: Engine,
    task: _Task,
    line: dict[str, Any],
) -> None:
    """Find the edges of some frames of a video; a bad one is put aside, the others go on."""
    for name, frame in frames:
        try:
            if isinstance(frame, str):
                raise InputError(frame, where=name)
            line["frames"].append(_one(bank, frame, engine, task))
        except PatchlabError as error:
            line["bad"].append({"path": name, "reason": str(error)})


def read_options(bank: Bank) -> images.ReadOptions:
    """How pictures for a bank are read: as its input contract says."""
    c = bank.contract
    known = images.ReadOptions(
        white=c.white,
        black=c.black,
        transfer=c.transfer,
        pixels=c.pixels,
        planes="colour" if c.format.planes > 1 else "luminance",
    )
    plane = c.plane.rpartition(" ")[2]
    return replace(known, bayer=plane) if plane else known  # type: ignore[arg-type]


def _stem(file: str, path: str) -> str:
    """The name of a picture's files: that of its own file, and the page's where it has several.

    No two are equal: a file ends in a suffix of pictures, and a page never does.
    """
    page = path.removeprefix(f"{file}#")
    return file if page == path else f"{file}_page{page}"


def _one(bank: Bank, frame: Frame, engine: Engine, task: _Task) -> dict[str, Any]:
    """Edges of one picture; its edgels by the compiled library where that has them."""
    asked, out = task.request, Path(task.out)
    levels = edges.levels_of(bank, asked.what, asked.rate, asked.threshold)
    place = compiled_edgels(bank, engine.native, levels) if frame.invalid is None else None
    found = edges.find(
        bank,
        frame.pixels,
        engine.respond,
        what=asked.what,
        rate=asked.rate,
        threshold=asked.threshold,
        invalid=frame.invalid,
        blur_px=bank.provenance.get("blur_sigma_px"),
        place=place,
    )
    stem = _stem(task.unit.file, frame.path)
    store.write_file(out / "edgels" / f"{stem}.csv", edges.edgels_csv(found.edgels))
    if task.draw is not None:
        for name, data in task.draw(frame, found.shown, orientation_count(bank)).items():
            store.write_file(out / name / f"{stem}.png", data)
    level = next(iter(found.maps.values())).threshold
    return {"path": frame.path, "edgels": len(found.edgels), "strength_threshold": level}


# ---------------------------------------------------------------- the journal


class _Journal:
    """Which units are done, one line each, and what was asked in the first line."""

    def __init__(self, out: Path, asked: Mapping[str, Any]) -> None:
        self.path, self.asked = out / JOURNAL, json.loads(json.dumps(asked))
        self.lines: dict[str, dict[str, Any]] = {}

    def begin(self) -> None:
        """Start an empty journal."""
        store.write_file(self.path, (json.dumps(self.asked) + "\n").encode())

    def reopen(self) -> None:
        """Take over what stands; a line that was cut off by a crash does not count.

        Raises
        ------
        UsageError : there is no journal, or it belongs to another request.
        """
        try:
            first, *rest = self.path.read_text(encoding="utf-8").splitlines()
        except (OSError, ValueError):
            raise UsageError(
                "there is nothing here to go on with",
                where=str(self.path.parent),
                remedy="leave out --resume",
            ) from None
        if _parsed(first) != self.asked:
            raise UsageError(
                "what stands here was found with another bank or other settings",
                where=str(self.path.parent),
                remedy="--force starts anew",
            )
        known = [line for line in map(_parsed, rest) if line]
        self.lines = {line["key"]: line for line in known}
        whole = [self.asked, *self.lines.values()]
        store.write_file(self.path, "".join(json.dumps(x) + "\n" for x in whole).encode())

    def add(self, line: dict[str, Any]) -> None:
        """Note a unit as done."""
        self.lines[line["key"]] = line
        with self.path.open("a", encoding="utf-8") as out:
            out.write(json.dumps(line) + "\n")


def _parsed(text: str) -> dict[str, Any]:
    try:
        found = json.loads(text)
    except ValueError:
        return {}
    return found if isinstance(found, dict) else {}


# ---------------------------------------------------------------- one table


def _parts(out: Path, lines: Mapping[str, dict[str, Any]], order: Iterable[str]) -> Iterator[Part]:
    """The pictures that are done, in order, each with its own file."""
    for key in order:
        for frame in lines.get(key, {"frames": []})["frames"]:
            stem = _stem(lines[key]["file"], frame["path"])
            yield frame["path"], out / "edgels" / f"{stem}.csv"


# ---------------------------------------------------------------- the output's folder


def _check_place(out: Path, pictures: Path) -> None:
    """Refuse an output that is a file, or that would put files among the photographs."""
    if any(path.exists() and not path.is_dir() for path in (out, *out.parents)):
        raise UsageError("the output is a file", where=str(out), remedy="name a folder")
    if not pictures.exists():
        return
    there, photos = out.resolve(), pictures.resolve()
    above = (photos, *photos.parents)
    among = photos in (there, *there.parents) if photos.is_dir() else there == photos.parent
    if among or any(there / name in above for name in PLACES):
        raise UsageError(
            "nothing is written under the photographs",
            where=str(out),
            remedy="choose an output folder elsewhere",
        )


def _clear(out: Path) -> None:
    """Remove what an earlier job wrote here, and nothing else."""
    if not any((out / name).is_file() for name in (JOURNAL, RESULT)):
        return
    for name in PLACES:
        if not (out / name).is_symlink():
            _clear_place(out / name)
    tables = [f"edgels.{kind}" for kind in get_args(TableFormat)]
    for name in (*(f".{t}.part" for t in tables), *tables, RESULT, JOURNAL):
        (out / name).unlink(missing_ok=True)


def _clear_place(place: Path) -> None:
    for at, _, names in os.walk(place, topdown=False):
        for name in filter(_is_ours, names):
            (Path(at) / name).unlink()
        if not os.listdir(at):
            os.rmdir(at)


def _is_ours(name: str) -> bool:
    """Whether a file is named as a picture's files are, or as the draft of one.

    A person's own ``a.png`` is not; ``a.png.png`` and ``a.tif_page0.csv`` are.
    """
    whole = name[1:].rpartition(".")[0] if name.startswith(".") else name
    stem, _, kind = whole.rpartition(".")
    picture = Path(re.sub(r"_page\d+$", "", stem))
    return kind in ("csv", "png") and picture.suffix.lower() in images.SUFFIXES


def _leave_nothing(out: Path, *, made: bool) -> None:
    """Clear up after a job that found no edges in any picture."""
    _clear(out)
    if made and not any(out.iterdir()):
        out.rmdir()


# ---------------------------------------------------------------- the job


def detect(
    path: Path,
    pictures: Path,
    out: Path,
    request: Request,
    *,
    jobs: int = 1,
    draw: Draw | None = None,
    max_bad: float = 0.1,
    force: bool = False,
    resume: bool = False,
    table: TableFormat = "csv",
    progress: Progress = silent,
) -> dict[str, Any]:
    """Edges of every picture: edgels in one table and one file a picture, maps when asked for.

    Parameters
    ----------
    path : a bank's folder, or a run's
    pictures : a folder or one file, of pictures or videos
    out : folder for ``edgels.csv`` or ``edgels.parquet``, ``edgels/``, ``detect.json`` and the
        pictures drawn
    request : what is looked for
    jobs : worker processes; the files are the same whatever their number
    draw : makes the pictures of one frame (a top-level function); None draws none
    max_bad : share of files, and of frames of videos, that may be unusable; those are listed
        and left out
    force, resume : replace what stands at ``out``, or go on with it
    table : csv or parquet, which needs pyarrow
    progress : told after each file and each part of a video; when it raises, what is finished
        is kept

    Raises
    ------
    InputError : there are no pictures, or more than ``max_bad`` of them cannot serve; when
        none could, nothing is left at ``out``.
    UsageError : the output exists, is a file or lies among the pictures; ``max_bad`` is not a
        share; the bank has no promise to set a threshold from; or pyarrow is missing.
    """
    require_format(table)
    if not 0 <= max_bad <= 1:
        raise UsageError(f"the share of bad pictures must be between 0 and 1, not {max_bad:g}")
    _check_place(out, pictures)
    folder = bank_folder(path)
    bank, _, head = banks.read_bank(folder)
    levels = edges.levels_of(bank, request.what, request.rate, request.threshold)
    told = {str(kind): float(high) for kind, (high, _) in levels.items()}
    listing = images.list_photos(pictures)
    if not listing.files:
        raise InputError("there are no pictures here", where=str(pictures))
    journal = _Journal(out, {"bank": head["id"], "thresholds": told, "pictures": draw is not None})
    made = not out.exists()
    if resume and not made:
        journal.reopen()
    else:
        may_write(out, force)
        _clear(out)
        journal.begin()
    root = listing.root
    units = [unit for name in listing.files for unit in _units(root, name)]
    left = [
        unit
        for unit in units
        if journal.lines.get(unit.key, {}).get("stamp") != _stamp(root / unit.file)
    ]
    tasks = [
        _Task(str(folder), head["id"], str(root), unit, str(out), request, draw) for unit in left
    ]
    done = len(units) - len(left)
    try:
        for line in map_ordered(_work, tasks, jobs=jobs):
            journal.add(line)
            done += 1
            progress("detect", done, len(units), line["file"])
    finally:
        write_table(out, table, _parts(out, journal.lines, [unit.key for unit in units]))
    lines = [journal.lines[unit.key] for unit in units]
    try:
        _check_bad(lines, pictures, max_bad)
    except InputError:
        if not any(line["frames"] for line in lines):
            _leave_nothing(out, made=made)
        raise
    return _result(head["id"], told, lines, out, table_name(table))


def _quarantined(lines: Iterable[dict[str, Any]]) -> list[dict[str, str]]:
    """Files, and frames of videos, that could not serve."""
    found = []
    for line in lines:
        if "reason" in line:
            found.append({"path": line["file"], "reason": line["reason"]})
        found += line["bad"]
    return found


def _check_bad(lines: list[dict[str, Any]], pictures: Path, max_bad: float) -> None:
    bad = _quarantined(lines)
    film = [images.is_film(line["file"]) for line in lines]
    total = sum(
        max(1, len(line["frames"]) + len(line["bad"])) if is_film else 1
        for line, is_film in zip(lines, film, strict=True)
    )
    if len(bad) > max_bad * total:
        raise InputError(
            f"{len(bad)} of {total} pictures cannot serve",
            where=str(pictures),
            remedy=f"the first: {bad[0]['path']}: {bad[0]['reason']}",
        )


def _result(
    bank_id: str, told: Mapping[str, float], lines: list[dict[str, Any]], out: Path, table: str
) -> dict[str, Any]:
    result = {
        "bank": bank_id,
        "thresholds": dict(told),
        "images": [frame for line in lines for frame in line["frames"]],
        "quarantined": _quarantined(lines),
        "table": table,
    }
    store.write_file(out / RESULT, store.canonical_json(result))
    return result
