"""The scikit-learn face: its own checks, and equality with the functions underneath."""

import numpy as np
import pytest
from numpy.testing import assert_allclose
from scipy import stats
from sklearn.base import clone
from sklearn.decomposition import PCA
from sklearn.exceptions import ConvergenceWarning
from sklearn.linear_model import LogisticRegression
from sklearn.model_selection import GridSearchCV
from sklearn.pipeline import make_pipeline
from sklearn.utils.estimator_checks import estimator_checks_generator

from patchlab.learn import amari_index, encode, learn_sparse, whiten
from patchlab.learn.density import log_density
from patchlab.learn.estimators import ICA, SparseCoder, Whitener
from patchlab.learn.whiten import moments, whitening

EXCEPTIONS = {
    "check_array_api_input": "array namespaces other than numpy's are not offered",
}
CHECKS = [
    (estimator, check)
    for each in (Whitener(), ICA(), SparseCoder())
    for estimator, check in estimator_checks_generator(each, mark="skip")
    if check.func.__name__ not in EXCEPTIONS
]


@pytest.mark.parametrize(
    ("estimator", "check"),
    CHECKS,
    ids=lambda v: v.func.__name__ if hasattr(v, "func") else type(v).__name__,
)
def test_scikit_learns_own_checks(estimator, check):
    check(estimator)


def test_no_check_of_scikit_learns_is_missing():
    assert len(CHECKS) >= 3 * 40


@pytest.fixture(scope="module")
def rows():
    r = np.random.default_rng(0)
    return r.laplace(size=(4000, 6)) @ r.standard_normal((6, 9))


@pytest.mark.parametrize("form", ["pca", "zca"])
def test_whitened_rows_are_white_and_come_back(rows, form):
    found = Whitener(retain=1.0, remove_dc=False, form=form).fit(rows)
    z = found.transform(rows)
    kept = np.cov(z.T, bias=True)
    assert_allclose(kept @ kept, kept, atol=1e-8)  # a projector: the identity for pca
    assert round(np.trace(kept)) == found.rank_ == 6
    assert_allclose(found.inverse_transform(z), rows, atol=1e-8)


def test_whitening_agrees_with_scikit_learns_up_to_signs(rows):
    ours = Whitener(4, remove_dc=False).fit_transform(rows)
    theirs = PCA(4, whiten=True).fit_transform(rows) * np.sqrt(4000 / 3999)
    assert_allclose(np.abs(ours), np.abs(theirs), atol=1e-8)


def test_brightness_goes_unless_asked_to_stay(rows):
    assert_allclose(Whitener().fit(rows).components_.sum(axis=1), 0, atol=1e-10)
    assert Whitener(remove_dc=False).fit(rows).removed_ != Whitener().fit(rows).removed_


@pytest.mark.parametrize("two_steps", [False, True])
def test_components_unmix(two_steps):
    r = np.random.default_rng(1)
    sources, mixing = r.laplace(size=(20_000, 6)), r.standard_normal((6, 6))
    first = Whitener(retain=1.0, remove_dc=False)
    ica = ICA(retain=1.0, remove_dc=False)
    steps = make_pipeline(first, ICA(whiten=False)) if two_steps else make_pipeline(ica)
    found = steps.fit_transform(sources @ mixing.T)
    assert_allclose(found.std(axis=0), 1, rtol=1e-3)
    assert amari_index(found.T @ sources / len(sources)) < 0.03
    last = steps[-1]
    assert last.converged_
    assert last.n_iter_ == last.n_iter_ > 0
    assert_allclose(last.components_ @ last.mixing_, np.eye(6), atol=1e-8)
    assert_allclose(steps.inverse_transform(found), sources @ mixing.T, atol=1e-6)


def test_a_limit_of_steps_warns(rows):
    with pytest.warns(ConvergenceWarning, match="after 2 iterations"):
        assert not ICA(max_iter=2).fit(rows).converged_


