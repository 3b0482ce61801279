"""The cost model: counts, prices, fitting, and plans that say what chose them."""

from __future__ import annotations

import dataclasses
from dataclasses import replace

import numpy as np
import pytest

from patchlab.bank import read_bank, write_bank
from patchlab.bank.candidates import KINDS
from patchlab.bank.costs import CHUNK, STANDING, Costs, Work, fitted, read_costs
from patchlab.bank.plan import make_plan
from patchlab.errors import InputError
from patchlab.export import c99
from patchlab.settings import Settings
from tests.bank.banks import lattice_bank, random_bank
from tests.bank.test_separable import round_gabors


def test_loads_are_counted_by_hand():
    # five kernels of 7 x 7 are one group: 49 values, 5 products kept, read at the joins, 5 planes
    plan = make_plan(random_bank(5, 7), "direct")
    assert plan.loads == 49 + 5 + 5
    assert plan.detail["work"].stores == 5 + 5
    assert plan.adds == 5 * 48
    # seven kernels are two groups, which load the same values each
    assert make_plan(random_bank(7, 7), "direct").loads == 2 * 49 + 7 + 7


def test_a_separable_kernel_is_counted_by_hand():
    taps = np.outer([1.0, 2, 5, 1, 3], [1.0, -1, 2, 7, 1])
    plan = make_plan(replace(random_bank(1, 5), taps=taps[None].astype(np.float32)), "separable")
    wide = 80 / CHUNK  # a chunk and its halo, in whole vectors
    assert plan.multiplies == 5 * wide + 5
    assert plan.adds == 4 * wide + 4
    assert plan.loads == 5 * wide + 5 + 1 + 1


def test_the_chunk_is_the_one_of_the_c_source():
    assert CHUNK == c99.CHUNK


def test_prices_are_found_again():
    draw = np.random.default_rng(3)
    true = Costs(0.01, 0.004, 0.02, 0.3, 0.015, 1.2)
    work = [
        Work(m, m + a, n, s, t)
        for m, a, n, s, t in draw.uniform(1, 400, (30, 5)) * draw.choice([0, 1], (30, 5))
    ]
    found, error = fitted(work, [true.time(w) for w in work])
    assert error < 1e-9
    for f in dataclasses.fields(Costs):
        assert getattr(found, f.name) == pytest.approx(getattr(true, f.name), rel=1e-6)


def test_no_price_is_negative():
    draw = np.random.default_rng(4)
    work = [Work(*row) for row in draw.uniform(1, 100, (20, 5))]
    found, error = fitted(work, draw.uniform(1, 2, 20))
    assert error > 0
    assert min(found.plain().values()) >= 0


@pytest.mark.parametrize(
    "given",
    [
        None,
        [],
        {},
        {**STANDING.plain(), "more": 1.0},
        {**STANDING.plain(), "load": -1.0},
        {**STANDING.plain(), "load": float("nan")},
        {**STANDING.plain(), "load": True},
        {**STANDING.plain(), "load": "0.1"},
    ],
)
def test_what_is_no_prices_is_refused(given):
    with pytest.raises(InputError, match="price"):
        read_costs(given, "file")
    assert read_costs(STANDING.plain(), "file") == STANDING


def test_prices_choose_and_the_plan_records_them(tmp_path):
    bank = round_gabors(15)
    cheap = make_plan(bank)
    assert cheap.kind == "tile FFT"
    dear = replace(STANDING, transform=10.0)
    other = make_plan(bank, costs=dear)
    assert other.kind == "separable"
    write_bank(tmp_path / "bank", bank, other)
    _, plan, head = read_bank(tmp_path / "bank")
    assert plan.kind == other.kind
    assert plan.detail["costs"] == dear
    assert head["plan"]["prices_ns"] == dear.plain()


@pytest.mark.parametrize("bank", [random_bank(16, 11), round_gabors(21), lattice_bank()])
def test_auto_is_never_dearer_than_what_is_as_exact(bank):
    auto = make_plan(bank)
    for kind in ("direct", "parity"):
        assert auto.detail["expected_ns"] <= make_plan(bank, kind).detail["expected_ns"] * 1.001


def test_the_option_knows_every_kind():
    field = next(f for f in dataclasses.fields(Settings) if f.name == "plan")
    assert set(field.metadata["choices"]) == set(KINDS)
