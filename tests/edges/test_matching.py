"""One-to-one matching and Pratt's merit: exact cases and scipy's assignment as referee."""

import numpy as np
import pytest
from scipy.optimize import linear_sum_assignment
from scipy.spatial.distance import cdist

from patchlab.edges.matching import direction_error, match, pratt_merit, spaced
from patchlab.errors import UsageError


def referee(a, b, radius):
    """Most pairs, then least distance, by dense assignment."""
    far = cdist(a, b)
    price = np.where(far <= radius, far - 1e6, 0.0)
    i, j = linear_sum_assignment(price)
    real = far[i, j] <= radius
    return real.sum(), far[i, j][real].sum()


@pytest.mark.parametrize("seed", range(8))
def test_against_dense_assignment(seed):
    g = np.random.default_rng(seed)
    a, b = g.uniform(0, 12, (90, 2)), g.uniform(0, 12, (110, 2))
    got = match(a, b, 1.0)
    count, total = referee(a, b, 1.0)
    assert len(got.found) == count
    assert got.distance.sum() == pytest.approx(total, abs=1e-6)
    assert len(set(got.found)) == len(set(got.truth)) == count
    np.testing.assert_allclose(got.distance, np.hypot(*(a[got.found] - b[got.truth]).T))
    assert got.distance.max() <= 1.0


def test_more_pairs_count_before_shorter_ones():
    found = np.array([[0.0, 0.0], [0.9, 0.0]])
    truth = np.array([[0.8, 0.0], [1.8, 0.0]])
    got = match(found, truth)
    assert got.found.tolist() == [0, 1]
    assert got.truth.tolist() == [0, 1]


def test_precision_recall_and_f():
    truth = np.column_stack([np.arange(10.0), np.zeros(10)])
    found = np.concatenate([truth[:6] + np.array([0, 0.3]), [[50.0, 50.0], [60.0, 0.0]]])
    got = match(found, truth)
    assert got.precision == 6 / 8
    assert got.recall == 6 / 10
    assert got.f == pytest.approx(2 * 0.75 * 0.6 / 1.35)
    back = match(truth, found)
    assert (back.precision, back.recall) == (got.recall, got.precision)


def test_a_doubled_line_is_half_wrong():
    truth = np.column_stack([np.arange(20.0), np.zeros(20)])
    found = np.concatenate([truth, truth + np.array([0, 0.5])])
    assert match(found, truth).precision == 0.5


def test_nothing_on_a_side():
    none, one = np.empty((0, 2)), np.zeros((1, 2))
    assert (match(none, one).precision, match(none, one).recall, match(none, one).f) == (1, 0, 0)
    assert (match(one, none).precision, match(one, none).recall) == (0, 1)
    assert match(none, none).f == 1
    assert len(match(one, one + 5).found) == 0


def test_a_long_contour_is_matched_quickly_and_wholly():
    t = np.linspace(0, 2 * np.pi, 20000, endpoint=False)
    circle = np.column_stack([np.cos(t), np.sin(t)]) * 20000 / (2 * np.pi)
    g = np.random.default_rng(0)
    got = match(circle + g.normal(0, 0.1, circle.shape), circle)
    assert got.f == 1
    assert got.distance.mean() == pytest.approx(0.1 * np.sqrt(np.pi / 2), rel=0.03)


def test_wrong_points_are_refused():
    with pytest.raises(UsageError, match=r"shape \(n, 2\)"):
        match(np.zeros((3, 3)), np.zeros((3, 2)))
    with pytest.raises(UsageError, match="finite"):
        match(np.array([[np.nan, 0]]), np.zeros((3, 2)))
    with pytest.raises(UsageError, match="radius"):
        match(np.zeros((3, 2)), np.zeros((3, 2)), 0.0)


@pytest.fixture
def line():
    return np.column_stack([np.zeros(40), np.arange(40.0)])


@pytest.mark.parametrize(("shift", "merit"), [(0, 1.0), (1, 0.9), (2, 9 / 13), (3, 0.5)])
def test_pratt_of_a_displaced_line(line, shift, merit):
    # 1 / (1 + d^2 / 9), exact
    assert pratt_merit(line + np.array([shift, 0]), line) == pytest.approx(merit, abs=1e-12)


def test_pratt_of_a_half_missed_and_of_a_doubled_line(line):
    assert pratt_merit(line[::2], line) == pytest.approx(0.5)
    assert pratt_merit(np.concatenate([line, line + np.array([1, 0])]), line) == pytest.approx(0.95)
    assert pratt_merit(np.empty((0, 2)), line) == 0
    assert pratt_merit(np.empty((0, 2)), np.empty((0, 2))) == 1


def test_direction_errors_wrap():
    assert direction_error(3.1, -3.1) == pytest.approx(6.2 - 2 * np.pi)
    assert direction_error(0.1, 0.1 + np.pi, signed=False) == pytest.approx(0, abs=1e-12)
    assert abs(direction_error(0.1, 0.1 + np.pi)) == pytest.approx(np.pi)


def test_truth_is_spaced_along_each_outline():
    t = np.arange(0, 2 * np.pi, 0.01)
    circle = 25 * np.column_stack([np.cos(t), np.sin(t)])
    line = np.column_stack([np.full(81, 60.0), np.arange(0, 20.25, 0.25)])
    both = np.concatenate([circle, line])
    kept = spaced(both)
    first = kept[kept < len(circle)]
    gaps = np.diff(first) * 0.25  # a quarter of a pixel of arc between samples
    assert gaps.min() >= 0.75
    assert gaps.max() <= 1.25
    assert len(first) == pytest.approx(2 * np.pi * 25, abs=1.5)
    assert (kept[kept >= len(circle)] - len(circle)).tolist() == list(range(0, 81, 4))
    assert spaced(np.empty((0, 2))).size == 0
