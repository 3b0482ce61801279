"""The kernel formulas against scikit-image, closed forms and symmetry."""

import numpy as np
import pytest
from skimage.filters import gabor_kernel

from patchlab.conventions import grid
from patchlab.errors import UsageError
from patchlab.families import noise_gain, render, without_dc


def test_gabor_is_scikit_images_up_to_its_scale():
    theirs = gabor_kernel(0.15, theta=0.4, sigma_x=2.0, sigma_y=3.0, n_stds=4, offset=0.7)
    height, width = theirs.shape
    ours = render(
        "gabor",
        {"theta_rad": 0.4, "sigma_u_px": 2.0, "sigma_v_px": 3.0, "frequency_cpp": 0.15,
         "phase_rad": 0.7, "amplitude": 1 / (2 * np.pi * 6)},
        max(height, width),
    )  # fmt: skip
    j, i = (ours.shape[0] - height) // 2, (ours.shape[1] - width) // 2
    np.testing.assert_allclose(ours[j : j + height, i : i + width], theirs.real, atol=1e-15)


def test_gd1_answers_positively_to_brightness_that_rises_along_theta():
    x, y = grid(15)
    for theta in (0.0, 0.6, 1.9):
        kernel = render("gd1", {"theta_rad": theta, "sigma_u_px": 1.5, "sigma_v_px": 2.0}, 15)
        assert (kernel * (x * np.cos(theta) + y * np.sin(theta))).sum() > 0


def test_derivatives_are_derivatives_of_the_gaussian():
    def gauss(shift):
        x, _ = grid(21)
        return np.exp(-((x - shift) ** 2) / 8 - grid(21)[1] ** 2 / 18)

    step = 1e-4
    first = (gauss(step) - gauss(-step)) / (2 * step)
    second = (gauss(step) - 2 * gauss(0) + gauss(-step)) / step**2
    gd1 = render("gd1", {"theta_rad": 0, "sigma_u_px": 2, "sigma_v_px": 3}, 21) / 2
    gd2 = -render("gd2", {"theta_rad": 0, "sigma_u_px": 2, "sigma_v_px": 3}, 21) / 4
    np.testing.assert_allclose(gd1, first, atol=1e-8)
    np.testing.assert_allclose(gd2, second, atol=1e-6)


def test_the_dc_of_a_gabor():
    # exp(-2 pi^2 (sigma f)^2) relative to the envelope: 2^-9 at one octave (closed form)
    p = {"theta_rad": 0.3, "sigma_u_px": 4.0, "sigma_v_px": 4.0, "phase_rad": 0.0}
    wave = render("gabor", {**p, "frequency_cpp": 0.5621719 / 4}, 61)
    envelope = render("gabor", {**p, "frequency_cpp": 0.0}, 61)
    assert wave.sum() / envelope.sum() == pytest.approx(2.0**-9, rel=1e-4)
    assert abs(without_dc(wave, envelope).sum()) < 1e-12


def test_noise_gain_of_scharr_under_bilinear_noise():
    # 3x3 binomial smoothing: white sd 1 becomes 0.375; Scharr/32 answers with 0.21449
    scharr = np.outer([3, 10, 3], [-1, 0, 1]) / 32
    assert noise_gain(scharr) == pytest.approx(0.4800716, rel=1e-6)
    h = np.outer([1, 2, 1], [1, 2, 1]) / 16
    from scipy.signal import correlate2d

    acov = correlate2d(h, h)
    white_sd = np.sqrt(acov[2, 2])
    assert white_sd == pytest.approx(0.375)
    assert white_sd * noise_gain(scharr, acov / acov[2, 2]) == pytest.approx(0.21449, rel=1e-4)


def test_nonsense_is_refused():
    p = {"theta_rad": 0.0, "sigma_u_px": 2.0, "sigma_v_px": 2.0}
    with pytest.raises(UsageError, match="Nyquist"):
        render("gabor", {**p, "frequency_cpp": 0.7, "phase_rad": 0}, 9)
    with pytest.raises(UsageError, match="positive"):
        render("gd1", {**p, "sigma_u_px": 0.0}, 9)
    with pytest.raises(UsageError, match="family"):
        render("sinc", p, 9)
