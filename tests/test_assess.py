"""The whole assessment of a bank: its own camera, reproducible figures, a page."""

import json
from dataclasses import replace

import numpy as np
import pytest
from click.testing import CliRunner

from patchlab import bank as banks
from patchlab import edges
from patchlab.bank import lattice
from patchlab.cli import commands
from patchlab.errors import InputError
from patchlab.images.scenes import Camera
from patchlab.pipeline import assess
from patchlab.types import Bank, InputContract, InputTable

CAMERA = Camera(bits=8, gain=0.5, full_well=600, read_noise=2.0, blur_sigma_px=0.8)


def made_bank(thresholds=True, **changes):
    electrons = np.arange(256) / CAMERA.gain
    inside = electrons + 3 / 8 + CAMERA.read_noise**2 + 1 / 12 / CAMERA.gain**2
    table = InputTable("stabilised", CAMERA.contract, (2 * np.sqrt(inside)).astype(np.float32), 1.0)
    kernels, taps = lattice.lattice_bank((8, 8), ((1.2, 1.44), (2.4, 2.9)), ("odd",), None, 1.0)
    bank = Bank("proof", kernels, taps, table, provenance={"blur_sigma_px": 0.8})
    bank = replace(bank, **changes)
    return replace(bank, thresholds=edges.calibrate(bank, megapixels=2)) if thresholds else bank


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    where = tmp_path_factory.mktemp("assess") / "bank"
    bank = made_bank()
    banks.write_bank(where, bank, banks.make_plan(bank), {}, seed=0, settings={})
    return where


@pytest.fixture
def small(monkeypatch):
    monkeypatch.setattr(assess, "QUICK", assess.Effort(96, 1, 128, 4, 2, True))


def test_the_camera_is_read_off_the_bank():
    found = assess.camera_of(made_bank(thresholds=False))
    assert found.gain == pytest.approx(0.5, rel=0.01)
    assert found.read_noise == pytest.approx(2.0, rel=0.02)
    assert found.full_well == pytest.approx(510, rel=0.01)
    assert (found.bits, found.blur_sigma_px, found.neighbour) == (8, 0.8, 0.0)


def test_the_colour_of_the_noise_comes_along():
    """A camera that mixes neighbours with weight 1/4 has correlation 2/3 at lag 1."""
    one = np.convolve([1, 2, 1], [1, 2, 1]) / 6
    found = assess.camera_of(made_bank(thresholds=False, noise_autocovariance=np.outer(one, one)))
    assert found.neighbour == pytest.approx(0.25, abs=0.002)
    draw = np.random.default_rng(1)
    codes = found.capture(np.full((400, 400), 30.0), draw).astype(float)
    kept = (1 / 4 + 1 / 8) ** 2
    want = kept * found.gain**2 * (30 + found.read_noise**2) + 1 / 12
    assert codes.var() == pytest.approx(want, rel=0.05)
    table = made_bank(thresholds=False).table
    assert table.apply(codes.astype(np.uint8)).std() == pytest.approx(1.0, abs=0.05)


def test_banks_that_know_too_little_are_refused():
    with pytest.raises(InputError, match="blur"):
        assess.camera_of(made_bank(thresholds=False, provenance={}))
    bank = made_bank(thresholds=False)
    with pytest.raises(InputError, match="noise was measured"):
        assess.camera_of(replace(bank, table=replace(bank.table, noise_sd=None)))


def test_cameras_that_are_not_simulated_are_told_apart():
    bank = made_bank(thresholds=False)
    bent = replace(bank.table, contract=replace(bank.contract, transfer="srgb"))
    with pytest.raises(InputError, match=r"follow srgb.*your own pictures"):
        assess.camera_of(replace(bank, table=bent))
    floats = InputTable(
        "stabilised", InputContract("float32", 0.0, 1.0), None, 1.0, slope=2.0, offset=1.0, scale=9
    )
    with pytest.raises(InputError, match=r"takes float32 pixels.*your own pictures"):
        assess.camera_of(replace(bank, table=floats))
    for kind in ("identity", "linear", "log"):
        with pytest.raises(InputError, match="noise was measured"):
            assess.camera_of(replace(bank, table=replace(bank.table, kind=kind)))


def run(*words):
    done = CliRunner().invoke(commands.patchlab, ["assess", *map(str, words)])
    assert done.exception is None, done.output
    return json.loads(done.stdout)


@pytest.mark.usefixtures("small")
def test_an_assessment_is_whole_reproducible_and_fair(folder, tmp_path):
    first = run(folder, "--quick", "--jobs", 1, "-o", tmp_path / "a", "--json")
    files = {p.name for p in (tmp_path / "a").iterdir()}
    assert files >= {"assess.json", "index.html", "light.png", "rates.png", "location.png"}
    assert json.loads((tmp_path / "a" / "assess.json").read_bytes()) == first
    again = assess.assess_bank(
        folder, None, rate=10, seed=0, jobs=1, quick=True, force=False, pictures=dict
    )
    assert json.loads(json.dumps(again)) == first

    found = first["detection"]
    assert len(found["light_electrons"]) == 5
    names = {(r["detector"], r["picture"]) for r in found["fixed"]}
    assert len(names) == 4 * 3  # OpenCV is installed for tests
    tuned = {(r["detector"], r["picture"]): r["mean_f"] for r in found["tuned"]}
    for row in found["fixed"]:  # tuning by the truth can only help
        assert tuned[row["detector"], row["picture"]] >= row["mean_f"] - 1e-3
    mine = next(r for r in found["ours"] if r["setting"].startswith("10 "))
    best = max(r["mean_f"] for r in found["fixed"] if r["picture"] == "raw")
    assert found["lead"]["over_best_fixed_on_raw"] == pytest.approx(mine["mean_f"] - best, abs=2e-3)
    assert mine["mean_f"] > 0.5
    page = (tmp_path / "a" / "index.html").read_text(encoding="utf-8")
    assert "A quick look" in page
    assert 'src="data:image/png' in page
