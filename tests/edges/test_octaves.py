"""Octaves: soft edges that a plain bank misses, in their place, at the promised rate."""

import dataclasses
import math

import numpy as np
import pytest
from scipy.special import ndtr

from patchlab.edges import calibrate, detect_edgels, thin, threshold

BASE, FIRST = ((1.1, 1.4),), ((2.2, 2.8), (4.4, 5.6))


@pytest.fixture(scope="module")
def banks(make_bank):
    """A bank of one size, and the same with two octaves; both with thresholds."""
    plain = make_bank(scales=BASE)
    more = dataclasses.replace(make_bank(scales=BASE + FIRST), octaves=2)
    return [
        dataclasses.replace(b, thresholds=calibrate(b, megapixels=1.5, rates=(10, 100, 1000)))
        for b in (plain, more)
    ]


SIDE = 96


def soft_edges(bank, engine, blur, contrast, count=6):
    """Share of an edge's length that is found, and errors and told errors of its edgels."""
    y, x = np.mgrid[:SIDE, :SIDE] - SIDE // 2
    g = np.random.default_rng(3)
    length, errors, told, scales = [], [], [], []
    for _ in range(count):
        theta, p = g.uniform(-math.pi, math.pi), g.uniform(-0.5, 0.5)
        across = x * math.cos(theta) + y * math.sin(theta) - p
        picture = contrast * ndtr(across / blur) + g.standard_normal(x.shape)
        _, e = detect_edgels(bank, picture.astype(np.float32), engine(bank), rate=10.0, blur_px=0.8)
        dx, dy = e["x"] - SIDE // 2, e["y"] - SIDE // 2
        off = dx * math.cos(theta) + dy * math.sin(theta) - p
        along = -dx * math.sin(theta) + dy * math.cos(theta)
        near = (np.abs(off) < 2 * blur) & (np.abs(along) < 20)
        length.append(len(np.unique(np.floor(along[near]))) / 40)
        errors.append(off[near])
        told.append(e["sd"][near])
        scales.append(e["scale"][near])
    return (np.mean(length), *map(np.concatenate, (errors, told, scales)))


@pytest.mark.parametrize(("blur", "contrast"), [(2.5, 3.0), (4.0, 3.0), (5.0, 4.0)])
def test_octaves_find_soft_edges_that_the_plain_bank_misses(banks, engine, blur, contrast):
    plain, more = (soft_edges(b, engine, blur, contrast) for b in banks)
    assert plain[0] < 0.45
    assert more[0] > 0.7
    assert more[0] > 2 * plain[0]


@pytest.mark.parametrize(("blur", "contrast"), [(3.0, 12.0), (4.0, 20.0), (5.0, 20.0)])
def test_soft_edges_are_in_their_place_and_told_honestly(banks, engine, blur, contrast):
    _, plain, _, _ = soft_edges(banks[0], engine, blur, contrast)
    share, errors, told, scales = soft_edges(banks[1], engine, blur, contrast)
    assert share > 0.8
    assert (scales > 0).mean() > 0.9
    assert np.median(np.abs(errors)) < 0.15
    assert np.median(np.abs(errors)) < np.median(np.abs(plain)) / 3
    assert 0.5 < np.median(np.abs(errors) / told) / 0.6745 < 1.5


def test_sharp_edges_stay_with_the_finest_scale(banks, engine):
    plain = soft_edges(banks[0], engine, 0.8, 10.0)
    more = soft_edges(banks[1], engine, 0.8, 10.0)
    assert (more[3] == 0).all()
    np.testing.assert_allclose(plain[1], more[1], atol=1e-4)  # kernels of another size round apart


def test_the_share_is_that_of_the_formula(banks):
    shapes = thin.shapes_of(banks[1])
    assert [s.octave for s in shapes] == [False, True, True]
    assert [s.apart_px for s in shapes] == [2, 2, 4]
    (j, share), (k, wider), last = thin.softer_of(shapes, "step")
    assert (j, k, last) == (1, 2, None)
    for found, s in ((share, 1.1), (wider, 2.2)):
        soft = thin.SOFT * s
        own, octave = (w**2 / math.hypot(w, soft) for w in (s, 2 * s))
        assert found == pytest.approx(own / octave)
        assert 1 / 4 < found < 1 / 2  # between very soft and sharp
    assert thin.softer_of(shapes, "line") == [None] * 3
    assert thin.softer_of(thin.shapes_of(banks[0]), "step") == [None]


def test_the_camera_s_own_blur_is_never_soft(make_bank):
    bank = dataclasses.replace(
        make_bank(scales=BASE + FIRST), octaves=2, provenance={"blur_sigma_px": 1.2}
    )
    assert [s.soft_px for s in thin.shapes_of(bank)] == pytest.approx([2.4, 2.64, 5.28])


@pytest.mark.parametrize("coloured", [False, True])
def test_the_promise_holds_over_all_scales_together(make_bank, smooth_autocovariance, coloured):
    noise = smooth_autocovariance if coloured else None
    bank = make_bank(scales=BASE + FIRST, orientations=6, autocovariance=noise)
    bank = dataclasses.replace(bank, octaves=2)
    table = calibrate(bank, megapixels=6, rates=(10, 100, 1000))
    counts = threshold.count_on_noise(bank, level=table.strength, megapixels=8, seed=5, key="fresh")
    found = counts.elements / counts.megapixels
    assert found[2] == pytest.approx(1000, rel=0.15)
    assert found[1] == pytest.approx(100, rel=0.15)
    assert 10 / 1.5 < found[0] < 15
