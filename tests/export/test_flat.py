"""Edges above a threshold: what is skipped changes nothing that reaches it."""

from __future__ import annotations

from dataclasses import replace

import numpy as np
import pytest
from scipy import ndimage

from patchlab.bank import reference
from patchlab.bank.flat import flat_bound
from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan, strength_members
from patchlab.edges.thin import thin
from patchlab.errors import InputError, UsageError
from patchlab.export import c99
from patchlab.export.build import STRICT, compile_library
from patchlab.store import sha256
from tests.bank.banks import lattice_bank, picture


def native(bank, flags=("-O1",)):
    plan = make_plan(bank)
    library = compile_library(c99.emit(bank, plan), bank.name, flags=(*STRICT, *flags))
    return NativeBank(bank, plan, library, sha256(library))


def backlit(shape, seed=0, top=255):
    """Two dark parts before a clipped background, with noise on the parts."""
    draw = np.random.default_rng(seed)
    y, x = np.mgrid[: shape[0], : shape[1]]
    part = (y - shape[0] / 2) ** 2 + (x - 60) ** 2 < 20**2
    part |= (abs(y - 30) < 9) & (abs(x - shape[1] + 50) < 30)
    out = np.full(shape, top, dtype=np.int64)
    out[part] = np.clip(draw.normal(top * 0.1, top * 0.01, int(part.sum())), 0, top)
    return out.astype(np.uint8 if top < 256 else np.uint16)


BANKS = {
    "step": lattice_bank("step", count=4, size=9),
    "energy": lattice_bank(
        "energy", families=("gd1", "gd2"), widths=((1.2, 2.0),), count=4, size=7,
        strength="energy", border="zero", pixels="Mono12", kind="stabilised",
    ),
    "line": lattice_bank(
        "line", families=("gd2",), widths=((1.2, 2.0),), count=4, size=7, strength="line",
        border="edge",
    ),
}  # fmt: skip


@pytest.fixture(scope="module", params=BANKS)
def compiled(request):
    """A bank, compiled."""
    bank = BANKS[request.param]
    return bank, native(bank)


def test_everything_that_reaches_the_threshold_is_the_same(compiled):
    bank, fast = compiled
    top = bank.contract.format.full_scale
    pixels = backlit((97, 400), top=top)
    for scale in range(len(bank.scales)):
        strength, turn = fast.edges(pixels, scale)
        for threshold in (0.02 * strength.max(), 0.3 * strength.max()):
            above, winner, skipped = fast.edges_above(pixels, scale, threshold)
            near = ndimage.binary_dilation(strength >= threshold, np.ones((3, 3)))
            np.testing.assert_array_equal(above[near], strength[near])
            np.testing.assert_array_equal(winner[near], turn[near])
            same = (above == strength) & (winner == turn)
            assert (same | ((above == 0) & (winner == 0))).all()
            assert 0 < skipped < pixels.size
            assert (~same).sum() <= skipped


def test_thinning_gives_the_same_edges(compiled):
    bank, fast = compiled
    pixels = backlit((97, 400), top=bank.contract.format.full_scale)
    strength, turn = fast.edges(pixels, 0)
    angles = np.array([k.parameters["theta_rad"] for k in bank.kernels[:4]])
    threshold = float(0.1 * strength.max())
    above, winner, skipped = fast.edges_above(pixels, 0, threshold)
    kept = thin(strength, turn, angles) & (strength >= threshold)
    np.testing.assert_array_equal(thin(above, winner, angles) & (above >= threshold), kept)
    assert kept.sum() > 50
    assert skipped > 0.3 * pixels.size


def test_bands_threads_and_addresses_skip_the_same(compiled):
    bank, fast = compiled
    pixels = backlit((97, 400), top=bank.contract.format.full_scale)
    whole, turn, skipped = fast.edges_above(pixels, 0, 9.0)
    total = 0
    for first, count in [(0, 1), (1, 50), (51, 46)]:
        part, winner, some = fast.edges_above(pixels, 0, 9.0, rows=(first, count))
        np.testing.assert_array_equal(part, whole[first : first + count])
        np.testing.assert_array_equal(winner, turn[first : first + count])
        total += some
    assert total == skipped
    again, _, some = fast.edges_above(pixels, 0, 9.0, threads=3)
    np.testing.assert_array_equal(again, whole)
    assert some == skipped


def test_a_threshold_of_nothing_skips_nothing(compiled):
    _, fast = compiled
    pixels = np.full((40, 80), 77, fast.bank.contract.format.dtype)
    for threshold in (0.0, -1.0, np.nan):
        strength, _, skipped = fast.edges_above(pixels, 0, threshold)
        assert skipped == 0
        np.testing.assert_array_equal(strength, fast.edges(pixels, 0)[0])
    assert fast.edges_above(pixels, 0, 1e30)[2] == pixels.size


