"""Fixed spots: hot and dead pixels, soft shadows, and what is no spot."""

import numpy as np
import pytest
from scipy import ndimage

from patchlab.camera.pixels import Region
from patchlab.camera.spots import SpotMeter

SHAPE = (160, 200)
AT = ((40, 50), (90, 120), (120, 60), (70, 170))


def scene(rng):
    """Blobs of many sizes and noise, 0 to 255."""
    plane = sum(30 * s * ndimage.gaussian_filter(rng.standard_normal(SHAPE), s) for s in (2, 5, 12))
    return np.clip(110 + plane, 20, 240) + 2 * rng.standard_normal(SHAPE)


def shadows():
    y, x = np.indices(SHAPE)
    return 1 - 0.5 * sum(np.exp(-((y - a) ** 2 + (x - b) ** 2) / 2 / 2.0**2) for a, b in AT)


def told(change=lambda codes, rng: codes, frames=10, still=False, seed=0):
    rng = np.random.default_rng(seed)
    meter, first = SpotMeter(), scene(rng)
    for _ in range(frames):
        codes = change(first + rng.standard_normal(SHAPE) if still else scene(rng), rng)
        usable = np.ones(SHAPE, bool)
        meter.add([Region("a", codes.astype(np.float32), usable)], SHAPE, 255)
    rate, found = meter.result(8)
    return round(rate * SHAPE[0] * SHAPE[1] / 1e6), found


def hot(codes, _):
    for y, x in AT:
        codes[y, x] += 60
    return codes


def dead(codes, _):
    for y, x in AT:
        codes[y, x] *= 0.2
    return codes


@pytest.mark.parametrize("seed", range(3))
def test_scenes_have_no_spots(seed):
    assert told(seed=seed) == (0, False)


@pytest.mark.parametrize("change", [hot, dead, lambda c, _: c * shadows()])
def test_each_spot_is_counted_once(change):
    assert told(change) == (len(AT), True)


def test_one_spot_is_no_mark_of_the_folder():
    def one(codes, _):
        codes[AT[0]] += 60
        return codes

    assert told(one) == (1, False)


def test_what_moves_and_what_fills_a_line_is_no_spot():
    def moving(codes, rng):
        codes[rng.integers(8, 150), rng.integers(8, 190)] += 100
        codes[:, 33] += 10  # a column has a mark of its own
        return codes

    assert told(moving) == (0, False)


def test_a_scene_that_stays_cannot_tell():
    assert told(still=True)[1] is None


def test_few_frames_cannot_tell():
    assert told(hot, frames=7) == (0, None)
