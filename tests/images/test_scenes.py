import math
from pathlib import Path

import numpy as np
import pytest
from scipy.special import ndtr

from patchlab.errors import UsageError
from patchlab.images import decode, list_photos
from patchlab.images.canvas import Leaf, Paint, Scene
from patchlab.images.demo import OMBREL_K2, make_sample_images, sample_frames, tile_works
from patchlab.images.leaves import Blob, Polygon, half_plane
from patchlab.images.scenes import Camera, dead_leaves, disk, expose, radii, render_scene

SAMPLES = Path(__file__).parents[2] / "sample_images"
SHARP = Camera(blur_sigma_px=0.7)


def scene(*leaves, shape=(64, 64), ground=0.2):
    return Scene(shape, tuple(leaves), Paint(ground))


# ---------------------------------------------------------------- exact pictures


@pytest.mark.parametrize("angle", [0, 0.001, 0.3, math.pi / 4, 1.2, math.pi / 2, 4.0])
@pytest.mark.parametrize("shift", [0, 0.1, 0.33, 0.6])
def test_a_straight_edge_is_an_error_function_at_its_true_place(angle, shift):
    cos, sin = math.cos(angle), math.sin(angle)
    half = Polygon.box(
        32 + shift * cos - 500 * cos, 32 + shift * sin - 500 * sin, 1000, 1000, angle
    )
    made = expose(scene(Leaf(half, Paint(0.8))), SHARP, light=1000)
    y, x = np.mgrid[:64, :64]
    d = (x - 32) * cos + (y - 32) * sin - shift
    exact = 1000 * (0.8 - 0.6 * ndtr(d / 0.7))
    steepest = 600 / (0.7 * math.sqrt(2 * math.pi))
    assert np.abs(made.clean - exact).max() / steepest < 0.005  # pixels of displacement
    edges = made.edges
    assert np.abs((edges["x"] - 32) * cos + (edges["y"] - 32) * sin - shift).max() < 1e-9
    assert np.allclose(np.cos(edges["theta"] - angle), -1)  # brighter against the normal
    assert np.allclose(edges["contrast"], 600)
    assert np.allclose(edges["dark"], 200)
    assert (edges["curvature"] == 0).all()
    assert np.hypot(np.ptp(edges["x"]), np.ptp(edges["y"])) > 60


def supersampled(blob, sigma, size=32, fine=32, margin=6):
    """Brute force: point samples on a fine grid, a sampled Gaussian."""
    g = (np.arange((size + 2 * margin) * fine) + 0.5) / fine - 0.5 - margin
    inside = blob.distance(g[None], g[:, None]) < 0
    w = np.exp(-((np.arange(size)[:, None] - g) ** 2) / (2 * sigma**2))
    w /= sigma * math.sqrt(2 * math.pi) * fine
    return w @ inside @ w.T


@pytest.mark.parametrize(
    "blob",
    [
        Blob(15.3, 16.1, 8, 8),
        Blob(15.3, 16.1, 9, 4, 0.5),
        Blob(15.3, 16.1, 2, 2),
        Blob(15.3, 16.1, 7, 5, 1.0, ((2, 0.12, 0.4), (3, 0.07, 2.0))),
    ],
)
def test_curved_shapes_against_brute_force(blob):
    made = expose(scene(Leaf(blob, Paint(0.8)), shape=(32, 32)), SHARP, light=1000)
    exact = 200 + 600 * supersampled(blob, 0.7)
    steepest = 600 / (0.7 * math.sqrt(2 * math.pi))
    assert np.abs(made.clean - exact).max() / steepest < 0.01
    edges = made.edges
    assert np.abs(blob.distance(edges["x"], edges["y"])).max() < 1e-9
    step = 1e-4  # the normal points at the bright inside
    x, y = edges["x"] + step * np.cos(edges["theta"]), edges["y"] + step * np.sin(edges["theta"])
    assert np.allclose(blob.distance(x, y), -step, rtol=1e-2)
    if blob.a == blob.b:
        assert np.allclose(edges["curvature"], 1 / blob.a, rtol=0.02)
    ends = np.diff(np.stack([edges["x"], edges["y"]]), axis=1, append=edges["x"][:1][0])
    turn = np.sum(edges["curvature"]) * np.hypot(*ends[:, :-1]).mean()
    assert turn == pytest.approx(2 * math.pi, rel=0.02)


