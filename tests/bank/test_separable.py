"""Separable products: exact where the rank is low, refused where it is not, bounded in between."""

from __future__ import annotations

import math

import numpy as np
import pytest

from patchlab.bank import apply, reference
from patchlab.bank.plan import describe, make_plan, rebuilt_taps
from patchlab.bank.products import Product, uses_of
from patchlab.bank.separable import rank_one, separable_terms
from patchlab.errors import UsageError
from patchlab.families import render
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank


def round_gabors(size=11, count=3, aspect=1.0):
    """Gabors of one envelope; with a round one each is exactly two separable products."""
    taps = []
    for j in range(count):
        p = {"theta_rad": math.pi * (j + 0.3) / count, "frequency_cpp": 0.12, "phase_rad": 0.4}
        p |= {"sigma_u_px": size / 6, "sigma_v_px": aspect * size / 6}
        taps.append(render("gabor", p, size))
    return given_bank(np.stack(taps))


def whole(matrix, basis="all"):
    return Product(basis, matrix, matrix.astype(np.float32))


@pytest.mark.parametrize(("aspect", "rank"), [(1.0, 2), (1.5, 5)])
def test_a_round_gabor_has_rank_two_and_others_do_not(aspect, rank):
    # Eckart & Young 1936; the ranks are computed here, not quoted
    taps = round_gabors(21, 1, aspect).taps[0].astype(float)
    values = np.linalg.svd(taps, compute_uv=False)
    assert (values > 1e-3 * values[0]).sum() >= rank
    terms = separable_terms(whole(taps), 1e-5 * np.abs(taps).sum(), most=2)
    assert len(terms) == (2 if rank == 2 else 0)


def test_the_rank_one_matrix_is_found_and_its_rounding_made_good():
    draw = np.random.default_rng(1)
    column, row = draw.standard_normal(9), draw.standard_normal(7)
    found = rank_one(np.outer(column, row))
    made = np.outer(*(f.astype(float) for f in found))
    np.testing.assert_allclose(made, np.outer(column, row), rtol=3e-7)
    # two terms: the second also carries what rounding the first one left
    second = np.outer(draw.standard_normal(9), draw.standard_normal(7))
    taps = np.outer(column, row) + second
    terms = separable_terms(whole(taps), 1e-6 * np.abs(taps).sum())
    total = sum(t.rounded for t in terms)
    np.testing.assert_allclose(total, taps, atol=1e-6)
    np.testing.assert_array_equal(terms[0].rounded, terms[0].exact)
    np.testing.assert_allclose(terms[0].rounded + terms[1].exact, taps, atol=1e-15)


def test_the_residual_is_what_is_allowed_or_nothing_is_taken():
    taps = round_gabors(15, 1, 1.2).taps[0].astype(float)
    for share in (1e-1, 1e-2, 1e-3, 1e-6):
        terms = separable_terms(whole(taps), share * np.abs(taps).sum())
        if terms:
            left = taps - sum(t.rounded for t in terms)
            assert np.abs(left).sum() <= share * np.abs(taps).sum()
    assert not separable_terms(whole(taps), 1e-6 * np.abs(taps).sum())


def test_nothing_that_saves_no_multiplies():
    assert separable_terms(whole(np.ones((2, 2))), 1.0) == ()
    assert separable_terms(whole(np.ones((1, 9))), 1.0) == ()
    assert len(separable_terms(whole(np.ones((3, 3))), 1e-6)) == 1


@pytest.mark.parametrize("kind", ["separable", "auto"])
def test_a_plan_computes_the_banks_own_kernels(kind):
    bank = round_gabors(9)
    plan = make_plan(bank, kind)
    assert "separable" in plan.kind
    assert plan.multiplies < make_plan(bank, "parity").multiplies / 1.5
    for rebuilt, taps in zip(rebuilt_taps(plan, bank.size), bank.taps, strict=True):
        np.testing.assert_allclose(rebuilt, taps, rtol=0, atol=4e-7 * np.abs(taps).max())


