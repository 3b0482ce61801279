"""Places below the pixel: the Cramer-Rao bound, no bias through the table, lines, text."""

import csv
import io
import math

import numpy as np
import pytest
from scipy import ndimage
from scipy.special import ndtr

from patchlab.edges import locate, matching, model, thin
from patchlab.errors import UsageError
from patchlab.types import EDGEL, EdgeMap, InputContract, InputTable
from tests.edges.conftest import correlate_with

HALF = 9


def bound(theta, p, blur, height, radius=locate.RADIUS_PX, profile="step"):
    """Cramer-Rao standard deviations of place and direction; low and high unknown.

    The Fisher matrix of ``low + (high - low) profile(u / blur)`` in a disk, noise sd 1,
    by finite differences of a model written here a second time.
    """
    w = model.Window.disk(radius)

    def picture(q):
        u = (w.x * math.cos(q[1]) + w.y * math.sin(q[1]) - q[0]) / blur
        return q[2] + (q[3] - q[2]) * (ndtr(u) if profile == "step" else np.exp(-u * u / 2))

    q, h = np.array([p, theta, 0.0, height]), 1e-5
    jac = np.stack([(picture(q + h * e) - picture(q - h * e)) / (2 * h) for e in np.eye(4)])
    return np.sqrt(np.diag(np.linalg.inv(jac @ jac.T)))[:2]


class Trials:
    """Many small pictures with one edge each, stacked into one tall picture.

    ``twice`` repeats every edge, for draws that give the second half the negative noise.
    """

    def __init__(self, bank, draw, n, seed=0, twice=False):
        g = np.random.default_rng(seed)
        self.theta = g.uniform(-math.pi, math.pi, n)
        self.p = g.uniform(-0.5, 0.5, n)
        if twice:
            self.theta, self.p, n = np.tile(self.theta, 2), np.tile(self.p, 2), 2 * n
        side = 2 * HALF + 1
        y, x = np.mgrid[-HALF : HALF + 1, -HALF : HALF + 1]
        cos, sin = np.cos(self.theta)[:, None, None], np.sin(self.theta)[:, None, None]
        d, t = x * cos + y * sin - self.p[:, None, None], -x * sin + y * cos
        self.values = draw(d, t, g).astype(np.float32).reshape(n * side, side)
        self.rows, self.bank = np.arange(n) * side + HALF, bank
        self.responses = correlate_with(bank)(self.values)
        kind = bank.strength
        best = thin.strongest(thin.shapes_of(bank)[0], self.responses.__getitem__, kind)
        edges = np.zeros(self.values.shape, bool)
        edges[self.rows, HALF] = True
        self.map = EdgeMap(
            best.strength, best.orientation, np.zeros(edges.shape, np.uint8), edges, 1
        )

    def find(self, **options):
        """Edgels, error along the true normal, and error of the direction."""
        got = locate.edgels(self.bank, self.values, self.map, self.responses, **options)
        error = (got["x"] - HALF) * np.cos(self.theta) + (got["y"] - self.rows) * np.sin(self.theta)
        signed = self.bank.strength == "step"
        turn = matching.direction_error(got["theta"], self.theta, signed=signed)
        return got, error - self.p, turn

    def bounds(self, blur, height, **more):
        some = zip(self.theta[:150], self.p[:150], strict=True)
        return np.sqrt(np.mean([bound(t, p, blur, height, **more) ** 2 for t, p in some], axis=0))


def blurred_step(height, blur):
    return lambda d, t, g: height * ndtr(d / blur) + g.standard_normal(d.shape)


@pytest.fixture
def fine(make_bank):
    return make_bank(scales=((1.1, 1.6),))


# ---------------------------------------------------------------- steps at the bound


def test_the_bound_of_this_file_is_the_published_one():
    # per row: var = 2 sqrt(pi) blur s^2 / A^2; with low and high unknown in a 21 px window
    # the factor is 4.264 at blur 1; a disk sees rows of different length
    x = np.arange(-10, 11)

    def variance(blur, unknown):
        phi = np.exp(-((x / blur) ** 2) / 2) / (blur * math.sqrt(2 * math.pi))
        columns = [phi, 1 - ndtr(x / blur), ndtr(x / blur)][: 1 + 2 * unknown]
        jac = np.stack(columns)
        return np.linalg.inv(jac @ jac.T)[0, 0]

    assert variance(1.0, unknown=False) == pytest.approx(3.54491, rel=1e-3)
    assert variance(1.0, unknown=True) == pytest.approx(4.264, rel=1e-3)
    # nine rows at most, none longer than nine pixels
    assert math.sqrt(4.264 / 9) < bound(0.0, 0.0, 1.0, 1.0)[0] < 1.5 * math.sqrt(4.264 / 9)


