"""Where a run works: its folder, its settings, and which finished stages it takes over.

A run is a folder that fills stage by stage: ``survey``, ``patches``, ``dictionary``,
``fits``, ``bank`` (and ``report``, which the command line adds; ``parts`` and ``assess`` may
stand there too). Each is an artefact
whose manifest names its settings, inputs and parents; a resumed run takes over
every artefact whose manifest says what it would say again.
"""

from __future__ import annotations

import json
import re
import shutil
import time
from collections.abc import Callable, Iterator, Mapping
from contextlib import contextmanager
from dataclasses import dataclass, field
from pathlib import Path
from typing import Any

from patchlab import cluster, store
from patchlab.errors import UsageError
from patchlab.pipeline import keep
from patchlab.progress import Progress, silent
from patchlab.settings import Settings
from patchlab.workers import usable_cores

CACHE = ".frames"
ROOMS = ("parts", "survey", "patches", "dictionary", "fits", "bank", "report", "assess")
MAPPED = ("patches",)
"""Artefacts that are mapped into memory, for they may be larger than it."""
RECIPE = 3
"""Raised whenever a stage would give another result for the same settings."""


@dataclass(frozen=True, eq=False)
class Desk:
    """Where a run works and how it tells of it.

    ``seconds`` and ``notes`` are filled as the stages go by.
    """

    out: Path
    settings: Settings
    resume: bool = False
    progress: Progress = silent
    tell: Callable[[str], None] = lambda text: None
    seconds: dict[str, float] = field(default_factory=dict)

    @property
    def jobs(self) -> int:
        """Worker processes, on this machine or on the cluster."""
        farm = cluster.current()
        if farm is not None:
            return max(farm.workers, 2)  # even one of it is elsewhere
        return self.settings.jobs or usable_cores()

    @property
    def cache(self) -> Path:
        """Where a video's decoded frames wait for the next pass; gone when the work ends."""
        return self.out / CACHE

    @contextmanager
    def timed(self, stage: str) -> Iterator[None]:
        """Add the wall time of a block to a stage."""
        start = time.perf_counter()
        try:
            yield
        finally:
            spent = time.perf_counter() - start
            self.seconds[stage] = round(self.seconds.get(stage, 0.0) + spent, 3)

    def stage(
        self,
        kind: str,
        about: Mapping[str, Any],
        make: Callable[[], Any],
        extra: Callable[[Any], dict[str, bytes]] = lambda noun: {},
    ) -> tuple[Any, dict[str, Any]]:
        """Take over a standing artefact that says the same, or make and save it.

        ``extra`` gives further files of the artefact for people. Returns the noun and its
        manifest.
        """
        about = {"seed": self.settings.seed, "body": {"recipe": RECIPE}, **about}
        folder = self.out / kind
        if self.resume and (folder / "manifest.json").is_file():
            head = store.read_manifest(folder, kind)
            if _says_the_same(head, about):
                self.tell(f"  {kind}: kept from before")
                return store.load(folder, kind, mapped=kind in MAPPED)
            self.tell(f"  {kind}: made anew ({_why_anew(head, about)})")
        with self.timed(kind):
            noun = make()
        head = store.save(folder, kind, noun, force=True, extra=extra(noun), **about)
        if kind in MAPPED:
            del noun  # from here on it is read as it is needed
            return store.load(folder, kind, mapped=True)
        return noun, head


def _says_the_same(head: Mapping[str, Any], about: Mapping[str, Any]) -> bool:
    wanted = json.loads(store.canonical_json({k: v for k, v in about.items() if k != "body"}))
    body = json.loads(store.canonical_json(about["body"]))
    return all(head.get(k) == v for k, v in {**wanted, **body}.items()) and (
        head.get("environment") == store.environment()
    )


_OTHER = {
    "inputs": "other photographs",
    "photos": "other photographs",
    "measured_on": "other static, dark or edge frames",
    "example": "another example frame",
    "seed": "another seed",
    "parents": "an earlier stage was made anew",
    "recipe": "another version of patchlab",
}


