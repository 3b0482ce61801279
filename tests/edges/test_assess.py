"""The measuring code of an assessment: it must not flatter."""

import dataclasses
import math

import numpy as np
import pytest
from scipy import ndimage
from scipy.stats import chi2

from patchlab.edges import assess, calibrate, rivals
from patchlab.edges.matching import count_pairs, match
from patchlab.types import InputContract, InputTable


def line_scene(contrast=5.0):
    x = np.arange(12.0, 40)
    truth = np.column_stack([x, np.full(x.size, 20.3)])
    return assess.Scene(np.zeros((48, 52), np.uint8), truth, np.full(x.size, contrast), 8)


def test_a_perfect_map_scores_one_and_a_doubled_one_loses_half_its_precision():
    scene = line_scene()
    assert assess.score(scene.truth, scene).f == 1.0
    twice = np.concatenate([scene.truth, scene.truth + np.array([0.0, 0.4])])
    found = assess.score(twice, scene)
    assert (found.precision, found.recall) == (0.5, 1.0)
    far = assess.score(scene.truth + np.array([0.0, 1.1]), scene)
    assert (far.precision, far.recall, far.f) == (0.0, 0.0, 0.0)


def test_faint_truth_is_neither_asked_for_nor_held_against_anyone():
    scene = line_scene()
    faint = np.where(np.arange(len(scene.truth)) < 14, 0.5, 5.0)
    scene = assess.Scene(scene.pixels, scene.truth, faint, 8)
    assert assess.score(scene.truth, scene).f == 1.0
    assert assess.score(scene.truth[14:], scene).f == 1.0


def test_elements_near_the_rim_do_not_count():
    scene = line_scene()
    rim = np.array([[3.0, 3.0], [51.0, 20.0]])
    assert assess.score(np.concatenate([scene.truth, rim]), scene).f == 1.0


@pytest.mark.parametrize("seed", range(4))
def test_counting_pairs_agrees_with_the_matching(seed):
    g = np.random.default_rng(seed)
    a, b = g.uniform(0, 14, (90, 2)), g.uniform(0, 14, (70, 2))
    assert count_pairs(a, b) == len(match(a, b).found)


def test_location_bound_is_the_published_one_when_nothing_else_is_unknown():
    """Position alone: var = 2 sqrt(pi) blur / contrast^2 a row; unknown levels cost a factor."""
    table = InputTable("identity", InputContract("float32", 0.0, 100.0), None, 1.0)
    bound, turn = assess.step_bounds(table, 0.0, 20.0, 1.0, 0.0, 0.0)
    alone = math.sqrt(2 * math.sqrt(math.pi) / 20**2 / 9)  # the disk is nine rows high
    assert 1.0 < bound / alone < 2.2  # the factor for a window of 21 px is 4.26 in variance
    stronger = assess.step_bounds(table, 0.0, 40.0, 1.0, 0.0, 0.0)
    assert stronger == pytest.approx((bound / 2, turn / 2))
    # a line through nine rows whose places scatter by ``rows`` each turns by its slope's sd
    rows = alone * 3
    slope = rows / math.sqrt(sum(j * j for j in range(-4, 5)))
    assert 0.8 < turn / slope < 2.2


def test_steps_are_located_at_the_bound_and_told_honestly(make_bank, engine):
    table = InputTable("identity", InputContract("float32", 0.0, 100.0), None, 1.0)
    bank = make_bank(table=table)
    correlate = engine(bank)
    bank = dataclasses.replace(bank, thresholds=calibrate(bank, megapixels=1, rates=(10, 1000)))

    def shoot(light, draw):
        return (light + draw.standard_normal(light.shape)).astype(np.float32)

    draw = np.random.default_rng(3)
    found = assess.locate_steps(
        bank, correlate, shoot, 20.0, base=5.0, blur_px=0.8, pictures=10, draw=draw
    )
    assert found.edgels > 200
    assert 0.8 < found.ratio < 1.25  # a dozen edges; the exact ratio is held in test_locate
    assert 0.75 < found.sd_ratio < 1.3
    assert abs(found.bias_px) < 0.02
    assert 0.75 < found.turn_deg / found.turn_bound_deg < 1.3


def test_counts_of_even_groups_pass_and_a_slope_over_grey_fails():
    g = np.random.default_rng(5)
    limit = assess.flatness(np.full(16, 20)).limit
    assert limit == pytest.approx(chi2.ppf(0.99, 15))
    even = [assess.flatness(g.poisson(20, 16)).flat for _ in range(200)]
    assert 0.95 < np.mean(even) <= 1.0
    sloped = [assess.flatness(g.poisson(np.linspace(8, 32, 16))).flat for _ in range(50)]
    assert np.mean(sloped) < 0.2


def test_elements_come_in_clusters_and_groups_do_not(make_bank, engine):
    """Why evenness is tested on groups: over tiles of noise their variance is their mean."""
    bank = make_bank(scales=((1.2, 1.5),))
    bank = dataclasses.replace(bank, thresholds=calibrate(bank, megapixels=1, rates=(100, 1000)))
    g = np.random.default_rng(8)
    tiles = [
        assess.count_flat(
            bank, g.standard_normal((160, 160), dtype=np.float32), engine(bank), (1000.0,)
        )
        for _ in range(40)
    ]
    elements = np.array([t.elements[0] for t in tiles])
    groups = np.array([t.groups[0] for t in tiles])
    assert elements.var() / elements.mean() > 2
    assert 0.4 < groups.var() / groups.mean() < 1.8
    area = sum(t.megapixels for t in tiles)
    assert 0.7 < elements.sum() / area / 1000 < 1.35


@pytest.mark.parametrize("name", rivals.DETECTORS)
def test_every_library_finds_a_strong_step_at_some_setting(name, step):
    picture = step((64, 64), 32.0, 32.0, 0.4, 30.0, 0.8)
    y, x = np.mgrid[:64, :64] - 32.0
    distance = np.abs(x * math.cos(0.4) + y * math.sin(0.4))
    grid = rivals.Grid(quick=True)
    runs = dict(rivals.DETECTORS[name](picture, grid))
    assert len(runs) == len(grid.sigmas) * len(grid.highs) * len(grid.ratios)
    inner = np.s_[8:-8, 8:-8]
    good = [
        m for m in runs.values() if m[inner].sum() > 40 and distance[inner][m[inner]].max() < 1.3
    ]
    assert good


def test_a_canny_on_gradients_gets_gradients_in_units_of_the_picture():
    seen = []

    def canny(x, y, low, high):
        seen.append((np.abs(x).max(), high))
        return np.abs(x) > high

    ramp = np.tile(np.arange(40, dtype=np.float32), (40, 1))
    grid = rivals.Grid(quick=True)
    runs = dict(rivals.by_gradients(canny)(ramp, grid))
    found = {name: m[10:-10, 10:-10].all() for name, m in runs.items()}
    # the slope is 1 a pixel: every threshold below it passes all, every one above none
    for (_, high, _), everywhere in zip(grid, found.values(), strict=True):
        assert everywhere == (rivals.SLOPE * high < 1)
    assert max(s for s, _ in seen) == 20000


def test_crossings_of_the_laplacian_are_one_pixel_wide(step):
    picture = step((64, 64), 32.2, 32.0, 0.0, 30.0, 0.8)
    bump = ndimage.gaussian_laplace(picture.astype(float), 1.0)
    rows = rivals._crossings(np.where(np.abs(bump) < 1e-6, 0.0, bump))[8:-8, 28:37]
    assert (rows.sum(axis=1) == 1).all()
