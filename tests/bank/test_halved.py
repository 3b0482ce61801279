"""Half resolution: what is really computed, its worst picture, and when a plan takes it."""

from __future__ import annotations

import math

import numpy as np
import pytest
from scipy import ndimage, signal

from patchlab.bank import halved
from patchlab.bank.plan import describe, make_plan
from patchlab.bank.products import parity_parts, unfold
from patchlab.conventions import UNIT_ROUNDOFF
from patchlab.families import render
from tests.bank.banks import given_bank, random_bank


def smooth(size=31, su=3.0, sv=3.3, count=2, **about):
    taps = []
    for j in range(count):
        p = {"theta_rad": math.pi * (j + 0.3) / count, "sigma_u_px": su, "sigma_v_px": sv}
        taps.append(render("gd1", p, size))
    return given_bank(np.stack(taps), "smooth", **about)


def test_the_filters_are_the_published_ones():
    # Deslauriers & Dubuc 1989: four and six points
    np.testing.assert_array_equal(halved.interpolator(2) * 16, [-1, 9, 9, -1])
    np.testing.assert_array_equal(halved.interpolator(3) * 256, [3, -25, 150, 150, -25, 3])
    for p in halved.FLATNESS:
        taps = halved.interpolator(p)
        assert taps.sum() == 1
        np.testing.assert_array_equal(taps.astype(np.float32), taps)
        # polynomials of degree 2 P - 1 come through exactly
        at = np.arange(1 - p, p + 1)
        for degree in range(2 * p):
            assert taps @ (at.astype(float) ** degree) == pytest.approx(0.5**degree, abs=1e-9)
        # half band: the response at pi - w is one less that at w
        _, response = signal.freqz(halved.smoother(p), worN=64, include_nyquist=True)
        size = np.abs(response)
        np.testing.assert_allclose(size + size[::-1], 1, atol=1e-12)


def evaluated(small, flatness, pixels):
    """Half resolution by scipy, step by step: another way to the same numbers."""
    d, u = halved.smoother(flatness), halved.interpolator(flatness)
    low = ndimage.correlate1d(ndimage.correlate1d(pixels, d, axis=0), d, axis=1)[::2, ::2]
    q = ndimage.correlate(low, small)
    for axis in (0, 1):
        shape = list(q.shape)
        shape[axis] *= 2
        wide = np.zeros(shape)
        even, odd = [slice(None)] * 2, [slice(None)] * 2
        even[axis], odd[axis] = slice(0, None, 2), slice(1, None, 2)
        wide[tuple(even)] = q
        # the weights stand from 1 - P to P about the even one
        wide[tuple(odd)] = ndimage.correlate1d(q, u, axis=axis, origin=-1)
        q = wide
    return q


@pytest.mark.parametrize("flatness", halved.FLATNESS)
def test_the_phases_are_what_is_computed(flatness):
    draw = np.random.default_rng(flatness)
    small = draw.standard_normal((5, 5))
    phases = halved.computed(small, flatness)
    reach = phases.shape[-1] // 2
    assert reach == 4 + 4 * flatness - 2
    pixels = draw.standard_normal((96, 100))
    found = evaluated(small, flatness, pixels)
    for a, b in np.ndindex(2, 2):
        y, x = 46 + a, 50 + b
        seen = pixels[y - reach : y + reach + 1, x - reach : x + reach + 1]
        assert found[y, x] == pytest.approx(float((phases[a, b] * seen).sum()), rel=1e-9)


def test_the_fit_is_a_least_squares_fit():
    bank = smooth(15, 2.0, 2.0, 1)
    kernel, c, p, r = bank.taps[0].astype(float), 7, 2, 4
    parts = halved.small_kernels({0: parity_parts(kernel)}, p, r, c)[0]
    small = sum(unfold(part, basis, r) for basis, part in parts.items())

    def loss(taps):
        return float((halved.off_by(halved.computed(taps, p), kernel) ** 2).sum())

    draw = np.random.default_rng(0)
    for _ in range(8):
        step = draw.standard_normal(small.shape) * 1e-3 * np.abs(small).max()
        step -= step.mean()  # the mean is kept by a rule of its own
        assert loss(small + step) > loss(small)
    assert small.sum() == pytest.approx(kernel.sum(), abs=1e-12)


