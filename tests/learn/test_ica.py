"""Independent components: ground truth, optimality, determinism, and honesty."""

import warnings
from dataclasses import replace

import numpy as np
import pytest

from patchlab.errors import InputError, UsageError
from patchlab.learn import Checkpoint, amari_index, learn_ica, learn_pca, match, whiten
from patchlab.learn.trust import split


def arrays(d):
    return d.filters, d.atoms, d.curve, d.kurtosis, d.pooled_atoms


def same_bytes(a, b):
    return all(x.tobytes() == y.tobytes() for x, y in zip(arrays(a), arrays(b), strict=True))


@pytest.fixture(scope="module")
def whitened(photos):
    return whiten(photos)


@pytest.fixture(scope="module")
def learned(photos, whitened):
    return learn_ica(photos, whitened, restarts=2)


def flat(kernels):
    return kernels.reshape(len(kernels), -1)


# ---------------------------------------------------------------- ground truth


@pytest.mark.parametrize(("n", "least"), [(20_000, 0.99), (5_000, 0.97)])
@pytest.mark.parametrize("orthogonal", [True, False])
def test_planted_gabors_come_back(make_set, make_gabors, n, least, orthogonal):
    atoms = make_gabors(40, 10, seed=4)
    coefficients = np.random.default_rng(6).laplace(size=(n, 40))
    patches = make_set(coefficients @ atoms)
    d = learn_ica(patches, whiten(patches, rank=40), restarts=1, orthogonal=orthogonal)
    assert d.converged
    assert np.abs(match(atoms.reshape(-1, 10, 10), d.atoms)[1]).min() > least


@pytest.mark.parametrize("orthogonal", [True, False])
def test_amari_index_of_laplace_sources(make_mixed, orthogonal):
    patches, mixing = make_mixed(np.random.default_rng(8).laplace(size=(20_000, 8)), 3)
    d = learn_ica(patches, whiten(patches, rank=8), restarts=1, orthogonal=orthogonal)
    assert amari_index(flat(d.filters) @ mixing) < 0.02
    assert d.identified.all()
    assert d.warnings == ()


def test_two_gaussian_sources_are_not_identified(make_mixed):
    """At most one Gaussian source can be told apart (Comon 1994)."""
    r = np.random.default_rng(10)
    sources = np.concatenate([r.laplace(size=(20_000, 3)), r.standard_normal((20_000, 2))], axis=1)
    patches, mixing = make_mixed(sources, 3)
    d = learn_ica(patches, whiten(patches, rank=5), restarts=1)
    P = np.abs(flat(d.filters) @ mixing) * sources.std(axis=0)
    gaussian = P[:, 3:].max(axis=1) > 0.5
    assert gaussian.sum() == 2
    assert np.array_equal(d.identified, ~gaussian)
    assert np.sort(P[~gaussian], axis=1)[:, :-1].max() < 0.03
    assert any("2 of 5 components are not identified" in line for line in d.warnings)


def test_one_gaussian_source_is_identified(make_mixed):
    r = np.random.default_rng(11)
    sources = np.concatenate([r.laplace(size=(20_000, 4)), r.standard_normal((20_000, 1))], axis=1)
    patches, mixing = make_mixed(sources, 3)
    d = learn_ica(patches, whiten(patches, rank=5), restarts=1)
    assert d.identified.all()
    assert amari_index(flat(d.filters) @ mixing) < 0.03


@pytest.mark.parametrize("orthogonal", [True, False])
def test_adaptive_densities_find_light_tails_too(make_mixed, orthogonal):
    r = np.random.default_rng(12)
    sources = np.concatenate([r.laplace(size=(20_000, 4)), r.uniform(-2, 2, (20_000, 4))], axis=1)
    patches, mixing = make_mixed(sources, 3)
    w = whiten(patches, rank=8)
    d = learn_ica(patches, w, restarts=1, density="adaptive", orthogonal=orthogonal)
    assert amari_index(flat(d.filters) @ mixing) < 0.02
    assert np.sum(d.kurtosis < 2) == 4
    fixed = learn_ica(patches, w, restarts=1, orthogonal=orthogonal)
    assert amari_index(flat(fixed.filters) @ mixing) > 0.1  # the need for it


# ---------------------------------------------------------------- optimality


def coefficients(d, patches):
    return (patches.patches - d.whitening.mean) @ flat(d.filters).T


def test_the_gradient_vanishes_at_the_end(make_mixed):
    patches, _ = make_mixed(np.random.default_rng(13).laplace(size=(9_000, 8)), 3)
    d = learn_ica(
        patches, whiten(patches, rank=8), restarts=1, orthogonal=False, tolerance=1e-12, seed=2
    )
    y = coefficients(d, patches)[split(len(patches), 2)[0]]
    y = y * [find_gain(y[:, i]) for i in range(8)]
    assert np.abs(np.tanh(y).T @ y / len(y) - np.eye(8)).max() < 1e-5
    assert d.converged


