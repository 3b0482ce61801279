import numpy as np
import pytest
from scipy import ndimage
from scipy.special import ndtr

from patchlab.camera import measure_blur, measure_noise, slanted_edge
from patchlab.errors import InputError
from patchlab.types import Frame, InputContract

FINE = 4


def leaves(seed, size=256):
    """Overlapping discs, front to back, radii with a scale-free law; FINE samples a pixel."""
    rng = np.random.default_rng(seed)
    n = size * FINE
    scene = np.full((n, n), np.nan, np.float32)
    y, x = np.mgrid[:n, :n].astype(np.float32)
    for _ in range(900):
        r = (6.0**-2 - rng.random() * (6.0**-2 - 80.0**-2)) ** -0.5 * FINE
        cy, cx = rng.random(2) * n
        t, b, lft, rgt = (int(np.clip(v, 0, n)) for v in (cy - r, cy + r + 1, cx - r, cx + r + 1))
        part = scene[t:b, lft:rgt]
        disc = (y[t:b, lft:rgt] - cy) ** 2 + (x[t:b, lft:rgt] - cx) ** 2 < r * r
        part[disc & np.isnan(part)] = rng.uniform(0.05, 0.85)
    return np.nan_to_num(scene, nan=0.4)


def binned(fine, k=FINE):
    h, w = (n // k * k for n in fine.shape)
    return fine[:h, :w].reshape(h // k, k, w // k, k).mean(axis=(1, 3))


@pytest.fixture(scope="module")
def scenes():
    return [leaves(seed) for seed in range(4)]


@pytest.mark.parametrize("sigma", [0.5, 0.7, 1.0, 1.2])
@pytest.mark.parametrize(("bits", "gain", "read"), [(8, 0.5, 1.0), (12, 0.25, 2.5)])
def test_blur_of_simulated_cameras(bench, scenes, sigma, bits, gain, read):
    # the pixel's aperture adds 1/12 px^2 to the lens
    contract = bench.contract(bits, black=2.0 ** (bits - 5))
    lights = [binned(ndimage.gaussian_filter(s, sigma * FINE)) for s in scenes]
    frames = bench.folder(lights, contract, gain, read, blur=1e-9)
    found, note = measure_blur(frames, measure_noise(frames))
    assert found == pytest.approx(np.sqrt(sigma**2 + 1 / 12), rel=0.1)
    assert "aperture included" in note


def test_blur_of_photographs_grows_as_it_must(bench):
    # reduced photographs hold some blur of their own: the squares' difference is what was added
    contract = bench.contract(8, black=8)
    lights = [binned(x, 3) for x in bench.photos()]
    widths = []
    for sigma in (0.5, 0.8, 1.2):
        frames = bench.folder(lights, contract, 0.5, 1.0, blur=sigma)
        widths.append(measure_blur(frames, measure_noise(frames))[0])
    for sigma, width in zip((0.8, 1.2), widths[1:], strict=True):
        added = np.sqrt(width**2 - widths[0] ** 2 + 0.5**2)
        assert added == pytest.approx(sigma, rel=0.1)


def test_joints_beside_steps_do_not_narrow_the_blur(bench):
    # tiles of random tone with a dark joint of 3 px between them: each step has an undershoot
    rng = np.random.default_rng(3)
    contract = bench.contract(8, black=8)
    lights = []
    for k in range(6):
        tones = np.kron(rng.uniform(0.2, 0.8, (7, 7)), np.ones((36 * FINE, 36 * FINE)))
        fine = np.indices(tones.shape) % (36 * FINE)
        tones[(fine < 3 * FINE).any(axis=0)] = 0.15
        turned = ndimage.rotate(tones, 10 + 9 * k, reshape=False, order=0, mode="mirror")
        disc = np.hypot(*(np.indices(tones.shape) - 500)) < 90 * FINE
        turned[disc] = 0.15 + 0.1 * k  # a large disc gives clean steps as well
        lights.append(binned(ndimage.gaussian_filter(turned, 0.7 * FINE)))
    frames = bench.folder(lights, contract, 0.5, 1.0, blur=1e-9)
    sigma, _ = measure_blur(frames, measure_noise(frames))
    assert sigma == pytest.approx(np.sqrt(0.7**2 + 1 / 12), rel=0.1)


def test_blur_says_when_it_cannot_tell(bench):
    contract = bench.contract(8)
    noise = np.random.default_rng(0).normal(100, 5, (128, 128)).round()
    sigma, note = measure_blur([bench.frame(noise, contract)], None)
    assert sigma is None
    assert note.startswith("not measurable here")


def slanted(sigma, angle=5.0, size=120):
    """An area-sampled blurred step across a line; the exact integral over each pixel."""
    slope = np.tan(np.radians(angle))
    fine = 8
    c = (np.arange(size * fine) + 0.5) / fine - 0.5
    x, y = np.meshgrid(c, c)
    d = (x - size / 2 + 0.3 - slope * (y - size / 2)) * np.cos(np.radians(angle))
    return binned(0.1 + 0.8 * ndtr(d / sigma), fine)


@pytest.mark.parametrize("sigma", [0.5, 0.7, 1.0])
@pytest.mark.parametrize("turn", [0, 1])
def test_mtf50_from_a_slanted_edge(sigma, turn):
    # truth: exp(-2 pi^2 s^2 f^2) of the lens times the sinc of the pixel along the normal
    contract = InputContract("float32", 0.0, 1.0)
    plane = np.rot90(slanted(sigma), turn).astype(np.float32)
    found = slanted_edge(Frame("edge", np.ascontiguousarray(plane), contract))
    a = np.radians(5)
    f = np.linspace(0, 1, 20001)
    truth = np.exp(-2 * (np.pi * sigma * f) ** 2) * np.sinc(f * np.cos(a)) * np.sinc(f * np.sin(a))
    mtf50 = f[np.flatnonzero(truth < 0.5)[0]]
    assert found.mtf50_cpp == pytest.approx(mtf50, rel=0.015)
    assert abs(found.angle_deg) == pytest.approx(5, abs=0.02)
    assert found.mtf[0] == 1
    near = found.frequency_cpp < 0.4
    wanted = np.interp(found.frequency_cpp[near], f, truth)
    assert np.abs(found.mtf[near] - wanted).max() < 0.02


def test_a_slanted_edge_must_be_there_and_slanted():
    contract = InputContract("float32", 0.0, 1.0)
    flat = np.full((60, 60), 0.4, np.float32)
    with pytest.raises(InputError, match="no edge"):
        slanted_edge(Frame("flat", flat, contract))
    straight = flat.copy()
    straight[:, 30:] = 0.8
    with pytest.raises(InputError, match="tilt"):
        slanted_edge(Frame("straight", straight, contract))


def test_a_photograph_of_a_scene_is_no_chart(bench):
    # lines through the middles of its rows exist, but no row's edge lies on them
    contract = bench.contract(8)
    for name in ("astronaut.png", "coffee.png", "motorcycle_left.png"):
        frame = bench.frame(bench.expose(bench.light(name), contract, 0.5, 1.0, 1), contract, name)
        with pytest.raises(InputError, match=r"no single straight edge|no edge runs") as refused:
            slanted_edge(frame)
        assert refused.value.where == name
