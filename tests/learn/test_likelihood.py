"""The compiled pass and its derivatives, against plain float64 and finite differences."""

from concurrent.futures import ThreadPoolExecutor

import numpy as np
import pytest
from scipy.integrate import quad
from scipy.linalg import expm

from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.learn.solver import Free, Orthogonal, Solver, State, turning

K = 6
SIGNS = np.array([1.0, 1, 1, 1, -1, -1])


def densities(y, sign):
    """-log p(y), written out as the module's text states it."""
    if sign > 0:
        return np.log(np.pi) + np.logaddexp(y, -y) - np.log(2)
    return (y**2 + 1 + np.log(2 * np.pi)) / 2 - (np.logaddexp(y, -y) - np.log(2))


def reference(z, W):
    y = z @ W.T
    total = sum(densities(y[:, i], SIGNS[i]).mean() for i in range(K))
    return total - np.linalg.slogdet(W)[1]


@pytest.fixture(scope="module")
def case():
    r = np.random.default_rng(5)
    z = np.concatenate([r.laplace(size=(20_000, 4)), r.uniform(-1, 1, (20_000, 2))], axis=1)
    z = np.ascontiguousarray(z / z.std(axis=0), np.float32)
    return z, np.linalg.qr(r.standard_normal((K, K)))[0] * r.uniform(0.8, 2, (K, 1))


def single(i, j):
    E = np.zeros((K, K))
    E[i, j] = 1
    return E


@pytest.mark.parametrize("sign", [1, -1])
def test_densities_integrate_to_one(sign):
    total = quad(lambda y: np.exp(-densities(y, sign)), -40, 40)[0]
    assert total == pytest.approx(1, abs=1e-8)


def test_the_pass_agrees_with_plain_float64(case):
    z, W = case
    at = Likelihood(Rows(z), SIGNS)(W)
    y = z.astype(np.float64) @ W.T
    t = np.tanh(y)
    light = SIGNS < 0
    psi, slope = np.where(light, y - t, t), np.where(light, t**2, 1 - t**2)
    assert at.value == pytest.approx(reference(z.astype(np.float64), W), abs=1e-6)
    np.testing.assert_allclose(at.score, psi.T @ y / len(y), atol=1e-6)
    np.testing.assert_allclose(at.slope, slope.mean(axis=0), atol=1e-6)
    np.testing.assert_allclose(at.energy, (y**2).mean(axis=0), atol=1e-6)


def test_tails_far_out_do_not_overflow():
    z = np.full((1000, K), 1e4, np.float32)
    at = Likelihood(Rows(z), np.ones(K))(np.eye(K))
    assert at.value == pytest.approx(K * (1e4 - np.log(2) + np.log(np.pi)), rel=1e-6)


def test_free_gradient_is_the_finite_difference(case):
    z, W = case
    gradient = Free().gradient(Likelihood(Rows(z), SIGNS)(W))
    z, h = z.astype(np.float64), 1e-5
    for i in range(K):
        for j in range(K):
            step = h * single(i, j)
            up = reference(z, W + step @ W)
            down = reference(z, W - step @ W)
            assert gradient[i, j] == pytest.approx((up - down) / (2 * h), abs=1e-6)


def test_orthogonal_gradient_is_the_finite_difference(case):
    z, W = case
    gradient = Orthogonal().gradient(Likelihood(Rows(z), SIGNS)(W))
    z, h = z.astype(np.float64), 1e-5
    geometry = Orthogonal()
    for i in range(K):
        for j in range(i + 1):
            E = single(i, j) if i == j else single(i, j) - single(j, i)
            up, down = (reference(z, geometry.move(W, s * h * E)) for s in (1, -1))
            assert np.sum(gradient * E) == pytest.approx((up - down) / (2 * h), abs=1e-6)


def test_pair_curvatures_are_second_differences(case):
    z, W = case
    pairs, own = Likelihood(Rows(z), SIGNS).pairs(W)
    bend = turning(W, pairs, own)
    z, h = z.astype(np.float64), 1e-3
    gain = np.linalg.norm(W, axis=1)[:, None]
    base = reference(z, W)
    for i, j in [(0, 1), (1, 0), (2, 5), (5, 2), (4, 5)]:
        values = [reference(z, W + s * h * single(i, j) @ W) for s in (1, -1)]
        assert pairs[i, j] == pytest.approx((sum(values) - 2 * base) / h**2, abs=1e-5)
        A = single(i, j) - single(j, i)
        values = [reference(z, gain * (expm(s * h * A) @ (W / gain))) for s in (1, -1)]
        # the second difference itself is off by h^2 / 12 times a fourth derivative
        assert bend[i, j] == pytest.approx((sum(values) - 2 * base) / h**2, abs=1e-5)


