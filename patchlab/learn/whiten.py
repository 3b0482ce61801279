"""Whitening: streamed moments, DC removed exactly, an explicit rank.

``z = K (x - mean)`` has unit covariance. The rank is never left to a solver's
tolerance: dividing by directions that rounding made would manufacture noise
for the learner to model.
"""

from __future__ import annotations

from collections.abc import Callable, Iterable, Iterator
from concurrent.futures import ThreadPoolExecutor
from contextlib import AbstractContextManager, contextmanager
from dataclasses import dataclass, replace
from itertools import chain
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab import cluster
from patchlab.errors import InputError, UsageError
from patchlab.learn.trust import split
from patchlab.types import F64, PatchSet, Whitening
from patchlab.workers import usable_cores

ROWS = 4096
"""Rows that are summed together: part of the order of summation, so fixed."""


NOISE_SHARE = 0.5
"""Share of a direction's variance at which noise drowns it."""


def one_thread() -> AbstractContextManager[Any]:
    """Keep BLAS to one thread: its sums must not depend on the machine's load or cores."""
    from threadpoolctl import threadpool_limits

    return threadpool_limits(limits=1, user_api="blas")  # type: ignore[no-any-return]


@contextmanager
def threads(jobs: int) -> Iterator[Callable[[Callable[[int], Any], Iterable[int]], Iterable[Any]]]:
    """``map`` for one job, a thread pool's for more: results in order either way."""
    if cluster.current() is not None:
        jobs = min(jobs, usable_cores())  # the rest of them is elsewhere
    if jobs == 1:
        yield map
        return
    with ThreadPoolExecutor(jobs) as pool:
        yield pool.map


@dataclass(frozen=True, eq=False)
class Moments:
    """Mean (d,) and covariance (d, d), divided by ``samples``, in float64."""

    samples: int
    mean: F64
    covariance: F64


def moments(patches: NDArray[Any] | Iterable[NDArray[Any]], *, block: int = 65536) -> Moments:
    """Mean and covariance of patches in one pass.

    Sums run in float64 over groups of 4096 rows counted from the first row, so
    the result has the same bytes however the rows are handed over.

    Parameters
    ----------
    patches : ndarray (n, d), may be memory-mapped, or an iterable of such arrays
    block : rows read at once from one array; changes memory, never the result

    Raises
    ------
    UsageError : ``block`` is not positive.
    InputError : no rows, rows of different length, or a value that is not finite.

    Examples
    --------
    >>> m = moments(np.array([[1.0, 2.0], [3.0, 6.0]]))
    >>> m.mean.tolist(), m.covariance.tolist()
    ([2.0, 4.0], [[1.0, 2.0], [2.0, 4.0]])
    """
    if block < 1:
        raise UsageError("a block has at least one row", where="block")
    groups = _groups(patches, block)
    head = next(groups, None)
    if head is None:
        raise InputError("there are no patches to learn from")
    shift = head.mean(axis=0, dtype=np.float64)  # sums about the first group's mean do not cancel
    count, first, second = 0, np.zeros_like(shift), np.zeros((shift.size, shift.size))
    tasks = ((group, shift) for group in chain([head], groups))
    farm = cluster.current()
    with one_thread():
        for n, own, square in (map if farm is None else farm.map_ordered)(_group_sums, tasks):
            count += n
            first += own
            second += square
    offset = first / count
    covariance = second / count - np.outer(offset, offset)
    return Moments(count, shift + offset, (covariance + covariance.T) / 2)


def _group_sums(task: tuple[NDArray[Any], F64]) -> tuple[int, F64, F64]:
    """Number, sum and sum of products of a group's rows about a shift."""
    group, shift = task
    centred = group.astype(np.float64) - shift
    return len(group), centred.sum(axis=0), centred.T @ centred


def _groups(patches: NDArray[Any] | Iterable[NDArray[Any]], block: int) -> Iterator[NDArray[Any]]:
    """Recut rows into groups of ROWS, checked to be finite."""
    waiting: list[NDArray[Any]] = []
    held = 0
    for rows in _chunks(patches, block):
        at = 0
        while at < len(rows):
            piece = rows[at : at + ROWS - held]
            if piece.ndim != 2 or (waiting and piece.shape[1] != waiting[0].shape[1]):
                raise InputError("patches must be rows of one length")
            if not np.isfinite(piece).all():
                raise InputError(
                    "a patch holds a value that is not a finite number",
                    remedy="mask such pixels as invalid before sampling",
                )
            waiting.append(piece)
            held += len(piece)
            at += len(piece)
            if held == ROWS:
                yield np.concatenate(waiting)
                waiting, held = [], 0
    if waiting:
        yield np.concatenate(waiting)


