"""Further frames of the camera for its survey: static scenes, dark frames, a slanted edge."""

from __future__ import annotations

from collections.abc import Iterator
from dataclasses import dataclass, replace
from pathlib import Path

from patchlab import images
from patchlab.errors import InputError
from patchlab.pipeline.desk import Desk
from patchlab.types import Frame

FEWEST = 2
"""Frames that a static scene needs."""


@dataclass(frozen=True, eq=False)
class Extras:
    """What a person gave beside the photographs; None where it was not given."""

    scenes: tuple[images.Intake, ...] | None = None
    dark: images.Intake | None = None
    edge: images.Intake | None = None

    @property
    def inputs(self) -> dict[str, dict[str, str]]:
        """SHA-256 of every file by what it is for: what a manifest keeps."""
        found: dict[str, dict[str, str]] = {}
        for scene in self.scenes or ():
            named = {f"{scene.root.name}/{k}": v for k, v in scene.inputs.items()}
            found.setdefault("static", {}).update(named)
        for name, intake in (("dark", self.dark), ("slanted_edge", self.edge)):
            if intake is not None:
                found[name] = intake.inputs
        return found

    def static_frames(self) -> Iterator[list[Frame]] | None:
        """The frames of one scene after the other, or None."""
        if self.scenes is None:
            return None
        return (list(images.iterate(scene)) for scene in self.scenes)

    def dark_frames(self) -> Iterator[Frame] | None:
        """The dark frames, or None."""
        return None if self.dark is None else images.iterate(self.dark)

    def edge_frame(self) -> Frame | None:
        """The picture of the slanted edge, or None."""
        return None if self.edge is None else next(images.iterate(self.edge))


def take_in_extras(photos: images.Intake, desk: Desk) -> Extras:
    """Read what ``--static``, ``--dark`` and ``--slanted-edge`` name.

    Raises
    ------
    InputError : nothing there, nothing readable, fewer than two frames in a static scene,
        or frames that are not the photographs' camera's.
    """
    s = desk.settings
    scenes = None if s.static is None else _scenes(Path(s.static), photos, desk)
    dark = None if s.dark is None else _folder(Path(s.dark), photos.options, desk)
    if dark is not None:
        _same_levels(dark, photos, "dark frames")
        _same_size(dark, photos)
    edge = None
    if s.slanted_edge is not None:
        edge = _folder(
            Path(s.slanted_edge), replace(photos.options, pixels=None, planes="luminance"), desk
        )
        if len(edge.frames) > 1:
            raise InputError(
                f"the slanted edge is one picture, not {len(edge.frames)}",
                where=s.slanted_edge,
                remedy="name the file",
            )
    return Extras(scenes, dark, edge)


def _folder(path: Path, options: images.ReadOptions, desk: Desk) -> images.Intake:
    return images.take_in(
        images.list_photos(path), options, max_bad=desk.settings.max_bad, jobs=desk.jobs
    )


def _scenes(path: Path, photos: images.Intake, desk: Desk) -> tuple[images.Intake, ...]:
    if not path.is_dir():
        raise InputError(
            "there is no such folder", where=str(path), remedy="name a folder of static scenes"
        )
    folders = sorted(p for p in path.iterdir() if p.is_dir() and not p.name.startswith("."))
    if not folders:
        raise InputError(
            "there is no static scene",
            where=str(path),
            remedy="make one folder for each scene, with two frames or more in each",
        )
    return tuple(_scene(folder, photos, desk) for folder in folders)


def _scene(folder: Path, photos: images.Intake, desk: Desk) -> images.Intake:
    scene = _folder(folder, photos.options, desk)
    if len(scene.frames) < FEWEST:
        copies = f" ({len(scene.copies)} equal it byte for byte)" if scene.copies else ""
        raise InputError(
            f"a static scene needs two frames, here is {len(scene.frames)}{copies}",
            where=str(folder),
            remedy="take every scene at least twice without moving anything",
        )
    _same_levels(scene, photos, "frames of a static scene")
    return scene


def _same_levels(extra: images.Intake, photos: images.Intake, what: str) -> None:
    own, wanted = extra.contract, photos.contract
    if own != wanted:
        raise InputError(
            f"these {what} are {own.pixels}, {own.black:g} to {own.white:g}, {own.transfer}; "
            f"the photographs are {wanted.pixels}, {wanted.black:g} to {wanted.white:g}, "
            f"{wanted.transfer}",
            where=str(extra.root),
            remedy="take them with the photographs' camera setting",
        )


def _same_size(dark: images.Intake, photos: images.Intake) -> None:
    known = {record.shape for record in photos.frames}
    for record in dark.frames:
        if record.shape not in known:
            h, w = record.shape
            height, width = photos.frames[0].shape
            raise InputError(
                f"this dark frame is {w} x {h} pixels, the photographs are {width} x {height}",
                where=str(dark.root / record.file),
                remedy="take dark frames with the photographs' camera setting",
            )
