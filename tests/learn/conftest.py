"""Patches for the learner's tests: planted mixtures, photographs, noise."""

from collections.abc import Callable

import numpy as np
import pytest
from numpy.typing import NDArray

from patchlab.types import PatchSet

Array = NDArray[np.float64]


def patch_set(rows: Array, *, normalise: bool = False) -> PatchSet:
    """A PatchSet from rows of pixels: DC removed, contrast-normalised on request."""
    n, size = len(rows), round(rows.shape[1] ** 0.5)
    dc = rows.mean(axis=1)
    rows = rows - dc[:, None]
    contrast = rows.std(axis=1) if normalise else np.ones(n)
    return PatchSet(
        np.ascontiguousarray(rows / contrast[:, None], dtype=np.float32),
        size,
        np.zeros(n, np.int32),
        np.zeros((n, 2), np.int32),
        dc.astype(np.float32),
        contrast.astype(np.float32),
        ("invented.png",),
        {},
    )


def mixed(sources: Array, size: int, seed: int = 0) -> tuple[PatchSet, Array]:
    """Sources (n, k) mixed into patches of ``size``; the mixing (d, k) has no DC."""
    r = np.random.default_rng(seed)
    mixing = r.standard_normal((size * size, sources.shape[1]))
    mixing -= mixing.mean(axis=0)
    return patch_set(sources @ mixing.T), mixing


def gabors(count: int, size: int, seed: int) -> Array:
    """``count`` random Gabors as rows of unit norm and no DC."""
    r = np.random.default_rng(seed)
    axis = np.arange(size) - (size - 1) / 2
    x, y = np.meshgrid(axis, axis)
    rows = []
    for _ in range(count):
        cx, cy = r.uniform(-0.3 * size, 0.3 * size, 2)
        theta, phase = r.uniform(0, np.pi), r.uniform(0, 2 * np.pi)
        sigma, frequency = r.uniform(0.1, 0.2) * size, r.uniform(0.1, 0.3)
        u = (x - cx) * np.cos(theta) + (y - cy) * np.sin(theta)
        v = (y - cy) * np.cos(theta) - (x - cx) * np.sin(theta)
        g = np.exp(-(u**2 + (v / 1.5) ** 2) / (2 * sigma**2))
        g *= np.cos(2 * np.pi * frequency * u + phase)
        rows.append((g - g.mean()).ravel())
    out = np.array(rows)
    return out / np.linalg.norm(out, axis=1, keepdims=True)


def pictures() -> list[Array]:
    """Photographs shipped inside scikit-image and scikit-learn, log luminance."""
    import skimage.data
    from sklearn.datasets import load_sample_images

    shipped = [skimage.data.astronaut(), skimage.data.coffee(), skimage.data.camera()]
    out = []
    for image in [*shipped, *load_sample_images().images]:
        plane = np.asarray(image, dtype=np.float64) / 255
        plane = plane @ [0.2126, 0.7152, 0.0722] if plane.ndim == 3 else plane
        out.append(np.log(plane**2.2 + 0.01))
    return out


def cut(planes: list[Array], size: int, count: int, seed: int = 0) -> Array:
    """Random patches (about ``count``), the flattest third dropped."""
    r = np.random.default_rng(seed)
    rows = []
    for plane in planes:
        each = int(1.5 * count / len(planes))
        y = r.integers(0, plane.shape[0] - size + 1, each)
        x = r.integers(0, plane.shape[1] - size + 1, each)
        windows = np.lib.stride_tricks.sliding_window_view(plane, (size, size))
        found = windows[y, x].reshape(each, -1)
        rows.append(found[np.argsort(-found.std(axis=1))[: each * 2 // 3]])
    out = np.concatenate(rows)
    return out[r.permutation(len(out))]


@pytest.fixture(scope="session")
def make_set() -> Callable[..., PatchSet]:
    return patch_set


@pytest.fixture(scope="session")
def make_mixed() -> Callable[..., tuple[PatchSet, Array]]:
    return mixed


@pytest.fixture(scope="session")
def make_gabors() -> Callable[..., Array]:
    return gabors


@pytest.fixture(scope="session")
def raw_photos() -> Array:
    """About 20,000 raw 8x8 patches of photographs."""
    return cut(pictures(), 8, 20_000)


@pytest.fixture(scope="session")
def photos(raw_photos: Array) -> PatchSet:
    """The same, DC removed and contrast-normalised."""
    return patch_set(raw_photos, normalise=True)


@pytest.fixture(scope="session")
def noise() -> PatchSet:
    """20,000 patches 6x6 of white Gaussian noise, contrast-normalised."""
    return patch_set(np.random.default_rng(3).standard_normal((20_000, 36)), normalise=True)
