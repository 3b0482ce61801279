"""Parts of objects: local components, and which side of the matrix is the sample."""

import json

import numpy as np
import pytest
from scipy.optimize import linear_sum_assignment
from sklearn.decomposition import PCA

from patchlab.cli import main
from patchlab.errors import InputError, UsageError
from patchlab.images.parts import FEATURES, brackets, deviations
from patchlab.learn import learn_parts, locality

COUNT = 160


@pytest.fixture(scope="module")
def stack():
    """Pictures of brackets, as codes."""
    return np.stack([made.frame.pixels for made in brackets(COUNT)]).astype(float)


@pytest.fixture(scope="module")
def truth(stack):
    """What the pictures change by with each feature, by regression on what is known."""
    known = np.column_stack([deviations(COUNT), np.ones(COUNT)])
    slopes = np.linalg.lstsq(known, stack.reshape(COUNT, -1), rcond=None)[0][:-1]
    return slopes.reshape(-1, *stack.shape[1:])


@pytest.fixture(scope="module")
def found(stack):
    return {
        (method, samples): learn_parts(stack, method=method, samples=samples, restarts=1)
        for method in ("ica", "pca")
        for samples in ("pixels", "pictures")
    }


def matched(a, b):
    """|cos| of the best pairs of two sets of pictures."""
    flat = [x.reshape(len(x), -1) / np.linalg.norm(x, axis=(1, 2))[:, None] for x in (a, b)]
    cosine = np.abs(flat[0] @ flat[1].T)
    return cosine[linear_sum_assignment(-cosine)]


def inside(images):
    """Share of each picture's energy in the region of one feature, the best one."""
    energy = images**2 / np.sum(images**2, axis=(1, 2), keepdims=True)
    shares = [
        energy[:, top:bottom, left:right].sum(axis=(1, 2))
        for left, top, right, bottom in (f.region for f in FEATURES)
    ]
    return np.max(shares, axis=0)


def test_the_set_varies_by_its_features_and_nowhere_else(truth):
    for feature, slope in zip(FEATURES, truth, strict=True):
        left, top, right, bottom = feature.region
        energy = slope**2
        assert energy[top:bottom, left:right].sum() > 0.85 * energy.sum(), feature.name


def test_as_many_as_there_are_features(found):
    assert all(len(parts) == len(FEATURES) for parts in found.values())


def test_independent_pixels_are_parts_where_principal_components_are_global(found, truth):
    independent, principal = found["ica", "pixels"], found["pca", "pixels"]
    assert independent.converged
    assert independent.locality.min() > 0.55
    assert independent.locality.mean() > principal.locality.mean() + 0.3
    assert matched(independent.images, truth).min() > 0.95
    assert matched(principal.images, truth).mean() < 0.8
    assert inside(independent.images).min() > 0.8
    assert np.median(inside(principal.images)) < 0.6
    assert independent.warnings == ()


def test_principal_components_agree_under_transposition(found):
    one, two = found["pca", "pixels"], found["pca", "pictures"]
    np.testing.assert_allclose(one.images, two.images, atol=1e-8)
    np.testing.assert_allclose(one.codes, two.codes, atol=1e-6)


def test_independent_components_do_not(found):
    one, two = found["ica", "pixels"], found["ica", "pictures"]
    assert matched(one.images, two.images).mean() < 0.75
    assert two.locality.mean() < one.locality.mean() - 0.3
    assert any("look normal" in text for text in two.warnings)  # tolerances are


def test_principal_components_are_those_of_another_library(stack, found):
    flat = stack.reshape(COUNT, -1)
    flat = flat - flat.mean(axis=0) - flat.mean(axis=1, keepdims=True) + flat.mean()
    k = len(FEATURES)
    pictures = PCA(k, svd_solver="full").fit(flat).components_
    pixels = PCA(k, svd_solver="full").fit_transform(flat.T).T
    ours = found["pca", "pixels"].images
    assert matched(ours, pictures.reshape(ours.shape)).min() > 1 - 1e-9
    assert matched(ours, pixels.reshape(ours.shape)).min() > 1 - 1e-9


