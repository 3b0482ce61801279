"""The drift command, as a person on a production line would use it."""

import json
import math
from dataclasses import replace

import numpy as np
import pytest
from click.testing import CliRunner
from PIL import Image
from scipy import ndimage

from patchlab import bank as banks
from patchlab.bank import lattice
from patchlab.camera.drift import Change
from patchlab.cli.commands import patchlab
from patchlab.images.scenes import Camera, render_scene
from patchlab.pipeline.drift import rate_now
from patchlab.types import Bank, InputTable, Thresholds

CAMERA = Camera(bits=8, gain=0.5, full_well=600, read_noise=2.0, blur_sigma_px=0.9)


def gaussian_tail(rate):
    """Thresholds of an exact Gaussian tail: rate = 1e6 exp(-strength^2 / 2)."""
    rate = np.array(rate)
    strength = np.sqrt(2 * np.log(1e6 / rate))
    return Thresholds(rate, strength, rate, 0.7, 1.0, "white")


def noise(now):
    return [Change("noise, dark", "noise units", 1.0, now, 1.06, 0.01, "steady")]


@pytest.mark.parametrize("grown", [0.8, 1.0, 1.1, 1.5])
def test_the_rate_follows_the_tail_within_the_table_and_beyond(grown):
    table = gaussian_tail([0.1, 1.0, 10.0, 100.0, 1000.0])
    truth = 1e6 * math.exp(-math.log(1e6 / 10.0) / grown**2)
    assert rate_now(table, 10.0, noise(grown)) == pytest.approx(truth, rel=1e-9)


def test_no_thresholds_no_rate():
    assert rate_now(None, 10.0, noise(1.0)) is None
    assert rate_now(gaussian_tail([1.0, 10.0]), 10.0, noise(None)) is None


@pytest.fixture(scope="module")
def bank(tmp_path_factory):
    where = tmp_path_factory.mktemp("drift") / "bank"
    electrons = np.arange(256) / CAMERA.gain
    # Anscombe's root with read noise in electrons; rounding's variance in electrons inside
    inside = electrons + 3 / 8 + CAMERA.read_noise**2 + 1 / (12 * CAMERA.gain**2)
    table = InputTable("stabilised", CAMERA.contract, (2 * np.sqrt(inside)).astype("f4"), 1.0)
    kernels, taps = lattice.lattice_bank((4,), ((1.2, 1.44),), ("odd",), None, 1.0)
    made = Bank("line", kernels, taps, table, provenance={"blur_sigma_px": 0.9, "marks": []})
    made = replace(made, thresholds=gaussian_tail([1.0, 10.0, 100.0]))
    banks.write_bank(where, made, banks.make_plan(made), {}, seed=0, settings={})
    return where


def photographs(folder, camera):
    folder.mkdir()
    for k in range(6):
        made = render_scene(k, (240, 320), camera, light=500, smallest=24.0, largest=120.0)
        Image.fromarray(made.frame.pixels).save(folder / f"{k}.png")
    return folder


def told(bank, photos, *options):
    ran = CliRunner().invoke(patchlab, ["drift", str(bank), str(photos), "--json", *options])
    return ran, json.loads(ran.stdout) if ran.stdout.startswith("{") else None


def test_the_camera_itself_is_steady(bank, tmp_path):
    ran, found = told(bank, photographs(tmp_path / "photos", CAMERA))
    assert ran.exception is None, ran.stderr
    assert found["verdict"] == "steady"
    assert 5 < found["false_edges"]["now"] < 20
    assert {c["name"] for c in found["changes"]} >= {"noise, dark", "noise, bright", "blur"}


def test_a_lens_out_of_focus_and_an_amplifier_turned_up_are_drift(bank, tmp_path):
    other = replace(CAMERA, gain=0.7, full_well=430, blur_sigma_px=1.5)
    ran, found = told(bank, photographs(tmp_path / "photos", other))
    assert found["verdict"] == "drifted"
    by_name = {c["name"]: c for c in found["changes"]}
    assert by_name["noise, bright"]["verdict"] == "drifted"
    assert by_name["blur"]["verdict"] == "drifted"
    assert found["false_edges"]["now"] > 50
    assert ran.exit_code != 0
    assert "drifted" in str(ran.exception)


def test_photographs_that_cannot_tell_do_not_pass(bank, tmp_path):
    folder = tmp_path / "photos"
    folder.mkdir()
    rng = np.random.default_rng(0)
    for k in range(3):
        grain = ndimage.gaussian_filter(rng.standard_normal((96, 96)), 0.8)
        pixels = np.clip(120 + 40 * grain / grain.std(), 1, 250).astype(np.uint8)
        Image.fromarray(pixels).save(folder / f"{k}.png")
    ran, found = told(bank, folder)
    assert found["verdict"] == "cannot tell"
    assert "cannot tell" in str(ran.exception)


def test_a_bank_that_knows_no_camera_is_refused(tmp_path):
    contract = CAMERA.contract
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), None)
    kernels, taps = lattice.lattice_bank((4,), ((1.2, 1.44),), ("odd",), None, 1.0)
    made = Bank("blind", kernels, taps, table)
    banks.write_bank(tmp_path / "bank", made, banks.make_plan(made), {}, seed=0, settings={})
    ran, _ = told(tmp_path / "bank", photographs(tmp_path / "photos", CAMERA))
    assert "neither its camera's noise nor its blur" in str(ran.exception)
