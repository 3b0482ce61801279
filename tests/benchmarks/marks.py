"""How surely the survey finds each mark: clean folders beside tampered copies of them.

    python tests/benchmarks/marks.py [--photos FOLDER] [--folders 40] [--first 0] [--half showing]
        [--jobs 1] [--kind NAME ...] [-o TABLE.json]

Folders of 8 to 12 frames are drawn from real photographs (``tampering.py`` says how, and how
strong each mark is) and judged as the survey does. Thresholds were set on folders of the half
``setting``; the half ``showing`` shares no photograph with it. A FOLDER's own photographs are
added, in turn to one half and the other.

Columns: folders with the mark in which it was found, left open (cannot tell) and missed; clean
folders in which it was found all the same, and left open; folders with another mark in which
it was found, those left aside where the other mark truly makes this one; and for duplicates
and blurred frames the share of the right frames named.
"""

import argparse
import json
from collections import defaultdict
from concurrent.futures import ProcessPoolExecutor
from functools import partial
from pathlib import Path
from typing import Any

import tampering

from patchlab.camera import measure_noise
from patchlab.camera.marks import MarkMeter

IMPLIED = {
    ("posterised_depth", "missing_levels"),
    ("missing_levels", "posterised_depth"),
    ("missing_levels", "clipped_levels"),  # a stretched tone curve clips
}
"""(tampering, mark that comes with it)."""


def judged(photos: list, side: str, kinds: tuple[str, ...], index: int) -> list[dict[str, Any]]:
    """What the survey says of one clean folder and its tampered copies."""
    base = tampering.clean(photos, index, side)
    said = []
    for kind in kinds:
        folder = base.folder(kind)
        frames = folder.frames()
        # of all verdicts only the one on blurred frames asks for the noise
        asks = kind in ("clean", "blurred_frames")
        meter = MarkMeter(measure_noise(frames) if asks else None)
        for frame in frames:
            meter.add(frame)
        marks = meter.result()
        named = {path for path, _ in marks.distrusted}
        said.append(
            {
                "kind": kind,
                "index": index,
                "frames": len(frames),
                "found": {m.name: m.found for m in marks.marks},
                "value": {m.name: float(f"{m.value:.5g}") for m in marks.marks},
                "named": sum(frames[i].path in named for i in folder.touched),
                "touched": len(folder.touched),
            }
        )
    return said


def table(said: list[dict[str, Any]]) -> list[dict[str, Any]]:
    """One row for each mark."""
    by_kind = defaultdict(list)
    for one in said:
        by_kind[one["kind"]].append(one)
    rows = []
    for mark in (k for k in by_kind if k != "clean"):
        own, clean = ([one["found"][mark] for one in by_kind[kind]] for kind in (mark, "clean"))
        others = [
            one["found"][mark]
            for kind, ones in by_kind.items()
            if kind not in ("clean", mark) and (kind, mark) not in IMPLIED
            for one in ones
            if mark != "blurred_frames"  # judged without the noise there
        ]
        touched = sum(one["touched"] for one in by_kind[mark])
        rows.append(
            {
                "mark": mark,
                "tampered": len(own),
                "found": own.count(True),
                "open": own.count(None),
                "missed": own.count(False),
                "clean": len(clean),
                "false": clean.count(True),
                "clean_open": clean.count(None),
                "others": len(others),
                "false_elsewhere": others.count(True),
                "frames_named": sum(o["named"] for o in by_kind[mark]) / touched
                if touched
                else None,
            }
        )
    return rows


def shown(row: dict[str, Any]) -> str:
    named = "" if row["frames_named"] is None else f"{row['frames_named']:7.1%}"
    return (
        f"{row['mark']:22s} {row['found']:3d} of {row['tampered']:3d}  {row['open']:3d} "
        f"{row['missed']:4d}   {row['false']:3d} of {row['clean']:3d}  {row['clean_open']:3d}   "
        f"{row['false_elsewhere']:3d} of {row['others']:3d}  {named}"
    )


def main() -> None:
    parser = argparse.ArgumentParser(description=__doc__.splitlines()[0])
    parser.add_argument("--photos", type=Path)
    parser.add_argument("--folders", type=int, default=40)
    parser.add_argument("--first", type=int, default=0)
    parser.add_argument("--half", choices=("setting", "showing"), default="showing")
    parser.add_argument("--kind", nargs="*", choices=tuple(tampering.TAMPER))
    parser.add_argument("--jobs", type=int, default=1)
    parser.add_argument("-o", dest="out", type=Path)
    asked = parser.parse_args()
    photos = tampering.halves(asked.photos)[asked.half == "showing"]
    kinds = ("clean", *(asked.kind or tampering.TAMPER))
    judge = partial(judged, photos, asked.half, kinds)
    said = []
    with ProcessPoolExecutor(asked.jobs) as pool:
        for ones in pool.map(judge, range(asked.first, asked.first + asked.folders)):
            said += ones
            if asked.out:
                asked.out.write_text(json.dumps({"rows": table(said), "folders": said}, indent=1))
    rows = table(said)
    print(f"{len(photos)} photographs, half '{asked.half}'")
    print("mark                       found  open missed  false     open   false elsewhere  named")
    for row in rows:
        print(shown(row))


if __name__ == "__main__":
    main()