def _chunks(patches: NDArray[Any] | Iterable[NDArray[Any]], block: int) -> Iterator[NDArray[Any]]:
    for rows in [patches] if isinstance(patches, np.ndarray) else patches:
        for start in range(0, len(rows), block):
            yield rows[start : start + block]


# ---------------------------------------------------------------- whitening


def whiten(
    patch_set: PatchSet,
    *,
    retain: float = 0.98,
    rank: int | None = None,
    form: Literal["pca", "zca"] = "pca",
    noise: F64 | None = None,
    held_out: int | None = None,
) -> Whitening:
    """Whitening of a patch set: K (rank, d) and its inverse on the kept directions.

    The patch mean (DC) is projected out exactly. Without ``rank`` the fewest leading
    directions that hold ``retain`` of the variance are kept, and the cut is then moved
    to the nearest spectral gap (:func:`cut`), so that it never splits a group of equal
    eigenvalues.

    Parameters
    ----------
    patch_set : PatchSet
    retain : share of the variance to keep, in (0, 1]
    rank : directions to keep; overrules ``retain``
    form : "pca" (rows are scaled eigenvectors) or "zca" (the symmetric form)
    noise : ndarray (d, d), the noise's part of the covariance (:func:`noise_covariance`);
        directions in which it makes up half of the variance or more are cut too
    held_out : the learner's seed: the patches that it holds out are left out here too, so that
        they are new to all that was learned; None takes every patch

    Raises
    ------
    UsageError : a parameter out of its range.
    InputError : constant patches, not more patches than directions, or values not finite.
    """
    patches, kept, values = patch_set.patches, len(patch_set), patch_set.patches.shape[1]
    if held_out is not None:
        train = np.sort(split(kept, held_out)[0])
        kept = train.size
    if kept <= values:
        raise InputError(
            f"{kept} patches cannot whiten {values} pixels",
            remedy=f"sample more than {values} patches, or use a smaller patch",
        )
    known = moments(patches if held_out is None else (patches[at] for at in _pieces(train)))
    planes = patch_set.planes
    return whitening(known, retain=retain, rank=rank, form=form, noise=noise, planes=planes)


def _pieces(index: NDArray[np.int64]) -> Iterator[NDArray[np.int64]]:
    return (index[at : at + ROWS] for at in range(0, index.size, ROWS))


def noise_covariance(
    patch_set: PatchSet,
    noise_sd: float,
    autocovariance: F64 | None = None,
    sample_noise: F64 | None = None,
) -> F64:
    """What the camera's noise adds to the covariance of normalised patches.

    Parameters
    ----------
    patch_set : PatchSet; each patch was divided by its own contrast, and its noise with it
    noise_sd : standard deviation of the noise in working values
    autocovariance : ndarray (2m + 1, 2m + 1) of the noise, centre 1; None means white
    sample_noise : ndarray (samples,), of colour pixels the standard deviation of the noise in
        each plane, independent from plane to plane; None or empty means ``noise_sd`` for all

    Returns
    -------
    ndarray (d, d)
    """
    if patch_set.planes > 1:
        sds = np.full(patch_set.planes, noise_sd)
        if sample_noise is not None and sample_noise.size:
            sds = sample_noise
        return np.asarray(np.kron(_plane_noise(patch_set, 1.0, autocovariance), np.diag(sds**2)))
    return _plane_noise(patch_set, noise_sd, autocovariance)


def _plane_noise(patch_set: PatchSet, noise_sd: float, autocovariance: F64 | None) -> F64:
    """Covariance (size * size, size * size) of the noise in one plane."""
    d = patch_set.size**2
    power = noise_sd**2 * float(np.mean(1 / patch_set.contrast.astype(np.float64) ** 2))
    if autocovariance is None:
        return power * np.eye(d)
    m = autocovariance.shape[0] // 2
    y, x = np.divmod(np.arange(d), patch_set.size)
    dy, dx = y[:, None] - y + m, x[:, None] - x + m
    near = (dy >= 0) & (dy <= 2 * m) & (dx >= 0) & (dx <= 2 * m)
    lags = autocovariance[np.clip(dy, 0, 2 * m), np.clip(dx, 0, 2 * m)]
    return np.asarray(power * np.where(near, lags, 0.0))