@pytest.mark.parametrize(
    ("blur", "height"), [(0.5, 20.0), (0.7, 5.0), (0.7, 50.0), (1.0, 10.0), (1.2, 50.0)]
)
def test_place_and_direction_are_at_the_cramer_rao_bound(fine, blur, height):
    trials = Trials(fine, blurred_step(height, blur), 1500, seed=3)
    got, error, turn = trials.find(blur_px=blur)
    place, direction = trials.bounds(blur, height)
    assert 0.95 <= np.sqrt(np.mean(error**2)) / place <= 1.12
    assert 0.95 <= np.sqrt(np.mean(turn**2)) / direction <= 1.12
    assert abs(error.mean()) < max(0.01, 4 * place / math.sqrt(1500)) / 2 + 0.005
    assert np.median(got["sd"]) == pytest.approx(place, rel=0.08)
    assert np.std(error / got["sd"]) == pytest.approx(1.0, abs=0.1)
    assert (got["kind"] == locate.STEP).all()


@pytest.mark.parametrize("blur", [0.5, 0.7, 1.0, 1.2])
@pytest.mark.parametrize("height", [5.0, 10.0, 20.0, 50.0])
def test_within_a_tenth_of_the_bound_and_without_bias_over_the_whole_grid(fine, blur, height):
    # every edge is seen with a noise and with its negative: what is linear in the noise cancels
    # in the mean, so that a bias of a thousandth of a pixel shows
    pairs = 4000 if height == 5 else 1200

    def draw(d, t, g):
        noise = g.standard_normal((pairs, *d.shape[1:]))
        return height * ndtr(d / blur) + np.concatenate([noise, -noise])

    trials = Trials(fine, draw, pairs, seed=17, twice=True)
    _, error, turn = trials.find(blur_px=blur)
    place, direction = trials.bounds(blur, height)
    sure = 1 + 2 / math.sqrt(2 * pairs)  # two standard errors of a standard deviation
    assert sure * np.sqrt(np.mean(error**2)) / place <= 1.1
    assert sure * np.sqrt(np.mean(turn**2)) / direction <= 1.1
    assert np.sqrt(np.mean(error**2)) / place >= 0.93  # below, the truth would have leaked
    middle = (error[:pairs] + error[pairs:]) / 2
    assert abs(middle.mean()) + 3 * middle.std() / math.sqrt(pairs) < 0.01


def test_blur_that_is_not_known_costs_little(fine):
    trials = Trials(fine, blurred_step(20.0, 0.9), 1000, seed=8)
    _, error, _ = trials.find(blur_px=None)
    assert np.sqrt(np.mean(error**2)) / trials.bounds(0.9, 20.0)[0] < 1.12


def test_a_softer_edge_than_the_cameras_blur_frees_its_blur(fine):
    trials = Trials(fine, blurred_step(40.0, 1.8), 600, seed=9)
    got, error, _ = trials.find(blur_px=0.7)
    assert np.sqrt(np.mean(error**2)) / trials.bounds(1.8, 40.0)[0] < 1.2
    assert np.std(error / got["sd"]) == pytest.approx(1.0, abs=0.2)


def test_the_parabola_is_worse_but_near(fine):
    trials = Trials(fine, blurred_step(20.0, 0.7), 1000, seed=4)
    got, error, turn = trials.find(refine=False)
    ratio = np.sqrt(np.mean(error**2)) / trials.bounds(0.7, 20.0)[0]
    assert 1.15 < ratio < 1.6
    assert np.abs(turn).max() < math.radians(6)
    assert np.std(error / got["sd"]) == pytest.approx(0.95, abs=0.2)


@pytest.mark.parametrize(("gain", "low", "high"), [(0.5, 100, 400), (0.2, 50, 1000)])
def test_no_bias_through_a_table_that_bends(make_bank, stabilised, gain, low, high):
    # photons, read noise, 8-bit codes, root table: a model of table values is off by -.16, -.31
    table = stabilised(gain, 1.0)

    def draw(d, t, g):
        mean = low + (high - low) * ndtr(d / 0.8)
        electrons = g.poisson(mean) + g.standard_normal(d.shape)
        return table.apply(np.clip(np.rint(gain * electrons), 0, 255).astype(np.uint8))

    trials = Trials(make_bank(scales=((1.1, 1.6),), table=table), draw, 1500, seed=6)
    _, plain, _ = trials.find(refine=False)
    got, error, _ = trials.find(blur_px=0.8)
    assert plain.mean() < -0.12
    assert abs(error.mean()) < 0.01
    assert np.std(error / got["sd"]) == pytest.approx(1.0, abs=0.15)


