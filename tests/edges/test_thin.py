"""Thinning, hysteresis, cascade: against plain loops, other libraries, and symmetry."""

import math

import numpy as np
import pytest
from scipy import ndimage
from skimage.filters import apply_hysteresis_threshold

from patchlab.edges import thin
from patchlab.errors import UsageError
from patchlab.types import Bank


def one_shape(bank, scale=0):
    return thin.shapes_of(bank)[scale]


@pytest.fixture
def noisy(step):
    g = np.random.default_rng(5)
    picture = step((64, 71), 33.2, 30.1, 0.4, 12.0, 0.9)
    picture += step((64, 71), 20.0, 50.0, 2.0, 9.0, 0.9)
    return picture + g.standard_normal(picture.shape, dtype=np.float32)


# ---------------------------------------------------------------- strength


def test_strength_is_the_largest_absolute_odd_response(make_bank, engine, noisy):
    bank = make_bank()
    responses = engine(bank)(noisy)
    for shape in thin.shapes_of(bank):
        got = thin.strongest(shape, responses.__getitem__, "step")
        planes = np.abs(responses[list(shape.odd)])
        np.testing.assert_array_equal(got.strength, planes.max(axis=0))
        np.testing.assert_array_equal(got.orientation, planes.argmax(axis=0))


def test_energy_is_the_root_of_the_sum_of_squares(make_bank, engine, noisy):
    bank = make_bank(scales=((1.3, 1.8),), parities=("odd", "even"), strength="energy")
    responses = engine(bank)(noisy)
    shape = one_shape(bank)
    got = thin.strongest(shape, responses.__getitem__, "energy")
    planes = responses[list(shape.odd)] ** 2 + responses[list(shape.even)] ** 2
    np.testing.assert_allclose(got.strength**2, planes.max(axis=0), rtol=1e-5)


def test_widths_and_reach_come_from_the_taps_when_parameters_do_not_say(make_bank):
    bank = make_bank(scales=((1.5, 1.5),))
    bare = tuple(
        type(k)(k.name, k.family, k.parity, k.scale, k.orientation, {}, 1.0) for k in bank.kernels
    )
    blind = one_shape(Bank("blind", bare, bank.taps, bank.table))
    known = one_shape(bank)
    assert blind.sigma_px == pytest.approx(known.sigma_px, rel=0.02)
    np.testing.assert_allclose(blind.angles, known.angles, atol=1e-12)
    energy = (bank.taps.astype(float) ** 2).sum(axis=0)
    c, r = bank.radius, blind.reach_px
    inside = energy[c - r : c + r + 1, c - r : c + r + 1].sum() / energy.sum()
    closer = energy[c - r + 1 : c + r, c - r + 1 : c + r].sum() / energy.sum()
    assert closer < 0.999 <= inside


def test_a_bank_without_the_parity_is_refused(make_bank):
    with pytest.raises(UsageError, match="no kernels that find line edges"):
        thin.shapes_of(make_bank(), "line")
    with pytest.raises(UsageError, match="pair"):
        thin.shapes_of(make_bank(), "energy")


# ---------------------------------------------------------------- thinning


def test_thinning_against_one_pixel_at_a_time():
    g = np.random.default_rng(2)
    strength = g.random((23, 31)).astype(np.float32)
    angles = np.pi * np.arange(8) / 8
    turn = g.integers(0, 8, strength.shape).astype(np.uint8)
    got = thin.thin(strength, turn, angles)
    expected = np.zeros_like(got)
    for y in range(1, 22):
        for x in range(1, 30):
            dx, dy = math.cos(angles[turn[y, x]]), math.sin(angles[turn[y, x]])
            beside = ndimage.map_coordinates(
                strength.astype(float), [[y + dy, y - dy], [x + dx, x - dx]], order=1
            )
            expected[y, x] = strength[y, x] > beside[0] and strength[y, x] >= beside[1]
    np.testing.assert_array_equal(got, expected)
    assert 0.05 < got.mean() < 0.6


def test_one_of_two_equal_neighbours_stays():
    strength = np.zeros((7, 9), np.float32)
    strength[:, 4:6] = 2.0
    got = thin.thin(strength, np.zeros((7, 9), np.uint8), np.zeros(1))
    assert got[1:-1].sum(axis=1).tolist() == [1] * 5
    assert got[1:-1, 5].all()


def test_floor_only_removes():
    g = np.random.default_rng(3)
    strength = g.random((40, 40)).astype(np.float32)
    turn = g.integers(0, 4, strength.shape).astype(np.uint8)
    angles = np.pi * np.arange(4) / 4
    whole = thin.thin(strength, turn, angles)
    np.testing.assert_array_equal(
        thin.thin(strength, turn, angles, 0.7), whole & (strength >= np.float32(0.7))
    )


