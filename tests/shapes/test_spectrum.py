"""Measured bandwidths against closed forms, sampled kernels and the uncertainty bound."""

import math

import numpy as np
import pytest

from patchlab import families
from patchlab.shapes import gabor
from patchlab.shapes.spectrum import amplitude_spectrum, bandwidths

STEP = {"theta_rad": 0.4, "sigma_u_px": 1.5, "sigma_v_px": 2.5}
WAVE = {**STEP, "sigma_u_px": 2.5, "frequency_cpp": 0.2, "phase_rad": 0.8}
ROUND = {"sigma_px": 1.5, "surround_px": 2.6, "ratio": 0.95}
KERNELS = [("gabor", WAVE), ("gd1", STEP), ("gd2", STEP), ("centre_surround", ROUND)]


@pytest.mark.parametrize(("octaves", "aspect"), [(0.5, 1.5), (1.0, 1.0), (1.2, 1.5)])
def test_a_wave_of_many_cycles_has_the_bandwidths_of_the_closed_forms(octaves, aspect):
    p = gabor.from_octaves(0.1, 0.3, octaves, aspect, 0.4)
    measured = bandwidths("gabor", p)
    n = p["sigma_u_px"] * 0.1
    # the other lobe of a real kernel reaches over at 1.2 octaves, by under 2 %
    tolerance = 1e-6 if octaves < 1 else 2e-2
    assert measured[0] == pytest.approx(octaves, rel=tolerance)
    assert measured[1] == pytest.approx(gabor.orientation_bandwidth(n, aspect * n), rel=tolerance)


def test_derivatives_have_one_bandwidth_in_octaves_at_every_size():
    # |z|^k exp(-z^2 / 2) falls to half its peak at two places that depend on k only
    for family, order in (("gd1", 1), ("gd2", 2)):
        z = np.linspace(1e-3, 6, 600_001)
        curve = z**order * np.exp(-z * z / 2)
        above = z[curve >= curve.max() / 2]
        expected = math.log2(above[-1] / above[0])
        for size in (0.7, 3.0):
            p = {"sigma_u_px": size, "sigma_v_px": 2 * size}
            assert bandwidths(family, p)[0] == pytest.approx(expected, abs=1e-4)


def test_an_open_low_pass_side_has_no_octaves():
    blob = {"sigma_u_px": 2.0, "sigma_v_px": 2.0, "frequency_cpp": 0.05, "phase_rad": 0.0}
    assert bandwidths("gabor", blob)[0] is None
    odd = bandwidths("gabor", {**blob, "phase_rad": math.pi / 2})
    assert odd[0] is not None  # an odd kernel answers nothing at zero frequency
    assert bandwidths("centre_surround", {**ROUND, "ratio": 0.2})[0] is None


def test_a_round_kernel_has_no_orientation():
    assert bandwidths("centre_surround", ROUND)[1] is None
    assert bandwidths("centre_surround", {**ROUND, "ratio": 1.0})[0] is not None


def _transform(kernel, fx, fy):
    """Absolute Fourier sum of a kernel's samples at given frequencies."""
    r = np.arange(len(kernel)) - (len(kernel) - 1) / 2
    rows = np.exp(-2j * np.pi * np.outer(fy, r))
    cols = np.exp(-2j * np.pi * np.outer(fx, r))
    return np.abs(np.einsum("fi,ij,fj->f", rows, kernel, cols))


@pytest.mark.parametrize(("family", "parameters"), KERNELS)
def test_the_spectrum_is_that_of_the_rendered_kernel(family, parameters):
    f, turn = np.meshgrid(np.linspace(0, 0.4, 9), np.linspace(0, math.pi, 7))
    f, turn = f.ravel(), turn.ravel()
    theta = parameters.get("theta_rad", 0.0)
    measured = _transform(
        families.render(family, parameters, 41),
        f * np.cos(theta + turn),
        f * np.sin(theta + turn),
    )
    ours = amplitude_spectrum(family, parameters, f, turn)
    factor = (ours @ measured) / (ours @ ours)
    np.testing.assert_allclose(factor * ours, measured, atol=2e-3 * measured.max())


@pytest.mark.parametrize(("family", "parameters"), KERNELS)
def test_bandwidths_are_where_the_rendered_kernel_falls_to_half(family, parameters):
    octaves, orientation = bandwidths(family, parameters)
    kernel = families.render(family, parameters, 41)
    theta = parameters.get("theta_rad", 0.0)
    f = np.linspace(1e-3, 0.49, 2000)
    along = _transform(kernel, f * math.cos(theta), f * math.sin(theta))
    above = f[along >= along.max() / 2]
    assert octaves == pytest.approx(math.log2(above[-1] / above[0]), abs=0.02)
    if orientation is None:
        assert family == "centre_surround"
        return
    peak = f[along.argmax()]
    turn = np.linspace(-math.pi / 2, math.pi / 2, 2001)
    circle = _transform(kernel, peak * np.cos(theta + turn), peak * np.sin(theta + turn))
    width = np.ptp(turn[circle >= along.max() / 2])
    assert orientation == pytest.approx(width, abs=0.01)


def _spread(density, x):
    density = density / density.sum()
    middle = (density * x).sum()
    return math.sqrt((density * (x - middle) ** 2).sum())


def _uncertainty(profile):
    """Product of the rms widths of |g|^2 and |G|^2."""
    n = len(profile)
    space = _spread(np.abs(profile) ** 2, np.arange(n))
    power = np.abs(np.fft.fftshift(np.fft.fft(profile))) ** 2
    return space * _spread(power, np.fft.fftshift(np.fft.fftfreq(n)))


def test_no_kernel_beats_the_uncertainty_bound_and_the_complex_gabor_meets_it():
    # Gabor 1946, J. IEE 93:429-457; Daugman 1985, J. Opt. Soc. Am. A 2:1160-1169
    bound = 1 / (4 * math.pi)
    p = {"theta_rad": 0.0, "sigma_u_px": 4.0, "sigma_v_px": 4.0, "frequency_cpp": 0.1}
    middle = 60
    even, odd, step, line = (
        families.render(family, {**p, "phase_rad": phase}, 121)[middle]
        for family, phase in (("gabor", 0.0), ("gabor", -math.pi / 2), ("gd1", 0.0), ("gd2", 0.0))
    )
    assert _uncertainty(even + 1j * odd) == pytest.approx(bound, rel=1e-6)
    for profile in (even, odd, step, line):
        assert _uncertainty(profile) > 1.5 * bound
