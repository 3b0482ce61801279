"""Frames that the survey did not look at."""

import numpy as np
import pytest
from scipy import ndimage

from patchlab import images
from patchlab.camera import MAX_FRAMES, judge_rest
from patchlab.images.formats import png_bytes
from patchlab.pipeline import run
from patchlab.pipeline.desk import Desk
from patchlab.settings import Settings
from patchlab.store import write_file
from patchlab.types import InputTable, NoiseModel, Survey


@pytest.fixture(scope="module")
def contract(bench):
    return bench.contract(8, black=16)


@pytest.fixture(scope="module")
def lights(bench):
    """Sixteen pictures: four corners of four photographs."""
    names = ("astronaut.png", "coffee.png", "chelsea.png", "motorcycle_left.png")
    return [
        bench.light(name)[y : y + 140, x : x + 140]
        for name in names
        for y in (0, 140)
        for x in (0, 150)
    ]


def surveyed(contract, noise=None):
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), None)
    return Survey(contract, noise or NoiseModel(False, "not asked for"), table, None)


@pytest.mark.parametrize("known", [True, False])
def test_each_reason_is_found_among_the_other_frames_and_no_clean_one(
    bench, lights, contract, known
):
    shots = [bench.expose(0.8 * x, contract, 0.4, 1.2, k) for k, x in enumerate(lights)]
    again = bench.expose(0.8 * lights[3], contract, 0.4, 1.2, 99)
    soft = bench.expose(ndimage.gaussian_filter(0.8 * lights[9], 2.5), contract, 0.4, 1.2, 98)
    burnt = bench.expose(np.minimum(20 * lights[4] + 0.5, 1.2), contract, 0.4, 1.2, 97)
    # the soft copy's own sharp frame is not in the folder, else it would be a duplicate
    shots[9] = soft
    frames = [bench.frame(s, contract, f"{k:02d}.png") for k, s in enumerate(shots)]
    frames += [bench.frame(again, contract, "again.png"), bench.frame(burnt, contract, "burnt.png")]
    law = NoiseModel(True, gain=0.4, read_noise=1.2) if known else None
    seen = frozenset(f.path for f in frames[:8])
    found = judge_rest(surveyed(contract, law), frames, seen)
    odd = [("again.png", "near duplicate"), ("burnt.png", "clipped")]
    soft_too = [("09.png", "blurred"), *odd]
    # where the noise is not known it may hide that a frame is soft
    assert list(found.distrusted) in ([soft_too] if known else [soft_too, odd])
    assert found.notes[-1].startswith("18 frames were judged")
    unseen = judge_rest(surveyed(contract, law), frames, frozenset(f.path for f in frames))
    assert unseen.distrusted == ()  # the survey's own verdict stands


def test_a_long_folder_is_judged_whole(bench, lights, contract, tmp_path):
    # 70 frames, the last but three repeats the first: an even choice of 64 may pass it over
    photos = tmp_path / "photos"
    rng = np.random.default_rng(5)
    for k in range(70):
        y, x = rng.integers(0, 12, 2)
        light = lights[k % 16][y : y + 128, x : x + 128]
        light = np.roll(light, rng.integers(128, size=2), (0, 1))  # another picture each time
        codes = bench.expose(0.8 * light, contract, 0.4, 1.2, k).astype(np.uint8)
        write_file(photos / f"{k:02d}.png", png_bytes(codes))
    desk = Desk(tmp_path / "run", Settings(jobs=1, black=16.0))
    intake = run.take_in(photos, desk)
    skipped = sorted(intake.names - intake.thinned(MAX_FRAMES).names)
    codes = images.read_file(photos, "00.png", images.ReadOptions())[0].pixels
    write_file(photos / skipped[-1], png_bytes(np.minimum(codes, 254) + np.uint8(1)))
    found, _ = run.survey(run.take_in(photos, desk), desk)
    assert (skipped[-1], "near duplicate") in found.distrusted