def test_a_picture_too_small_to_have_neighbours_has_no_elements():
    assert not thin.thin(np.ones((2, 5), np.float32), np.zeros((2, 5), np.uint8), np.zeros(1)).any()


@pytest.mark.parametrize("degrees", [0, 10, 22.5, 37, 45, 68, 90, 113, 135, 160])
def test_a_step_gives_one_thin_line_where_it_is(make_bank, engine, step, degrees):
    bank, theta = make_bank(), math.radians(degrees)
    x0, y0 = 48.3, 47.8
    picture = step((96, 96), x0, y0, theta, 20.0, 0.8)
    found = thin.edge_map(bank, engine(bank)(picture), 5.0)
    rows, cols = np.nonzero(found.edges)
    across = (cols - x0) * math.cos(theta) + (rows - y0) * math.sin(theta)
    along = -(cols - x0) * math.sin(theta) + (rows - y0) * math.cos(theta)
    assert np.abs(across).max() <= 0.75
    # Pixels nearer than half a pixel to the line stay: one for each pixel of its length on
    # average. On an exact diagonal all have one of two distances, so none or every second stays.
    middle = np.abs(along) < 35
    assert 70 / math.sqrt(2) - 2 <= middle.sum() <= 70 * math.sqrt(2) + 2
    if degrees % 45:
        assert 66 <= middle.sum() <= 84
    gaps = np.diff(np.sort(along[middle]))
    assert gaps.max() < 1.6
    assert (found.scale[found.edges] == 0).all()


# ---------------------------------------------------------------- hysteresis and cascade


def test_hysteresis_is_that_of_scikit_image_with_eight_neighbours():
    g = np.random.default_rng(7)
    strength = ndimage.gaussian_filter(g.standard_normal((80, 90)), 1.5).astype(np.float32) * 5
    strength[strength < 0.3] = 0
    got = thin.hysteresis(strength, 0.6, 1.2)
    label, n = ndimage.label(strength >= 0.6, structure=np.ones((3, 3)))
    top = ndimage.maximum(strength, label, np.arange(1, n + 1))
    np.testing.assert_array_equal(got, np.isin(label, 1 + np.flatnonzero(top >= 1.2)))
    four = apply_hysteresis_threshold(strength, 0.6, 1.2)  # theirs joins four neighbours
    assert (got | four == got).all()
    assert got.sum() >= four.sum() > 0


def test_hysteresis_with_equal_thresholds_is_a_threshold():
    strength = np.random.default_rng(1).random((9, 9)).astype(np.float32)
    np.testing.assert_array_equal(thin.hysteresis(strength, 0.5, 0.5), strength >= np.float32(0.5))


@pytest.mark.parametrize(("low", "high"), [(0.0, 1.0), (2.0, 1.0), (-1.0, 1.0)])
def test_thresholds_out_of_order_are_refused(low, high):
    with pytest.raises(UsageError, match="hysteresis needs"):
        thin.hysteresis(np.ones((3, 3), np.float32), low, high)


def test_dilation_is_a_disk():
    mask = np.random.default_rng(0).random((40, 50)) > 0.97
    y, x = np.mgrid[-2:3, -2:3]
    disk = x * x + y * y < 2.5**2
    np.testing.assert_array_equal(
        thin.dilate(mask, 2), ndimage.binary_dilation(mask, structure=disk)
    )


def test_coarse_elements_stay_away_from_fine_ones():
    fine, coarse = np.zeros((2, 20, 20), np.float32)
    fine[:, 6] = 5.0
    coarse[:, 8] = 9.0
    coarse[:, 9] = 9.0
    edges, level = thin.cascade([fine, coarse], 3.0, 4.0)
    assert edges[:, 6].all()
    assert not edges[:, 8].any()
    assert edges[:, 9].all()
    assert (level[:, 9] == 1).all()
    assert (level[:, 6] == 0).all()


def test_the_coarse_scale_finds_what_the_fine_one_cannot(make_bank, engine, step):
    bank = make_bank()
    g = np.random.default_rng(11)
    picture = step((128, 128), 64.0, 64.0, 0.3, 2.8, 2.0)
    picture += g.standard_normal(picture.shape, dtype=np.float32)
    responses, alone, ratio = engine(bank)(picture), make_bank(scales=((1.1, 1.6),)), 0.7
    found = thin.edge_map(bank, responses, 5.2, hysteresis_ratio=ratio)
    first = thin.edge_map(alone, responses[:8], 5.2, hysteresis_ratio=ratio)
    assert found.edges.sum() > 1.7 * first.edges.sum() > 0
    assert (found.scale[found.edges] == 1).sum() > 50