@pytest.mark.parametrize("samples", ["pixels", "pictures"])
@pytest.mark.parametrize("method", ["ica", "pca"])
def test_pictures_are_rebuilt_on_what_was_kept(stack, found, method, samples):
    parts = found[method, samples]
    rebuilt = parts.mean + parts.light[:, None, None]
    rebuilt = rebuilt + np.tensordot(parts.codes, parts.images, axes=1)
    flat = (stack - stack.mean(axis=0)).reshape(COUNT, -1)
    flat = flat - flat.mean(axis=1, keepdims=True)
    lost = np.linalg.svd(flat, compute_uv=False)[len(parts) :]
    assert np.linalg.norm(stack - rebuilt) == pytest.approx(np.linalg.norm(lost), rel=1e-5)
    np.testing.assert_allclose(np.linalg.norm(parts.images, axis=(1, 2)), 1, atol=1e-9)
    assert np.all(np.diff(parts.contribution) <= 1e-12)


def test_independent_means_uncorrelated_over_the_samples(found):
    images = found["ica", "pixels"].images.reshape(len(FEATURES), -1)
    codes = found["ica", "pictures"].codes
    for rows in (images, codes.T):
        gram = np.corrcoef(rows)
        assert np.abs(gram - np.diag(np.diag(gram))).max() < 1e-4


def test_the_order_of_pictures_does_not_matter(stack, found):
    turned = learn_parts(stack[::-1], restarts=1)
    assert matched(turned.images, found["ica", "pixels"].images).min() > 0.9999


def test_locality_of_a_blob_follows_its_width():
    """A Gaussian blob of sd s in an even picture of n x n: spread of the energy s, n / sqrt(6)."""
    y, x = np.mgrid[:101, :101] - 50.0
    blobs = np.array([np.exp(-(x**2 + y**2) / (4 * s**2)) for s in (2.0, 5.0, 10.0)])
    expected = 1 - np.sqrt(2) * np.array([2, 5, 10]) / np.sqrt((101**2 - 1) / 6)
    np.testing.assert_allclose(locality(blobs), expected, atol=1e-3)
    shifted = np.roll(blobs[:1], (7, -9), axis=(1, 2))
    np.testing.assert_allclose(locality(shifted), locality(blobs[:1]), atol=1e-9)
    corners = np.zeros((1, 9, 9))
    corners[0, [0, 8], [0, 8]] = 1
    assert locality(corners)[0] < -0.5


def test_what_cannot_be_learned_from_is_refused(stack):
    with pytest.raises(UsageError, match="samples"):
        learn_parts(stack, samples="rows")
    with pytest.raises(UsageError, match="components"):
        learn_parts(stack, components=COUNT)
    with pytest.raises(UsageError, match="stack"):
        learn_parts(stack[0])
    with pytest.raises(InputError, match="too few"):
        learn_parts(stack[:3])
    with pytest.raises(InputError, match="do not differ"):
        learn_parts(np.ones((6, 8, 8)))
    with pytest.raises(InputError, match="finite"):
        learn_parts(np.full((6, 8, 8), np.nan))


def call(*words):
    with pytest.raises(SystemExit) as end:
        main([str(w) for w in words])
    return end.value.code


def test_the_command(tmp_path, capsys):
    assert call("scenes", "--kind", "brackets", "--count", 60, "-o", tmp_path / "set", "-q") == 0
    assert b"invented" in (tmp_path / "set" / "NOTE.md").read_bytes()
    capsys.readouterr()
    words = ("parts", tmp_path / "set", "-o", tmp_path / "out", "--components", 9, "--json", "-q")
    assert call(*words) == 0
    told = json.loads(capsys.readouterr().out)
    assert told["samples"] == "pixels"
    assert told["independent"]["mean_locality"] > told["principal"]["mean_locality"] + 0.2
    names = {p.name for p in (tmp_path / "out").iterdir()}
    assert {"parts.png", "index.html", "codes.csv", "manifest.json"} <= names
    assert len((tmp_path / "out" / "codes.csv").read_text().splitlines()) == 61
    assert call(*words) == 2  # something stands there
    assert call("scenes", "--count", 1, "-o", tmp_path / "set", "-q") == 2  # another kind's folder


def test_pictures_of_several_sizes_are_refused(tmp_path, capsys):
    from PIL import Image

    for i, size in enumerate([(20, 16), (20, 16), (18, 16), (20, 16)]):
        Image.fromarray(np.full(size, 40 * i, np.uint8)).save(tmp_path / f"{i}.png")
    assert call("parts", tmp_path, "-o", tmp_path.parent / "parts", "-q") == 3
    assert "one size" in capsys.readouterr().err
