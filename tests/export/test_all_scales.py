"""All scales in one pass: the bits of each scale alone."""

from __future__ import annotations

import numpy as np
import pytest

from patchlab.bank.native import NativeBank
from patchlab.bank.plan import make_plan
from patchlab.errors import UsageError
from patchlab.export import c99
from patchlab.export.build import STRICT, compile_library
from patchlab.store import sha256
from tests.bank.banks import lattice_bank, picture, random_bank


def native(bank):
    plan = make_plan(bank)
    library = compile_library(c99.emit(bank, plan), bank.name, flags=(*STRICT, "-O1"))
    return NativeBank(bank, plan, library, sha256(library))


@pytest.fixture(scope="module")
def compiled():
    """Three scales of energy, two orientations each."""
    widths = ((1.0, 1.2), (1.2, 1.8), (1.5, 2.0))
    return native(
        lattice_bank("every", families=("gd1", "gd2"), count=2, size=9, widths=widths,
                     strength="energy")
    )  # fmt: skip


def test_each_scale_is_as_it_is_alone(compiled):
    pixels = picture((50, 333))
    strength, turn = compiled.edges_all(pixels)
    assert strength.shape == turn.shape == (3, 50, 333)
    for scale in range(3):
        alone, winner = compiled.edges(pixels, scale)
        np.testing.assert_array_equal(strength[scale], alone)
        np.testing.assert_array_equal(turn[scale], winner)
    for first, count in [(0, 1), (7, 43), (49, 1)]:
        part, who = compiled.edges_all(pixels, rows=(first, count))
        np.testing.assert_array_equal(part, strength[:, first : first + count])
        np.testing.assert_array_equal(who, turn[:, first : first + count])
    again, _ = compiled.edges_all(pixels, threads=3)
    np.testing.assert_array_equal(again, strength)


@pytest.mark.parametrize(
    ("planes", "turns", "words"),
    [
        (4 * 59, 60 * 20, "strength_plane_bytes"),
        (4 * 60 * 19, 60 * 20, "strength_plane_bytes"),
        (4 * 60 * 20 + 2, 60 * 20, "strength_plane_bytes"),
        (4 * 60 * 20, 60 * 19, "orientation_plane_bytes"),
    ],
)
def test_planes_that_overlap_are_refused(compiled, planes, turns, words):
    pixels = picture((20, 60))
    strength = np.empty((4, 20, 60), np.float32)
    turn = np.empty((4, 20, 60), np.uint8)
    scratch = np.empty(compiled.scratch_bytes(60, 20), np.uint8)
    code = compiled._edges_all(
        pixels.ctypes.data, 60, 60, 20, 0, 20, strength.ctypes.data, 240, planes,
        turn.ctypes.data, 60, turns, scratch.ctypes.data,
    )  # fmt: skip
    assert words in compiled._message(code).decode()


def test_planes_may_be_interleaved(compiled):
    pixels = picture((20, 60))
    strength, turn = np.empty((20, 3, 60), np.float32), np.empty((20, 3, 60), np.uint8)
    scratch = np.empty(compiled.scratch_bytes(60, 20), np.uint8)
    code = compiled._edges_all(
        pixels.ctypes.data, 60, 60, 20, 0, 20, strength.ctypes.data, 3 * 240, 240,
        turn.ctypes.data, 180, 60, scratch.ctypes.data,
    )  # fmt: skip
    assert code == 0
    whole, who = compiled.edges_all(pixels)
    np.testing.assert_array_equal(strength.transpose(1, 0, 2), whole)
    np.testing.assert_array_equal(turn.transpose(1, 0, 2), who)


def test_a_bank_without_scales_has_none():
    with pytest.raises(UsageError, match="no such scale"):
        native(random_bank(2, 3)).edges_all(picture((9, 9)))
