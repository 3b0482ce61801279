"""From many edges' widths to the camera's."""

from pathlib import Path

import imageio.v3 as iio
import numpy as np
import pytest

from patchlab.camera import measure_blur, measure_noise
from patchlab.camera.widths import Edges, freed, sharpest
from patchlab.types import Frame, InputContract

SAMPLES = Path(__file__).parents[2] / "sample_images"


def test_the_invented_camera_whose_edges_all_have_shadows():
    # the note beside the pictures: blur 0.8 pixels, pixel aperture included
    contract = InputContract("Mono8", 0.0, 255.0)
    files = sorted(SAMPLES.glob("*.png"))
    frames = [Frame(p.name, iio.imread(p), contract) for p in files]
    sigma, note = measure_blur(frames, measure_noise(frames))
    assert sigma == pytest.approx(0.8, rel=0.1)
    assert "standard error" in note


@pytest.mark.parametrize("soft", [0.0, 0.3, 0.7])
@pytest.mark.parametrize("noisy", [0.03, 0.2])
def test_soft_edges_do_not_hide_the_sharp_ones(soft, noisy):
    inside = []
    for seed in range(8):
        rng = np.random.default_rng(seed)
        errors = 0.9 * noisy * rng.uniform(0.5, 1.5, 200)
        wider = np.where(rng.random(200) < soft, 0.9 * rng.exponential(0.6, 200), 0.0)
        widths = 0.9 + wider + errors * rng.standard_normal(200)
        sigma, error = sharpest(widths, errors)
        assert sigma == pytest.approx(0.9, rel=0.12)
        inside.append(abs(sigma - 0.9) < 2.5 * error)
    assert np.mean(inside) >= 0.75


def planted(rng, slope):
    """Edges of width 0.8 whose width errors go along with the slopes' errors."""
    n, height = 400, rng.uniform(0.2, 0.6, 400)
    spread = np.array([[0.04, 0.01, 0.0], [0.01, 0.004, 0.0], [0.0, 0.0, 0.0004]])
    spread = spread[None] * height[:, None, None] ** 2
    root = np.linalg.cholesky(spread)
    truth = np.stack([np.full(n, 0.8), slope * height * rng.standard_normal(n), np.zeros(n)], 1)
    fit = truth + (root @ rng.standard_normal((n, 3, 1)))[:, :, 0]
    return Edges(height, fit, spread)


def test_without_shading_the_slopes_cost_nothing():
    # then a width's variance is that given both slopes: 0.04 - 0.01^2 / 0.004 of height squared
    edges = planted(np.random.default_rng(1), 0.0)
    width, error = freed(edges)
    best = np.sqrt(0.04 - 0.01**2 / 0.004) * edges.height
    assert np.median(error) == pytest.approx(np.median(best), rel=0.15)
    assert np.mean((width - 0.8) / error) == pytest.approx(0, abs=0.2)
    assert np.std((width - 0.8) / error) == pytest.approx(1, abs=0.15)


def test_with_shading_each_width_keeps_its_own():
    edges = planted(np.random.default_rng(2), 0.5)
    width, error = freed(edges)
    assert np.median(error) == pytest.approx(np.median(0.2 * edges.height), rel=0.05)
    assert np.std((width - 0.8) / error) == pytest.approx(1, abs=0.15)


def test_no_edge_is_no_width():
    none = Edges(np.empty(0), np.empty((0, 3)), np.empty((0, 3, 3)))
    assert [v.size for v in freed(none)] == [0, 0]
