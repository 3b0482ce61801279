"""The course of batches: what it evaluates, where it ends, and that it is worth its steps."""

import numpy as np
import pytest
from numpy.testing import assert_allclose

from patchlab.learn.incremental import FIRST, LAST, STEPS, course, length
from patchlab.learn.likelihood import Likelihood, Rows
from patchlab.learn.solver import Orthogonal, Solver, State


@pytest.fixture(scope="module")
def white():
    """Sources of heavy tails, mixed by a rotation; exactly white."""
    r = np.random.default_rng(0)
    rows = r.laplace(size=(20_000, 12)) @ np.linalg.qr(r.standard_normal((12, 12)))[0]
    rows -= rows.mean(axis=0)
    values, vectors = np.linalg.eigh(rows.T @ rows / len(rows))
    return Rows((rows @ (vectors / np.sqrt(values))).astype(np.float32))


@pytest.fixture(scope="module")
def start():
    turn = np.linalg.qr(np.random.default_rng(1).standard_normal((12, 12)))[0]
    return np.linspace(1.2, 1.8, 12)[:, None] * turn


@pytest.mark.parametrize("light", [0, 5])
def test_a_batch_of_all_rows_is_the_whole_evaluation(white, start, light):
    signs = np.where(np.arange(12) < light, -1.0, 1.0)
    objective = Likelihood(white, signs)
    whole, batch = objective(start), objective.batch(start, 0, len(white))
    for name in ("score", "slope", "energy"):
        assert_allclose(getattr(batch, name), getattr(whole, name), atol=2e-5)


def test_steps_grow_shorter():
    lengths = [length(i) for i in range(STEPS + 1)]
    assert lengths[0] == FIRST
    assert lengths[-1] == pytest.approx(LAST)
    assert np.all(np.diff(lengths) <= 0)


def test_a_course_ends_near_the_optimum_and_on_the_manifold(white, start):
    objective = Likelihood(white, np.ones(12))
    W = course(objective, start)
    best = Solver(objective, Orthogonal(), 1e-9, 500).run(State(W))
    assert best.outcome == "converged"
    assert objective(start).value - best.curve[-1] > 0.5
    # what batches of 2048 leave: parameters over twice the batch, times half the last step
    assert objective(W).value - best.curve[-1] < 12 * 13 / 2 / 4096
    unit = W / np.linalg.norm(W, axis=1, keepdims=True)
    assert_allclose(unit @ unit.T, np.eye(12), atol=1e-12)


def test_the_listener_hears_every_step(white, start):
    heard = []
    course(Likelihood(white, np.ones(12)), start, start=4, stop=9, after=heard.append)
    assert heard == [5, 6, 7, 8, 9]