def whitening(
    known: Moments,
    *,
    retain: float = 0.98,
    rank: int | None = None,
    form: Literal["pca", "zca"] = "pca",
    noise: F64 | None = None,
    keep_dc: bool = False,
    planes: int = 1,
) -> Whitening:
    """Whitening from moments; the parameters and errors of :func:`whiten`.

    ``K D`` is the identity (pca) or the projector on the kept directions (zca). With
    ``keep_dc`` the constant direction stays: for rows that are not patches. Of colour patches
    the constant of each of the ``planes`` goes: a row holds a pixel's samples side by side.
    """
    d, constants = known.mean.size, 0 if keep_dc else planes
    _check_options(d, retain, rank, form, constants)
    with one_thread():
        spectrum, U = _eigen(known.covariance, constants)
    numeric = _numeric_rank(known, spectrum)
    if rank is None:
        rank, notes = cut(spectrum[:numeric], retain, known.samples)
        if noise is not None:
            rank, notes = _above_noise(spectrum, U, noise, rank, notes)
    elif rank > numeric:
        raise InputError(
            f"only {numeric} directions carry variance, not {rank}", remedy="ask for a lower rank"
        )
    else:
        notes = [f"rank {rank} was asked for"]
    U, scale = U[:, :rank], np.sqrt(spectrum[:rank])
    K, D = (U / scale).T, U * scale
    if form == "zca":
        K, D = U @ K, D @ U.T
        K, D = (K + K.T) / 2, (D + D.T) / 2
    mean = known.mean
    if not keep_dc:
        own = mean.reshape(-1, planes)
        mean = (own - own.mean(axis=0)).ravel() if planes > 1 else mean - mean.mean()
    removed = _removed(spectrum, rank, numeric, notes, planes)[keep_dc:]
    return Whitening(
        np.ascontiguousarray(K),
        np.ascontiguousarray(D),
        mean,
        spectrum,
        rank,
        form,
        removed,
        known.samples,
        planes,
    )


def _check_options(d: int, retain: float, rank: int | None, form: str, constants: int) -> None:
    if not 0 < retain <= 1:
        raise UsageError(f"retain {retain} is not in (0, 1]", where="retain")
    most = d - constants
    if rank is not None and not 1 <= rank <= most:
        raise UsageError(
            f"rank {rank} is not in 1 to {most}",
            where="rank",
            remedy=f"{d} pixels less the patch mean leave {most} directions" if constants else "",
        )
    if form not in ("pca", "zca"):
        raise UsageError(f"unknown form {form!r}", where="form", remedy="choose pca or zca")