def find_gain(y):
    from scipy.optimize import brentq

    return brentq(lambda g: np.mean(np.tanh(g * y) * g * y) - 1, 0.1, 10, xtol=1e-12)


def test_held_out_likelihood_is_not_below_fastica(photos, whitened, learned):
    from sklearn.decomposition import FastICA

    train, held = split(len(photos), 0)
    z = ((photos.patches - whitened.mean) @ whitened.K.T).astype(np.float32)
    with warnings.catch_warnings():
        warnings.simplefilter("ignore")
        other = FastICA(whiten=False, max_iter=100, random_state=0).fit(z[train])
    W = other.components_.astype(np.float64)
    y = z[train].astype(np.float64) @ W.T
    gain = np.array([find_gain(y[:, i]) for i in range(len(W))])
    y = gain * (z[held].astype(np.float64) @ W.T)
    density = np.log(np.pi) + np.logaddexp(y, -y) - np.log(2)
    score = np.linalg.slogdet(gain[:, None] * W)[1] - density.sum(axis=1).mean()
    assert learned.log_likelihood >= score


def test_relaxing_orthogonality_only_helps(photos, whitened, learned):
    free = learn_ica(photos, whitened, restarts=1, orthogonal=False)
    assert free.converged
    assert free.curve[-1] < free.curve[0]
    assert free.log_likelihood > learned.log_likelihood - 0.05
    np.testing.assert_allclose(
        flat(free.filters) @ flat(free.atoms).T, np.eye(len(free)), atol=1e-9
    )


def test_components_beat_principal_components(photos, whitened, learned):
    pca = learn_pca(photos, whitened)
    assert learned.log_likelihood > pca.log_likelihood + 1
    assert np.median(learned.kurtosis) > np.median(pca.kurtosis)


# ---------------------------------------------------------------- form


def test_filters_and_atoms_encode_and_rebuild(photos, whitened, learned):
    centred = photos.patches[:500] - whitened.mean
    kept = centred @ (whitened.D @ whitened.K).T
    np.testing.assert_allclose(
        centred @ flat(learned.filters).T @ flat(learned.atoms), kept, atol=1e-9
    )
    np.testing.assert_allclose(
        flat(learned.filters) @ flat(learned.atoms).T, np.eye(len(learned)), atol=1e-10
    )


def test_canonical_order_sign_and_scale(photos, learned):
    np.testing.assert_allclose(coefficients(learned, photos).var(axis=0), 1, atol=1e-4)
    assert np.all(np.diff(learned.contribution) <= 0)
    retained = learned.whitening.spectrum[: learned.whitening.rank].sum()
    assert learned.contribution.sum() == pytest.approx(
        retained / learned.whitening.spectrum.sum(), rel=1e-9
    )
    size = np.abs(flat(learned.atoms))
    assert np.all(flat(learned.atoms)[np.arange(len(size)), size.argmax(axis=1)] > 0)
    assert np.abs(learned.filters.sum(axis=(1, 2))).max() < 1e-9
    y = coefficients(learned, photos)
    kurtosis = (y**4).mean(axis=0) / (y**2).mean(axis=0) ** 2
    np.testing.assert_allclose(learned.kurtosis, kurtosis, rtol=1e-3)


def test_restarts_are_pooled_and_the_best_leads(photos, whitened, learned):
    k = len(learned)
    assert learned.pooled_atoms.shape == (2 * k, 8, 8)
    np.testing.assert_allclose(np.linalg.norm(flat(learned.pooled_atoms), axis=1), 1, atol=1e-12)
    assert np.abs(match(learned.atoms, learned.pooled_atoms[:k])[1]).min() > 1 - 1e-12
    assert np.abs(match(learned.atoms, learned.pooled_atoms[k:])[1]).min() < 0.99
    assert learned.curve[-1] <= learn_ica(photos, whitened, restarts=1).curve[-1]


def test_the_curve_falls_and_converges(learned):
    assert learned.converged
    assert np.all(np.diff(learned.curve) < 0)
    assert learned.iterations >= len(learned.curve) - 1
    assert learned.warnings == ()


def test_fewer_components_live_in_the_leading_directions(photos, whitened):
    d = learn_ica(photos, whitened, components=10, restarts=1)
    assert len(d) == d.whitening.rank == 10
    lost = np.eye(64) - whitened.D[:, :10] @ whitened.K[:10]
    assert np.abs(flat(d.atoms) @ lost.T).max() < 1e-10


