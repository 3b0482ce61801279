"""Plans: exact sharing, counted work, error bounds that hold."""

from __future__ import annotations

from dataclasses import replace

import numpy as np
import pytest
from hypothesis import given, settings
from hypothesis import strategies as st

from patchlab.bank.plan import describe, make_plan, parity_parts, rebuilt_taps, strength_members
from patchlab.conventions import UNIT_ROUNDOFF, gamma
from patchlab.errors import UsageError
from tests.bank.banks import given_bank, lattice_bank, random_bank, table


def bank_a():
    """16 kernels of 11 x 11, 8 orientations, odd and even."""
    return lattice_bank(families=("gd1", "gd2"), widths=((2.0, 3.0),), strength="energy")


def test_mirrored_kernels_need_a_quarter_of_the_multiplies():
    # even: 2 x 36 + 3 x (36 + 25); odd: 2 x 30 + 3 x (30 + 30)
    assert make_plan(bank_a(), "direct").multiplies == 16 * 121 == 1936
    assert make_plan(bank_a(), "parity").multiplies == 495
    assert make_plan(bank_a()).kind == "parity"


def test_kernels_without_symmetry_stay_direct():
    bank = random_bank(5, 7)
    assert make_plan(bank).kind == "direct"
    assert make_plan(bank).multiplies == make_plan(bank, "parity").multiplies == 5 * 49
    assert make_plan(bank, "parity").adds > make_plan(bank, "direct").adds


def test_one_bank_may_hold_both():
    mirrored = lattice_bank(widths=((1.5, 2.0),), size=7).taps
    mixed = given_bank(np.concatenate([mirrored, random_bank(2, 7).taps]))
    plan = make_plan(mixed)
    assert {"all", "eo", "oe"} == set(plan.detail["bases"])
    assert plan.multiplies < make_plan(mixed, "parity").multiplies + 1
    assert plan.adds < make_plan(mixed, "parity").adds


def test_sharing_needs_the_symmetry_bit_for_bit():
    bank = bank_a()
    taps = bank.taps.copy()
    taps[1] = np.nextafter(taps[1], np.float32(1))
    assert make_plan(replace(bank, taps=taps), "parity").multiplies > 495


@pytest.mark.parametrize("kind", ["auto", "direct", "parity"])
@pytest.mark.parametrize("bank", [bank_a(), random_bank(4, 9), random_bank(2, 1), lattice_bank()])
def test_a_plan_computes_the_banks_own_kernels(bank, kind):
    plan = make_plan(bank, kind)
    for rebuilt, taps in zip(rebuilt_taps(plan, bank.size), bank.taps, strict=True):
        room = 4 * UNIT_ROUNDOFF * np.abs(bank.taps).max()
        np.testing.assert_allclose(rebuilt, taps, rtol=0, atol=room if kind != "direct" else 0)


@given(st.integers(0, 4), st.integers(0, 2**32 - 1))
@settings(max_examples=30, deadline=None)
def test_parts_add_up_to_the_kernel(radius, seed):
    kernel = np.random.default_rng(seed).integers(-99, 99, (2 * radius + 1,) * 2).astype(float)
    parts = parity_parts(kernel)
    assert sum(p.size for p in parts.values()) == kernel.size
    y, x = np.mgrid[-radius : radius + 1, -radius : radius + 1]
    total = np.zeros_like(kernel)
    for basis, part in parts.items():
        rows = np.abs(y) - (basis[0] == "o")
        cols = np.abs(x) - (basis[1] == "o")
        sign = np.where(basis[0] == "o", np.sign(y), 1) * np.where(basis[1] == "o", np.sign(x), 1)
        inside = (rows >= 0) & (cols >= 0)
        total[inside] += (part[rows[inside], cols[inside]] * sign[inside]) if part.size else 0
    np.testing.assert_array_equal(total, kernel)


def test_the_direct_bound_is_the_textbook_one():
    bank = random_bank(3, 7, pixels="Mono12", kind="stabilised")
    plan = make_plan(bank, "direct")
    for bound, taps in zip(plan.error_bound, bank.taps, strict=True):
        sum_abs = np.abs(taps.astype(np.float64)).sum()
        assert bound == pytest.approx(gamma(49) * sum_abs * float(bank.table.values.max()))


