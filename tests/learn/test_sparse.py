"""Sparse coding: optimality conditions, an outside reference, dead atoms."""

import warnings

import numpy as np
import pytest
from sklearn.decomposition import MiniBatchDictionaryLearning
from sklearn.linear_model import Lasso

from patchlab.errors import InputError, UsageError
from patchlab.learn import (
    encode,
    lasso,
    learn_ica,
    learn_pca,
    learn_sparse,
    match,
    penalty_from_noise,
    whiten,
)
from patchlab.learn.sparse import Learner, SparseState, objective
from patchlab.learn.trust import split


def unit(B):
    return B / np.linalg.norm(B, axis=0)


@pytest.fixture(scope="module")
def problem():
    r = np.random.default_rng(0)
    return r.standard_normal((300, 20)) * 2, unit(r.standard_normal((20, 50)))


@pytest.fixture(scope="module")
def whitened(photos):
    return whiten(photos, rank=30)


@pytest.fixture(scope="module")
def learned(photos, whitened):
    return learn_sparse(photos, whitened, atoms=60)


def flat(kernels):
    return kernels.reshape(len(kernels), -1)


@pytest.mark.parametrize("penalty", [0.1, 1.0, 3.0])
@pytest.mark.parametrize("scale", [1.0, 2.5])
def test_kkt_conditions(problem, penalty, scale):
    z, B = problem
    B = B * scale
    a = lasso(z, B, penalty, tolerance=1e-8)
    c = (z - a @ B.T) @ B
    active = a != 0
    slack = 1e-8 * penalty * scale**2
    assert active.any()
    assert np.abs(c[active] - penalty * np.sign(a[active])).max() <= slack + 1e-10
    assert np.abs(c[~active]).max() <= penalty + slack


@pytest.mark.parametrize("penalty", [0.8, 2.0])
def test_exact_steps_finish_what_descent_begins(problem, penalty, monkeypatch):
    """Independent atoms never need more than the active set: conditions at rounding level."""
    z, B = problem
    monkeypatch.setattr("patchlab.learn.coding._settle", None)
    a = lasso(z, B, penalty)
    c = (z - a @ B.T) @ B
    wrong = np.where(a != 0, np.abs(c - penalty * np.sign(a)), np.abs(c) - penalty)
    assert wrong.max() < 1e-6 * penalty
    assert np.abs(wrong[a != 0]).max() < 1e-10


@pytest.mark.parametrize("penalty", [0.05, 1.0])
def test_atoms_that_repeat_meet_the_conditions(problem, penalty):
    """Equal and opposite atoms leave the active set singular: feature-sign search finishes."""
    z, B = problem
    B = np.concatenate([B, B[:, :10], -B[:, 5:15]], axis=1)
    a = lasso(z[:60], B, penalty)
    c = (z[:60] - a @ B.T) @ B
    wrong = np.where(a != 0, np.abs(c - penalty * np.sign(a)), np.abs(c) - penalty)
    assert wrong.max() < 1e-6 * penalty + 1e-10
    single = lasso(z[:60], B[:, :50], penalty)
    both = [
        0.5 * np.sum((z[:60] - x @ D.T) ** 2) + penalty * np.abs(x).sum()
        for x, D in ((a, B), (single, B[:, :50]))
    ]
    assert both[0] == pytest.approx(both[1], rel=1e-9)


def test_float32_meets_its_tolerance(problem):
    z, B = problem
    a = lasso(z.astype(np.float32), B, 1.0, tolerance=1e-3)
    assert a.dtype == np.float32
    c = (z - a.astype(np.float64) @ B.T) @ B
    assert np.abs(np.abs(c[a != 0]) - 1).max() < 2e-3
    assert np.abs(c[a == 0]).max() < 1 + 2e-3


def test_orthonormal_atoms_give_the_soft_threshold(problem):
    z, _ = problem
    Q = np.linalg.qr(np.random.default_rng(1).standard_normal((20, 20)))[0]
    c = z @ Q
    soft = np.sign(c) * np.maximum(np.abs(c) - 0.7, 0)
    np.testing.assert_allclose(lasso(z, Q, 0.7), soft, atol=1e-12)


def test_codes_are_zero_just_when_the_penalty_is_large_enough(problem):
    z, B = problem
    largest = np.abs(z[0] @ B).max()
    assert not lasso(z[:1], B, largest).any()
    assert np.count_nonzero(lasso(z[:1], B, largest * 0.999)) == 1


