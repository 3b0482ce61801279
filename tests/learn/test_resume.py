"""Learning that was broken off goes on in its run's folder and ends with the same bytes."""

import os
import signal
import subprocess
import sys
import time

import numpy as np
import pytest
from PIL import Image

from patchlab.errors import Interrupted
from patchlab.pipeline import desk as desks
from patchlab.pipeline import run as runs
from patchlab.pipeline.keep import FILE, Keeper
from patchlab.settings import Settings

OPTIONS = {"patches": 3000, "patch_size": 8, "restarts": 3, "jobs": 1, "table": "linear"}


@pytest.fixture(scope="module")
def photos(tmp_path_factory):
    """Frames of overlapping squares, invented here."""
    folder = tmp_path_factory.mktemp("frames")
    r = np.random.default_rng(0)
    for i in range(4):
        plane = np.full((160, 200), 120.0)
        for _ in range(400):
            y, x, h = r.integers(0, 160), r.integers(0, 200), r.integers(4, 30)
            plane[y : y + h, x : x + h + r.integers(0, 20)] = r.uniform(20, 230)
        noisy = plane + r.normal(size=plane.shape)
        Image.fromarray(np.clip(noisy, 0, 255).astype(np.uint8)).save(folder / f"{i}.png")
    return folder


def learn(photos, out, *, resume=False, progress=lambda *a: None, told=None, **options):
    settings = Settings(**{**OPTIONS, **options})
    desks.prepare(out, photos, resume=resume, force=False)
    told = [] if told is None else told
    runs.work(photos, desks.Desk(out, settings, resume, progress, told.append), "learn")
    files = sorted((out / "dictionary").iterdir())
    return {p.name: p.read_bytes() for p in files}


def stop_at(share):
    """A listener that breaks learning off at a share of its way."""

    def listen(stage, done, total, note=""):
        if stage == "learn" and done >= share * total:
            raise Interrupted("stopped")

    return listen


@pytest.fixture(scope="module", params=["ica", "sparse"])
def whole(request, photos, tmp_path_factory):
    out = tmp_path_factory.mktemp("runs") / "whole"
    return request.param, learn(photos, out, method=request.param), out


def test_nothing_is_left_over_at_the_end(whole):
    assert not (whole[2] / FILE).exists()


@pytest.mark.parametrize("seed", range(3))
def test_broken_off_anywhere_learning_ends_with_the_same_bytes(whole, photos, tmp_path, seed):
    method, expected, _ = whole
    share = np.random.default_rng(seed).uniform(0.04, 0.9)
    if method == "sparse":
        share = (seed + 2) / 50  # it is told of passes, and ends after a few
    with pytest.raises(Interrupted):
        learn(photos, tmp_path / "run", method=method, progress=stop_at(share))
    assert (tmp_path / "run" / FILE).exists()
    told = []
    assert learn(photos, tmp_path / "run", method=method, resume=True, told=told) == expected
    assert any("goes on where learning was left" in line for line in told)
    assert not (tmp_path / "run" / FILE).exists()


def test_killed_in_the_act(whole, photos, tmp_path):
    method, expected, _ = whole
    out = tmp_path / "run"
    words = [sys.executable, "-m", "patchlab", "learn", str(photos), "-o", str(out), "-q"]
    words += [w for k, v in OPTIONS.items() for w in (f"--{k.replace('_', '-')}", str(v))]
    words += ["--method", method]
    process = subprocess.Popen(words, env=os.environ | {"PYTHONWARNINGS": "ignore"})
    try:
        end = time.monotonic() + 120
        while not (out / FILE).exists() and process.poll() is None and time.monotonic() < end:
            time.sleep(0.005)
    finally:
        process.send_signal(signal.SIGTERM if os.name == "nt" else signal.SIGKILL)
        process.wait()
    assert learn(photos, out, method=method, resume=True) == expected


def test_other_settings_do_not_go_on_from_it(photos, tmp_path):
    with pytest.raises(Interrupted):
        learn(photos, tmp_path / "run", progress=stop_at(0.5))
    told = []
    learn(photos, tmp_path / "run", resume=True, told=told, seed=1)
    assert not any("goes on" in line for line in told)


def test_a_damaged_file_counts_as_none(photos, tmp_path):
    with pytest.raises(Interrupted):
        learn(photos, tmp_path / "run", progress=stop_at(0.5))
    file = tmp_path / "run" / FILE
    for data in (file.read_bytes()[:-200], b"", b"no archive"):
        file.write_bytes(data)
        assert Keeper(tmp_path / "run", "x").find(dict) is None
    learn(photos, tmp_path / "run", resume=True)
    assert not file.exists()
