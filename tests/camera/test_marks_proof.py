"""A small part of ``tests/benchmarks/marks.py``: every mark on tampered copies of clean folders.

The photographs are those of the half ``showing``: no threshold was set on them.
"""

import importlib.util
from pathlib import Path

import pytest

from patchlab.camera import measure_noise
from patchlab.camera.marks import MarkMeter

FOLDERS = 2
PLACE = Path(__file__).parents[1] / "benchmarks" / "tampering.py"
SPEC = importlib.util.spec_from_file_location("tampering", PLACE)
tampering = importlib.util.module_from_spec(SPEC)
SPEC.loader.exec_module(tampering)


@pytest.fixture(scope="module")
def folders():
    photos = tampering.shipped(tampering.SHOWING)
    return [tampering.clean(photos, index, "quick") for index in range(FOLDERS)]


def judged(folder, *, noise):
    """Marks found in a folder, and the frames it distrusts."""
    frames = folder.frames()
    meter = MarkMeter(measure_noise(frames) if noise else None)
    for frame in frames:
        meter.add(frame)
    marks = meter.result()
    return {m.name for m in marks.marks if m.found}, dict(marks.distrusted), marks.grid


def test_clean_folders_show_nothing(folders):
    for clean in folders:
        found, distrusted, grid = judged(clean.folder(), noise=True)
        assert not found
        assert not distrusted
        assert grid is None


@pytest.mark.parametrize("kind", sorted(tampering.TAMPER))
def test_tampered_copies_show_their_mark(folders, kind):
    told = 0
    for clean in folders:
        folder = clean.folder(kind)
        found, distrusted, grid = judged(folder, noise=kind == "blurred_frames")
        told += kind in found
        if kind in ("near_duplicates", "blurred_frames"):
            named = {f"{i:02d}.png" for i in folder.touched}
            assert named & set(distrusted)
            assert len(set(distrusted) - named) <= 1
        if kind == "block_grid":
            assert grid == folder.grid
    assert told == FOLDERS