def test_codes_agree_with_scikit_learn(problem):
    z, B = problem
    a = lasso(z[:20], B, 0.8, tolerance=1e-9)
    for row, code in zip(z, a, strict=False):
        # its quadratic term is divided by the number of samples, here the m entries of z
        other = Lasso(alpha=0.8 / 20, fit_intercept=False, tol=1e-12, max_iter=100_000)
        np.testing.assert_allclose(code, other.fit(B, row).coef_, atol=1e-5)


def test_a_zero_atom_is_never_used(problem):
    z, B = problem
    B = B.copy()
    B[:, 3] = 0
    assert not lasso(z, B, 0.5)[:, 3].any()


def test_lasso_refuses_what_it_cannot_do(problem):
    z, B = problem
    for bad in ((z, B, 0.0), (z, B, -1.0), (z[:, :5], B, 1.0)):
        with pytest.raises(UsageError):
            lasso(*bad)
    with pytest.raises(InputError):
        lasso(np.full((1, 20), np.nan), B, 1.0)


def held_out(patches, w):
    train, held = split(len(patches), 0)
    z = ((patches.patches - w.mean) @ w.K.T).astype(np.float32)
    return z[train], z[held]


def test_objective_is_within_two_percent_of_scikit_learns(photos, whitened, learned):
    train, held = held_out(photos, whitened)
    with warnings.catch_warnings():
        warnings.simplefilter("ignore")
        other = MiniBatchDictionaryLearning(
            60, alpha=1.2, max_iter=3, batch_size=256, fit_algorithm="cd", random_state=0
        ).fit(train.astype(np.float64))
    B = unit(other.components_.T)
    theirs = objective(held, B, lasso(held, B, 1.2, tolerance=1e-3), 1.2).mean()
    assert learned.curve[-1] <= 1.02 * theirs


def test_curve_is_the_held_out_objective_and_falls(photos, whitened, learned):
    _, held = held_out(photos, whitened)
    B = unit(whitened.K @ flat(learned.atoms).T)
    mine = objective(held, B, lasso(held, B, 1.2, tolerance=1e-6), 1.2).mean()
    assert learned.curve[-1] == pytest.approx(mine, rel=1e-4)
    assert np.all(np.diff(learned.curve) < 0)
    assert learned.converged
    assert learned.warnings == ()


def test_a_planted_overcomplete_dictionary_is_found(make_set):
    """Fifty random atoms in twenty dimensions, three to a signal.

    The test signal of Aharon, Elad & Bruckstein 2006 (quoted from memory), with an atom
    counted as found when 1 - |cos| < 0.01.
    """
    r = np.random.default_rng(2)
    atoms = unit(r.standard_normal((20, 50)))
    codes = np.zeros((6000, 50))
    for row in codes:
        row[r.choice(50, 3, replace=False)] = r.standard_normal(3)
    lift = np.linalg.qr(np.concatenate([np.ones((36, 1)), r.standard_normal((36, 20))], axis=1))[0]
    patches = make_set(codes @ atoms.T @ lift[:, 1:].T)
    w = whiten(patches, rank=20)
    d = learn_sparse(patches, w, atoms=50, penalty=0.5, tolerance=1e-5, max_iterations=80)
    cosine = np.abs(match(atoms.T @ lift[:, 1:].T, flat(d.atoms))[1])
    assert np.mean(cosine > 0.99) >= 0.8


def test_filters_rebuild_the_kept_directions(photos, whitened, learned):
    centred = photos.patches[:200] - whitened.mean
    kept = centred @ (whitened.D @ whitened.K).T
    rebuilt = centred @ flat(learned.filters).T @ flat(learned.atoms)
    np.testing.assert_allclose(rebuilt, kept, atol=1e-6)


def test_encode_has_unit_variance_codes_that_rebuild(photos, whitened, learned):
    rows = photos.patches[split(len(photos), 0)[0]]
    codes = encode(learned, rows, tolerance=1e-3)
    np.testing.assert_allclose(np.mean(codes**2, axis=0), 1, atol=1e-3)
    centred = rows - whitened.mean
    error = centred - codes @ flat(learned.atoms)
    assert np.sum((error @ whitened.K.T) ** 2) < 0.6 * np.sum((centred @ whitened.K.T) ** 2)
    tight = encode(learned, rows[:200], penalty=1e-4)
    kept = centred[:200] @ (whitened.D @ whitened.K).T
    np.testing.assert_allclose(tight @ flat(learned.atoms), kept, atol=1e-3)


