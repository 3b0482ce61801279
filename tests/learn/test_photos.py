"""What photographs must show, and noise must not."""

import numpy as np
import pytest
from scipy import stats

from patchlab.learn import learn_ica, learn_pca, shape_numbers, shape_spread, whiten
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.learn.solver import Orthogonal, Solver, State
from patchlab.learn.sure import _distance, relearned
from patchlab.learn.whiten import moments


@pytest.fixture(scope="module")
def principal(photos):
    return learn_pca(photos, whiten(photos))


def test_the_first_principal_component_of_raw_patches_is_brightness(raw_photos, photos):
    """Common practice, no source."""
    values = photos.patches * photos.contrast[:, None] + photos.dc[:, None]
    np.testing.assert_allclose(values, raw_photos, atol=1e-5)
    first = np.linalg.eigh(moments(values).covariance)[1][:, -1]
    assert abs(first.sum()) / 8 > 0.95


def test_principal_components_are_the_whitenings_directions(photos, principal):
    w = principal.whitening
    filters = principal.filters.reshape(len(principal), -1)
    atoms = principal.atoms.reshape(len(principal), -1)
    np.testing.assert_allclose(np.abs(filters @ w.D), np.eye(w.rank), atol=1e-10)
    np.testing.assert_allclose(filters @ atoms.T, np.eye(w.rank), atol=1e-10)
    np.testing.assert_allclose(
        principal.contribution, w.spectrum[: w.rank] / w.spectrum.sum(), rtol=1e-10
    )
    assert np.isfinite(principal.log_likelihood)


def test_equal_eigenvalues_are_not_identified(noise, photos, principal):
    assert learn_pca(noise, whiten(noise)).identified.mean() < 0.2
    assert principal.identified.any()


def test_components_of_photographs_have_heavy_tails_and_no_warning(photos):
    d = learn_ica(photos, whiten(photos), restarts=1)
    assert np.median(d.kurtosis) > 5
    assert d.warnings == ()


def test_components_are_found_again_where_the_data_say_so(photos, make_mixed):
    patches, _ = make_mixed(np.random.default_rng(1).laplace(size=(9000, 8)), 3)
    w = whiten(patches, rank=8)
    sure = learn_ica(patches, w, restarts=3, resamples=4)
    assert sure.over_restarts.min() > 0.99
    assert sure.over_resamples.min() > 0.99
    assert sure.over_restarts.max() < 1 + 1e-12
    unsure = learn_ica(photos, whiten(photos), restarts=2, resamples=2)
    assert np.mean(unsure.over_restarts > 0.9) < 0.9
    # of what the data leave open, a start that is kept shows less than a new one
    assert np.median(unsure.over_restarts) < np.median(unsure.over_resamples) < 0.999
    lone = learn_ica(patches, w, restarts=1)
    assert np.isnan(lone.over_restarts).all()
    assert np.isnan(lone.over_resamples).all()
    assert shape_spread(lone) == {}
    # the crowd is stable where its members are not
    for shape in shape_spread(unsure).values():
        assert 0 < shape["distance"] < 1.5 * shape["chance"]


def test_numbers_of_a_shape():
    y, x = np.mgrid[:24, :24] - 11.5
    for theta in (0.3, 1.2, 2.9):
        u = x * np.cos(theta) + y * np.sin(theta)
        wave = np.exp(-(x**2 + y**2) / (2 * 3**2)) * np.cos(2 * np.pi * 0.2 * u)
        found = shape_numbers(wave[None])
        assert found["orientation"][0] == pytest.approx(theta, abs=0.01)
        assert found["frequency"][0] == pytest.approx(0.2, abs=0.01)
        assert found["size"][0] == pytest.approx(3 / np.sqrt(2), rel=0.01)


def test_spread_of_shapes_is_scipys_distance(photos):
    known = learn_ica(photos, whiten(photos, rank=20), restarts=2)
    a, b = (shape_numbers(known.pooled_atoms[i : i + 20]) for i in (0, 20))
    found = shape_spread(known)
    for name in ("frequency", "size"):
        expected = stats.ks_2samp(a[name], b[name]).statistic
        assert found[name]["distance"] == pytest.approx(expected)
    # Kuiper's does not change when the circle is cut elsewhere
    turned = [np.mod(s["orientation"] + 1.0, np.pi) for s in (a, b)]
    assert _distance(*turned, True) == pytest.approx(found["orientation"]["distance"])
    assert found["size"]["chance"] == pytest.approx(1.358 * np.sqrt(2 / 20))


def test_halves_say_how_far_the_sample_moves_a_component():
    """A half lies as far from the whole as the whole from the truth."""
    r = np.random.default_rng(7)
    mixing = np.linalg.qr(r.standard_normal((6, 6)))[0]
    wholes, halves = [], []
    for _ in range(12):
        rows = Rows((r.laplace(size=(4000, 6)) @ mixing / np.sqrt(2)).astype(np.float32))
        solver = Solver(Likelihood(rows, np.ones(6)), Orthogonal(), 1e-10, 200)
        best = solver.run(State(np.pi / 2 * mixing)).W
        options = {"count": 2, "tolerance": 1e-10, "limit": 200}
        anew = relearned(rows, best, np.ones(6), Orthogonal(), **options)
        unit = best / np.linalg.norm(best, axis=1, keepdims=True)
        wholes.append(unit - mixing)
        halves += [w / np.linalg.norm(w, axis=1, keepdims=True) - unit for w in anew]
    assert np.std(halves) == pytest.approx(np.std(wholes), rel=0.2)