def test_half_plane_area_against_monte_carlo():
    rng = np.random.default_rng(0)
    u, v = rng.random((2, 400_000)) - 0.5
    for angle in (0.0, 1e-9, 0.2, 0.9, 1.5, 3.0):
        nx, ny = math.cos(angle), math.sin(angle)
        for d in (-0.6, -0.2, 0.0, 0.31, 0.69):
            share = half_plane(np.array([d]), np.array(nx), np.array(ny), 1.0)[0]
            assert abs(share - (nx * u + ny * v + d < 0).mean()) < 0.004


def test_a_thin_line_has_two_edges_and_the_right_weight():
    line = Polygon.strip(-50, 20.3, 150, 20.3, 0.7)
    made = expose(scene(Leaf(line, Paint(0.9))), SHARP, light=100)
    profile = made.clean[:, 30] - 20
    assert profile.sum() == pytest.approx(70 * 0.7, rel=1e-3)
    assert (profile * np.arange(64)).sum() / profile.sum() == pytest.approx(20.3, abs=0.004)
    assert set(np.round(made.edges["y"], 6)) == {19.95, 20.65}
    assert (made.edges["width"] == 0.7).all()


# ---------------------------------------------------------------- the truth about edges


def test_only_what_is_seen_is_an_edge():
    back = Leaf(Polygon.box(20, 32, 30, 30), Paint(0.9))
    front = Leaf(Blob(36, 32, 12, 12), Paint(0.05))
    made = expose(scene(back, front), SHARP, light=500)
    edges = made.edges
    mine = edges[edges["leaf"] == 1]
    assert (np.hypot(mine["x"] - 36, mine["y"] - 32) > 12).all()
    theirs = edges[edges["leaf"] == 2]
    inside = (np.abs(theirs["x"] - 20) < 14.5) & (np.abs(theirs["y"] - 32) < 14.5)
    assert np.allclose(theirs["contrast"][inside], 500 * 0.85)
    outside = (np.abs(theirs["x"] - 20) > 15.5) | (np.abs(theirs["y"] - 32) > 15.5)
    assert np.allclose(theirs["contrast"][outside], 500 * 0.15)
    # the circle cuts the box's right side (x = 35) at y = 32 +- sqrt(144 - 1)
    cut = made.junctions[~made.junctions["corner"]]
    expected = [(35, 32 - math.sqrt(143)), (35, 32 + math.sqrt(143))]
    for x, y in expected:
        assert np.hypot(cut["x"] - x, cut["y"] - y).min() < 0.2
    assert len(cut) == 2
    corners = made.junctions[made.junctions["corner"]]
    assert np.allclose(
        sorted(zip(corners["x"], corners["y"], strict=True)), [(5, 17), (5, 47), (35, 17), (35, 47)]
    )
    assert made.boundary[32, 48]
    assert not made.boundary[32, 35]


def test_contrast_follows_shading_and_shadow():
    sloped = Leaf(Polygon.box(20, 32, 30, 30), Paint(0.5, slope_y=0.02))
    made = expose(scene(sloped), SHARP, light=100)
    right = made.edges[np.isclose(made.edges["x"], 35)]
    assert np.allclose(right["contrast"], 100 * (0.5 * (1 + 0.02 * (right["y"] - 32)) - 0.2))
    dark = Leaf(Polygon.box(20, 32, 30, 30), Paint(0.5), shadow=0.5, shadow_px=6)
    edges = expose(scene(dark), SHARP, light=100).edges
    assert np.allclose(edges["contrast"], 50 - 20 * 0.5, atol=0.5)