def test_encode_works_over_independent_components(photos, whitened):
    d = learn_ica(photos, whitened, restarts=1)
    codes = encode(d, photos.patches[:100], penalty=0.5)
    y = (photos.patches[:100] - whitened.mean) @ flat(d.filters).T
    np.testing.assert_allclose(codes, np.sign(y) * np.maximum(np.abs(y) - 0.5, 0), atol=1e-6)


def test_dead_atoms_are_revived_from_the_worst_coded_patches(photos, whitened):
    learner = Learner(photos.patches, whitened, 40, 6.0, 0, 1e-3, map)
    start = learner.start()
    once = learner.turn(start)  # under this penalty some atoms find no use
    assert once.revived > 0
    np.testing.assert_allclose(np.linalg.norm(once.B, axis=0), 1, atol=1e-12)
    used = np.full(40, 50)
    used[[3, 8]] = 9
    worst = np.eye(2, 30, dtype=np.float32) * 5
    after = learner._revive(start, used, worst)
    assert after.revived == 2
    np.testing.assert_allclose(after.B[:, [3, 8]], np.eye(30, 2))
    others = np.setdiff1d(np.arange(40), [3, 8])
    assert np.array_equal(after.B[:, others], start.B[:, others])


def test_threads_seed_and_resuming(photos, whitened):
    kept = []
    options = {"atoms": 40, "tolerance": 3e-3}
    whole = learn_sparse(photos, whitened, **options, checkpoint=kept.append)
    assert len(kept) > 2
    stored = SparseState.from_arrays(kept[1].arrays())
    for other in (
        learn_sparse(photos, whitened, **options, jobs=3),
        learn_sparse(photos, whitened, **options, resume=stored),
    ):
        assert other.atoms.tobytes() == whole.atoms.tobytes()
        assert other.curve.tobytes() == whole.curve.tobytes()
    apart = learn_sparse(photos, whitened, **options, seed=1)
    assert apart.atoms.tobytes() != whole.atoms.tobytes()


def test_what_is_wrong_is_said(photos, whitened):
    early = learn_sparse(photos, whitened, atoms=30, max_iterations=1)
    assert not early.converged
    assert any("not converged after 1 passes" in line for line in early.warnings)
    deaf = learn_sparse(photos, whitened, atoms=30, penalty=12.0, max_iterations=2)
    assert any("penalty is too high" in line for line in deaf.warnings)


@pytest.mark.parametrize(
    "options", [{"atoms": 0}, {"atoms": 121}, {"penalty": 0.0}, {"tolerance": 0.0}, {"jobs": 0}]
)
def test_wrong_parameters_are_refused(photos, whitened, options):
    with pytest.raises(UsageError):
        learn_sparse(photos, whitened, **{"atoms": 30, **options})
    with pytest.raises(UsageError, match="64 pixels"):
        encode(learn_pca(photos, whitened), np.zeros((1, 9), np.float32))


def test_noise_alone_hardly_uses_an_atom_at_the_penalty_from_noise(photos):
    w = whiten(photos)
    variance = 0.3 * w.spectrum[w.rank - 1]
    noise = np.random.default_rng(0).normal(0, np.sqrt(variance), (2000, 64))
    known = learn_ica(photos, w, restarts=1, tolerance=1e-3)
    penalty = penalty_from_noise(w, variance * np.eye(64), len(known))
    atoms = known.whitening.K @ known.atoms.reshape(len(known), -1).T
    B = atoms / np.linalg.norm(atoms, axis=0)
    used = np.count_nonzero(lasso(noise @ w.K.T, B, penalty), axis=1)
    assert used.mean() < 1
    assert np.count_nonzero(lasso(noise @ w.K.T, B, penalty / 3), axis=1).mean() > 5
    tiny, huge = (penalty_from_noise(w, v * np.eye(64), 50) for v in (0.0, 1e6))
    assert 0 < tiny < penalty < huge < 10


def test_smaller_batches_do_not_learn_worse(photos, whitened, monkeypatch):
    """The sums stand for a share of a pass, whatever the batch."""
    ends = []
    for batch in (512, 4096):
        monkeypatch.setattr("patchlab.learn.sparse.BATCH", batch)
        ends.append(learn_sparse(photos, whitened, atoms=60, max_iterations=4).curve[-1])
    assert ends[0] < 1.002 * ends[1]