def _why_anew(head: Mapping[str, Any], about: Mapping[str, Any]) -> str:
    """What differs from a standing artefact, in a few words."""
    wanted = json.loads(store.canonical_json({**about, **about["body"]}))
    differs = {k for k in wanted if k != "body" and head.get(k) != wanted[k]}
    why = [text for key, text in _OTHER.items() if key in differs]
    if "settings" in differs:
        before, now = head.get("settings") or {}, wanted["settings"]
        names = sorted(k for k in {*before, *now} if before.get(k) != now.get(k))
        why.append(f"other settings: {', '.join(names)}")
    if head.get("environment") != store.environment():
        why.append("another environment")
    return "; ".join(dict.fromkeys(why)) or "it was made otherwise"


# ---------------------------------------------------------------- the run's folder


def prepare(out: Path, photos: object, *, resume: bool, force: bool, dry_run: bool = False) -> None:
    """Check that a run may use its output folder, and sweep up after a killed run.

    Raises
    ------
    UsageError : the folder is inside the photographs', holds something else, or holds a run
        and neither ``resume`` nor ``force`` was given.
    """
    if isinstance(photos, Path) and photos.exists():
        inside = photos.resolve() if photos.is_dir() else photos.resolve().parent
        if photos.is_dir() and (out.resolve() == inside or inside in out.resolve().parents):
            raise UsageError(
                "nothing is written under the photographs",
                where=str(out),
                remedy="choose an output folder elsewhere",
            )
    if out.exists() and not out.is_dir():
        raise UsageError("the output is a file", where=str(out), remedy="name a folder")
    if not out.exists():
        return
    standing = [p for p in out.iterdir() if not p.name.startswith(".")]
    strange = sorted(p.name for p in standing if not _of_a_run(p))
    if strange:
        raise UsageError(
            f"the folder holds something that is not a run's ({strange[0]}), so it is left alone",
            where=str(out),
            remedy="choose another output folder",
        )
    if standing and not (resume or force):
        raise UsageError(
            "there is a run here already",
            where=str(out),
            remedy="--resume goes on with it, --force starts anew",
        )
    if not dry_run:
        _sweep(out)


def _of_a_run(path: Path) -> bool:
    """Whether something in a run's folder was put there by a run."""
    if path.name not in ROOMS:
        return path.name == "run.json" and path.is_file()
    manifest = "bank.json" if path.name == "bank" else "manifest.json"
    return path.is_dir() and ((path / manifest).is_file() or not any(path.iterdir()))


def _sweep(out: Path) -> None:
    """Remove what a killed run left half made."""
    shutil.rmtree(out / CACHE, ignore_errors=True)
    for left in out.glob(".*.*"):
        if left.is_dir() and left.name.split(".")[1] in ROOMS:
            shutil.rmtree(left, ignore_errors=True)
    for half in out.glob(f".{keep.FILE}.*"):
        half.unlink(missing_ok=True)


def clear_after(out: Path, stage: str) -> None:
    """Remove the later stages of an earlier run, once ``stage`` of the new one stands."""
    for name in ROOMS[ROOMS.index(stage) + 1 :]:
        if (out / name).exists() and _of_a_run(out / name):
            shutil.rmtree(out / name, ignore_errors=True)
    (out / "run.json").unlink(missing_ok=True)
    (out / keep.FILE).unlink(missing_ok=True)


def bank_name(out: Path, settings: Settings) -> str:
    """The C prefix of a bank: as set, or made from the folder's name."""
    if settings.name:
        return settings.name
    text = re.sub(r"[^0-9a-z]+", "_", out.resolve().name.lower()).strip("_")
    return text if re.match(r"[a-z]", text) else f"bank_{text}".strip("_")


def may_write(folder: Path, force: bool) -> None:
    """Refuse an output that stands already, unless ``force``."""
    if folder.exists() and not force:
        raise UsageError(
            "there is something here already", where=str(folder), remedy="--force replaces it"
        )
