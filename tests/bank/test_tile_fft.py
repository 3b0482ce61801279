"""Tile transforms: their count, their bound, and when a plan takes them."""

from __future__ import annotations

import numpy as np
import pytest
from scipy import fft as scipy_fft

from patchlab.bank import apply, bank_from_taps, reference, tile_fft
from patchlab.bank.plan import describe, make_plan
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank


def in_float32(spectra, padded, width):
    """Columns through scipy's float32 transforms: an independent float32 evaluation."""
    h = spectra.shape[1]
    columns = scipy_fft.rfft(padded.astype(np.float32), axis=0)
    weights = spectra[..., 0] + 1j * spectra[..., 1]
    total = sum(weights[:, i, None] * columns[:, i : i + width] for i in range(h))
    return scipy_fft.irfft(total.astype(np.complex64), tile_fft.LENGTH, axis=0) * tile_fft.LENGTH


@pytest.mark.parametrize("size", [1, 5, 15, 33])
def test_spectra_make_correlations_within_the_bound(size):
    bank = random_bank(2, size)
    tiles = tile_fft.tile_fft(bank.taps, (0, 1))
    assert tiles.rows == 64 - size + 1
    draw = np.random.default_rng(2)
    padded = draw.choice([0.0, 255.0], (64, 20 + size - 1))
    for k, taps in enumerate(bank.taps.astype(float)):
        exact = sum(
            taps[j, i] * padded[j : j + tiles.rows, i : i + 20]
            for j in range(size)
            for i in range(size)
        )
        error = np.abs(in_float32(tiles.spectra[k], padded, 20)[: tiles.rows] - exact).max()
        assert error <= tile_fft.bound(taps, 255)
        # neither idle nor out of all proportion
        assert tile_fft.bound(taps, 255) < 3e-4 * np.abs(taps).sum() * 255


def test_the_bound_follows_scale_and_span():
    taps = random_bank(1, 9).taps[0].astype(float)
    assert tile_fft.bound(2 * taps, 10) == pytest.approx(2 * tile_fft.bound(taps, 10))
    assert tile_fft.bound(taps, 30) == pytest.approx(3 * tile_fft.bound(taps, 10))


def test_arbitrary_kernels_from_nine_pixels_go_by_tiles():
    for size, kind in ((5, "direct"), (7, "direct"), (11, "tile FFT"), (15, "tile FFT")):
        plan = make_plan(random_bank(16, size))
        assert plan.kind == kind
        assert plan.multiplies < 16 * size**2 + 1
    # 15 x 15: 225 multiplies a kernel directly
    assert make_plan(random_bank(32, 15)).multiplies < 32 * 60


def test_float_pixels_go_by_tiles_only_when_asked():
    # one value that is not a number would spoil a whole block
    bank = random_bank(16, 11, pixels="float32")
    assert make_plan(bank).kind == "direct"
    assert make_plan(bank, "fft").kind == "tile FFT"


def test_a_bank_that_makes_a_strength_keeps_its_products():
    bank = lattice_bank(size=21, widths=((2.0, 3.0),))
    assert make_plan(bank, "fft").detail["fft"] is None
    assert make_plan(bank).kind == "parity"


def test_one_plan_may_hold_parts_and_tiles():
    mirrored = lattice_bank(widths=((1.5, 2.0),), size=11).taps
    bank = given_bank(np.concatenate([mirrored, random_bank(6, 11).taps]))
    plan = make_plan(bank)
    assert {"parity", "tile FFT"} <= set(plan.kind.split(" and "))
    assert plan.detail["fft"].kernels == tuple(range(8, 14))
    assert "6 kernels of 11 x 11 by tile FFT" in describe(plan)
    pixels = picture((30, 31))
    error = np.abs(apply.responses(bank, pixels, plan) - reference.responses(bank, pixels))
    assert (error.max(axis=(1, 2)) <= plan.error_bound).all()


def test_kernels_larger_than_half_a_block_do_not():
    assert make_plan(random_bank(2, 35), "fft").detail["fft"] is None
    assert make_plan(random_bank(2, 3), "fft").kind == "tile FFT"


def test_learned_and_given_kernels_go_by_tiles_though_they_make_a_strength():
    taps = random_bank(8, 13).taps
    bank = bank_from_taps(taps, pixels="Mono8", name="given")
    assert bank.scales == (0,)
    plan = make_plan(bank)
    assert plan.kind == "tile FFT"
    assert len(plan.detail["strength"][0]) == 8  # by products, which stand by
    pixels = picture((30, 31))
    found, _ = apply.strength(bank, pixels, 0, plan)
    expected, _ = reference.strength(bank, pixels, 0)
    assert np.abs(found - expected).max() <= max(plan.error_bound)
