"""The C of separable products and of half resolution: bounds, worst pictures, bands, sanitizers."""

from __future__ import annotations

from dataclasses import replace

import numpy as np
import pytest

from patchlab.bank import halved, reference
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.errors import InputError
from patchlab.export import c99
from patchlab.export.build import STRICT, compile_library, run_selftest
from patchlab.store import sha256
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank
from tests.bank.test_halved import smooth
from tests.bank.test_separable import round_gabors
from tests.export.test_c99 import SANITIZE, case

ONE = np.outer([1.0, -2, 0.5, 3, 1], [2.0, 1, -1, 0.5, 0.25])


def banks():
    """Separable products of every basis, of taps, of oblong support, and mixed with others."""
    mirrored = lattice_bank("mirrored", widths=((1.5, 1.5),), families=("gd1", "gd2"), size=9,
                            count=4, strength="energy")  # fmt: skip
    pointed = given_bank(
        np.concatenate([[np.pad(ONE[:3], ((2, 2), (1, 1)))], random_bank(2, 7).taps]), "pointed"
    )
    return {
        "mirrored": (mirrored, "separable"),
        "pointed": (pointed, "separable"),
        "float": (replace(round_gabors(9), name="round", table=random_bank(
            1, 3, pixels="float32").table), "separable"),
        "wide": (replace(smooth(25, 2.6, 3.0, 1), name="wide", border="edge"), "halved"),
    }  # fmt: skip


BANKS = banks()


def native(bank, kind, flags=("-O1",)):
    plan = make_plan(bank, kind)
    library = compile_library(c99.emit(bank, plan), bank.name, flags=flags)
    return plan, NativeBank(bank, plan, library, sha256(library))


@pytest.mark.parametrize("name", BANKS)
def test_compiles_clean_and_passes_its_selftest(name):
    bank, kind = BANKS[name]
    plan = make_plan(bank, kind)
    assert {"separable": "separable", "halved": "half resolution"}[kind] in plan.kind
    shapes = {"smallest": (bank.size, bank.size), "wide": (bank.size + 2, 131)}
    cases = [case(bank, plan, label, shape) for label, shape in shapes.items()]
    files = c99.emit(bank, plan) | c99.emit_selftest(bank, plan, cases)
    if name in ("mirrored", "float"):
        result = run_selftest(files, bank.name, flags=(*STRICT, "-O1"))
        assert result.passed, result.output
        return
    for lanes, flags in ((1, SANITIZE), (4, ("-O1",)), (8, ("-O1",)), (16, SANITIZE)):
        result = run_selftest(
            files, bank.name, flags=(*STRICT, *flags, f"-D{bank.name}_MAX_LANES={lanes}")
        )
        assert result.passed, result.output


@pytest.fixture(scope="module")
def wide():
    """Kernels at half resolution, compiled."""
    bank = smooth(border="mirror101")
    return bank, *native(bank, "halved", ("-O2",))


@pytest.mark.parametrize("border", ["zero", "edge", "mirror101", "mirror", "wrap"])
def test_half_resolution_for_every_border(border):
    bank = smooth(25, 2.6, 3.0, 1, border=border)
    plan, fast = native(bank, "halved")
    assert plan.detail["halved"].kernels == (0,)
    for shape in ((25, 25), (26, 140), (90, 31)):
        pixels = picture(shape)
        error = np.abs(fast.responses(pixels) - reference.responses(bank, pixels)).max()
        assert error <= plan.error_bound[0]
        # the bound is for the worst picture: noise is far within, a wrong phase would not be
        assert error <= 0.7 * plan.error_bound[0]


def test_the_worst_picture_comes_near_the_bound(wide):
    bank, plan, fast = wide
    found = plan.detail["halved"]
    reach = found.reach
    for k in found.kernels:
        phases = found.phases(k)
        error = halved.off_by(phases, bank.taps[k].astype(float))
        errors = []
        for a, b in np.ndindex(2, 2):
            y, x = 70 + a, 64 + b
            for most in (True, False):
                pixels = np.zeros((141, 150), np.uint8)
                at = slice(y - reach, y + reach + 1), slice(x - reach, x + reach + 1)
                pixels[at] = halved.worst(error[a, b], 0, 255, most)
                rest = fast.responses(pixels)[k, y, x] - reference.responses(bank, pixels)[k, y, x]
                errors.append(abs(float(rest)))
        assert max(errors) <= plan.error_bound[k]
        assert max(errors) > 0.95 * plan.error_bound[k]


def test_bands_give_the_same_bits(wide):
    _, _, fast = wide
    pixels = picture((150, 333))
    whole = fast.responses(pixels)
    for first, count in [(0, 1), (0, 150), (149, 1), (63, 2), (64, 64), (37, 90)]:
        band = fast.responses(pixels, rows=(first, count))
        np.testing.assert_array_equal(band, whole[:, first : first + count])
    for threads in (2, 3):
        np.testing.assert_array_equal(fast.responses(pixels, threads=threads), whole)
    shifted = np.empty((len(whole), 150, 400), np.float32)[:, :, 5:338]
    np.testing.assert_array_equal(fast.responses(pixels, out=shifted), whole)


def test_an_even_shift_of_the_picture_shifts_the_responses(wide):
    bank, _, fast = wide
    pixels = picture((140, 150))
    whole = fast.responses(pixels)
    part = fast.responses(pixels[2:, 4:])
    c = 2 * bank.size
    np.testing.assert_array_equal(part[:, c:-c, c:-c], whole[:, 2 + c : -c, 4 + c : -c])


def test_a_flat_picture_stays_flat_and_bad_codes_are_found(wide):
    bank, plan, fast = wide
    flat = fast.responses(np.full((60, 70), 200, np.uint8))
    assert np.abs(flat).max() <= 1e-5 * np.abs(bank.taps).sum(axis=(1, 2)).max() * 200
    twelve = smooth(25, 2.6, 3.0, 1, pixels="Mono12")
    _, code = native(twelve, "halved")
    pixels = picture((100, 40), "Mono12")
    pixels[99, 39] = 4096
    with pytest.raises(InputError, match="beyond the pixel format"):
        code.responses(pixels)
    code.responses(pixels, rows=(0, 60))
    assert plan.detail["fixed"] is not None


def test_separable_strengths_agree_with_the_oracle():
    bank, kind = BANKS["mirrored"]
    plan, fast = native(bank, kind)
    pixels = picture((40, 150))
    found, _ = fast.edges(pixels, 0)
    expected, _ = reference.strength(bank, pixels, 0)
    assert np.abs(found - expected).max() <= 2 * max(plan.error_bound)
    error = np.abs(fast.responses(pixels) - reference.responses(bank, pixels)).max(axis=(1, 2))
    assert (error <= plan.error_bound).all()
    for first, count in [(0, 1), (7, 30)]:
        band = fast.responses(pixels, rows=(first, count))
        np.testing.assert_array_equal(band, fast.responses(pixels)[:, first : first + count])
