"""Order, sign, scale, the Amari index and matching."""

from itertools import permutations

import numpy as np
import pytest

from patchlab.errors import UsageError
from patchlab.learn import amari_index, match
from patchlab.learn.order import canonical


def test_canonical_form():
    r = np.random.default_rng(0)
    atoms = r.standard_normal((5, 9))
    filters, variance = np.linalg.pinv(atoms).T, r.uniform(0.5, 4, 5)
    f, a, order = canonical(filters, atoms, variance)
    size = np.linalg.norm(a, axis=1)
    assert np.all(np.diff(size) <= 0)
    assert np.all(a[np.arange(5), np.abs(a).argmax(axis=1)] > 0)
    np.testing.assert_allclose(size, (np.linalg.norm(atoms, axis=1) * variance**0.5)[order])
    np.testing.assert_allclose(f @ a.T, np.eye(5), atol=1e-12)  # the product is kept


def test_sign_of_a_tie_is_the_first_pixels():
    for row in ([-2.0, 2.0, 1.0], [2.0 + 1e-9, -2.0, 0.0], [-2.0, 2.0 + 1e-9, 0.0]):
        atom = canonical(np.eye(1, 3), np.array([row]), np.ones(1))[1][0]
        assert atom[0] > 0


@pytest.mark.parametrize(
    ("P", "value"),
    [
        # worked by hand from Amari, Cichocki & Yang 1996, divided by 2 n (n - 1)
        (np.ones((4, 4)), 1.0),
        (np.array([[1, 0.1], [0.2, 1]]), 0.15),
        (np.array([[0, 2], [-4, 0]]), 0.0),
    ],
)
def test_amari_index_of_worked_arrays(P, value):
    assert amari_index(P) == pytest.approx(value, abs=1e-12)


def test_amari_index_ignores_scale_order_and_sign():
    r = np.random.default_rng(1)
    P = r.standard_normal((6, 6))
    other = 3 * P[r.permutation(6)][:, r.permutation(6)] * r.choice([-1, 1], (6, 1))
    assert amari_index(other) == pytest.approx(amari_index(P), abs=1e-12)


def test_amari_index_refuses_what_has_none():
    for bad in (np.ones((2, 3)), np.ones((1, 1)), np.diag([1.0, 0.0])):
        with pytest.raises(UsageError):
            amari_index(bad)


def test_match_is_the_best_of_all_permutations():
    r = np.random.default_rng(2)
    a, b = r.standard_normal((5, 3, 3)), r.standard_normal((5, 3, 3))
    partner, cosine = match(a, b)
    cos = np.array([[np.sum(p * q) / np.linalg.norm(p) / np.linalg.norm(q) for q in b] for p in a])
    best = max(sum(abs(cos[i, p[i]]) for i in range(5)) for p in permutations(range(5)))
    assert np.abs(cosine).sum() == pytest.approx(best, abs=1e-12)
    np.testing.assert_allclose(cosine, cos[np.arange(5), partner], atol=1e-12)


def test_match_refuses_atoms_of_other_sizes():
    with pytest.raises(UsageError):
        match(np.ones((2, 3, 3)), np.ones((2, 4, 4)))
    with pytest.raises(UsageError):
        match(np.ones((3, 3, 3)), np.ones((2, 3, 3)))