def test_mean_levels_follow_the_truth_across_a_textured_scene():
    """Where no other edge is near, the picture's step equals the told contrast."""
    made = render_scene(5, (160, 160), SHARP, light=1000, smallest=12, largest=60)
    edges = made.edges[made.edges["contrast"] > 100]
    x, y = edges["x"], edges["y"]
    c, s = np.cos(edges["theta"]), np.sin(edges["theta"])
    every = np.stack([made.edges["x"], made.edges["y"]])
    inner = (x > 6) & (x < 153) & (y > 6) & (y < 153)
    found = []
    for k in np.flatnonzero(inner)[::7]:
        gap = every - np.array([[x[k]], [y[k]]])
        along, across = gap[1] * c[k] - gap[0] * s[k], gap[0] * c[k] + gap[1] * s[k]
        if ((np.abs(across) > 0.5) & (np.hypot(along, across) < 6)).any():
            continue
        ends = [made.clean[round(y[k] + d * s[k]), round(x[k] + d * c[k])] for d in (3.0, -3.0)]
        found.append((ends[0] - ends[1]) / edges["contrast"][k])
    assert len(found) > 30
    assert np.median(found) == pytest.approx(1, abs=0.04)


# ---------------------------------------------------------------- statistics


def test_radii_follow_the_inverse_cube():
    r = radii(np.random.default_rng(0), 200_000, 2.0, 120.0)
    assert r.min() >= 2
    assert r.max() <= 120
    # P(R > t) = (t^-2 - 120^-2) / (2^-2 - 120^-2)
    for t in (3, 6, 20):
        assert (r > t).mean() == pytest.approx((t**-2 - 120**-2) / (0.25 - 120**-2), abs=0.005)


def spectrum_exponent(picture):
    """Exponent a of power ~ f^-a: Hann window, radial mean, 4 cycles a picture to 0.7 Nyquist."""
    n = picture.shape[0]
    window = np.hanning(n)[:, None] * np.hanning(n)
    power = np.abs(np.fft.fft2((picture / picture.mean() - 1) * window)) ** 2
    f = np.hypot(*np.meshgrid(np.fft.fftfreq(n), np.fft.fftfreq(n)))
    edges = np.geomspace(4 / n, 0.35, 16)
    bins = np.digitize(f, edges)
    means = np.array([[f[bins == k].mean(), power[bins == k].mean()] for k in range(1, 16)])
    return -np.polyfit(*np.log(means).T, 1)[0]


def test_dead_leaves_have_the_statistics_of_photographs():
    """Wide bands round values measured for disks of r^-3, radii 2 to 120 pixels."""
    exponents, tails = [], []
    for seed in range(3):
        plain = dead_leaves(seed, smallest=2, largest=120, maker=disk, texture=0)
        clean = expose(plain, Camera(blur_sigma_px=0.3), light=1000, edges=False).clean
        dx = np.diff(clean, axis=1).ravel()
        tails.append(((dx - dx.mean()) ** 4).mean() / dx.var() ** 2)
        exponents.append(spectrum_exponent(clean))
    assert 12 < np.mean(tails) < 25
    assert 2.0 < np.mean(exponents) < 2.8


# ---------------------------------------------------------------- the camera


@pytest.mark.parametrize(
    ("bits", "gain", "well"), [(8, 0.5, 500), (12, 0.25, 14000), (10, 0.1, 9000)]
)
def test_noise_follows_the_linear_model(bits, gain, well):
    """EMVA 1288: var = K (mean - dark) + K^2 read^2 + 1/12."""
    camera = Camera(bits=bits, gain=gain, full_well=well, read_noise=3.0, black=20)
    for share in (0.05, 0.3, 0.6):
        level = np.full((250, 400), share * well)
        codes = camera.capture(level, np.random.default_rng(bits)).astype(float)
        assert codes.mean() == pytest.approx(20 + gain * share * well, rel=0.005)
        law = gain * (codes.mean() - 20) + (gain * 3.0) ** 2 + 1 / 12
        assert codes.var() == pytest.approx(law, rel=0.03)


def test_saturation_and_black_are_clipped():
    camera = Camera(bits=8, gain=0.5, full_well=400, black=10)
    assert camera.contract.white == 210
    codes = camera.capture(np.full((50, 50), 800.0), np.random.default_rng(0))
    assert (codes == 210).all()
    dark = Camera(read_noise=9).capture(np.zeros((50, 50)), np.random.default_rng(0))
    assert dark.min() == 0
    assert (dark == 0).mean() > 0.5