def test_mirrored_kernels_share_their_small_parts():
    one = smooth(count=1).taps
    bank = given_bank(np.concatenate([one, one[:, :, ::-1], one[:, ::-1]]), "smooth")
    plan = make_plan(bank, "halved")
    alone = make_plan(given_bank(one, "smooth"), "halved")
    found, single = plan.detail["halved"], alone.detail["halved"]
    assert found.kernels == (0, 1, 2)
    assert len(found.products) == len(single.products)


@pytest.mark.parametrize("border", ["mirror101", "zero"])
def test_the_worst_picture_reaches_the_bound(border):
    bank = smooth(border=border)
    found = make_plan(bank, "halved").detail["halved"]
    low, high = halved.extent(bank.table.values.astype(float), border)
    assert (low, high) == (0, 255)
    for k, bound in zip(found.kernels, found.bound, strict=True):
        phases = found.phases(k)
        error = halved.off_by(phases, bank.taps[k].astype(float))
        rows = [
            abs(float((error[a, b] * halved.worst(error[a, b], low, high, most)).sum()))
            for a, b in np.ndindex(2, 2)
            for most in (True, False)
        ]
        assert max(rows) == pytest.approx(halved.approximation(error, low, high))
        # the rest of the bound is the rounding of the sums
        rounding = halved.rounding(list(found.products), found.sums[k], found.flatness) * 255
        assert bound == pytest.approx(max(rows) + rounding)
        assert 0 < rounding < 1000 * UNIT_ROUNDOFF * np.abs(bank.taps[k]).sum() * 255
        draw = np.random.default_rng(k)
        for _ in range(20):  # and no other picture does more harm
            other = draw.choice([low, high], error.shape[-2:])
            assert np.abs((error * other).sum(axis=(-2, -1))).max() <= max(rows)


def test_negative_working_values_count():
    error = np.array([[[[1.0, -2.0]]]])
    assert halved.approximation(error, -3.0, 5.0) == 3 + 10
    assert halved.approximation(error, 0.0, 5.0) == 10
    assert halved.extent(np.array([2.0, 7.0]), "zero") == (0.0, 7.0)
    assert halved.extent(np.array([2.0, 7.0]), "wrap") == (2.0, 7.0)


def test_smooth_kernels_err_less_with_flatter_filters():
    bank = smooth(31, 3.0, 3.0, 1)
    split, every = {0: parity_parts(bank.taps[0].astype(float))}, {0: math.inf}
    bounds = [halved._halved(split, every, (0, 255), 15, p, 8).bound[0] for p in (2, 3, 4)]
    assert bounds[0] > 2 * bounds[1] > 2 * bounds[2]


def test_a_tolerance_lets_it_in_and_exactness_keeps_it_out():
    bank = smooth(31, 3.0, 3.3)
    assert make_plan(bank).detail["halved"] is None
    weight = np.abs(bank.taps).sum(axis=(1, 2)).max() * 255
    loose = make_plan(bank, tolerance=0.01 * weight)
    assert "half resolution" in loose.kind
    assert max(loose.error_bound) <= 0.01 * weight
    assert loose.detail["expected_ns"] < make_plan(bank).detail["expected_ns"]
    assert "kernels at half resolution" in describe(loose)
    # asked for by name it gives the most exact filter
    asked = make_plan(bank, "halved")
    assert max(asked.error_bound) <= max(loose.error_bound)


def test_kernels_that_it_would_spoil_stay():
    mixed = np.concatenate([smooth(count=2).taps, random_bank(2, 31).taps])
    plan = make_plan(given_bank(mixed), "halved")
    assert plan.detail["halved"].kernels == (0, 1)
    assert make_plan(random_bank(2, 9), "halved").detail["halved"] is None


def test_every_border_reaches_as_far_as_it_needs():
    for c in range(1, 17):
        for p, radius in halved.settings(c):
            assert c <= 2 * radius + 4 * p - 2 <= 2 * c