@pytest.mark.parametrize("seed", range(3))
def test_pictures_wider_than_a_tile_and_random_blocks(seed):
    bank = lattice_bank("tiles", count=2, size=31, widths=((3.0, 4.0),))
    fast = native(bank)
    draw = np.random.default_rng(seed)
    coarse = draw.choice([0, 0, 0, 200, 255], (5, 25)).astype(np.uint8)
    pixels = np.kron(coarse, np.ones((10, 140), np.uint8))[:47, :3333]
    assert pixels.shape[1] > 2 * (c99.RING_BYTES // (4 * bank.size))
    strength, _ = fast.edges(pixels, 0)
    threshold = float(np.quantile(strength, 0.9))
    above, _, skipped = fast.edges_above(pixels, 0, threshold)
    near = ndimage.binary_dilation(strength >= threshold, np.ones((3, 3)))
    np.testing.assert_array_equal(above[near], strength[near])
    assert skipped > 0


@pytest.mark.parametrize("lanes", [1, 4, 8])
def test_every_instruction_set_skips_the_same(lanes):
    bank = BANKS["step"]
    pixels = backlit((61, 300))
    one, other = native(bank), native(bank, ("-O1", f"-D{bank.name}_MAX_LANES={lanes}"))
    assert one.edges_above(pixels, 0, 5.0)[2] == other.edges_above(pixels, 0, 5.0)[2] > 0


def test_float_pixels_are_never_skipped():
    bank = lattice_bank("floats", count=2, size=7, pixels="float32")
    fast = native(bank)
    pixels = np.zeros((20, 90), np.float32)
    pixels[10, 70] = np.nan
    strength, _, skipped = fast.edges_above(pixels, 0, 1e9)
    assert skipped == 0
    np.testing.assert_array_equal(strength, fast.edges(pixels, 0)[0])


def test_the_bound_holds_on_the_worst_window():
    for bank in BANKS.values():
        plan = make_plan(bank)
        values = bank.table.values.astype(float)
        for scale in range(len(bank.scales)):
            members = strength_members(bank, scale)
            w, d, e = flat_bound(bank, members, plan.error_bound)
            assert (w, d, e) == plan.detail["flat"][scale]
            reached = 0.0
            for _, *pair in members:
                kernels = [k for k in pair if k is not None]
                for low, high in ((0, 40), (30, 255), (200, 201)):
                    pixels = np.where(bank.taps[kernels[0]] > 0, high, low)
                    pixels = pixels.astype(bank.contract.format.dtype)
                    strength = reference.strength(bank, pixels, scale)[0]
                    c = bank.size // 2
                    bound = w * (values[high] - values[low]) + d * abs(values[low]) + e
                    assert strength[c, c] <= bound
                    reached = max(reached, float(strength[c, c] / bound))
            assert reached > 0.5  # and it is no idle one


def test_refused_arguments(compiled):
    bank, fast = compiled
    pixels = backlit((40, 200), top=bank.contract.format.full_scale)
    with pytest.raises(UsageError, match="no such scale"):
        fast.edges_above(pixels, 9, 1.0)
    with pytest.raises(UsageError, match="first_row"):
        fast.edges_above(pixels, 0, 1.0, rows=(39, 2))
    if bank.contract.pixels == "Mono12":
        pixels[39, 5] = 4096
        with pytest.raises(InputError, match="beyond the pixel format"):
            fast.edges_above(pixels, 0, 1.0)
        reach = bank.size // 2
        fast.edges_above(pixels, 0, 1.0, rows=(0, 39 - reach))
        with pytest.raises(InputError, match="beyond the pixel format"):
            fast.edges_above(pixels, 0, 1.0, rows=(0, 40 - reach))


def test_kernels_of_one_tap_and_of_a_whole_chunk():
    for size in (1, 3, 63, 65):
        taps = np.zeros((1, size, size), np.float32)
        taps[0, size // 2, 0], taps[0, size // 2, -1] = -1, 1
        bank = lattice_bank("corner", count=1, size=3)
        bank = replace(bank, kernels=bank.kernels[:1], taps=taps)
        fast = native(bank)
        for width in (size, size + 1, 130):
            pixels = picture((size + 2, max(width, size)))
            strength, _ = fast.edges(pixels, 0)
            above, _, _ = fast.edges_above(pixels, 0, float(np.median(strength)))
            near = ndimage.binary_dilation(strength >= np.median(strength), np.ones((3, 3)))
            np.testing.assert_array_equal(above[near], strength[near])