# ---------------------------------------------------------------- determinism


def test_whitening_signs_and_rotations_give_the_same_dictionary(photos, whitened):
    one = learn_ica(photos, whitened, components=20, restarts=1, tolerance=1e-8)
    r = np.random.default_rng(14)
    w = one.whitening
    flip = np.diag(r.choice([-1.0, 1.0], 20))
    turn = np.linalg.qr(r.standard_normal((20, 20)))[0]
    for Q, close in ((flip, 1e-9), (turn, 1e-2)):
        other = replace(w, K=Q @ w.K, D=w.D @ Q.T)
        d = learn_ica(photos, other, restarts=1, tolerance=1e-8)
        assert np.abs(d.atoms - one.atoms).max() < close * np.abs(one.atoms).max()


def test_zca_learns_what_pca_learns(photos):
    a = learn_ica(photos, whiten(photos, rank=15), restarts=1, tolerance=1e-8)
    b = learn_ica(photos, whiten(photos, rank=15, form="zca"), restarts=1, tolerance=1e-8)
    assert np.abs(match(a.atoms, b.atoms)[1]).min() > 0.999


def test_threads_do_not_change_a_bit(photos, whitened):
    options = {"components": 16, "restarts": 2, "seed": 5}
    one = learn_ica(photos, whitened, **options)
    assert same_bytes(one, learn_ica(photos, whitened, **options, jobs=3))


def test_patches_too_many_to_copy_are_whitened_in_every_pass(photos, whitened, monkeypatch):
    options = {"components": 12, "restarts": 1, "tolerance": 1e-8}
    copied = learn_ica(photos, whitened, **options)
    monkeypatch.setattr("patchlab.learn.ica.CACHE_BYTES", 0)
    lazy = learn_ica(photos, whitened, **options)
    assert lazy.converged
    assert np.abs(match(copied.atoms, lazy.atoms)[1]).min() > 0.9999


def test_the_seed_is_the_start(photos, whitened):
    a, b = (learn_ica(photos, whitened, components=16, restarts=1, seed=s) for s in (1, 2))
    assert not same_bytes(a, b)


@pytest.mark.parametrize("density", ["tanh", "adaptive"])
def test_a_resumed_learner_ends_with_the_same_bytes(photos, whitened, density):
    kept = []
    options = {"components": 16, "restarts": 2, "seed": 3, "density": density}
    whole = learn_ica(photos, whitened, **options, checkpoint=kept.append)
    assert len(kept) > 3
    for place in (kept[0], kept[len(kept) // 2], kept[-1]):
        stored = Checkpoint.from_arrays(place.arrays())
        assert same_bytes(whole, learn_ica(photos, whitened, **options, resume=stored))


def test_a_damaged_checkpoint_is_refused():
    with pytest.raises(InputError, match="damaged checkpoint"):
        Checkpoint.from_arrays({"place": np.arange(5)})


# ---------------------------------------------------------------- honesty


def test_a_stop_too_early_is_said(photos, whitened):
    d = learn_ica(photos, whitened, restarts=1, max_iterations=4)
    assert not d.converged
    assert d.iterations == 4
    assert any("not converged after 4 iterations" in line for line in d.warnings)


def test_white_noise_is_recognised(noise):
    d = learn_ica(noise, whiten(noise), restarts=1)
    assert any("Gaussian noise" in line for line in d.warnings)
    assert np.median(d.kurtosis) == pytest.approx(3, abs=0.3)
    assert d.identified.mean() < 0.1


def test_progress_is_told_and_can_stop(photos, whitened):
    from patchlab.errors import Interrupted

    seen = []

    def listen(stage, done, total, note=""):
        seen.append((stage, done, total, note))
        if done > 0.5:
            raise Interrupted("stopped")

    with pytest.raises(Interrupted):
        learn_ica(photos, whitened, components=16, restarts=1, progress=listen, jobs=2)
    assert {s[0] for s in seen} == {"learn"}
    assert all(0 <= s[1] <= s[2] for s in seen)
    assert "restart 1 of 1" in seen[0][3]


@pytest.mark.parametrize(
    "options",
    [
        {"components": 1000},
        {"components": 0},
        {"restarts": 0},
        {"tolerance": 0.0},
        {"max_iterations": 0},
        {"density": "cubic"},
        {"jobs": 0},
    ],
)
def test_wrong_parameters_are_refused(photos, whitened, options):
    with pytest.raises(UsageError):
        learn_ica(photos, whitened, **options)


def test_a_whitening_of_another_size_is_refused(noise, whitened):
    with pytest.raises(UsageError, match="another patch size"):
        learn_ica(noise, whitened)