def test_the_bound_grows_with_the_largest_working_value():
    small, large = random_bank(pixels="Mono8"), random_bank(pixels="Mono16")
    ratio = make_plan(large).error_bound[0] / make_plan(small).error_bound[0]
    assert ratio == pytest.approx(65535 / 255)


def test_the_parity_bound_is_tighter_on_mirrored_banks():
    bank = bank_a()
    parity, direct = (make_plan(bank, kind).error_bound for kind in ("parity", "direct"))
    assert all(0 < p < d for p, d in zip(parity, direct, strict=True))


def test_equal_and_zero_kernels_cost_nothing_more():
    taps = random_bank(1, 5).taps
    plan = make_plan(given_bank(np.concatenate([taps, -taps, 0 * taps])))
    assert plan.multiplies == 25
    assert plan.detail["sums"] == (((0, 1),), ((0, -1),), ())
    assert plan.error_bound[2] == 0


@pytest.mark.parametrize("strength", ["step", "line", "energy"])
def test_members_are_in_the_order_of_their_orientation(strength):
    bank = lattice_bank(families=("gd1", "gd2"), count=4, strength=strength)
    turns = strength_members(bank, 1)
    assert [turn for turn, _, _ in turns] == [0, 1, 2, 3]
    for turn, even, odd in turns:
        assert (even is None) == (strength == "step")
        assert (odd is None) == (strength == "line")
        for index, parity in ((even, "even"), (odd, "odd")):
            if index is not None:
                kernel = bank.kernels[index]
                assert (kernel.parity, kernel.scale, kernel.orientation) == (parity, 1, turn)


@pytest.mark.parametrize("strength", ["line", "energy"])
def test_a_scale_without_its_kernels_is_refused(strength):
    with pytest.raises(UsageError, match="even"):
        make_plan(replace(lattice_bank(), strength=strength))


def test_an_unknown_plan_is_refused():
    with pytest.raises(UsageError, match="unknown plan"):
        make_plan(lattice_bank(), "fast")


def test_a_person_can_read_it():
    text = describe(make_plan(bank_a()))
    assert "495 multiplies" in text
    assert "12 parts are shared" in text
    assert "even in y, odd in x" in text


def test_the_interface_number_follows_the_content():
    bank = lattice_bank()
    taps = bank.taps.copy()
    taps[3, 2, 2] *= 2
    others = [
        replace(bank, name="other"),
        replace(bank, border="wrap"),
        replace(bank, taps=taps),
        replace(bank, table=table("Mono8", "stabilised")),
    ]
    numbers = {make_plan(b).detail["abi"] for b in [bank, *others]}
    assert len(numbers) == 5
    assert make_plan(lattice_bank()).detail["abi"] == make_plan(bank).detail["abi"]
    assert all(0 < n < 2**31 for n in numbers)


@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_zeros_at_the_rim_cost_nothing(kind):
    wide = given_bank(np.pad(random_bank(3, 5).taps, ((0, 0), (3, 3), (3, 3))))
    plan = make_plan(wide, kind)
    assert plan.multiplies == 3 * 25
    assert plan.error_bound == make_plan(random_bank(3, 5), kind).error_bound
    for rebuilt, taps in zip(rebuilt_taps(plan, 11), wide.taps, strict=True):
        np.testing.assert_allclose(rebuilt, taps, rtol=0, atol=4 * UNIT_ROUNDOFF)


def test_oblong_support_is_cut_along_both_sides():
    taps = np.zeros((2, 9, 9))
    taps[0, 4, 1:8] = np.arange(7.0)
    taps[1, 3:6, 4] = (1.0, 5.0, 2.0)
    plan = make_plan(given_bank(taps), "direct")
    assert [c.shape for c in plan.detail["coefficients"]] == [(1, 7), (3, 1)]
    assert plan.multiplies == 10
    assert len(plan.detail["product_groups"]) == 2
