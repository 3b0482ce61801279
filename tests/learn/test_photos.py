"""What photographs must show, and noise must not."""

import numpy as np
import pytest

from patchlab.learn import learn_ica, learn_pca, stability, whiten
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


def test_stability_over_restarts(photos, make_mixed):
    patches, _ = make_mixed(np.random.default_rng(1).laplace(size=(9000, 8)), 3)
    sure = stability(learn_ica(patches, whiten(patches, rank=8), restarts=3))
    assert sure.min() > 0.99
    unsure = stability(learn_ica(photos, whiten(photos), restarts=2))
    assert np.mean(unsure > 0.9) < 0.9
    assert np.isnan(stability(learn_ica(patches, whiten(patches, rank=8), restarts=1))).all()