def _eigen(covariance: F64, constants: int) -> tuple[F64, F64]:
    """Eigenvalues (d,), falling, and (d, d - constants) eigenvectors, orthogonal to the constants.

    There is a constant for each plane, or none: then all d eigenvectors.

    The problem is solved in an orthonormal basis of the zero-mean patches, so the DC is
    gone by construction; its eigenvalues are listed last, as zeros. Each vector's largest
    absolute entry is positive.
    """
    d = len(covariance)
    basis = np.eye(d)
    if constants:
        each = np.tile(np.eye(constants), (d // constants, 1)) / np.sqrt(d // constants)
        basis = np.linalg.qr(np.hstack([each, basis[:, constants:]]))[0][:, constants:]
    values, vectors = np.linalg.eigh(basis.T @ covariance @ basis)
    U = basis @ vectors[:, ::-1]
    U *= np.sign(U[np.argmax(np.abs(U), axis=0), np.arange(U.shape[1])])
    return np.append(np.maximum(values[::-1], 0), np.zeros(d - U.shape[1])), U


def _numeric_rank(known: Moments, spectrum: F64) -> int:
    """Directions whose variance stands clear of float32 patches and float64 sums."""
    power = float(known.mean @ known.mean + np.trace(known.covariance))
    floor = max(spectrum[0] * 1e-10, power * 1e-12)
    numeric = int(np.sum(spectrum > floor))
    if not numeric:
        raise InputError(
            "the patches hold no contrast: every pixel is the same",
            remedy="use pictures with structure",
        )
    return numeric


def cut(spectrum: F64, retain: float, samples: int) -> tuple[int, list[str]]:
    """How many directions to keep, and why.

    The fewest that hold ``retain`` of the variance; then the cut moves to the nearest
    gap within a tenth of that number (at least three). A gap is a ratio of neighbouring
    eigenvalues of at least twice the window's median log ratio that stands clear of
    sampling error, four times ``sqrt(2 / samples)``, the error of a log eigenvalue
    (Anderson 1963, Ann. Math. Statist. 34:122, for normal data). Without a gap the cut stays.

    Parameters
    ----------
    spectrum : ndarray (m,), positive eigenvalues, falling
    retain : share in (0, 1]
    samples : patches behind the spectrum

    Returns
    -------
    rank and notes, one sentence each

    Examples
    --------
    >>> cut(np.array([8.0, 4.0, 1.0, 0.9, 0.8, 0.7, 0.1]), 0.8, 10_000)[0]
    2
    """
    share = np.cumsum(spectrum) / spectrum.sum()
    wanted = min(int(np.sum(share < retain * (1 - 1e-12))) + 1, spectrum.size)
    if wanted == spectrum.size:
        return wanted, [
            f"{retain:.4g} of the variance needs all {wanted} directions that carry any"
        ]
    reach = max(3, wanted // 10)
    low, high = max(1, wanted - reach), min(spectrum.size - 1, wanted + reach)
    places = np.arange(low, high + 1)
    steps = np.log(spectrum[places - 1] / spectrum[places])
    least = max(2 * float(np.median(steps)), 4 * np.sqrt(2 / samples))
    gaps = places[steps >= least]
    if not gaps.size:
        return wanted, [f"{retain:.4g} of the variance is held by {wanted} directions; no gap near"]
    rank = int(min(gaps, key=lambda r: (abs(r - wanted), -r)))
    ratio = float(spectrum[rank - 1] / spectrum[rank])
    return rank, [
        f"{retain:.4g} of the variance is held by {wanted} directions; the cut stands at {rank}, "
        f"where the variance falls by a factor of {ratio:.3g}"
    ]


def _above_noise(
    spectrum: F64, U: F64, noise: F64, rank: int, notes: list[str]
) -> tuple[int, list[str]]:
    """Move the cut down to the first direction in which noise is half of the variance."""
    part = np.einsum("ij,ij->j", U, noise @ U)[:rank] / spectrum[:rank]
    drowned = np.flatnonzero(part >= NOISE_SHARE)
    if not drowned.size or drowned[0] >= rank:
        return rank, notes
    clear = max(int(drowned[0]), 2)
    note = (
        f"from direction {clear + 1} on, the camera's noise is {100 * NOISE_SHARE:.0f} % "
        "of the variance or more: cut there"
    )
    return clear, [*notes, note]


def _removed(
    spectrum: F64, rank: int, numeric: int, notes: list[str], planes: int
) -> tuple[str, ...]:
    what = "the patch mean (DC)" if planes == 1 else "the mean of each plane of a patch (DC)"
    lines = [f"{what}: projected out exactly", *notes]
    if rank < numeric:
        lost = spectrum[rank:numeric].sum() / spectrum.sum()
        lines.append(
            f"directions {rank + 1} to {numeric}: {100 * lost:.3g} % of the variance, "
            "beyond the cut"
        )
    if numeric < spectrum.size - planes:
        lines.append(
            f"directions {numeric + 1} to {spectrum.size - planes}: no variance beyond rounding"
        )
    return tuple(lines)


def leading(known: Whitening, components: int | None) -> Whitening:
    """The pca form of a whitening, cut down to its leading ``components`` directions.

    Raises
    ------
    UsageError : more components than the whitening kept, or none.
    """
    k = known.rank if components is None else components
    if not 1 <= k <= known.rank:
        raise UsageError(
            f"{k} components do not fit a whitening of rank {known.rank}",
            where="components",
            remedy="ask for fewer, or keep more of the variance",
        )
    K, D = known.K, known.D
    if known.form == "zca":  # its singular vectors are the eigenvectors
        with one_thread():
            U = np.linalg.eigh(D)[1][:, ::-1][:, : known.rank]
        U = U * np.sign(U[np.argmax(np.abs(U), axis=0), np.arange(known.rank)])
        K, D = U.T @ K, D @ U
    elif k == known.rank:
        return known
    note = (f"directions {k + 1} to {known.rank}: left out, {k} components were asked for",)
    return replace(
        known,
        K=np.ascontiguousarray(K[:k]),
        D=np.ascontiguousarray(D[:, :k]),
        rank=k,
        form="pca",
        removed=known.removed + (note if k < known.rank else ()),
    )
