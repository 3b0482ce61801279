"""The learner behind scikit-learn's interface: rows in, rows out, in pipelines and searches.

Thin: every number comes from the functions of this package. Rows may have any length of
two or more; ``remove_dc`` takes the mean of each row for the patch's brightness and leaves
it out, so switch it off for rows that are not patches. Float32 rows give float32 results.
"""

from __future__ import annotations

from collections.abc import Iterator
from contextlib import contextmanager
from typing import Any, ClassVar, Literal

import numpy as np
from numpy.typing import NDArray
from sklearn.base import BaseEstimator, ClassNamePrefixFeaturesOutMixin, TransformerMixin
from sklearn.exceptions import ConvergenceWarning
from sklearn.utils import check_random_state
from sklearn.utils.validation import check_is_fitted, validate_data

from patchlab.errors import PatchlabError
from patchlab.learn import sparse
from patchlab.learn.density import log_density
from patchlab.learn.ica import components_of, unmix
from patchlab.learn.likelihood import Rows
from patchlab.learn.order import canonical
from patchlab.learn.whiten import leading, moments, one_thread, threads, whitening
from patchlab.types import F64, Whitening

Array = NDArray[Any]


class _Rows(ClassNamePrefixFeaturesOutMixin, TransformerMixin, BaseEstimator):  # type: ignore[misc]
    """What the three share: checked rows, their whitening, names and tags."""

    n_components: int | None
    retain: float
    remove_dc: bool
    components_: Array
    mean_: Array
    converged_: bool
    n_iter_: int

    def _checked(self, X: Any, *, reset: bool) -> Array:
        kinds = (np.float64, np.float32)
        least = {"ensure_min_samples": 2, "ensure_min_features": 2} if reset else {}
        if not reset:
            check_is_fitted(self)
        return np.asarray(validate_data(self, X, reset=reset, dtype=kinds, **least))

    def _whitening(self, X: Array, form: Literal["pca", "zca"] = "pca") -> Whitening:
        return whitening(
            moments(X),
            retain=self.retain,
            rank=self.n_components,
            form=form,
            keep_dc=not self.remove_dc,
        )

    @property
    def _n_features_out(self) -> int:
        return int(self.components_.shape[0])

    def __sklearn_tags__(self) -> Any:
        tags = super().__sklearn_tags__()
        tags.transformer_tags.preserves_dtype = ["float64", "float32"]
        return tags


class _Linear(_Rows):
    """Rows to coordinates by one matrix, and back by another, whose attribute ``_back`` names."""

    _back: ClassVar[str]

    def transform(self, X: Any) -> Array:
        """Coordinates (n, k) of rows X (n, d): ``(X - mean_) @ components_.T``."""
        X = self._checked(X, reset=False)
        return np.asarray((X - self.mean_) @ self.components_.T)

    def inverse_transform(self, X: Any) -> Array:
        """Rows (n, d) of coordinates, without what the whitening cut."""
        check_is_fitted(self)
        return np.asarray(np.asarray(X) @ getattr(self, self._back).T + self.mean_)


class Whitener(_Linear):
    """Decorrelate rows: ``transform`` gives unit covariance, ``inverse_transform`` goes back.

    Parameters
    ----------
    n_components : directions to keep; None lets ``retain`` and the spectrum's gaps decide
    retain : share of the variance to keep, in (0, 1]
    form : "pca", or "zca" (as many columns as the rows have, as near to them as can be)
    remove_dc : project out the mean of each row

    Attributes
    ----------
    components_ : ndarray (rank, d), or (d, d) for zca: the whitening matrix
    dewhitening_ : ndarray (d, rank) or (d, d)
    mean_ : ndarray (d,)
    explained_variance_ : ndarray (d,), the spectrum, falling
    rank_ : directions kept
    removed_ : what was cut and why, one sentence each
    n_features_in_, feature_names_in_ : as in scikit-learn

    Examples
    --------
    >>> rows = np.random.default_rng(0).normal(size=(500, 4)) * [1, 2, 3, 4]
    >>> z = Whitener(retain=1.0, remove_dc=False).fit_transform(rows)
    >>> bool(np.allclose(z.T @ z / 500, np.eye(4)))
    True
    """

    _back = "dewhitening_"

    def __init__(
        self,
        n_components: int | None = None,
        *,
        retain: float = 0.98,
        form: Literal["pca", "zca"] = "pca",
        remove_dc: bool = True,
    ) -> None:
        self.n_components = n_components
        self.retain = retain
        self.form = form
        self.remove_dc = remove_dc

    def fit(self, X: Any, y: Any = None) -> Whitener:
        """Learn the whitening of rows X (n, d).

        Raises
        ------
        ValueError : rows that cannot be whitened, or a parameter out of its range.
        """
        X = self._checked(X, reset=True)
        with _as_value_error():
            found = self._whitening(X, self.form)
        self.components_ = found.K.astype(X.dtype)
        self.dewhitening_ = found.D.astype(X.dtype)
        self.mean_ = found.mean.astype(X.dtype)
        self.explained_variance_ = found.spectrum.astype(X.dtype)
        self.rank_, self.removed_ = found.rank, found.removed
        return self


