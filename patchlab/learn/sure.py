"""How sure a dictionary is: of its components one by one, and of their shapes as a crowd.

A basis of edges can sit anywhere, so the objective has many near-equal optima: another
start gives other components, yet the same crowd of them. Both are measured, and apart from
them what the sample alone does: components learned anew, from where they stand, on halves
of the patches.
"""

from __future__ import annotations

from dataclasses import replace
from itertools import combinations

import numpy as np
from numpy.typing import NDArray

from patchlab.learn.likelihood import Likelihood, Mapper, Rows
from patchlab.learn.order import match
from patchlab.learn.solver import Geometry, Solver, State
from patchlab.types import F64, Dictionary

SHAPES = ("orientation", "frequency", "size")


def relearned(
    rows: Rows,
    W: F64,
    signs: F64,
    geometry: Geometry,
    *,
    count: int,
    tolerance: float,
    limit: int,
    mapper: Mapper = map,
) -> list[F64]:
    """W learned anew on ``count`` halves of the rows, each from where W stands.

    The halves come in pairs that share nothing: even and odd rows, then even and odd pairs
    of rows, and so on; so rows must be in random order. A half's estimate differs from the
    whole's by as much as the whole's own from the truth (half the sample, twice the variance,
    less what both share; Shao & Wu 1989, Ann. Statist. 17:1176, delete-half jackknife).

    Parameters
    ----------
    rows : Rows in random order
    W : ndarray (k, k), an optimum over all rows
    signs : ndarray (k,)
    geometry : of the solver
    count : halves
    tolerance : Newton decrement, nats per patch
    limit : steps for each
    """
    out = []
    for i in range(count):
        place = np.arange(len(rows))
        half = np.flatnonzero(place >> (i // 2) & 1 == i % 2)
        taken = replace(rows, index=half if rows.index is None else rows.index[half])
        solver = Solver(Likelihood(taken, signs, mapper), geometry, tolerance, limit)
        out.append(solver.run(State(W)).W)
    return out


def found_again(atoms: F64, others: list[F64]) -> F64:
    """Mean |cos| (k,) of each atom with its partner in other sets, by optimal matching.

    NaN without any other set.
    """
    if not others:
        return np.full(len(atoms), np.nan)
    return np.asarray(np.mean([np.abs(match(atoms, other)[1]) for other in others], axis=0))


def shape_numbers(atoms: F64) -> dict[str, F64]:
    """Orientation, frequency and size of atoms (k, size, size), from their moments.

    Of colour atoms (k, size, size, samples) the moments of all planes are added.

    Returns
    -------
    dict of ndarray (k,): ``orientation`` of the wave vector in [0, pi), ``frequency`` in
    cycles per pixel (centroid of the power spectrum), ``size`` in pixels (root mean square
    distance from the middle of the energy, over root two).
    """
    k, size = len(atoms), atoms.shape[1]
    padded = 4 * size
    f = np.fft.fftfreq(padded)
    planes = np.moveaxis(atoms if atoms.ndim == 4 else atoms[..., None], -1, 0)
    power = np.sum([np.abs(np.fft.fft2(p, (padded, padded))) ** 2 for p in planes], axis=0)
    power /= np.maximum(power.sum(axis=(1, 2), keepdims=True), 1e-300)
    wave = f[None, :] + 1j * f[:, None]
    turn = np.sum(power * wave**2, axis=(1, 2))
    energy = np.sum(planes**2, axis=0)
    energy = energy / np.maximum(np.sum(energy, axis=(1, 2), keepdims=True), 1e-300)
    place = (np.arange(size)[None, :] + 1j * np.arange(size)[:, None])[None]
    middle = np.sum(energy * place, axis=(1, 2)).reshape(k, 1, 1)
    spread = np.sum(energy * np.abs(place - middle) ** 2, axis=(1, 2))
    return {
        "orientation": np.angle(turn) / 2 % np.pi,
        "frequency": np.sum(power * np.abs(wave), axis=(1, 2)),
        "size": np.sqrt(spread / 2),
    }


def shape_spread(known: Dictionary) -> dict[str, dict[str, float]]:
    """How far the crowd of shapes differs between restarts.

    For each of orientation, frequency and size: ``distance``, the largest over pairs of
    restarts of the Kolmogorov-Smirnov distance (Kuiper's, which knows no beginning of the
    circle, for orientation), and ``chance``, what two draws of as many independent atoms
    exceed once in twenty (asymptotic, Stephens 1970, J. R. Stat. Soc. B 32:115). Empty with
    one restart.
    """
    sets = known.pooled_atoms.reshape(-1, *known.atoms.shape)
    if len(sets) < 2:
        return {}
    numbers = [shape_numbers(s) for s in sets]
    out = {}
    for name in SHAPES:
        pairs = combinations([n[name] for n in numbers], 2)
        found = [crowd_distance(a, b, name == "orientation") for a, b in pairs]
        out[name] = {"distance": max(d for d, _ in found), "chance": found[0][1]}
    return out


def crowd_distance(a: F64, b: F64, circular: bool) -> tuple[float, float]:
    """How far two samples (n,) and (m,) differ, and what chance exceeds once in twenty.

    Kolmogorov-Smirnov's distance, Kuiper's when ``circular``; the asymptotic quantiles of
    Stephens 1970.

    Examples
    --------
    >>> distance, chance = crowd_distance(np.arange(50.0), np.arange(50.0) + 5, False)
    >>> round(distance, 6), round(chance, 3)
    (0.1, 0.272)
    """
    chance = (1.747 if circular else 1.358) * (1 / len(a) + 1 / len(b)) ** 0.5
    return _distance(a, b, circular), float(chance)


def _distance(a: F64, b: F64, circular: bool) -> float:
    """Kolmogorov-Smirnov's distance of two samples, or Kuiper's."""
    at = np.concatenate([a, b])
    gap = _below(a, at) - _below(b, at)
    if circular:
        return float(max(gap.max(), 0) + max(-gap.min(), 0))
    return float(np.abs(gap).max())


def _below(sample: F64, at: F64) -> NDArray[np.float64]:
    return np.searchsorted(np.sort(sample), at, side="right") / len(sample)
