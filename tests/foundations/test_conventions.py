"""Borders, angles, transfer and randomness against the libraries that have them too."""

import cv2
import numpy as np
import pytest
from hypothesis import given
from hypothesis import strategies as st
from scipy import ndimage

from patchlab import conventions as c
from patchlab.errors import UsageError

rng = np.random.default_rng(5)
IMAGE = rng.normal(size=(9, 11))


@pytest.mark.parametrize("border", c.BORDERS)
def test_pad_agrees_with_numpy(border):
    np.testing.assert_array_equal(
        c.pad(IMAGE, 4, border), np.pad(IMAGE, 4, mode=c.BORDERS[border].numpy)
    )


@pytest.mark.parametrize("border", c.BORDERS)
def test_names_agree_with_scipy_and_opencv(border):
    kernel = np.arange(1.0, 10).reshape(3, 3)
    padded = c.pad(IMAGE, 1, border)
    ours = sum(kernel[j, i] * padded[j : j + 9, i : i + 11] for j in range(3) for i in range(3))
    scipys = ndimage.correlate(IMAGE, kernel, mode=c.BORDERS[border].scipy)
    np.testing.assert_allclose(ours, scipys, atol=1e-12)
    if border != "wrap":  # filter2D has no wrap
        flag = getattr(cv2, c.BORDERS[border].opencv)
        opencvs = cv2.filter2D(IMAGE, cv2.CV_64F, kernel, borderType=flag)
        np.testing.assert_allclose(ours, opencvs, atol=1e-12)


def test_an_unknown_border_is_refused_by_name():
    with pytest.raises(UsageError, match="mirror101"):
        c.border_index("reflect", np.arange(3), 3)


@given(st.floats(-20, 20), st.floats(-20, 20))
def test_folding_an_angle_keeps_the_wave(theta, phase):
    folded, new = c.fold_theta(theta, phase)
    assert 0 <= folded < np.pi
    assert -np.pi < new <= np.pi + 1e-12
    x, y = c.grid(5)

    def wave(t, p):
        return np.cos(0.7 * (x * np.cos(t) + y * np.sin(t)) + p)

    np.testing.assert_allclose(wave(theta, phase), wave(folded, new), atol=1e-12)


@pytest.mark.parametrize("count", [1, 2, 6, 8, 12])
def test_the_lattice_is_its_own_mirror_image(count):
    lattice = c.orientation_lattice(count)
    mirrored = np.sort((np.pi - lattice) % np.pi)
    np.testing.assert_allclose(mirrored, lattice, atol=1e-12)


# IEC 61966-2-1:1999, values worked with its formula
@pytest.mark.parametrize(
    ("code", "light"),
    [(1, 3.035270e-4), (10, 0.003035270), (11, 0.003346536), (50, 0.03189603), (118, 0.1811642),
     (128, 0.2158605), (188, 0.5028865), (254, 0.9911021), (255, 1.0)],
)  # fmt: skip
def test_srgb_decoding(code, light):
    assert c.srgb_decode(np.array(code / 255)) == pytest.approx(light, abs=1e-7)


def test_srgb_round_trip():
    codes = np.arange(256) / 255
    np.testing.assert_allclose(c.srgb_encode(c.srgb_decode(codes)), codes, atol=1e-12)
    assert 255 * float(c.srgb_encode(np.array(0.18))) == pytest.approx(117.6458, abs=1e-4)


def test_luminance_weights_are_rec_709():  # ITU-R BT.709
    assert c.REC709 == (0.2126, 0.7152, 0.0722)
    assert sum(c.REC709) == pytest.approx(1)


def test_randomness_belongs_to_its_key():
    a = c.rng(3, "a/b.png").integers(1 << 40, size=4)
    assert (a == c.rng(3, "a/b.png").integers(1 << 40, size=4)).all()
    assert (a != c.rng(3, "a/c.png").integers(1 << 40, size=4)).any()
    assert (a != c.rng(4, "a/b.png").integers(1 << 40, size=4)).any()


def test_float_error_constant():  # Higham 2002, section 3.1: n u / (1 - n u)
    assert c.gamma(441) == pytest.approx(2.62863e-5, rel=1e-5)


def test_shift_cosine_sees_through_a_shift_and_a_sign():
    kernel = rng.normal(size=(5, 5))
    a, b = np.zeros((9, 9)), np.zeros((9, 9))
    a[0:5, 1:6], b[3:8, 2:7] = kernel, -kernel
    assert c.shift_cosine(a, b) == pytest.approx(1)
    assert c.shift_cosine(a, rng.normal(size=(9, 9))) < 0.8
