"""The learned basis on real photographs: edges there, none where there should be none.

Photographs come with scikit-image (NASA public domain and CC0) and scikit-learn
(CC BY 2.0); nothing of them is kept in this repository.
"""

import numpy as np
import pytest
import skimage.data
from scipy import ndimage
from sklearn.datasets import load_sample_images

from patchlab import bank as banks
from patchlab import camera, learn, shapes
from patchlab.conventions import REC709, srgb_decode
from patchlab.images.sample import SampleSettings, sample
from patchlab.types import Frame, InputContract, NoiseModel, Survey

CONTRACT = InputContract("float32", 0.0, 1.0)


def light(picture):
    """Linear luminance of an sRGB photograph in [0, 1]."""
    linear = srgb_decode(np.asarray(picture, dtype=np.float64) / 255)
    return linear @ np.array(REC709) if linear.ndim == 3 else linear


@pytest.fixture(scope="module")
def photographs():
    names = ("astronaut", "camera", "chelsea", "coffee", "rocket", "coins")
    pictures = [getattr(skimage.data, name)() for name in names]
    return [light(p) for p in [*pictures, *load_sample_images().images]]


def phase_randomised(picture, seed):
    """The same power spectrum with random phases."""
    rng = np.random.default_rng(seed)
    phase = np.angle(np.fft.fft2(rng.normal(size=picture.shape)))
    mean = picture.mean()
    return mean + np.fft.ifft2(np.abs(np.fft.fft2(picture - mean)) * np.exp(1j * phase)).real


def log_light(pictures):
    """Log of light in [0, 1], as the published experiments had it."""
    return [np.log(np.maximum(p, 0) + 0.01).astype(np.float32) for p in pictures]


def learned(pictures, size=8, count=20_000, seed=0, tone=log_light, **options):
    """Patches, dictionary and fits of some pictures in [0, 1]."""
    tabled = tone(pictures)
    frames = [Frame(f"{i}.npy", p, CONTRACT) for i, p in enumerate(tabled)]
    table = camera.make_table("identity", CONTRACT, None)
    settings = SampleSettings(size=size, patches=count, seed=seed)
    patches = sample(frames, table, settings, count_frames=len(frames))
    whitening = learn.whiten(patches)
    dictionary = learn.learn_ica(patches, whitening, seed=seed, restarts=1, **options)
    return patches, dictionary, shapes.fit_kernels(dictionary.atoms, "atoms")


@pytest.fixture(scope="module")
def on_photographs(photographs):
    return learned(photographs)


def share(fits, r2=0.8):
    """Share of the components whose best kernel explains more than ``r2``."""
    return np.mean([f.r2 > r2 for f in fits.fits])


def test_photographs_give_edges(on_photographs):
    # Bell & Sejnowski 1997; the share is from a reference experiment on the same photographs
    _, dictionary, fits = on_photographs
    assert dictionary.converged
    assert share(fits) >= 0.6
    assert np.median(dictionary.kurtosis) >= 8
    assert fits.count("good") >= 0.6 * len(fits)


def test_the_same_spectrum_with_random_phases_does_not(photographs):
    random = [phase_randomised(p, i) for i, p in enumerate(photographs)]
    span = [(p - p.min()) / np.ptp(p) for p in random]
    _, dictionary, fits = learned(span)
    assert share(fits) <= 0.35
    assert np.median(dictionary.kurtosis) < 8


def test_white_noise_gives_nothing_and_a_warning():
    rng = np.random.default_rng(3)
    noise = [rng.normal(0.5, 0.1, (300, 300)).astype(np.float32) for _ in range(4)]
    _, dictionary, fits = learned(noise, count=15_000, tone=list)
    assert share(fits) == 0
    assert dictionary.warnings
    assert abs(np.median(dictionary.kurtosis) - 3) < 0.3


def test_brightness_is_the_first_principal_component(on_photographs):
    # common practice, no source
    patches, _, _ = on_photographs
    raw = patches.patches * patches.contrast[:, None] + patches.dc[:, None]
    _, vectors = np.linalg.eigh(np.cov(raw.T))
    first = vectors[:, -1]
    assert abs(first.sum()) / np.sqrt(first.size) > 0.95


def survey_of(blur=None):
    """A survey that measured nothing but perhaps the blur."""
    table = camera.make_table("identity", CONTRACT, None)
    return Survey(CONTRACT, NoiseModel(False, "not asked for"), table, blur_sigma_px=blur)


def widths(bank):
    """Finest sigma across the edge and its sigma along it."""
    p = bank.kernels[0].parameters
    return np.array([p["sigma_u_px"], p["sigma_v_px"]])


def chosen(pictures, purpose, seed=0, kernels=16):
    """A bank learned from pictures at patch size 12."""
    _, dictionary, fits = learned(pictures, size=12, count=20_000, seed=seed)
    settings = banks.BankSettings(kernels=kernels, purpose=purpose, name="b")
    return banks.choose_bank(dictionary, fits, survey_of(), settings)


@pytest.fixture(scope="module")
def feature_bank(photographs):
    return chosen(photographs, "features")


def test_the_bank_follows_the_blur_of_the_camera(photographs, feature_bank):
    found = [widths(feature_bank)[0]]
    for blur in (0.7, 1.2):
        blurred = [ndimage.gaussian_filter(p, blur) for p in photographs]
        found.append(widths(chosen(blurred, "features"))[0])
    assert found[0] * 1.1 < found[1]
    assert found[1] * 1.1 < found[2]


def test_a_rotated_basis_is_covered_less(feature_bank):
    coverage = feature_bank.coverage
    assert coverage.learned > coverage.rotated + 0.2
    assert coverage.learned > coverage.untrained


def test_photographs_turned_by_90_degrees_give_the_bank_turned(photographs, feature_bank):
    turned = chosen([np.rot90(p).copy() for p in photographs], "features", seed=1)
    np.testing.assert_allclose(widths(turned), widths(feature_bank), rtol=0.06)
    by_angle = {
        (k.scale, k.parity, round(np.degrees(k.parameters["theta_rad"]), 3)): i
        for i, k in enumerate(feature_bank.kernels)
    }
    for k, taps in zip(turned.kernels, turned.taps, strict=True):
        angle = round((np.degrees(k.parameters["theta_rad"]) + 90) % 180, 3)
        twin = feature_bank.taps[by_angle[k.scale, k.parity, angle]]
        a, b = np.rot90(taps).ravel(), twin.ravel()
        if a.size == b.size:
            assert abs(a @ b) / np.linalg.norm(a) / np.linalg.norm(b) > 0.98


def test_the_bank_is_stable_over_seeds(photographs, feature_bank):
    again = chosen(photographs, "features", seed=5)
    assert banks.compare_banks(feature_bank, again).min() >= 0.95