class ICA(_Linear):
    """Independent components by maximum likelihood: :func:`patchlab.learn.learn_ica` on rows.

    Parameters
    ----------
    n_components : how many, in the leading directions; None for all that ``retain`` keeps
    whiten : False when the rows are white already, as :class:`Whitener` makes them
    retain : share of the variance to keep, in (0, 1]
    remove_dc : project out the mean of each row; nothing is projected out of white rows
    density : "tanh" (heavy tails) or "adaptive" (heavy or light, chosen per component)
    orthogonal : keep components uncorrelated
    restarts : how many starts, the best of which is kept
    tol : Newton decrement that ends learning, nats per row and component
    max_iter : steps of one start
    n_jobs : threads; results do not depend on them
    random_state : key of the starts

    Attributes
    ----------
    components_ : ndarray (k, d), filters; coefficients have unit variance
    mixing_ : ndarray (d, k), atoms as columns
    mean_ : ndarray (d,)
    whitening_ : what the components were learned through
    converged_ : whether the stated tolerance was reached
    n_iter_ : steps of the best start
    curve_ : objective of its last stage, nats per row

    Examples
    --------
    >>> sources = np.random.default_rng(0).laplace(size=(4000, 2))
    >>> ica = ICA(remove_dc=False, retain=1.0).fit(sources @ [[1.0, 0.5], [0.2, 1.0]])
    >>> ica.converged_, ica.components_.shape
    (True, (2, 2))
    """

    _back = "mixing_"

    def __init__(
        self,
        n_components: int | None = None,
        *,
        whiten: bool = True,
        retain: float = 0.98,
        remove_dc: bool = True,
        density: Literal["tanh", "adaptive"] = "tanh",
        orthogonal: bool = True,
        restarts: int = 1,
        tol: float = 1e-6,
        max_iter: int = 1000,
        n_jobs: int = 1,
        random_state: Any = 0,
    ) -> None:
        self.n_components = n_components
        self.whiten = whiten
        self.retain = retain
        self.remove_dc = remove_dc
        self.density = density
        self.orthogonal = orthogonal
        self.restarts = restarts
        self.tol = tol
        self.max_iter = max_iter
        self.n_jobs = n_jobs
        self.random_state = random_state

    def fit(self, X: Any, y: Any = None) -> ICA:
        """Learn the components of rows X (n, d).

        Raises
        ------
        ValueError : rows that cannot be whitened, or a parameter out of its range.
        """
        X = self._checked(X, reset=True)
        with _as_value_error():
            through = self._whitening(X) if self.whiten else _white(X, self.n_components)
            rows = Rows.of(np.ascontiguousarray(X, np.float32), through)
            run = unmix(
                rows,
                through,
                seed=_seed(self.random_state),
                orthogonal=self.orthogonal,
                restarts=self.restarts,
                tolerance=self.tol,
                max_iterations=self.max_iter,
                density=self.density,
                jobs=self.n_jobs,
            )
        filters, atoms, order = components_of(run.W, through)
        self.components_, self.mixing_ = filters.astype(X.dtype), atoms.T.astype(X.dtype)
        self.mean_, self.whitening_ = through.mean.astype(X.dtype), through
        self.converged_, self.n_iter_ = run.outcome == "converged", run.iterations
        self.curve_ = np.array(run.curve)
        self._unmixing, self._signs = run.W[order], run.signs[order]
        _warn_unless(self.converged_, self.n_iter_)
        return self

    def score_samples(self, X: Any) -> F64:
        """Log density of rows X (n, d) in nats: :func:`patchlab.learn.density.log_density`."""
        X = self._checked(X, reset=False)
        return log_density(X, self.whitening_, self._unmixing, self._signs)

    def score(self, X: Any, y: Any = None) -> float:
        """Mean log density of rows, nats: what a search over ``n_components`` may maximise."""
        return float(self.score_samples(X).mean())


