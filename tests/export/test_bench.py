"""The benchmark times only right answers, tells the plans apart, and says what it did."""

from __future__ import annotations

import json

import numpy as np
import pytest
from click.testing import CliRunner

from patchlab.bank import make_plan, reference, write_bank
from patchlab.bank.plan import make_plan as plan_of
from patchlab.cli.commands import patchlab
from patchlab.errors import UsageError, VerificationError
from patchlab.export import bench
from patchlab.pipeline import bench as timed
from tests.bank.banks import lattice_bank, picture, random_bank


def test_libraries_give_the_same_responses():
    bank = lattice_bank(families=("gd1", "gd2"), count=4, widths=((1.2, 2.0),), strength="energy")
    pixels = picture((40, 53))
    exact = reference.responses(bank, pixels)
    names = []
    for entrant in bench.libraries(bank, 53, 40):
        names.append(entrant.name)
        bench.worst_share(entrant, pixels, exact)  # raises where it is wrong
        found = entrant.run(pixels, 2)
        if "strength" in entrant.name:
            strength, turn = reference.strength(bank, pixels, 0)
            np.testing.assert_allclose(found[0], strength, atol=1e-3)
            assert (found[1] == turn).mean() > 0.99
        else:
            np.testing.assert_allclose(found, exact, atol=1e-2)
    assert "OpenCV filter2D" in names
    assert "onnxruntime, exported graph" in names
    assert "scipy.fft, spectrum shared" in names


def test_a_wrong_answer_is_not_timed():
    bank = random_bank(2, 5)
    pixels = picture((9, 11))
    exact = reference.responses(bank, pixels)
    wrong = bench.Entrant("wrong", "", lambda p, n: exact + 1, make_plan(bank).error_bound)
    with pytest.raises(VerificationError, match="wrong answer"):
        bench.measure([wrong], pixels, 3, small=(pixels, exact))


def test_every_round_runs_everyone_once():
    calls = []
    entrants = [
        bench.Entrant(
            name, "", lambda p, n, name=name: calls.append((name, n)), threaded=name == "a"
        )
        for name in "ab"
    ]
    timings = bench.measure(entrants, picture((3, 3)), 3, threads=(1, 2))
    assert calls == [("a", 1), ("b", 1), ("a", 2)] * 4
    assert [(t.target, t.threads) for t in timings] == [("a", 1), ("b", 1), ("a", 2)]
    assert timings[0].ratio == timings[2].ratio == 1


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    bank = lattice_bank("timed", count=4, size=9, widths=((1.2, 2.0),))
    place = tmp_path_factory.mktemp("bench") / "bank"
    write_bank(place, bank, plan_of(bank))
    return place


def test_the_command_prints_plans_and_targets(folder):
    options = ["bench", str(folder), "--size", "64x48", "--repeats", "3"]
    found = json.loads(CliRunner().invoke(patchlab, [*options, "--json"]).stdout)
    assert {p["asked"] for p in found["plans"]} == {"direct", "parity", "separable"}
    assert sum(p["chosen"] for p in found["plans"]) == 1
    by_kind = {p["kind"]: p for p in found["plans"]}
    assert by_kind["direct"]["multiplies_per_pixel"] == 4 * 81
    assert by_kind["parity"]["multiplies_per_pixel"] < 4 * 81
    assert all(p["library_bytes"] > 0 and p["scratch_bytes"] > 0 for p in found["plans"])
    assert all(p["loads_per_pixel"] > 0 and p["expected_ms"] > 0 for p in found["plans"])
    for target in found["targets"]:
        assert target["error_of_bound"] is None or 0 <= target["error_of_bound"] <= 1
    names = {t["target"] for t in found["targets"]}
    assert {"compiled library", "compiled library, fixed point", "numpy engine"} <= names
    assert {t["threads"] for t in found["targets"]} == {1, 2}


def test_wrong_sizes_and_choices_are_refused(folder):
    with pytest.raises(UsageError, match="at least 9x9"):
        timed.bench(folder, 8, 100, 3)
    run = CliRunner().invoke(patchlab, ["bench", "--size", "64x48"])
    assert run.exit_code != 0
    run = CliRunner().invoke(patchlab, ["bench", str(folder), "--cases"])
    assert run.exit_code != 0


def test_the_fixed_cases_are_what_they_say():
    found = {bank.name: (bank, what) for bank, what in timed.fixed_cases()}
    assert plan_of(found["a"][0]).multiplies == 495
    assert plan_of(found["a"][0]).kind == "parity"
    assert (len(found["b"][0]), found["b"][0].size) == (32, 15)
    assert plan_of(found["b"][0]).kind == "tile FFT"
    assert (len(found["c"][0]), found["c"][0].size) == (24, 9)
    assert plan_of(found["c"][0]).kind == "parity"
    assert plan_of(found["edges"][0]).kind == "parity"
    sizes = [b.size for b, _ in timed.fixed_cases() if b.name.startswith("size_")]
    assert sizes == [7, 9, 11, 15, 21, 31]
