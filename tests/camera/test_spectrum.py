import numpy as np
import pytest

from patchlab.camera import measure_spectrum
from patchlab.errors import InputError

SIXTEEN = 16


def field(exponent, seed, size=512):
    """Gaussian field of power f^-a around middle grey."""
    rng = np.random.default_rng(seed)
    spectrum = np.fft.rfft2(rng.standard_normal((size, size)))
    radius = np.hypot(np.fft.fftfreq(size)[:, None], np.fft.rfftfreq(size)[None])
    radius[0, 0] = 1
    plane = np.fft.irfft2(spectrum * radius ** (-exponent / 2), (size, size))
    return np.clip(0.5 + 0.08 * plane / plane.std(), 0, 1)


@pytest.mark.parametrize("exponent", [0.0, 1.0, 2.0, 3.0])
def test_synthetic_fields(bench, exponent):
    contract = bench.contract(SIXTEEN)
    frames = [bench.frame(65535 * field(exponent, s), contract, f"{s}") for s in range(6)]
    found = measure_spectrum(frames)
    assert found.exponent == pytest.approx(exponent, abs=0.1)
    assert found.spread < 0.15
    assert abs(found.anisotropy) < 0.5


def test_the_power_is_on_the_scale_of_contrast_squared(bench):
    # white noise of standard deviation s over a mean m has power (s / m)^2 at all frequencies
    rng = np.random.default_rng(1)
    contract = bench.contract(SIXTEEN)
    frame = bench.frame(rng.normal(30_000, 600, (512, 512)), contract)
    found = measure_spectrum([frame])
    assert abs(found.exponent) < 0.15
    assert np.median(found.power[3:]) == pytest.approx((600 / 30_000) ** 2, rel=0.05)
    assert found.mean_light == pytest.approx(30_000 / 65535, rel=1e-3)


def test_photographs(bench):
    # Tolhurst, Tadmor and Chao 1992: power exponents of 1.6 to 3.0 over 135 pictures
    contract = bench.contract(SIXTEEN)
    frames = [bench.frame(65535 * x, contract, str(i)) for i, x in enumerate(bench.photos())]
    found = measure_spectrum(frames)
    assert len(frames) == 13
    assert 1.6 < found.exponent < 3.0
    assert 0.1 < found.spread < 0.8
    assert (np.diff(found.power[2:40]) < 0).mean() > 0.9


def test_stripes_lean_to_their_axis(bench):
    contract = bench.contract(SIXTEEN)
    x = np.arange(256)
    stripes = np.tile(30_000 + 9_000 * np.sin(2 * np.pi * x / 16), (256, 1))
    stripes = stripes + np.random.default_rng(0).normal(0, 300, stripes.shape)
    assert measure_spectrum([bench.frame(stripes, contract)]).anisotropy > 3
    assert measure_spectrum([bench.frame(stripes.T, contract)]).anisotropy < -3


def test_flat_frames_have_no_spectrum(bench):
    flat = bench.frame(np.full((64, 64), 100), bench.contract(8))
    with pytest.raises(InputError, match="flat"):
        measure_spectrum([flat])
