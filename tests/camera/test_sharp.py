"""The ratio of fine to middling noise power: 1 for white noise, above it after sharpening only."""

import numpy as np
import pytest
from scipy import ndimage

from patchlab.camera.pixels import Region
from patchlab.camera.sharp import PLAIN, SHARP_THRESHOLD, SharpMeter, Sharpness, verdict

SIDE = 400


def measured(change=None, scene=0.0, frames=4, seed=0):
    """White noise of 4 codes over a scene, changed, rounded."""
    rng = np.random.default_rng(seed)
    meter = SharpMeter()
    for _ in range(frames):
        codes = 500 + scene + 4 * rng.standard_normal((SIDE, SIDE))
        codes = codes if change is None else change(codes)
        usable = np.ones(codes.shape, bool)
        meter.add(Region("a", np.round(codes).astype(np.float32), usable))
    return meter.result()


def unsharp(amount, radius):
    return lambda x: x + amount * (x - ndimage.gaussian_filter(x, radius))


def steps():
    return 60.0 * (np.add.outer(np.arange(SIDE) // 50, np.arange(SIDE) // 40) % 2)


@pytest.mark.parametrize("seed", range(5))
def test_white_noise_gives_one_whatever_is_chosen(seed):
    found = measured(seed=seed)
    assert found.ratio == pytest.approx(1, abs=3 * found.error)
    assert verdict(found, coloured=False) is not True


@pytest.mark.parametrize(("amount", "radius"), [(0.5, 1.0), (1.0, 1.0), (1.0, 0.7)])
def test_sharpened_noise_lies_above_one_beside_edges_too(amount, radius):
    for scene in (0.0, ndimage.gaussian_filter(steps(), 0.7)):
        found = measured(unsharp(amount, radius), scene)
        assert found.ratio > 1.1
        assert verdict(found, coloured=False) is True
        assert verdict(found, coloured=True) is None  # compression has its own colour


def test_more_sharpening_gives_a_higher_ratio():
    ratios = [measured(unsharp(amount, 1.0)).ratio for amount in (0.0, 0.5, 1.0, 2.0)]
    assert np.all(np.diff(ratios) > 0.03)
    # far below the mask's own ratio of powers, for short blocks blur frequencies
    assert 1.3 < ratios[2] < 1.6


def test_smoothed_or_faint_noise_cannot_tell():
    assert verdict(measured(lambda x: ndimage.gaussian_filter(x, 0.6)), coloured=False) is None
    for seed in range(4):  # a third of a code: what stands out by chance must not decide
        faint = measured(lambda x: 500 + (x - 500) / 12, seed=seed)
        assert verdict(faint, coloured=False) is None
    assert verdict(None, coloured=False) is None


def test_false_is_said_only_of_plain_and_well_measured_noise():
    assert verdict(Sharpness(1.0, 0.03, 1.0, 500), coloured=False) is False
    assert verdict(Sharpness(1.0, 0.08, 1.0, 60), coloured=False) is None
    assert verdict(Sharpness(PLAIN[0] - 0.01, 0.03, 1.0, 500), coloured=False) is None
    assert verdict(Sharpness(SHARP_THRESHOLD + 0.01, 0.2, 1.0, 60), coloured=False) is None
