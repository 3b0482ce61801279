"""Make the banks in this folder again from ``sample_images``, or check that they are current.

    python filters/rebuild.py          # make them
    python filters/rebuild.py --check  # compare a fresh build with what stands here

Making them also makes the pictures in ``tour/`` that the README shows.

Each ``NAME.toml`` here becomes the bank ``NAME/``. Learning ends in the same bytes on one
machine; between machines the last digits of a matrix product differ, so the check asks for
kernels at |cos| >= 0.999, thresholds within 2 %, and targets that agree with their oracle.
"""

from __future__ import annotations

import shutil
import sys
import tempfile
from pathlib import Path

import numpy as np

from patchlab import bank as banks
from patchlab import images, report
from patchlab.pipeline import compare, desk, parts, run, use
from patchlab.settings import Settings, from_toml

HERE = Path(__file__).resolve().parent
PHOTOS = HERE.parent / "sample_images"


TOUR = ("atoms", "bank", "edges")
"""Pictures of the first bank's page that the README shows."""


def build(config: Path, folder: Path) -> Path:
    """Run the main job by one configuration; gives the bank's folder."""
    settings = Settings(**from_toml(config.read_text(), config.name), name=config.stem)
    run.work(PHOTOS, desk.Desk(folder, settings))
    return folder / "bank"


def keep_pictures(folder: Path) -> None:
    """Write a run's page and keep the README's pictures of it."""
    report.write(folder)
    (HERE / "tour").mkdir(exist_ok=True)
    for name in TOUR:
        shutil.copyfile(folder / "report" / f"{name}.png", HERE / "tour" / f"{name}.png")


def draw_parts(work: Path) -> None:
    """The README's picture of parts: made brackets, their components side by side."""
    images.make_brackets(work / "brackets")
    pair = parts.find_parts(work / "brackets", work / "parts")
    (HERE / "tour" / "parts.png").write_bytes(report.parts_pages(*pair)["parts.png"])


def differences(standing: Path, fresh: Path) -> list[str]:
    """What differs between two builds of one bank, in sentences."""
    if not (standing / "bank.json").is_file():
        return ["it is missing"]
    found = []
    if not use.verify(standing)["passed"]:
        found.append("its targets differ from its oracle, or a file was changed")
    match = compare.compare(standing, fresh)
    if match.verdict == "different":
        found.append(f"a kernel moved: the worst match is at |cos| = {match.cosine.min():.6f}")
    old, new = (banks.read_bank(p)[0] for p in (standing, fresh))
    if [k.name for k in old.kernels] != [k.name for k in new.kernels]:
        found.append("the kernels have other names")
    if (old.thresholds is None) != (new.thresholds is None):
        found.append("thresholds came or went")
    elif old.thresholds is not None and new.thresholds is not None:
        ratio = old.thresholds.strength / new.thresholds.strength
        if np.abs(ratio - 1).max() > 0.02:
            found.append("a threshold moved by more than 2 %")
    return found


def main(check: bool) -> int:
    """Build every bank; with ``check`` leave the standing ones and say what differs."""
    wrong = 0
    for config in sorted(HERE.glob("*.toml")):
        with tempfile.TemporaryDirectory() as work:
            fresh = build(config, Path(work) / "run")
            standing = HERE / config.stem
            if check:
                found = differences(standing, fresh)
                wrong += len(found)
                print(f"{config.stem}: {'; '.join(found) or 'current'}")
            else:
                shutil.rmtree(standing, ignore_errors=True)
                shutil.copytree(fresh, standing)
                if config.stem == "tessary_edges":
                    keep_pictures(fresh.parent)
                    draw_parts(Path(work))
                print(f"{config.stem}: made")
    return 1 if wrong else 0


if __name__ == "__main__":
    sys.exit(main("--check" in sys.argv[1:]))
