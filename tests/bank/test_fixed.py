"""Fixed point: kernels without DC stay so, nothing overflows, the error bound is reached."""

from __future__ import annotations

import numpy as np
import pytest
from hypothesis import given, settings
from hypothesis import strategies as st

from patchlab.bank import reference
from patchlab.bank.fixed import CODE_LIMIT, LIMIT, fixed_point
from patchlab.bank.plan import make_plan
from patchlab.bank.products import uses_of
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank

BANKS = {
    "pairs": lattice_bank(
        families=("gd1", "gd2"), widths=((2.0, 3.0),), strength="energy", count=4
    ),
    "two scales": lattice_bank(count=4, pixels="Mono12", kind="stabilised", border="zero"),
    "arbitrary": random_bank(5, 7),
    "arbitrary, 10 bits": random_bank(3, 5, seed=3, pixels="Mono10", border="wrap"),
}


def fixed_of(bank, kind="auto", finer=0):
    d = make_plan(bank, kind).detail
    return fixed_point(
        bank, d["bases"], d["coefficients"], d["sums"], d["product_groups"], finer=finer
    )


@pytest.mark.parametrize("name", BANKS)
@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_responses_stay_within_the_bound(name, kind):
    bank = BANKS[name]
    fixed = fixed_of(bank, kind)
    pixels = picture((bank.size + 9, 41), bank.contract.pixels)
    counts, ends = fixed.counts(pixels)
    step = np.array(fixed.step)[:, None, None]
    error = np.abs(counts * step - reference.responses(bank, pixels)).max(axis=(1, 2))
    assert (error <= fixed.bound).all()
    assert ends == 0


@pytest.mark.parametrize("name", BANKS)
def test_the_worst_picture_reaches_what_the_taps_are_off_by(name):
    bank = BANKS[name]
    fixed = fixed_of(bank)
    low, high = float(bank.table.values.min()), float(bank.table.values.max())
    c = bank.radius
    for k in range(len(bank)):
        e = fixed.tap_error[k]
        for most in (True, False):
            pixels = fixed.worst(k, bank.table.values, most).astype(bank.contract.format.dtype)
            count = fixed.counts(pixels)[0][k, c, c] * fixed.step[k]
            error = count - reference.responses(bank, pixels)[k, c, c]
            plus, minus = (high, low) if most else (low, high)
            taps = plus * e[e > 0].sum() + minus * e[e < 0].sum()
            assert abs(error) <= fixed.bound[k]
            # the rest of the bound is the rounding of codes and of the count
            values, codes = bank.table.values.astype(float), fixed.codes.astype(float)
            per_value = CODE_LIMIT / values.max() if (values != codes).any() else 1.0
            reach = np.abs(bank.taps[k] + e).sum()
            room = 0.5 * fixed.step[k] + reach * np.abs(codes / per_value - values).max()
            assert abs(error - taps) <= room * (1 + 1e-3)


@pytest.mark.parametrize("pixels", ["Mono8", "Mono10", "Mono12"])
@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_kernels_without_dc_sum_to_exactly_zero(pixels, kind):
    bank = lattice_bank(families=("gd1", "gd2"), count=8, strength="energy", pixels=pixels)
    assert abs(bank.taps.astype(float).sum(axis=(1, 2))).max() < 1e-5
    fixed = fixed_of(bank, kind)
    assert (fixed.taps.sum(axis=(1, 2)) == 0).all()
    flat = np.full((bank.size, bank.size), bank.contract.format.full_scale)
    assert (fixed.counts(flat.astype(bank.contract.format.dtype))[0] == 0).all()


def test_plain_rounding_would_leave_a_mean():
    # measured on 15 x 15 Gabors: sums of +7 to -9 counts; so the balance has something to do
    bank = lattice_bank(families=("gd2",), count=8, strength="line")
    fixed = fixed_of(bank, "direct")
    plain = np.rint(bank.taps / np.float64(np.abs(bank.taps).max()) * 127)
    assert (plain.sum(axis=(1, 2)) != 0).any()
    assert (fixed.taps.sum(axis=(1, 2)) == 0).all()


@pytest.mark.parametrize("name", BANKS)
@pytest.mark.parametrize("kind", ["direct", "parity"])
def test_no_partial_sum_can_leave_32_bits(name, kind):
    fixed = fixed_of(BANKS[name], kind)
    most = int(np.abs(fixed.codes.astype(int)).max())
    assert 4 * most <= LIMIT
    for terms in fixed.sums:
        total = 0
        for p, _ in terms:
            part = fixed.coefficients[p].astype(np.int64)
            total += int((np.abs(part) * uses_of(fixed.bases[p], part.shape)).sum())
        assert total * most + 2**15 < 2**31
    assert max(int(np.abs(c.astype(int)).max()) for c in fixed.coefficients) <= LIMIT


@pytest.mark.parametrize("name", BANKS)
def test_the_largest_response_nearly_fills_the_range(name):
    bank = BANKS[name]
    fixed = fixed_of(bank)
    biggest = 0
    for k in range(len(bank)):
        for sign in (1, -1):
            light = sign * fixed.taps[k] > 0
            values = bank.table.values
            pixels = np.where(light, values.argmax(), values.argmin())
            counts, ends = fixed.counts(pixels.astype(bank.contract.format.dtype))
            assert ends == 0
            biggest = max(biggest, int(np.abs(counts[k, bank.radius, bank.radius]).max()))
    assert LIMIT / 2 - 2 <= biggest < LIMIT


def test_saturation_is_counted_when_finer_counts_are_asked_for():
    bank = BANKS["arbitrary"]
    fixed = fixed_of(bank, finer=4)
    assert any(fixed.clips)
    k = int(np.argmax(fixed.clips))
    pixels = np.where(fixed.taps[k] > 0, 255, 0).astype(np.uint8)
    counts, ends = fixed.counts(pixels)
    assert counts.max() == LIMIT
    assert ends == int((np.abs(counts.astype(int)) == LIMIT).sum()) > 0
    assert fixed.step[k] == pytest.approx(fixed_of(bank).step[k] / 16)


@given(st.integers(0, 2**32 - 1))
@settings(max_examples=20, deadline=None)
def test_negative_sums_are_rounded_halves_upwards(seed):
    taps = np.random.default_rng(seed).integers(-9, 10, (1, 3, 3)).astype(float)
    fixed = fixed_of(given_bank(taps))
    pixels = picture((4, 5), seed=seed % 1000)
    counts, _ = fixed.counts(pixels)
    padded = np.pad(pixels.astype(np.int64), 1, mode="reflect")
    b = fixed.shift[0]
    for y in range(4):
        for x in range(5):
            total = int((fixed.taps[0] * padded[y : y + 3, x : x + 3]).sum())
            assert counts[0, y, x] == np.floor((total + (2**b) // 2) / 2**b)


@pytest.mark.parametrize("pixels", ["Mono16", "float32"])
def test_pixels_of_more_than_12_bits_have_none(pixels):
    assert make_plan(random_bank(pixels=pixels)).detail["fixed"] is None


def test_zero_kernels_give_zero():
    fixed = fixed_of(given_bank(np.zeros((2, 3, 3))))
    assert (fixed.counts(picture((4, 4)))[0] == 0).all()
    assert fixed.bound[0] < 1
