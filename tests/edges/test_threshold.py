"""The false-alarm promise: published laws, asked rates against found ones, both noises."""

import dataclasses
import math

import numpy as np
import pytest
from scipy import ndimage

from patchlab.edges import noise, thin, threshold
from patchlab.errors import UsageError
from patchlab.families import noise_gain
from patchlab.types import Bank, Kernel, Thresholds

SCHARR = np.array([[-3.0, 0, 3], [-10, 0, 10], [-3, 0, 3]]) / 32


def scharr_pair(make_bank, autocovariance=None):
    """The two Scharr masks as one energy pair of unit noise gain (uncorrelated, equal norm)."""
    taps = np.stack([SCHARR, SCHARR.T])
    taps /= noise_gain(SCHARR, autocovariance)
    kernels = (
        Kernel("gx", "given", "odd", 0, 0, {"theta_rad": 0.0}, 1.0),
        Kernel("gy", "given", "even", 0, 0, {"theta_rad": 0.0}, 1.0),
    )
    return Bank(
        "scharr",
        kernels,
        taps.astype(np.float32),
        make_bank().table,
        strength="energy",
        noise_autocovariance=autocovariance,
    )


def energy_on(bank, picture):
    planes = [ndimage.correlate(picture, k, mode="wrap") for k in bank.taps]
    return thin.strongest(thin.shapes_of(bank)[0], planes.__getitem__, "energy").strength


# ---------------------------------------------------------------- laws


def test_quadrature_energy_on_white_noise_follows_the_rayleigh_law(make_bank):
    # P(m > T) = exp(-T^2 / 2); neighbours correlate, so counts scatter by sqrt(1.2) more
    white = np.random.default_rng(0).standard_normal((2048, 2048), dtype=np.float32)
    energy = energy_on(scharr_pair(make_bank), white)
    expected_t = {1e-2: 3.034854, 1e-3: 3.716922, 1e-4: 4.291932}
    for p, t in expected_t.items():
        assert math.sqrt(-2 * math.log(p)) == pytest.approx(t, abs=1e-6)
        n = energy.size
        assert abs((energy > t).sum() - n * p) < 4 * math.sqrt(1.2 * n * p)
    assert energy.mean() == pytest.approx(1.253314, rel=2e-3)


def test_correlated_noise_needs_its_autocovariance(make_bank, smooth_autocovariance):
    # with [1 2 1] smoothing, "pixel sd times norm" gives 7.70e-3 false alarms for 1e-3 asked
    white = np.random.default_rng(1).standard_normal((2048, 2048), dtype=np.float32)
    kernel = np.outer([1, 2, 1], [1, 2, 1]) / 16
    smooth = ndimage.correlate(white, kernel.astype(np.float32), mode="wrap")
    assert smooth.std() == pytest.approx(0.375, rel=0.01)
    smooth /= smooth.std()
    t = math.sqrt(-2 * math.log(1e-3))
    aware = (energy_on(scharr_pair(make_bank, smooth_autocovariance), smooth) > t).mean()
    naive = (energy_on(scharr_pair(make_bank), smooth) > t).mean()
    assert aware == pytest.approx(1e-3, rel=0.15)
    assert naive == pytest.approx(7.70e-3, rel=0.05)


def test_rice_rate_of_a_one_dimensional_signal_is_the_textbook_value():
    # a Gaussian derivative across rows, white noise: lambda_2 = 3 / (2 s^2) along the normal
    s = 3.0
    u = np.arange(-15.0, 16)
    kernel = np.zeros((31, 31))
    kernel[15] = u * np.exp(-u * u / (2 * s * s))
    kernel /= np.linalg.norm(kernel)
    mean, square = noise.spectral_moments(kernel, 0.0, None)
    assert square == pytest.approx(3 / (2 * s * s), rel=1e-3)
    assert mean == pytest.approx(2 / (s * math.sqrt(math.pi)), rel=1e-3)
    rate = threshold.rice_rate(kernel[None], np.zeros(1), None, 2.0, parity="odd")
    per_pixel = math.sqrt(1.5) / s / math.pi * math.exp(-2)
    assert rate == pytest.approx(1e6 * per_pixel, rel=1e-3)


def gabor_bank(make_bank, frequency=0.16, su=2.2, sv=3.0):
    """Eight quadrature pairs of equal norm, DC corrected."""
    from patchlab.families import render, without_dc

    kernels, taps = [], []
    for parity, phase in (("odd", -math.pi / 2), ("even", 0.0)):
        for j in range(8):
            p = {"theta_rad": math.pi * j / 8, "sigma_u_px": su, "sigma_v_px": sv}
            k = render("gabor", {**p, "frequency_cpp": frequency, "phase_rad": phase}, 21)
            if parity == "even":
                flat = {**p, "frequency_cpp": 0.0, "phase_rad": 0.0}
                k = without_dc(k, render("gabor", flat, 21))
            taps.append(k / np.linalg.norm(k))
            kernels.append(Kernel(f"{parity}{j}", "gabor", parity, 0, j, p, 1.0))
    return Bank(
        "gabor", tuple(kernels), np.array(taps, np.float32), make_bank().table, strength="energy"
    )


