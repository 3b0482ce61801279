"""Prices fitted to a machine: written, read, refused, and gone by only when asked."""

from __future__ import annotations

import json

import numpy as np
import pytest
from click.testing import CliRunner

from patchlab.bank import read_bank
from patchlab.bank.costs import STANDING
from patchlab.cli.commands import patchlab
from patchlab.errors import InputError, UsageError
from patchlab.pipeline import bench_banks, calibrate
from tests.bank.banks import random_bank
from tests.bank.test_separable import round_gabors


def few_banks():
    """Less than what a machine is calibrated with."""
    yield random_bank(3, 3), ("direct",)
    yield random_bank(2, 9), ("direct", "fft")


def run(*words):
    return CliRunner().invoke(patchlab, [str(w) for w in words])


def test_the_command_writes_prices_and_export_goes_by_them(tmp_path, monkeypatch):
    monkeypatch.setattr(calibrate, "calibration_banks", few_banks)
    monkeypatch.setattr(calibrate, "PICTURE", (64, 48))
    path = tmp_path / "costs.json"
    done = run("bench", "--calibrate", path, "--repeats", 3, "--json")
    assert done.exit_code == 0, done.output
    found = json.loads(done.stdout)
    assert json.loads(path.read_bytes())["prices_ns"] == found["prices_ns"]
    assert [p["plan"] for p in found["plans"]] == [
        "arbitrary, direct", "arbitrary, direct", "arbitrary, fft",
    ]  # fmt: skip
    assert all(p["measured_ns"] > 0 for p in found["plans"])
    prices = calibrate.costs_file(path)
    assert prices.plain() == found["prices_ns"]
    # a second file of the name is not written over
    with pytest.raises(UsageError, match="stands already"):
        calibrate.calibrate(path, 3)

    np.save(tmp_path / "taps.npy", round_gabors(9).taps)
    common = ["export", "--taps", tmp_path / "taps.npy", "--pixels", "Mono8", "--no-library"]
    for name, words in (("plain", []), ("priced", ["--costs", path]),
                        ("asked", ["--plan", "separable", "--tolerance", "2"])):  # fmt: skip
        done = run(*common, "-o", tmp_path / name, *words, "-q")
        assert done.exit_code == 0, done.output
    plans = {n: read_bank(tmp_path / n)[1].detail for n in ("plain", "priced", "asked")}
    assert plans["plain"]["costs"] == plans["asked"]["costs"] == STANDING
    assert plans["priced"]["costs"] == prices
    assert (plans["asked"]["asked"], plans["asked"]["tolerance"]) == ("separable", 2.0)
    # what stands has its plan
    done = run("export", tmp_path / "plain", "-o", tmp_path / "more", "--plan", "fft")
    assert done.exit_code != 0


@pytest.mark.parametrize(
    "text", ["", "{", "[1]", '{"format": "other"}', '{"format": "patchlab costs 1"}']
)
def test_what_is_no_cost_model_is_refused(tmp_path, text):
    path = tmp_path / "costs.json"
    path.write_text(text)
    with pytest.raises(InputError):
        calibrate.costs_file(path)
    with pytest.raises(InputError, match="cannot be read"):
        calibrate.costs_file(tmp_path / "none.json")


def test_calibrate_stands_alone(tmp_path):
    assert run("bench", "--calibrate", tmp_path / "c.json", "--cases").exit_code != 0
    assert not (tmp_path / "c.json").exists()


def test_the_banks_strain_every_price():
    work = [
        calibrate.banks.make_plan(bank, kind).detail["work"].priced()
        for bank, kinds in bench_banks.calibration_banks()
        for kind in kinds
    ]
    assert np.linalg.matrix_rank(np.array(work)) == len(STANDING.plain())
    kinds = {
        word
        for b, ks in bench_banks.calibration_banks()
        for k in ks
        for word in calibrate.banks.make_plan(b, k).kind.split(" and ")
    }
    assert {"direct", "parity", "separable", "tile FFT", "half resolution"} <= kinds