def test_float32_stays(rows):
    rows = rows.astype(np.float32)
    for estimator in (Whitener(), ICA(), SparseCoder(penalty=0.3)):
        found = estimator.fit(rows)
        assert found.transform(rows).dtype == found.components_.dtype == np.float32
        assert found.inverse_transform(found.transform(rows)).dtype == np.float32


def test_names_of_columns(rows):
    found = Whitener(3).fit(rows)
    assert list(found.get_feature_names_out()) == ["whitener0", "whitener1", "whitener2"]
    assert len(ICA(4).fit(rows).get_feature_names_out()) == 4


def test_bad_parameters_are_value_errors(rows):
    for bad in (Whitener(40), ICA(density="cosh"), SparseCoder(99), SparseCoder(penalty=-1.0)):
        with pytest.raises(ValueError, match=r"\w"):
            bad.fit(rows)


def test_log_density_of_gaussian_parts_is_scipys(rows):
    """A rank cut: the rest must be the Gaussian that scipy gives; the kept part, by hand."""
    through = whitening(moments(rows), rank=4, keep_dc=True)
    found = log_density(rows[:50], through, np.eye(4), np.ones(4))
    z = (rows[:50] - through.mean) @ through.K.T
    kept = -np.log(np.pi * np.cosh(z)).sum(axis=1) - np.log(through.spectrum[:4]).sum() / 2
    values, vectors = np.linalg.eigh(np.cov(rows.T, bias=True))
    rest = (rows[:50] - rows.mean(axis=0)) @ vectors[:, ::-1][:, 4:6]
    gauss = stats.norm.logpdf(rest, scale=np.sqrt(values[::-1][4:6].mean())).sum(axis=1)
    assert_allclose(found, kept + gauss, rtol=1e-6)


def test_light_tails_have_a_density_of_their_own():
    through = whitening(moments(np.random.default_rng(2).normal(size=(500, 1)) @ [[1.0, -1.0]]))
    grid = np.linspace(-8, 8, 4001)[:, None] @ [[1.0, -1.0]]
    length = np.sqrt(2) * 16 / 4000
    for sign in (1.0, -1.0):
        mass = np.exp(log_density(grid, through, np.eye(1), np.array([sign]))).sum() * length
        assert mass == pytest.approx(1, abs=2e-3)


def test_a_search_finds_the_number_of_sources():
    r = np.random.default_rng(4)
    sources = r.laplace(size=(3000, 4)) @ (3 * r.standard_normal((4, 8)))
    rows = sources + 0.3 * r.standard_normal((3000, 8))
    search = GridSearchCV(ICA(remove_dc=False), {"n_components": [2, 4, 7]}, cv=3).fit(rows)
    assert search.best_params_ == {"n_components": 4}


def test_in_a_classifier(rows):
    labels = rows[:, 0] > 0
    pipe = make_pipeline(ICA(5, remove_dc=False), LogisticRegression())
    search = GridSearchCV(pipe, {"ica__n_components": [3, 6]}, cv=2).fit(rows[:1000], labels[:1000])
    assert search.score(rows[1000:], labels[1000:]) > 0.9
    assert clone(search.best_estimator_).get_params()["ica__n_components"] == 6


def test_sparse_codes_are_those_of_the_function(make_set):
    r = np.random.default_rng(5)
    patches = make_set(r.laplace(size=(3000, 8)) @ r.standard_normal((8, 16)))
    known = learn_sparse(patches, whiten(patches), atoms=7, penalty=0.3)
    found = SparseCoder(7, penalty=0.3).fit(patches.patches)
    assert_allclose(found.components_, known.atoms.reshape(7, -1), rtol=2e-4, atol=2e-5)
    codes = found.transform(patches.patches[:50].astype(np.float64))
    assert_allclose(codes, encode(known, patches.patches[:50], 0.3), atol=5e-3)
    assert np.mean(codes == 0) > 0.05