def test_rice_sum_and_monte_carlo_agree_for_eight_quadrature_pairs(make_bank):
    # overlap of orientations and sampling of the field cancel for this well-spread bank
    bank = gabor_bank(make_bank)
    counts = threshold.count_on_noise(bank, level=[4.06], hysteresis=1.0, megapixels=3, seed=5)
    shape = thin.shapes_of(bank)[0]
    rice = threshold.rice_rate(bank.taps[list(shape.odd)], shape.angles, None, 4.06, parity="pair")
    found = counts.maxima[0] / counts.megapixels
    assert rice == pytest.approx(found, rel=0.15)
    assert found == pytest.approx(1000, rel=0.15)


# ---------------------------------------------------------------- synthetic noise


def test_synthetic_noise_has_the_autocovariance(smooth_autocovariance):
    tiles = list(noise.noise_tiles(smooth_autocovariance, 4, seed=3))
    spectra = np.mean([np.abs(np.fft.fft2(t)) ** 2 for t in tiles], axis=0)
    lags = np.fft.ifft2(spectra).real / tiles[0].size
    got = np.roll(lags, (2, 2), (0, 1))[:5, :5]
    np.testing.assert_allclose(got, smooth_autocovariance, atol=0.006)


def test_noise_depends_on_seed_and_key_only():
    a, b = noise.noise_tiles(None, 2, seed=1, size=64)
    again = list(noise.noise_tiles(None, 2, seed=1, size=64))
    np.testing.assert_array_equal([a, b], again)
    assert not np.array_equal(a, b)
    assert not np.array_equal(a, next(noise.noise_tiles(None, 1, seed=2, size=64)))
    assert not np.array_equal(a, next(noise.noise_tiles(None, 1, seed=1, key="x", size=64)))


def test_periodic_engine_is_wrapped_correlation(make_bank):
    bank = make_bank()
    tile = next(noise.noise_tiles(None, 1, seed=0))
    plane = noise.Torus(bank, noise.TILE).responses(tile)
    for i in (0, 3, 11):
        expected = ndimage.correlate(tile, bank.taps[i], mode="wrap")
        np.testing.assert_allclose(plane(i), expected, atol=2e-5)


def test_another_engine_finds_the_same_rate(make_bank, engine):
    bank = make_bank(scales=((1.2, 1.7),), orientations=4)
    level = [3.2]
    own = threshold.count_on_noise(bank, level=level, megapixels=0.5)
    other = threshold.count_on_noise(bank, level=level, megapixels=0.5, correlate=engine(bank))
    rates = [c.elements[0] / c.megapixels for c in (own, other)]
    assert rates[0] == pytest.approx(rates[1], rel=0.03)  # the same noise, less its rim


# ---------------------------------------------------------------- the promise


def asked_and_found(bank, megapixels, seed):
    table = threshold.calibrate(bank, megapixels=8, rates=(10, 100, 1000))
    counts = threshold.count_on_noise(
        bank, level=table.strength, megapixels=megapixels, seed=seed, key="fresh"
    )
    return table, counts


def test_asked_rates_are_found_on_white_noise(make_bank):
    table, counts = asked_and_found(make_bank(), 24, seed=123)
    found = counts.elements / counts.megapixels
    assert found[2] == pytest.approx(1000, rel=0.15)
    assert found[1] == pytest.approx(100, rel=0.15)
    assert 10 / 1.5 < found[0] < 15
    groups = counts.groups / counts.megapixels
    np.testing.assert_allclose(groups[1:], table.groups[1:], rtol=0.15)
    # one-sided by construction: Rice leaves out what makes maxima rarer here
    ratio = table.rice[1:] / (counts.maxima[1:] / counts.megapixels)
    assert ((ratio > 1.0) & (ratio < 2.8)).all()


def test_asked_rates_are_found_on_coloured_noise(make_bank, smooth_autocovariance):
    table, counts = asked_and_found(make_bank(autocovariance=smooth_autocovariance), 16, 77)
    found = counts.elements / counts.megapixels
    assert table.noise == "coloured"
    assert found[2] == pytest.approx(1000, rel=0.15)
    assert found[1] == pytest.approx(100, rel=0.15)


def test_hysteresis_outside_the_calibration_would_break_the_promise(make_bank):
    bank = make_bank()
    alone = threshold.calibrate(bank, hysteresis=1.0, megapixels=3, rates=(1000,))
    counts = threshold.count_on_noise(
        bank, level=alone.strength, hysteresis=0.7, megapixels=2, seed=9
    )
    assert counts.elements[0] / counts.megapixels > 2000


