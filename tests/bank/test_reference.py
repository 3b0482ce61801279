"""The float64 oracle against scipy, OpenCV and hand-made values."""

from __future__ import annotations

import cv2
import numpy as np
import pytest
from scipy import ndimage

from patchlab.bank import reference
from patchlab.conventions import BORDERS
from patchlab.errors import InputError, UsageError
from tests.bank.banks import given_bank, lattice_bank, picture, random_bank

ONE_TO_NINE = np.arange(1.0, 10.0).reshape(3, 3)


def test_impulse_gives_the_flipped_kernel():
    # ONNX Runtime and cv2.filter2D give the same: correlation, not convolution
    bank = given_bank([ONE_TO_NINE], border="zero")
    pixels = np.zeros((7, 8), dtype=np.uint8)
    pixels[3, 4] = 1
    found = reference.responses(bank, pixels)[0]
    assert found[2:5, 3:6].tolist() == [[9, 8, 7], [6, 5, 4], [3, 2, 1]]
    assert found.sum() == 45


@pytest.mark.parametrize("border", BORDERS)
@pytest.mark.parametrize("at", [(0, 0), (0, 7), (6, 0), (6, 7), (3, 4), (0, 4)])
def test_impulse_at_the_border(border, at):
    bank = given_bank([ONE_TO_NINE], border=border)
    pixels = np.zeros((7, 8), dtype=np.uint8)
    pixels[at] = 1
    found = reference.responses(bank, pixels)[0]
    expected = ndimage.correlate(
        pixels.astype(float), ONE_TO_NINE, mode=BORDERS[border].scipy, cval=0.0
    )
    np.testing.assert_array_equal(found, expected)
    if border != "wrap":  # OpenCV's filter2D has no wrap
        rule = getattr(cv2, BORDERS[border].opencv)
        np.testing.assert_array_equal(
            found, cv2.filter2D(pixels.astype(float), cv2.CV_64F, ONE_TO_NINE, borderType=rule)
        )


@pytest.mark.parametrize("border", BORDERS)
@pytest.mark.parametrize("shape", [(7, 7), (8, 19), (23, 8)])
def test_pictures_against_scipy(border, shape):
    bank = random_bank(3, 7, pixels="Mono12", kind="stabilised", border=border)
    pixels = picture(shape, "Mono12")
    worked = bank.table.apply(pixels).astype(np.float64)
    for found, taps in zip(reference.responses(bank, pixels), bank.taps, strict=True):
        expected = ndimage.correlate(worked, taps.astype(float), mode=BORDERS[border].scipy)
        np.testing.assert_allclose(found, expected, rtol=0, atol=1e-10)


def test_the_border_comes_after_the_table():
    # code 0 has a working value that is not 0, but what lies outside is 0
    bank = given_bank([np.ones((3, 3))], pixels="Mono12", kind="stabilised", border="zero")
    pixels = np.zeros((5, 5), dtype=np.uint16)
    value = float(bank.table.values[0])
    assert value > 1
    found = reference.responses(bank, pixels)[0]
    assert found[2, 2] == pytest.approx(9 * value)
    assert found[0, 0] == pytest.approx(4 * value)


@pytest.mark.parametrize(
    ("pixels", "words"),
    [
        (np.zeros((10, 40), np.uint8), "smaller"),
        (np.zeros((40, 10), np.uint8), "smaller"),
        (np.zeros((40, 40), np.uint16), "takes Mono8"),
        (np.zeros((40, 40), np.float64), "takes Mono8"),
        (np.zeros((40, 40, 3), np.uint8), "one plane"),
    ],
)
def test_pictures_that_do_not_fit_are_refused(pixels, words):
    with pytest.raises(InputError, match=words):
        reference.responses(lattice_bank(), pixels)


def test_a_code_beyond_the_format_is_refused():
    pixels = np.full((9, 9), 4096, dtype=np.uint16)
    with pytest.raises(InputError, match="beyond Mono12"):
        reference.responses(random_bank(pixels="Mono12"), pixels)


@pytest.mark.parametrize("kind", ["step", "line", "energy"])
def test_strength_is_the_largest_magnitude(kind):
    bank = lattice_bank(families=("gd1", "gd2"), count=4, size=7, strength=kind)
    pixels = picture((20, 21))
    planes = reference.responses(bank, pixels)
    for scale in (0, 1):
        odd = planes[list(bank.members(scale, "odd"))]
        even = planes[list(bank.members(scale, "even"))]
        every = {"step": np.abs(odd), "line": np.abs(even), "energy": np.hypot(even, odd)}[kind]
        strength, turn = reference.strength(bank, pixels, scale)
        np.testing.assert_allclose(strength, every.max(axis=0), rtol=1e-14)
        chosen = np.take_along_axis(every, turn[None].astype(int), axis=0)[0]
        np.testing.assert_allclose(chosen, every.max(axis=0), rtol=1e-14)
        assert set(np.unique(turn)) == {0, 1, 2, 3}


def test_a_scale_that_is_not_there_is_refused():
    with pytest.raises(UsageError, match="scale 2"):
        reference.strength(lattice_bank(), picture((20, 20)), 2)