@pytest.mark.parametrize("radius", [8, 20])
def test_curvature_is_taken_out_where_the_residual_asks(fine, radius):
    def draw(d, t, g):
        return 50 * ndtr((radius - np.hypot(d - radius, t)) / 0.8) + g.standard_normal(d.shape)

    trials = Trials(fine, draw, 600, seed=2)
    _, plain, _ = trials.find(refine=False)
    _, error, _ = trials.find(blur_px=0.8)
    assert plain.mean() > 0.05
    assert abs(error.mean()) < 0.01
    assert np.abs(error).max() < 0.15


def test_a_second_edge_close_by_is_kept_out_of_the_fit(fine, monkeypatch):
    # a bar of 3.5 px: its far side lies in the wide disk, not in the narrow one
    def draw(d, t, g):
        return 40 * (ndtr(d / 0.7) - ndtr((d - 3.5) / 0.7)) + g.standard_normal(d.shape)

    trials = Trials(fine, draw, 500, seed=14)
    got, error, _ = trials.find(blur_px=0.7)
    assert np.sqrt(np.mean(error**2)) < 0.05
    assert np.std(error / got["sd"]) == pytest.approx(1.0, abs=0.3)
    monkeypatch.setattr(locate, "NARROW_PX", 10.0)
    _, wide, _ = trials.find(blur_px=0.7)
    assert np.sqrt(np.mean(wide**2)) > 2 * np.sqrt(np.mean(error**2))


def test_errors_are_honest_under_coloured_noise(make_bank, smooth_autocovariance):
    bank = make_bank(scales=((1.1, 1.6),), autocovariance=smooth_autocovariance)

    def draw(d, t, g):
        white = g.standard_normal(d.shape)
        kernel = np.outer([1, 2, 1], [1, 2, 1]) / 6.0
        noise = ndimage.correlate(white, kernel[None], mode="wrap")
        return 30 * ndtr(d / 0.9) + noise

    got, error, _ = Trials(bank, draw, 1000, seed=12).find(blur_px=0.9)
    assert np.std(error / got["sd"]) == pytest.approx(1.0, abs=0.2)


def test_sobel_and_scharr_have_their_known_direction_errors():
    # worst error on a Gaussian-blurred step, all angles 0 to 45 degrees, offsets within half
    # a pixel: it checks the code that measures directions
    masks = {"prewitt": [1, 1, 1], "sobel": [1, 2, 1], "scharr": [3, 10, 3]}
    known = {
        0.7: {"prewitt": 3.58, "sobel": 1.37, "scharr": 0.241},
        1.0: {"prewitt": 2.06, "sobel": 0.907, "scharr": 0.097},
        2.0: {"prewitt": 0.576, "sobel": 0.279, "scharr": 0.059},
    }
    theta = np.deg2rad(np.linspace(0, 45, 181))[:, None, None, None]
    p = np.linspace(-0.5, 0.5, 41)[None, :, None, None]
    y, x = np.mgrid[-1:2, -1:2]
    for blur, errors in known.items():
        step = ndtr((x * np.cos(theta) + y * np.sin(theta) - p) / blur)
        for name, side in masks.items():
            mask = np.outer(side, [-1, 0, 1])
            gx, gy = (step * mask).sum(axis=(2, 3)), (step * mask.T).sum(axis=(2, 3))
            turn = matching.direction_error(np.arctan2(gy, gx), theta[..., 0, 0])
            assert np.degrees(np.abs(turn).max()) == pytest.approx(errors[name], rel=0.015)


# ---------------------------------------------------------------- lines


@pytest.mark.parametrize("height", [25.0, -25.0])
def test_lines_are_placed_on_their_centre(make_bank, height):
    bank = make_bank(scales=((1.2, 1.8),), parities=("even",), strength="line")

    def draw(d, t, g):
        return 5 + height * np.exp(-(d**2) / (2 * 1.1**2)) + g.standard_normal(d.shape)

    trials = Trials(bank, draw, 800, seed=5)
    got, error, turn = trials.find(blur_px=0.7)
    expected = locate.BRIGHT if height > 0 else locate.DARK
    assert (got["kind"] == expected).all()
    place, direction = trials.bounds(1.1, abs(height), profile="line")
    assert 0.95 <= np.sqrt(np.mean(error**2)) / place <= 1.15
    assert np.sqrt(np.mean(turn**2)) / direction <= 1.2
    assert abs(error.mean()) < 0.01
    assert ((got["theta"] >= 0) & (got["theta"] < np.float32(math.pi))).all()