def test_the_bound_holds_and_is_no_larger_than_that_of_the_taps():
    bank = round_gabors()
    plan = make_plan(bank, "separable")
    assert max(plan.error_bound) <= max(make_plan(bank, "direct").error_bound)
    for pixels in (picture((31, 40)), np.where(picture((31, 40)) > 127, 255, 0).astype(np.uint8)):
        found = apply.responses(bank, pixels, plan)
        error = np.abs(found - reference.responses(bank, pixels)).max(axis=(1, 2))
        assert (error <= plan.error_bound).all()


def test_the_residual_is_in_the_bound():
    bank = round_gabors(15, 2, 1.1)
    room = 0.1 * np.abs(bank.taps).sum(axis=(1, 2)).min() * 255
    exact, loose = make_plan(bank, "separable"), make_plan(bank, "separable", tolerance=room)
    assert loose.multiplies < exact.multiplies
    assert max(exact.error_bound) < max(loose.error_bound) <= room
    for k, rebuilt in enumerate(rebuilt_taps(loose, bank.size)):
        off = rebuilt - bank.taps[k].astype(float)
        # the picture that shows the largest value where the kernel is too large
        pixels = np.where(off > 0, 255, 0).astype(np.uint8)
        c = bank.size // 2
        error = apply.responses(bank, pixels, loose)[k, c, c]
        error -= reference.responses(bank, pixels)[k, c, c]
        assert abs(error) <= loose.error_bound[k]
        assert abs(error) > loose.error_bound[k] / 20


def test_parts_that_kernels_share_stay_shared():
    kernel = round_gabors(11, 1).taps
    mirrored = given_bank(np.concatenate([kernel, kernel[:, :, ::-1], -kernel]))
    one = make_plan(given_bank(kernel), "separable")
    assert make_plan(mirrored, "separable").multiplies == one.multiplies


def test_kernels_of_a_strength_stay_whole_unless_it_is_asked_for():
    bank = lattice_bank(widths=((2.0, 2.0),), size=21)
    assert make_plan(bank).kind == "parity"
    asked = make_plan(bank, "separable")
    assert asked.kind == "separable"
    assert asked.multiplies < make_plan(bank).multiplies / 2
    assert "column times row" in describe(asked)
    pixels = picture((30, 41))
    strength, turn = apply.strength(bank, pixels, 0, asked)
    expected, winner = reference.strength(bank, pixels, 0)
    assert np.abs(strength - expected).max() <= max(asked.error_bound)
    assert (turn == winner).mean() > 0.99


def test_fixed_point_keeps_whole_products():
    bank = round_gabors()
    plan = make_plan(bank, "separable")
    fixed = plan.detail["fixed"]
    pixels = picture((20, 25))
    counts, _ = fixed.counts(pixels)
    error = np.abs(np.array(fixed.step)[:, None, None] * counts
                   - reference.responses(bank, pixels))  # fmt: skip
    assert (error.max(axis=(1, 2)) <= fixed.bound).all()


def test_full_rank_stays_as_it_is():
    assert make_plan(random_bank(3, 9), "separable").kind == "direct"


def test_uses_count_in_the_residual():
    taps = np.diag([1.0, 1e-3, 1e-3, 1e-3])
    weight = float((np.abs(taps - np.diag([1, 0, 0, 0])) * uses_of("ee", (4, 4))).sum())
    assert separable_terms(whole(taps, "ee"), weight * 0.99, most=1) == ()
    assert len(separable_terms(whole(taps, "ee"), weight * 1.01, most=1)) == 1


def test_a_wrong_tolerance_is_refused():
    for tolerance in (-1.0, math.nan, math.inf):
        with pytest.raises(UsageError, match="tolerance"):
            make_plan(random_bank(1, 3), tolerance=tolerance)
