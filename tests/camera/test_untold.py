"""A read noise that the frames cannot tell is not told; the law and the table do without it."""

import numpy as np
import pytest

from patchlab.camera import (
    make_table,
    measure_noise,
    measure_noise_dark,
    measure_noise_static,
    noise_of_table,
)
from patchlab.camera.survey import better_noise
from patchlab.camera.table import read_of, sd_of
from patchlab.types import NoiseModel


@pytest.fixture(scope="module")
def clipped(bench):
    """Ten photographs of a camera whose black level 0 cuts the dark noise off."""
    contract = bench.contract(8)
    return contract, measure_noise(bench.folder(bench.photos(10), contract, 0.5, 1.5, seed=4))


def test_black_level_zero_leaves_the_read_noise_untold(clipped):
    contract, noise = clipped
    assert noise.measurable
    assert noise.gain == pytest.approx(0.5, rel=0.05)
    assert noise.read_noise is None
    assert noise.read_noise_error is None
    assert "black level is 0" in noise.reason
    # the curve holds the law down to black
    assert read_of(noise, contract) ** 2 + 1 / 12 == pytest.approx(noise.sd[0] ** 2, rel=1e-9)
    assert np.allclose(sd_of(noise, contract, noise.levels), noise.sd, rtol=1e-9)


def test_the_table_does_without_it(clipped):
    contract, noise = clipped
    truth = NoiseModel(True, gain=0.5, read_noise=1.5, levels=noise.levels, sd=noise.sd)
    levels = np.linspace(0.03, 0.85, 30) * contract.white
    sd = noise_of_table(make_table("stabilised", contract, noise), truth, levels)
    assert np.abs(sd - 1).max() < 0.05


def test_dark_frames_fill_it_in(bench):
    contract = bench.contract(12, black=64)
    levels = contract.black + np.linspace(0, 3600, 20)
    law = NoiseModel(
        True, reason="read noise not measurable here: too little is dark", gain=0.5,
        gain_error=0.01, levels=levels, sd=np.sqrt(0.5 * (levels - 64) + 9.0),
    )  # fmt: skip
    dark = bench.folder([np.zeros((200, 200))] * 3, contract, 0.5, 2.0)
    better, notes = better_noise(law, contract, None, dark)
    assert better.read_noise == pytest.approx(2.0, rel=0.02)
    assert better.reason == ""
    assert better.sd[0] == pytest.approx(np.sqrt(4 + 1 / 12), rel=0.02)
    assert "comes from the dark frames" in notes[0]


@pytest.mark.parametrize("black", [16.0, 16.25, 16.5])
@pytest.mark.parametrize("read", [0.42, 0.5, 0.8])
def test_dark_noise_of_half_a_code_is_not_biased_by_rounding(bench, black, read):
    # about a whole code 1/12 is too little to take off, about a half too much
    contract = bench.contract(8, black=16)
    rng = np.random.default_rng(3)
    frames = [
        bench.frame(np.rint(black + read * rng.standard_normal((400, 400))), contract, f"{k}.png")
        for k in range(4)
    ]
    found = measure_noise_dark(frames)
    if not found.measurable:
        assert read < 0.5
        assert black == 16.0
        return
    assert found.read_noise == pytest.approx(read, rel=0.02)
    assert abs(found.read_noise - read) < 4 * found.read_noise_error


def test_static_scenes_without_darkness_tell_the_gain_only(bench):
    contract = bench.contract(12, black=64)
    lights = [0.3 + 0.6 * np.tile(np.linspace(0, 1, 256), (256, 1))] * 2
    scenes = [
        [bench.frame(bench.expose(x, contract, 0.5, 1.0, 10 * i + k), contract) for k in range(2)]
        for i, x in enumerate(lights)
    ]
    noise = measure_noise_static(scenes)
    assert noise.gain == pytest.approx(0.5, rel=0.03)
    assert noise.read_noise is None
    assert "too little is dark" in noise.reason