def test_row_noise_and_neighbours():
    flat = np.full((300, 300), 200.0)
    rows = Camera(row_noise=8).capture(flat, np.random.default_rng(1)).astype(float)
    assert rows.mean(axis=1).var() == pytest.approx(16, rel=0.25)
    assert rows.mean(axis=0).var() < 1
    mixed = Camera(neighbour=0.25).capture(flat, np.random.default_rng(1)).astype(float)
    mixed -= mixed.mean()
    # taps 1/4 1/2 1/4: correlation (2 * 1/8) / (3/8) at lag 1; rounding adds 1/12 to the variance
    assert (mixed[:, 1:] * mixed[:, :-1]).mean() / mixed.var() == pytest.approx(2 / 3, abs=0.03)


@pytest.mark.parametrize(
    "bad",
    [{"bits": 9}, {"blur_sigma_px": 0.1}, {"gain": 0}, {"read_noise": -1}, {"neighbour": 0.3}],
)
def test_camera_settings_are_checked(bad):
    with pytest.raises(UsageError):
        Camera(**bad)
    with pytest.raises(UsageError, match="light"):
        render_scene(0, (32, 32), light=0)
    with pytest.raises(UsageError, match="sizes"):
        dead_leaves(0, smallest=5, largest=5)


def test_same_seed_same_bytes_other_shot_other_noise():
    a, b = render_scene(9, (48, 64)), render_scene(9, (48, 64))
    assert a.frame.pixels.tobytes() == b.frame.pixels.tobytes()
    assert a.edges.tobytes() == b.edges.tobytes()
    other = render_scene(9, (48, 64), shot=1)
    assert np.array_equal(a.clean, other.clean)
    assert not np.array_equal(a.frame.pixels, other.frame.pixels)
    assert not np.array_equal(a.clean, render_scene(10, (48, 64)).clean)


def test_light_scales_the_picture_not_the_scene():
    a, b = render_scene(9, (48, 64), light=100), render_scene(9, (48, 64), light=400)
    assert np.allclose(4 * a.clean, b.clean)
    assert np.allclose(4 * a.edges["contrast"], b.edges["contrast"])


def test_hidden_leaves_are_not_painted_but_nothing_seen_is_lost():
    """Painting with and without the leaves that lie hidden gives one picture."""
    whole = dead_leaves(2, (60, 60), smallest=4, largest=30)
    made = expose(whole, SHARP, light=100)
    seen = set(made.edges["leaf"].tolist())
    covers = Leaf(Polygon.box(30, 30, 300, 300), Paint(0.5))
    below = Scene(whole.shape, (*whole.leaves, covers, *whole.leaves), whole.background, whole.seed)
    again = expose(below, SHARP, light=100)
    first = len(whole.leaves) + 1
    assert {k for k in again.edges["leaf"].tolist() if k < first} == set()
    assert {k - first for k in again.edges["leaf"].tolist() if k > first} == seen


# ---------------------------------------------------------------- the sample frames


def test_sample_frames_are_small_and_there():
    listing = list_photos(SAMPLES)
    assert len(listing.files) == 24
    assert listing.other == 1
    assert sum(p.stat().st_size for p in SAMPLES.iterdir()) < 6e6
    assert "invented" in (SAMPLES / "NOTE.md").read_text(encoding="utf-8")


def test_sample_frames_are_made_again(tmp_path):
    (path,) = make_sample_images(tmp_path, 1)
    kept = (SAMPLES / path.name).read_bytes()
    new = decode(path.read_bytes(), "new")[0].pixels.astype(int)
    old = decode(kept, "old")[0].pixels.astype(int)
    # the last bit of a library's sine may turn a rounding; on one machine nothing differs
    assert (new != old).mean() < 1e-3
    assert decode(kept, "old")[0].contract == OMBREL_K2.contract


def test_sample_frames_know_their_edges():
    (made,) = sample_frames(1)
    assert made.frame.path == "wall-01.png"
    assert len(made.edges) > 10_000
    assert (made.edges["width"] > 0).any()
    assert len({leaf.paint.tone for leaf in tile_works("bed", 2).leaves}) > 100
