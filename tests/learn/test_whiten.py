"""Moments and whitening: identities to 1e-10, and refusals."""

import numpy as np
import pytest

from patchlab.errors import InputError, UsageError
from patchlab.learn import moments, whiten, whitening
from patchlab.learn.whiten import Moments, cut, leading


@pytest.fixture(scope="module")
def rows():
    r = np.random.default_rng(1)
    return r.standard_normal((10_000, 25)) @ r.standard_normal((25, 25)) + r.standard_normal(25)


def test_moments_are_numpys(rows):
    known = moments(rows)
    assert known.samples == len(rows)
    np.testing.assert_allclose(known.mean, rows.mean(axis=0), atol=1e-12)
    np.testing.assert_allclose(known.covariance, np.cov(rows.T, bias=True), atol=1e-11)


@pytest.mark.parametrize("block", [977, 4096, 5000, 10**6])
def test_moments_have_the_same_bytes_for_any_block(rows, block):
    first, other = moments(rows), moments(rows, block=block)
    assert first.mean.tobytes() == other.mean.tobytes()
    assert first.covariance.tobytes() == other.covariance.tobytes()


def test_moments_have_the_same_bytes_for_any_chunking(rows):
    chunks = np.split(rows, [1, 50, 4097, 9000])
    assert moments(rows).covariance.tobytes() == moments(iter(chunks)).covariance.tobytes()


def test_every_patch_doubled_gives_the_same_moments(rows):
    once, twice = moments(rows), moments(np.concatenate([rows, rows]))
    np.testing.assert_allclose(twice.mean, once.mean, atol=1e-12)
    np.testing.assert_allclose(twice.covariance, once.covariance, atol=1e-11)


def test_a_large_offset_does_not_spoil_the_covariance(rows):
    np.testing.assert_allclose(moments(rows + 1e6).covariance, moments(rows).covariance, atol=1e-6)


@pytest.mark.parametrize("form", ["pca", "zca"])
@pytest.mark.parametrize("rank", [None, 7, 40])
def test_whitening_identities(photos, form, rank):
    w = whiten(photos, form=form, rank=rank)
    C = moments(photos.patches).covariance
    U = np.linalg.svd(w.K)[2][: w.rank]
    goal = np.eye(w.rank) if form == "pca" else U.T @ U
    np.testing.assert_allclose(w.K @ w.D, goal, atol=1e-10)
    np.testing.assert_allclose(w.K @ C @ w.K.T, goal, atol=1e-10)
    if form == "zca":
        assert np.array_equal(w.K, w.K.T)
    if rank is not None:
        assert w.rank == rank


def test_the_patch_mean_is_removed_exactly_even_from_raw_patches(raw_photos, make_set):
    w = whitening(moments(raw_photos))
    assert np.abs(w.K.sum(axis=1)).max() < 1e-12 * np.abs(w.K).max() * 64
    assert np.abs(w.D.sum(axis=0)).max() < 1e-12
    own = whiten(make_set(raw_photos))
    assert own.rank == w.rank
    np.testing.assert_allclose(own.spectrum, w.spectrum, rtol=1e-5, atol=1e-9)


def test_spectrum_falls_and_ends_with_the_patch_mean(photos):
    w = whiten(photos)
    assert w.spectrum.shape == (64,)
    assert np.all(np.diff(w.spectrum) <= 0)
    assert w.spectrum[-1] == 0
    np.testing.assert_allclose(
        w.spectrum.sum(), np.trace(moments(photos.patches).covariance), rtol=1e-6
    )


def test_rotated_patches_have_the_same_spectrum(photos, make_set):
    turned = np.rot90(photos.patches.reshape(-1, 8, 8), axes=(1, 2)).reshape(-1, 64)
    a, b = whiten(photos), whiten(make_set(turned.astype(np.float64)))
    np.testing.assert_allclose(a.spectrum, b.spectrum, rtol=1e-5, atol=1e-9)
    assert a.rank == b.rank


def test_the_cut_never_splits_equal_eigenvalues():
    spectrum = np.array([50.0, 20.0, 10.0] + [1.0] * 6 + [0.01] * 4)
    for retain in (0.945, 0.95, 0.96, 0.98, 0.995):
        rank, notes = cut(spectrum, retain, 100_000)
        assert rank in (3, 9)
        assert str(rank) in notes[0]


def test_without_a_gap_the_cut_stays_where_the_variance_is_held():
    spectrum = 0.9 ** np.arange(40.0)
    rank, _ = cut(spectrum, 0.9, 100_000)
    share = np.cumsum(spectrum) / spectrum.sum()
    assert share[rank - 1] >= 0.9 > share[rank - 2]


def test_removed_directions_are_listed(photos, make_set):
    text = " ".join(whiten(photos, retain=0.9).removed)
    assert "DC" in text
    assert "0.9 of the variance" in text
    r = np.random.default_rng(0)
    flat = make_set(r.standard_normal((500, 5)) @ r.standard_normal((5, 16)))
    assert any("no variance beyond rounding" in line for line in whiten(flat, retain=1).removed)
    assert whiten(flat, retain=1).rank == 5


@pytest.mark.parametrize("value", [np.nan, np.inf])
def test_values_that_are_not_finite_are_refused(value):
    rows = np.ones((100, 9))
    rows[50, 3] = value
    with pytest.raises(InputError, match="finite"):
        moments(rows)


def test_data_that_cannot_serve_is_refused(make_set):
    with pytest.raises(InputError, match="no contrast"):
        whiten(make_set(np.full((500, 16), 7.0)))
    with pytest.raises(InputError, match="16 patches"):
        whiten(make_set(np.random.default_rng(0).standard_normal((16, 16))))
    with pytest.raises(InputError, match="no patches"):
        moments(np.empty((0, 4)))
    low = np.random.default_rng(0).standard_normal((500, 3)) @ np.eye(3, 16)
    with pytest.raises(InputError, match="only"):
        whiten(make_set(low), rank=9)


@pytest.mark.parametrize(
    "options", [{"retain": 0.0}, {"retain": 1.5}, {"rank": 0}, {"rank": 64}, {"form": "other"}]
)
def test_wrong_parameters_are_refused(photos, options):
    with pytest.raises(UsageError):
        whiten(photos, **options)


def test_leading_directions_of_both_forms_agree(photos):
    a = leading(whiten(photos, rank=20), 12)
    b = leading(whiten(photos, rank=20, form="zca"), 12)
    assert a.rank == b.rank == 12
    np.testing.assert_allclose(b.K @ b.D, np.eye(12), atol=1e-10)
    np.testing.assert_allclose(np.abs(a.K @ b.D), np.eye(12), atol=1e-8)
    with pytest.raises(UsageError, match="21 components"):
        leading(whiten(photos, rank=20), 21)


def test_moments_of_a_known_law_give_its_whitening():
    C = np.diag([4.0, 4.0, 1.0, 1.0])
    H = np.array([[1, 1, 1, 1], [1, -1, 1, -1], [1, 1, -1, -1], [1, -1, -1, 1]]) / 2
    w = whitening(Moments(10**6, np.zeros(4), H @ C @ H.T), retain=1.0)
    np.testing.assert_allclose(w.spectrum, [4, 1, 1, 0], atol=1e-12)