def test_energy_tells_steps_from_lines(make_bank):
    bank = make_bank(scales=((1.3, 1.8),), parities=("odd", "even"), strength="energy")
    steps = Trials(bank, blurred_step(30.0, 0.8), 60, seed=1)
    steps.p[:] = 0
    got, _, _ = Trials(bank, lambda d, t, g: 30 * ndtr(d / 0.8), 60, seed=1).find(blur_px=0.8)
    near = np.abs(steps.p) < 0.3
    assert (got["kind"][near] == locate.STEP).mean() > 0.9
    lines, _, _ = Trials(bank, lambda d, t, g: 30 * np.exp(-d * d / 3), 60, seed=1).find()
    assert (lines["kind"] == locate.BRIGHT).mean() > 0.9


# ---------------------------------------------------------------- the array


def small_scene(fine, engine, step):
    picture = step((60, 64), 30.3, 29.6, 2.5, 25.0, 0.8)
    picture += np.random.default_rng(0).standard_normal(picture.shape, dtype=np.float32)
    responses = engine(fine)(picture)
    return picture, thin.edge_map(fine, responses, 5.0), responses


def test_edgels_come_in_row_order_with_named_fields(fine, engine, step):
    picture, found, responses = small_scene(fine, engine, step)
    got = locate.edgels(fine, picture, found, responses, blur_px=0.8)
    rows, cols = np.nonzero(found.edges)
    assert got.dtype == EDGEL
    assert got.size == rows.size > 30
    assert np.hypot(got["x"] - cols, got["y"] - rows).max() < 1.6
    np.testing.assert_array_equal(got["strength"], found.strength[rows, cols])
    across = (got["x"] - 30.3) * math.cos(2.5) + (got["y"] - 29.6) * math.sin(2.5)
    assert np.abs(across).max() < 0.25
    assert np.abs(matching.direction_error(got["theta"], 2.5)).max() < math.radians(10)


def test_the_negative_picture_turns_every_direction(fine, engine, step):
    picture, found, responses = small_scene(fine, engine, step)
    a = locate.edgels(fine, picture, found, responses, blur_px=0.8)
    b = locate.edgels(fine, -picture, found, -responses, blur_px=0.8)
    np.testing.assert_allclose(a["x"], b["x"], atol=2e-3)
    turned = matching.direction_error(a["theta"], b["theta"] + math.pi)
    assert np.abs(turned).max() < 2e-3


def test_results_do_not_depend_on_the_chunk(fine, engine, step, monkeypatch):
    picture, found, responses = small_scene(fine, engine, step)
    whole = locate.edgels(fine, picture, found, responses, blur_px=0.8)
    monkeypatch.setattr(model, "CHUNK", 7)
    parts = locate.edgels(fine, picture, found, responses, blur_px=0.8)
    assert whole.tobytes() == parts.tobytes()


def test_pixels_that_are_invalid_do_not_count(fine, engine, step):
    picture, found, responses = small_scene(fine, engine, step)
    invalid = np.zeros(picture.shape, bool)
    invalid[25, 20:40] = True
    spoilt = picture.copy()
    spoilt[invalid] = 1e4
    a = locate.edgels(fine, picture, found, responses, blur_px=0.8, invalid=invalid)
    b = locate.edgels(fine, spoilt, found, responses, blur_px=0.8, invalid=invalid)
    assert a.tobytes() == b.tobytes()
    c = locate.edgels(fine, spoilt, found, responses, blur_px=0.8)
    assert c.tobytes() != a.tobytes()


def test_an_edge_near_a_corner_says_so_in_its_error(fine, engine, step):
    corner = np.minimum(
        step((60, 60), 30.0, 0.0, 0.0, 40.0, 0.8), step((60, 60), 0.0, 30.0, math.pi / 2, 40.0, 0.8)
    )
    corner += np.random.default_rng(1).standard_normal(corner.shape, dtype=np.float32)
    responses = engine(fine)(corner)
    found = thin.edge_map(fine, responses, 5.0)
    got = locate.edgels(fine, corner, found, responses, blur_px=0.8)
    near = np.hypot(got["x"] - 30, got["y"] - 30) < 2.5
    assert near.any()
    assert np.median(got["sd"][near]) > 2 * np.median(got["sd"][~near])


