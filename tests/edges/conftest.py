"""Banks, engines and pictures that the tests of this room share."""

import math

import cv2
import numpy as np
import pytest
from scipy.special import ndtr

from patchlab.conventions import orientation_lattice
from patchlab.families import noise_gain, render, without_dc
from patchlab.types import Bank, InputContract, InputTable, Kernel


def identity_table():
    """Working values are the pixels themselves, with noise of standard deviation 1."""
    return InputTable("identity", InputContract("float32", 0.0, 1.0), None, 1.0)


def root_table(gain=0.5, read=1.0):
    """Mono8 through the generalised Anscombe root: noise of standard deviation 1."""
    codes = np.arange(256.0)
    inside = gain * codes + 0.375 * gain**2 + (gain * read) ** 2 + 1 / 12
    values = (2 / gain * np.sqrt(inside)).astype(np.float32)
    return InputTable("stabilised", InputContract("Mono8", 0, 255), values, 1.0)


def build_bank(
    scales=((1.1, 1.6), (2.1, 2.9)),
    orientations=8,
    parities=("odd",),
    autocovariance=None,
    strength="step",
    table=None,
):
    size = 2 * math.ceil(3.2 * max(max(s) for s in scales)) + 1
    kernels, taps = [], []
    for scale, (su, sv) in enumerate(scales):
        for parity in parities:
            for j, theta in enumerate(orientation_lattice(orientations)):
                p = {"theta_rad": float(theta), "sigma_u_px": su, "sigma_v_px": sv}
                family = "gd1" if parity == "odd" else "gd2"
                k = render(family, p, size)
                if parity == "even":
                    flat = {**p, "frequency_cpp": 0.0, "phase_rad": 0.0}
                    k = without_dc(k, render("gabor", flat, size))
                taps.append(k / noise_gain(k, autocovariance))
                kernels.append(Kernel(f"s{scale}{parity}{j}", family, parity, scale, j, p, 1.0))
    return Bank(
        "proof",
        tuple(kernels),
        np.array(taps, np.float32),
        table or identity_table(),
        strength=strength,
        noise_autocovariance=autocovariance,
    )


def correlate_with(bank):
    """An engine on working values: OpenCV's correlation, the frame mirrored about its pixels."""

    def correlate(values):
        border = cv2.BORDER_REFLECT_101
        return np.stack([cv2.filter2D(values, cv2.CV_32F, k, borderType=border) for k in bank.taps])

    return correlate


def step_picture(shape, x, y, theta, height, blur):
    """Rises by ``height`` along theta where it crosses (x, y)."""
    rows, cols = np.mgrid[: shape[0], : shape[1]]
    d = (cols - x) * math.cos(theta) + (rows - y) * math.sin(theta)
    return (height * ndtr(d / blur)).astype(np.float32)


@pytest.fixture(scope="session")
def make_bank():
    return build_bank


@pytest.fixture
def engine():
    return correlate_with


@pytest.fixture
def step():
    return step_picture


@pytest.fixture
def stabilised():
    return root_table


@pytest.fixture
def smooth_autocovariance():
    """Noise after [1 2 1] x [1 2 1] / 16: its own autocorrelation, centre 1."""
    one = np.convolve([1, 2, 1], [1, 2, 1]) / 6
    return np.outer(one, one)
