"""Bandwidths in closed form, and the names that other libraries give a Gabor."""

import math

import cv2
import numpy as np
import pytest
from skimage.filters import gabor_kernel

from patchlab import families
from patchlab.errors import UsageError
from patchlab.shapes import gabor

# sigma f = a (2^b + 1) / (2^b - 1) with a = sqrt(ln 2 / 2) / pi: derived, and computed
OCTAVES = [
    (0.5, 1.0921926),
    (1.0, 0.5621719),
    (1.4, 0.4160530),
    (1.5, 0.3923653),
    (2.0, 0.3123177),
]


@pytest.mark.parametrize(("octaves", "sigma_f"), OCTAVES)
def test_octaves_and_sigma_f_agree_with_the_table(octaves, sigma_f):
    assert gabor.sigma_f_from_octaves(octaves) == pytest.approx(sigma_f, abs=5e-8)
    assert gabor.bandwidth_octaves(sigma_f) == pytest.approx(octaves, abs=1e-6)


def test_octaves_exist_only_while_the_low_pass_side_is_closed():
    limit = gabor.HALF_AMPLITUDE
    assert limit == pytest.approx(0.18739063, abs=5e-9)
    assert gabor.bandwidth_octaves(limit) is None
    assert gabor.bandwidth_octaves(limit * 1.001) > 10
    with pytest.raises(UsageError, match="octaves"):
        gabor.sigma_f_from_octaves(0.0)


# The first is published: BMC Neuroscience 6:12 (2005) gives 37 degrees for 1.5 octaves at
# aspect 1.5. The others were computed from the exact formula.
@pytest.mark.parametrize(
    ("octaves", "aspect", "degrees", "tolerance"),
    [(1.5, 1.5, 37.0, 0.5), (1.4, 1.3, 40.16, 0.01), (1.0, 1.0, 38.38, 0.01)],
)
def test_orientation_bandwidth(octaves, aspect, degrees, tolerance):
    n = gabor.sigma_f_from_octaves(octaves)
    width = math.degrees(gabor.orientation_bandwidth(n, aspect * n))
    assert width == pytest.approx(degrees, abs=tolerance)


@pytest.mark.parametrize("aspect", [0.5, 1.0, 1.0 + 1e-13, 2.5])
def test_orientation_bandwidth_solves_its_equation(aspect):
    a, b = 0.4, 0.4 * aspect
    t = gabor.orientation_bandwidth(a, b) / 2
    level = math.exp(-2 * math.pi**2 * ((a * (1 - math.cos(t))) ** 2 + (b * math.sin(t)) ** 2))
    assert level == pytest.approx(0.5, abs=1e-12)


def test_a_kernel_too_small_to_turn_has_no_orientation_bandwidth():
    assert gabor.orientation_bandwidth(0.05, 0.05) is None
    assert gabor.orientation_bandwidth(0.0, 0.0) is None
    assert gabor.orientation_bandwidth(0.3, 0.01) is not None
    assert gabor.orientation_bandwidth(0.02, 0.1) is None


@pytest.mark.parametrize("reflected", [False, True])
def test_wavelength_dialect_goes_there_and_back(reflected):
    p = dict(zip(families.PARAMETERS["gabor"][3:], (2.8, 1.7, 2.9, 0.13, -1.1), strict=True))
    there = gabor.to_wavelength(p, reflected=reflected)
    assert there["wavelength_px"] == pytest.approx(1 / 0.13)
    assert there["psi_rad"] == pytest.approx(1.1 if reflected else -1.1)
    back = gabor.from_wavelength(*there.values(), reflected=reflected)
    assert back == pytest.approx(p, rel=1e-14)


def test_octave_dialect_goes_there_and_back():
    p = dict(zip(families.PARAMETERS["gabor"][3:], (2.8, 2.7, 2.9, 0.13, -1.1), strict=True))
    back = gabor.from_octaves(*gabor.to_octaves(p).values())
    assert back == pytest.approx(p, rel=1e-13)


def test_dialects_fold_directions_with_the_phase():
    p = gabor.from_wavelength(8.0, math.pi + 0.3, 0.5, 2.0, 0.7)
    q = gabor.from_octaves(0.125, 0.3 - math.pi, 1.0, offset=0.5)
    for folded in (p, q):
        assert folded["theta_rad"] == pytest.approx(0.3)
        assert folded["phase_rad"] == pytest.approx(-0.5)


def test_dialects_refuse_what_has_no_meaning():
    flat = {"theta_rad": 0.0, "sigma_u_px": 1.0, "sigma_v_px": 1.0, "phase_rad": 0.0}
    with pytest.raises(UsageError, match="Nyquist"):
        gabor.from_wavelength(1.9, 0.0, 0.0, 2.0, 1.0)
    with pytest.raises(UsageError, match="Nyquist"):
        gabor.from_octaves(0.6, 0.0, 1.0)
    with pytest.raises(UsageError, match="wavelength"):
        gabor.to_wavelength({**flat, "frequency_cpp": 0.0})
    with pytest.raises(UsageError, match="low-pass"):
        gabor.to_octaves({**flat, "frequency_cpp": 0.15})
    with pytest.raises(UsageError, match="positive"):
        gabor.from_wavelength(8.0, 0.0, 0.0, 2.0, 0.0)
    with pytest.raises(UsageError, match="positive"):
        gabor.from_octaves(0.1, 0.0, 1.0, aspect=-1.0)


@pytest.mark.parametrize("psi", [0.0, math.pi / 2, 1.0])
def test_opencv_kernels_are_the_reflected_dialect(psi):
    theirs = cv2.getGaborKernel((15, 15), 2.5, 0.6, 7.0, 0.8, psi, cv2.CV_64F)
    ours = gabor.from_wavelength(7.0, 0.6, psi, 2.5, 0.8, reflected=True)
    np.testing.assert_allclose(families.render("gabor", ours, 15), theirs, atol=1e-12)


def test_scikit_image_kernels_are_the_octave_dialect():
    theirs = gabor_kernel(0.15, theta=0.6, bandwidth=1.2, n_stds=3, offset=0.7)
    ours = gabor.from_octaves(0.15, 0.6, 1.2, offset=0.7)
    size = theirs.shape[1]
    rendered = families.render("gabor", ours, size)
    cut = (size - theirs.shape[0]) // 2
    rendered = rendered[cut : size - cut] if cut else rendered
    mass = 2 * math.pi * ours["sigma_u_px"] * ours["sigma_v_px"]
    np.testing.assert_allclose(rendered / mass, theirs.real, atol=1e-12)