def test_independent_components_have_the_preconditioners_curvature(case):
    """H2 is H1 in the limit of independent components (Ablin et al. 2018, section 3)."""
    z, _ = case
    objective = Likelihood(Rows(z), SIGNS)
    at, (pairs, _) = objective(np.eye(K)), objective.pairs(np.eye(K))
    off = ~np.eye(K, dtype=bool)
    np.testing.assert_allclose(pairs[off], np.outer(at.slope, at.energy)[off], atol=0.03)


def test_free_solve_inverts_its_own_hessian(case):
    z, W = case
    geometry = Free()
    curvature = geometry.curvature(Likelihood(Rows(z), SIGNS)(W))
    E = np.random.default_rng(0).standard_normal((K, K))
    product = curvature * E + E.T
    np.fill_diagonal(product, np.diag(curvature) * np.diag(E))
    np.testing.assert_allclose(geometry.solve(curvature, product), E, atol=1e-10)


def test_orthogonal_moves_stay_orthogonal(case):
    _, W = case
    E = np.random.default_rng(0).standard_normal((K, K))
    moved = Orthogonal().move(W, E - E.T + np.diag(np.diag(E)))
    unit = moved / np.linalg.norm(moved, axis=1, keepdims=True)
    np.testing.assert_allclose(unit @ unit.T, np.eye(K), atol=1e-13)


def test_threads_do_not_change_a_bit(case):
    z, W = case
    alone = Likelihood(Rows(z), SIGNS)(W)
    with ThreadPoolExecutor(3) as pool:
        together = Likelihood(Rows(z), SIGNS, pool.map)(W)
    assert alone.value == together.value
    assert alone.score.tobytes() == together.score.tobytes()


def test_patches_whitened_as_they_are_read_give_the_same_objective(case):
    z, W = case
    r = np.random.default_rng(2)
    basis, offset = r.standard_normal((K, 9)), r.standard_normal(K)
    rows = ((z + offset) @ np.linalg.pinv(basis).T).astype(np.float32)
    index = np.sort(r.choice(len(z), 15_000, replace=False))
    lazy = Rows(rows, index, basis, offset)
    for other in (lazy, lazy.whitened()):
        at = Likelihood(other, SIGNS)(W)
        assert at.value == pytest.approx(Likelihood(Rows(z[index]), SIGNS)(W).value, abs=1e-5)
    half = lazy.whitened(np.arange(0, 15_000, 2))
    np.testing.assert_allclose(half.data, z[index][::2], atol=1e-4)


@pytest.mark.parametrize("geometry", [Free(), Orthogonal()])
def test_a_poisoned_memory_is_recovered_from(case, geometry):
    """Pairs of negative curvature make L-BFGS climb; the search forgets them and goes on."""
    z, _ = case
    start = np.linalg.qr(np.random.default_rng(9).standard_normal((K, K)))[0] * 1.5
    objective = Likelihood(Rows(z), SIGNS)
    gradient = geometry.gradient(objective(start))
    poisoned = State(start, steps=(gradient,), changes=(-1e-3 * gradient,))
    end = Solver(objective, geometry, 1e-7, 500).run(poisoned)
    clean = Solver(objective, geometry, 1e-7, 500).run(State(start))
    assert end.outcome == clean.outcome == "converged"
    assert end.curve[-1] == pytest.approx(clean.curve[-1], abs=1e-4)
    assert np.all(np.diff(end.curve) < 0)


def test_a_search_that_cannot_fall_is_reported(case):
    z, W = case
    good = Likelihood(Rows(z), SIGNS)

    def deceitful(at):
        value = good(at)
        return value if at is W else type(value)(at, np.inf, value.score, value.slope, value.energy)

    assert Solver(deceitful, Free(), 1e-9, 10).run(State(W)).outcome == "stalled"