class SparseCoder(_Rows):
    """A sparse-coding dictionary: :func:`patchlab.learn.learn_sparse` on rows.

    Parameters
    ----------
    n_components : atoms, from one to four times the rank; None for as many as the rank
    penalty : l1, in units of white coordinates
    retain : share of the variance that whitening keeps, in (0, 1]
    remove_dc : project out the mean of each row
    tol : relative gain of a pass that ends learning
    max_iter : passes over all rows
    transform_tol : of the optimality (KKT) conditions of codes, relative to the penalty
    n_jobs : threads; results do not depend on them
    random_state : key of the start, the order of rows and the held-out rows

    Attributes
    ----------
    components_ : ndarray (k, d), atoms; codes of the learning rows have unit variance
    mean_ : ndarray (d,)
    whitening_ : what the atoms were learned through
    converged_ : whether the held-out objective had stopped falling
    n_iter_ : passes over all rows
    curve_ : held-out objective after each pass

    Examples
    --------
    >>> codes = np.random.default_rng(0).laplace(size=(2000, 3))
    >>> rows = codes @ np.random.default_rng(1).normal(size=(3, 8))
    >>> SparseCoder(penalty=0.2, random_state=0).fit(rows).transform(rows[:5]).shape
    (5, 3)
    """

    def __init__(
        self,
        n_components: int | None = None,
        *,
        penalty: float = sparse.PENALTY,
        retain: float = 0.98,
        remove_dc: bool = True,
        tol: float = 1e-3,
        max_iter: int = 50,
        transform_tol: float = 1e-6,
        n_jobs: int = 1,
        random_state: Any = 0,
    ) -> None:
        self.n_components = n_components
        self.penalty = penalty
        self.retain = retain
        self.remove_dc = remove_dc
        self.tol = tol
        self.max_iter = max_iter
        self.transform_tol = transform_tol
        self.n_jobs = n_jobs
        self.random_state = random_state

    def fit(self, X: Any, y: Any = None) -> SparseCoder:
        """Learn the atoms of rows X (n, d), a tenth of them held out to see when to stop.

        Raises
        ------
        ValueError : fewer than ten rows, rows that cannot be whitened, or a parameter out of
            its range.
        """
        X = self._checked(X, reset=True)
        with _as_value_error():
            keep_dc = not self.remove_dc
            through = whitening(moments(X), retain=self.retain, keep_dc=keep_dc)
            count = through.rank if self.n_components is None else self.n_components
            sparse.check_options(through, count, self.penalty, self.tol, self.max_iter, self.n_jobs)
            self._learn(np.ascontiguousarray(X, np.float32), through, count)
        self.components_ = self.components_.astype(X.dtype)
        self.mean_, self.whitening_ = through.mean.astype(X.dtype), through
        _warn_unless(self.converged_, self.n_iter_)
        return self

    def _learn(self, rows: Array, through: Whitening, count: int) -> None:
        with one_thread(), threads(self.n_jobs) as mapper:
            learner = sparse.Learner(
                rows, through, count, self.penalty, _seed(self.random_state), self.tol, mapper
            )
            state = learner.run(learner.start(), self.max_iter)
            second, _, _ = learner.statistics(state.B)
        atoms = (through.D @ state.B).T
        _, self.components_, _ = canonical(atoms, atoms, second / learner.train.size)
        self.converged_, self.n_iter_ = state.outcome == "converged", state.passes
        self.curve_ = np.array(state.curve)

    def transform(self, X: Any) -> Array:
        """Sparse codes (n, k) of rows X (n, d); ``codes @ components_ + mean_`` rebuilds them."""
        X = self._checked(X, reset=False)
        with _as_value_error():
            codes = sparse.codes_of(
                X, self.whitening_, self.components_, self.penalty, self.transform_tol
            )
        return np.asarray(codes.astype(X.dtype))

    def inverse_transform(self, X: Any) -> Array:
        """Rows (n, d) of codes."""
        check_is_fitted(self)
        return np.asarray(np.asarray(X) @ self.components_ + self.mean_)


def _white(X: Array, components: int | None) -> Whitening:
    """The whitening that changes nothing but the mean, cut to the leading columns."""
    found, d = moments(X), X.shape[1]
    eye, spectrum = np.eye(d), np.diag(found.covariance).copy()
    return leading(
        Whitening(eye, eye, found.mean, spectrum, d, "pca", (), found.samples), components
    )


def _seed(state: Any) -> int:
    """A whole number of a scikit-learn ``random_state``."""
    if isinstance(state, int | np.integer):
        return int(state)
    return int(check_random_state(state).randint(2**31 - 1))


def _warn_unless(converged: bool, iterations: int) -> None:
    if not converged:
        import warnings

        warnings.warn(
            f"not converged after {iterations} iterations; raise max_iter or tol",
            ConvergenceWarning,
            stacklevel=3,
        )


@contextmanager
def _as_value_error() -> Iterator[None]:
    """scikit-learn's callers expect ValueError."""
    try:
        yield
    except PatchlabError as error:
        raise ValueError(str(error)) from error
