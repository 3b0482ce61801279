"""Drift of a camera from its bank: truth is a simulated camera on shipped photographs."""

from dataclasses import replace

import numpy as np
import pytest

from patchlab.camera import drift, make_table
from patchlab.types import InputContract, InputTable, Mark, NoiseModel, Survey

GAIN, READ = 0.5, 1.5


@pytest.fixture(scope="module")
def contract(bench):
    return bench.contract(8, black=8)


@pytest.fixture(scope="module")
def table(contract):
    levels = np.linspace(8, 240, 39)
    sd = np.sqrt(GAIN * (levels - 8) + READ**2 + 1 / 12)
    law = NoiseModel(True, gain=GAIN, read_noise=READ, levels=levels, sd=sd)
    return make_table("stabilised", contract, law)


@pytest.fixture(scope="module")
def lights(bench):
    return [bench.light(n, 320) for n in ("astronaut.png", "coffee.png", "china.jpg", "camera.png")]


def noise_now(bench, table, lights, contract, gain, read):
    keeper = drift.NoiseKeeper(table, None)
    for frame in bench.folder(lights, contract, gain, read, blur=0.7):
        keeper.add(frame)
    return keeper.changes()


def test_the_same_camera_is_steady(bench, table, lights, contract):
    found = noise_now(bench, table, lights, contract, GAIN, READ)
    assert [c.verdict for c in found] == ["steady"] * 3
    assert [c.now for c in found] == pytest.approx([1, 1, 1], abs=0.04)


def test_more_gain_shows_where_photons_make_the_noise(bench, table, lights, contract):
    dark, middle, bright = noise_now(bench, table, lights, contract, 1.3 * GAIN, READ)
    assert bright.verdict == "drifted"
    # variance 1.3 times as large, but for read noise, which counts most in the dark
    assert bright.now == pytest.approx(np.sqrt(1.3), rel=0.03)
    assert dark.now < middle.now < bright.now


def test_more_read_noise_shows_in_the_dark_first(bench, table, lights, contract):
    dark, _, bright = noise_now(bench, table, lights, contract, GAIN, 3 * READ)
    assert dark.verdict == "drifted"
    assert dark.now > bright.now + 0.05 > 1.05


def test_texture_alone_cannot_tell(bench, table, contract):
    textures = [bench.light("gravel.png", 256), bench.light("grass.png", 256)]
    found = noise_now(bench, table, textures, contract, 0.01 * GAIN, 0.1)
    assert "cannot tell" in drift.verdict_of(found)


def surveyed(blur):
    contract = InputContract("float32", 0, 1)
    table = InputTable("identity", contract, None, None)
    return Survey(contract, NoiseModel(False, "no"), table, blur, "no edge")


@pytest.mark.parametrize(
    ("before", "now", "verdict"),
    [
        (0.8, 0.85, "steady"),
        (0.8, 1.1, "drifted"),
        (0.8, 0.6, "drifted"),
        (0.8, None, "cannot tell"),
    ],
)
def test_blur(before, now, verdict):
    assert drift.blur_change(before, surveyed(now)).verdict == verdict


def test_colour_is_compared_lag_by_lag():
    acov = np.zeros((7, 7))
    acov[3, 3], acov[3, 2], acov[3, 4] = 1, 0.3, 0.3
    coloured = NoiseModel(True, autocovariance=acov)
    white = NoiseModel(True)
    assert drift.colour_change(acov, coloured).verdict == "steady"
    assert drift.colour_change(None, white).verdict == "steady"
    found = drift.colour_change(None, coloured)
    assert found.verdict == "drifted"
    assert found.now == pytest.approx(0.3)
    assert drift.colour_change(acov, white).now == pytest.approx(0.3)


def test_only_new_marks_of_the_camera_count():
    marks = [
        Mark("row_noise", True, 0.3, 0.1, "lines", "subtract"),
        Mark("block_grid", True, 1.4, 1.1, "grids", "save uncompressed"),
        Mark("near_duplicates", True, 0.3, 0.0, "", ""),
        Mark("sharpening", None, 0.0, 0.0, "", ""),
        Mark("vignetting", False, 0.0, 0.1, "", ""),
    ]
    found = drift.new_marks(("row_noise",), marks)
    assert [c.name for c in found] == ["mark: block grid"]
    assert found[0].verdict == "drifted"


def test_the_verdict_of_all():
    steady = drift.blur_change(0.8, surveyed(0.8))
    unknown, drifted = replace(steady, verdict="cannot tell"), replace(steady, verdict="drifted")
    assert drift.verdict_of([steady, steady]) == "steady"
    assert drift.verdict_of([steady, unknown]) == "cannot tell"
    assert drift.verdict_of([unknown, drifted]) == "drifted"