def test_weak_coarse_maxima_beside_a_strong_one_are_dropped(make_bank):
    shape = thin.shapes_of(make_bank())[1]
    strength = np.zeros((40, 40), np.float32)
    strength[:, 20] = 30.0
    strength[:, 24] = 8.0
    strength[:, 36] = 8.0
    flat = thin.ScaleMap(shape, strength, np.zeros((40, 40), np.uint8), own=thin.RELATIVE_FLOOR)
    kept = thin.candidates(flat, 3.0, margin=0)
    assert kept[5:-5, 20].all()
    assert not kept[:, 24].any()
    assert kept[5:-5, 36].all()


# ---------------------------------------------------------------- the whole chain


def test_a_rotated_picture_has_the_rotated_edges(make_bank, engine, noisy):
    bank = make_bank()
    a = thin.edge_map(bank, engine(bank)(noisy), 4.0)
    b = thin.edge_map(bank, engine(bank)(np.rot90(noisy).copy()), 4.0)
    assert a.edges.sum() > 80
    np.testing.assert_array_equal(np.rot90(a.edges), b.edges)
    turned = (np.rot90(a.orientation)[b.edges].astype(int) + 4) % 8
    np.testing.assert_array_equal(turned, b.orientation[b.edges])
    np.testing.assert_array_equal(np.rot90(a.scale)[b.edges], b.scale[b.edges])


@pytest.mark.parametrize(("gain", "shift"), [(1.0, 500.0), (4.0, 0.0), (-2.0, 30.0)])
def test_brightness_and_contrast_do_not_move_edges(make_bank, engine, noisy, gain, shift):
    bank = make_bank()
    a = thin.edge_map(bank, engine(bank)(noisy), 4.0)
    changed = (gain * noisy.astype(np.float64) + shift).astype(np.float32)
    b = thin.edge_map(bank, engine(bank)(changed), 4.0 * abs(gain))
    assert (a.edges != b.edges).mean() < 1e-3
    both = a.edges & b.edges
    np.testing.assert_allclose(b.strength[both], abs(gain) * a.strength[both], rtol=1e-3)


def test_a_flat_picture_has_no_edges(make_bank, engine):
    bank = make_bank()
    found = thin.edge_map(bank, engine(bank)(np.full((50, 60), 200.0, np.float32)), 3.0)
    assert not found.edges.any()


def test_no_elements_within_the_kernels_reach_of_the_border(make_bank, engine):
    bank = make_bank()
    noise = np.random.default_rng(4).standard_normal((200, 200), dtype=np.float32)
    found = thin.edge_map(bank, engine(bank)(noise), 2.0)
    for shape in thin.shapes_of(bank):
        mine = found.edges & (found.scale == shape.scale)
        r = shape.reach_px
        assert mine.sum() == mine[r:-r, r:-r].sum() > 0


def test_elements_that_see_an_invalid_pixel_are_dropped(make_bank, engine, step):
    bank = make_bank(scales=((1.1, 1.6),))
    picture = step((60, 60), 30.0, 30.0, 0.0, 20.0, 0.8)
    invalid = np.zeros(picture.shape, bool)
    invalid[30, 31] = True
    whole = thin.edge_map(bank, engine(bank)(picture), 5.0)
    cut = thin.edge_map(bank, engine(bank)(picture), 5.0, invalid=invalid)
    r = one_shape(bank).reach_px
    gone = np.nonzero(whole.edges & ~cut.edges)[0]
    assert gone.tolist() == list(range(30 - r, 31 + r))


def test_a_higher_threshold_finds_a_subset(make_bank, engine, noisy):
    bank = make_bank(scales=((1.1, 1.6),))
    responses = engine(bank)(noisy)
    many = thin.edge_map(bank, responses, 3.0).edges
    few = thin.edge_map(bank, responses, 6.0).edges
    assert 0 < few.sum() < many.sum()
    assert not (few & ~many).any()


def test_wrong_planes_and_thresholds_are_refused(make_bank, engine, noisy):
    bank = make_bank()
    responses = engine(bank)(noisy)
    with pytest.raises(UsageError, match="responses must be"):
        thin.edge_map(bank, responses[:3], 4.0)
    with pytest.raises(UsageError, match="must be positive"):
        thin.edge_map(bank, responses, 0.0)