def test_no_elements_no_edgels(fine):
    flat = np.zeros((40, 40), np.float32)
    responses = np.zeros((8, 40, 40), np.float32)
    found = thin.edge_map(fine, responses, 5.0)
    got = locate.edgels(fine, flat, found, responses)
    assert got.shape == (0,)
    assert locate.edgels_csv(got) == b"x_px,y_px,theta_deg,strength,sd_px,scale,kind,width_px\n"


def test_planes_of_different_pictures_are_refused(fine, engine, step):
    picture, found, responses = small_scene(fine, engine, step)
    with pytest.raises(UsageError, match="one picture"):
        locate.edgels(fine, picture[:-1], found, responses)
    with pytest.raises(UsageError, match="cannot fit"):
        locate.edgels(fine, picture, found, responses, blur_px=0.0)


def test_csv_reads_back_to_the_same_numbers(fine, engine, step):
    picture, found, responses = small_scene(fine, engine, step)
    got = locate.edgels(fine, picture, found, responses, blur_px=0.8)
    rows = list(csv.DictReader(io.StringIO(locate.edgels_csv(got).decode())))
    assert len(rows) == got.size
    for field, column in (("x", "x_px"), ("y", "y_px"), ("strength", "strength"), ("sd", "sd_px")):
        back = np.array([np.float32(r[column]) for r in rows])
        np.testing.assert_array_equal(back, got[field])
    degrees = np.array([float(r["theta_deg"]) for r in rows])
    np.testing.assert_allclose(np.deg2rad(degrees), got["theta"], atol=1e-6)
    assert {r["kind"] for r in rows} == {"step"}


# ---------------------------------------------------------------- parts


def test_cubic_samples_follow_a_quadratic_exactly():
    y, x = np.mgrid[:12, :14].astype(float)
    plane = (0.3 * x * x - 0.2 * x * y + 0.1 * y * y + x - 4).astype(np.float32)[None]
    g = np.random.default_rng(3)
    sy, sx = g.uniform(3, 8, 50), g.uniform(3, 9, 50)
    got = locate.sample(plane, np.zeros(50, int), sy, sx)
    expected = 0.3 * sx * sx - 0.2 * sx * sy + 0.1 * sy * sy + sx - 4
    np.testing.assert_allclose(got, expected, atol=1e-5)


@pytest.mark.parametrize("transfer", ["linear", "srgb"])
def test_curve_of_an_integer_table(transfer):
    contract = InputContract("Mono8", 5, 250, transfer)
    values = np.sqrt(np.arange(256.0) + 3).astype(np.float32)
    curve = model.curve_of(InputTable("stabilised", contract, values, 1.0))
    codes = np.arange(5, 251)
    light = contract.light(codes) * 245 + (5 if transfer == "linear" else 0)
    got, slope = curve.at(light)
    np.testing.assert_allclose(got, values[codes], rtol=1e-6)
    assert (slope[:-1] > 0).all()
    np.testing.assert_allclose(curve.inverse(values[codes]), light, rtol=1e-4, atol=1e-3)
    beyond, flat = curve.at(np.array([1e4]))
    assert beyond[0] == pytest.approx(curve.value[-1])
    assert flat[0] == 0


def test_curve_of_a_float_root():
    contract = InputContract("float32", 0.0, 100.0)
    table = InputTable("stabilised", contract, None, 1.0, slope=2.0, offset=1.0, scale=3.0)
    light = np.linspace(0, 100, 313)
    got, slope = model.curve_of(table).at(light)
    np.testing.assert_allclose(got, 3 * np.sqrt(2 * light + 1), rtol=2e-5)
    np.testing.assert_allclose(slope[1:-1], 3 / np.sqrt(2 * light + 1)[1:-1], rtol=2e-2)


@pytest.mark.parametrize("profile", ["step", "line"])
def test_jacobian_is_that_of_finite_differences(profile, stabilised):
    g = np.random.default_rng(4)
    curve = model.Curve(np.array([0.0, 1e4]), np.array([0.0, 2e4]), clipped=False)
    window = model.Window.disk(4)
    data = g.standard_normal((3, window.x.size))
    problem = model._Problem(data, np.ones_like(data), window, curve, profile, 0.8, np.zeros(3))
    q = g.normal(0, 0.3, (3, 6)) + np.array([0, 0, 100, 140, 0, 0])
    _, jac = problem.residual(q)
    for i in range(6):
        h = np.zeros(6)
        h[i] = 1e-6
        up, _ = problem.residual(q + h)
        down, _ = problem.residual(q - h)
        np.testing.assert_allclose(jac[:, i], (down - up) / 2e-6, atol=1e-5)