def test_the_rate_is_not_higher_at_the_border_of_a_mirrored_frame(make_bank, engine):
    bank = make_bank()
    threshold_1000 = 4.21
    inner = rim = 0
    for tile in noise.noise_tiles(None, 16, seed=40, size=256):
        edges = thin.edge_map(bank, engine(bank)(tile), threshold_1000).edges
        centre = edges[30:-30, 30:-30].sum()
        inner, rim = inner + centre, rim + edges.sum() - centre
    area = 256**2 - 196**2
    assert rim / area < 1.15 * inner / 196**2


# ---------------------------------------------------------------- the table


@pytest.fixture
def table():
    return Thresholds(
        rate=np.array([0.1, 1.0, 10.0, 100.0, 1000.0]),
        strength=np.array([6.0, 5.6, 5.2, 4.7, 4.2]),
        rice=np.ones(5),
        hysteresis=0.7,
        megapixels=1.0,
        noise="white",
    )


def test_strength_and_rate_are_inverse(table):
    for rate in (0.1, 0.3, 1, 7, 10, 55, 100, 999, 1000):
        assert threshold.rate_for(table, threshold.strength_for(table, rate)) == pytest.approx(rate)
    for rate, strength in zip(table.rate, table.strength, strict=True):
        assert threshold.strength_for(table, rate) == pytest.approx(strength)


@pytest.mark.parametrize("rate", [0.05, 2000, -1, float("nan")])
def test_a_rate_outside_the_table_is_refused(table, rate):
    with pytest.raises(UsageError, match=r"ask for 0\.1 to 1000"):
        threshold.strength_for(table, rate)


def test_a_strength_outside_the_table_is_refused(table):
    with pytest.raises(UsageError, match=r"ask for 4\.200 to 6\.000"):
        threshold.rate_for(table, 7.0)


def test_interpolation_lies_on_the_tail(make_bank):
    tail = threshold.Tail(12.3, 1.0, 2.6, -0.15)
    rates = np.array(threshold.RATES)
    dense = Thresholds(rates, np.array([tail.strength(r) for r in rates]), rates, 0.7, 1, "white")
    for rate in (0.3, 3, 30, 300):
        exact = tail.strength(rate)
        assert threshold.strength_for(dense, rate) == pytest.approx(exact, abs=0.003)


def test_tail_comes_back_from_counts_that_follow_it():
    tail = threshold.Tail(12.3, 1.0, 2.6, -0.15)
    level, area = threshold.LEVELS, 1e4
    groups = np.array([round(tail.groups(t) * area) for t in level])
    elements = np.array([round(tail.rate(t) * area) for t in level])
    got = threshold.fit_tail(threshold.Counts(level, elements, groups, groups, area))
    assert got.b == pytest.approx(1.0, abs=1e-4)
    for rate in threshold.RATES:
        assert got.rate(tail.strength(rate)) == pytest.approx(rate, rel=0.01)
    assert tail.rate(tail.strength(10)) == pytest.approx(10)


def test_thresholds_are_in_noise_units_whatever_the_table_s_unit(make_bank):
    bank = make_bank(scales=((1.2, 1.7),), orientations=4)
    table = dataclasses.replace(bank.table, noise_sd=0.125)
    small = Bank("small", bank.kernels, bank.taps * 8, table)
    a = threshold.calibrate(bank, megapixels=1.0)
    b = threshold.calibrate(small, megapixels=1.0)
    np.testing.assert_array_equal(a.strength, b.strength)


def test_calibration_is_deterministic_and_tells_progress(make_bank):
    bank = make_bank(scales=((1.2, 1.7),), orientations=4)
    heard = []
    settings = {"megapixels": 2.0, "rates": (1000, 10)}
    a = threshold.calibrate(bank, progress=lambda *x: heard.append(x), **settings)
    b = threshold.calibrate(bank, **settings)
    np.testing.assert_array_equal(a.strength, b.strength)
    assert a.rate.tolist() == [10, 1000]
    assert a.strength[0] > a.strength[1]
    assert heard[-1][1] == heard[-1][2] == len(heard) > 1


def test_what_cannot_be_calibrated_is_refused(make_bank):
    bank = make_bank(scales=((1.2, 1.7),), orientations=2)
    double = Bank("loud", bank.kernels, bank.taps * 2, bank.table)
    with pytest.raises(UsageError, match="standard deviation 2, not 1"):
        threshold.calibrate(double)
    blind = dataclasses.replace(bank, table=dataclasses.replace(bank.table, noise_sd=None))
    with pytest.raises(UsageError, match="noise is not known"):
        threshold.calibrate(blind)
    with pytest.raises(UsageError, match="positive numbers"):
        threshold.calibrate(bank, rates=(0.0, 1.0))
    with pytest.raises(UsageError, match="hysteresis ratio"):
        threshold.calibrate(bank, hysteresis=1.5)
    none = np.zeros(3, np.int64)
    with pytest.raises(UsageError, match="more megapixels"):
        threshold.fit_tail(threshold.Counts(np.array([4.0, 5, 6]), none, none, none, 1.0))
