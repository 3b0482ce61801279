"""How much of the learned atoms a bank reproduces, and the widths that reproduce most.

The coverage of an atom by a group of kernels (an even and an odd one, or an odd one alone)
is the largest share of the atom's energy that lies in the group's span, over all whole-pixel
shifts that keep the group's centre on the patch and at least a quarter of its energy inside.
Atoms and shifted kernels are cropped to the patch and their means removed. A bank covers an
atom as its best group does, and all atoms weigh the same: weighting by energy would give two
thirds of the say to a tenth of the atoms, ramps as wide as the window.

A high coverage says little by itself, since smooth kernels cover part of anything smooth.
So it is told beside two nulls: the best bank of the same structure on a random rotation of
the basis, and an untrained bank on the learned atoms.
"""

from __future__ import annotations

from collections.abc import Sequence
from dataclasses import dataclass
from typing import Literal

import numpy as np
from numpy.lib.stride_tricks import sliding_window_view
from scipy.optimize import minimize

from patchlab.conventions import orientation_lattice, rng
from patchlab.errors import InputError, UsageError
from patchlab.families import render, without_dc
from patchlab.types import F32, F64, Coverage

Parity = Literal["pair", "odd"]
Widths = tuple[tuple[float, float], ...]

INSIDE = 0.25
"""Share of a group's energy that must stay on the patch after a shift."""
FINEST_PX = 0.6
"""Smallest width across: below it the pixel grid cannot hold a derivative kernel."""
GRID_STEP = 1.15
ASPECTS = (1.0, 1.4, 2.0, 2.8, 4.0)
BOUND_TOLERANCE = 0.01
FINE, ROUGH = 2e-3, 5e-2
"""Where the search for widths ends, relative: for a bank, and for a null's coverage (to 1e-4)."""
UNTRAINED = (1.2, 2.4)
"""Widths (across, along, pixels) of the finest size of the untrained bank."""
UNTRAINED_RATIO = 1.8
ATOM_PIXELS = 1 << 17
"""Most pixels of atoms that are looked at: 910 atoms of 12 x 12, 512 of 16 x 16."""


# ---------------------------------------------------------------- one group of kernels


def _shifts(kernel: F64, size: int) -> F64:
    """Every placement of a kernel's centre on a patch, (size * size, size * size) pixels."""
    reach, half = size - 1, kernel.shape[0] // 2
    padded = np.pad(kernel, max(reach - half, 0))
    middle = padded.shape[0] // 2
    window = padded[middle - reach : middle + reach + 1, middle - reach : middle + reach + 1]
    views = sliding_window_view(window, (size, size))
    return np.ascontiguousarray(views, dtype=np.float64).reshape(size * size, size * size)


def _spans(group: F64, size: int) -> F32:
    """Orthonormal bases (shifts, members, size * size) of a group's allowed placements."""
    placed = [_shifts(kernel, size) for kernel in group]
    inside = sum((p * p).sum(axis=1) for p in placed) / float((group * group).sum())
    allowed = inside >= INSIDE
    basis: list[F64] = []
    for p in placed:
        q = p[allowed]
        q = q - q.mean(axis=1, keepdims=True)
        before = np.linalg.norm(q, axis=1, keepdims=True)
        for other in basis:
            q = q - other * (q * other).sum(axis=1, keepdims=True)
        norm = np.linalg.norm(q, axis=1, keepdims=True)
        good = norm > 1e-6 * np.maximum(before, 1e-300)  # else it adds no direction of its own
        basis.append(np.where(good, q / np.where(good, norm, 1), 0))
    return np.stack(basis, axis=1).astype(np.float32)


def _unit_atoms(atoms: F64) -> F32:
    """Atoms as unit rows (n, size * size) without their means; flat ones are left out."""
    a = np.asarray(atoms, dtype=np.float64)
    if a.ndim != 3 or a.shape[1] != a.shape[2]:
        raise UsageError("atoms must be an array (n, size, size)")
    rows = a.reshape(len(a), -1)
    rows = rows - rows.mean(axis=1, keepdims=True)
    norm = np.linalg.norm(rows, axis=1)
    kept = norm > 1e-12
    if not kept.any():
        raise InputError("no atom has any structure to cover")
    return np.asarray(rows[kept] / norm[kept, None], dtype=np.float32)


def _covered(group: F64, rows: F32) -> F32:
    """Coverage (n,) of unit rows by one group."""
    size = round(rows.shape[1] ** 0.5)
    spans = _spans(group, size)
    if not len(spans):
        return np.zeros(len(rows), dtype=np.float32)
    dots = spans.reshape(-1, rows.shape[1]) @ rows.T
    energy = (dots * dots).reshape(len(spans), -1, len(rows)).sum(axis=1)
    return np.asarray(energy.max(axis=0))


def coverage_of(groups: Sequence[F64], atoms: F64) -> F64:
    """Share of each atom that the best group reproduces.

    Parameters
    ----------
    groups : arrays (members, h, h), h odd: kernels that share a centre, usually an even and
        an odd one
    atoms : ndarray (n, size, size); scale, sign and mean do not matter

    Returns
    -------
    ndarray (n,) in [0, 1], float64, without the atoms that are flat

    Raises
    ------
    UsageError : atoms of a wrong shape. InputError : every atom is flat.

    Examples
    --------
    >>> import numpy as np
    >>> from patchlab.families import render
    >>> step = render("gd1", {"theta_rad": 0.3, "sigma_u_px": 1.0, "sigma_v_px": 1.5}, 11)
    >>> print(coverage_of([step[None]], np.stack([step, -7 * step])).round(6))
    [1. 1.]
    """
    rows = _unit_atoms(atoms)
    best = np.zeros(len(rows), dtype=np.float32)
    for group in groups:
        best = np.maximum(best, _covered(np.asarray(group, dtype=np.float64), rows))
    return np.minimum(best.astype(np.float64), 1.0)


# ---------------------------------------------------------------- banks on a lattice


def oriented_group(theta: float, widths: tuple[float, float], size: int, parity: Parity) -> F64:
    """The kernels of one orientation, for measuring coverage.

    Parameters
    ----------
    theta : direction, radians
    widths : (across, along) the edge, one standard deviation, pixels
    size : window side, odd
    parity : "pair" (gd1 and gd2) or "odd" (gd1)

    Returns
    -------
    ndarray (2 or 1, size, size) of unit norm, DC exactly removed
    """
    p = {"theta_rad": theta, "sigma_u_px": widths[0], "sigma_v_px": widths[1]}
    members = [render("gd1", p, size)]
    if parity == "pair":
        envelope = render("gabor", {**p, "frequency_cpp": 0.0, "phase_rad": 0.0}, size)
        members.append(without_dc(render("gd2", p, size), envelope))
    return np.stack([m / np.linalg.norm(m) for m in members])


class _Table:
    """Coverage of fixed atoms by one size on a lattice, each orientation computed once.

    Lattices share the orientations they have in common, so 4 of them are within 8.
    """

    def __init__(self, rows: F32, parity: Parity) -> None:
        self.rows, self.parity = rows, parity
        self.size = round(rows.shape[1] ** 0.5)
        self.known: dict[tuple[float, float, float], F32] = {}

    def _orientation(self, theta: float, widths: tuple[float, float]) -> F32:
        key = (round(theta, 9), *widths)
        if key not in self.known:
            group = oriented_group(theta, widths, 2 * self.size - 1, self.parity)
            self.known[key] = _covered(group, self.rows)
        return self.known[key]

    def __call__(self, count: int, widths: tuple[float, float]) -> F32:
        turns = [self._orientation(float(t), widths) for t in orientation_lattice(count)]
        return np.asarray(np.maximum.reduce(turns))

    def bank(self, structure: Sequence[int], widths: Widths) -> float:
        """Mean coverage by a whole bank."""
        best = [self(n, w) for n, w in zip(structure, widths, strict=True)]
        return float(np.maximum.reduce(best).mean(dtype=np.float64))


@dataclass(frozen=True)
class RefinedWidths:
    """The widths that cover most atoms.

    Parameters
    ----------
    structure : orientations of each size, finest first
    widths : (across, along) of each size, pixels
    at_bound : for each size, the names of the widths that ended on a bound
    coverage : mean over the atoms
    """

    structure: tuple[int, ...]
    widths: Widths
    at_bound: tuple[tuple[str, ...], ...]
    coverage: float


def size_bounds(size: int) -> tuple[float, float, float]:
    """Bounds for atoms of a patch side: finest, widest across (size / 6), longest (size / 3).

    >>> size_bounds(12)
    (0.6, 2.0, 4.0)
    """
    return FINEST_PX, size / 6, size / 3


def _grid(size: int) -> list[tuple[float, float]]:
    """Shapes that the search starts from: widths by steps of 15 %, five aspects, capped."""
    low, across, along = size_bounds(size)
    steps = int(np.floor(np.log(across / low) / np.log(GRID_STEP) + 1e-9)) + 1
    widths = sorted({*(low * GRID_STEP**i for i in range(steps)), across})
    return sorted({(width, min(width * a, along)) for width in widths for a in ASPECTS})


def _best_last(vectors: F32, others: Sequence[F32]) -> tuple[int, float]:
    """Which shape adds most to the sizes already chosen, and the coverage then."""
    joined = vectors
    for other in others:
        joined = np.maximum(joined, other)
    means = joined.mean(axis=1, dtype=np.float64)
    pick = int(means.argmax())
    return pick, float(means[pick])


def _ascend(vectors: Sequence[F32], start: int) -> tuple[list[int], float]:
    """Coordinate ascent: ``vectors[i]`` (shapes, atoms) is the coverage by size i alone."""
    chosen = [start]
    value = float(vectors[0][start].mean(dtype=np.float64))
    for i in range(1, len(vectors)):
        pick, value = _best_last(vectors[i], [vectors[j][c] for j, c in enumerate(chosen)])
        chosen.append(pick)
    last = -1.0
    while value > last + 1e-9:
        last = value
        for i in range(len(vectors)):
            others = [vectors[j][c] for j, c in enumerate(chosen) if j != i]
            chosen[i], value = _best_last(vectors[i], others)
    return chosen, value


def _best_on_grid(table: _Table, structure: Sequence[int]) -> tuple[Widths, float]:
    """The best shapes of the grid, by coordinate ascent from every shape."""
    shapes = _grid(table.size)
    by_count = {n: np.stack([table(n, s) for s in shapes]) for n in set(structure)}
    vectors = [by_count[n] for n in structure]
    found = [_ascend(vectors, start) for start in range(len(shapes))]
    chosen, value = max(found, key=lambda f: f[1])
    return tuple(shapes[i] for i in chosen), value


def _polish(table: _Table, structure: Sequence[int], start: Widths, tolerance: float) -> Widths:
    """Nelder-Mead in the widths' logarithms: repairs the flips between grid cells."""
    low, across, along = size_bounds(table.size)
    bounds = [(np.log(low), np.log(top)) for _ in structure for top in (across, along)]

    def loss(x: F64) -> float:
        pairs = np.exp(x).reshape(-1, 2)
        return -table.bank(structure, tuple((float(a), float(b)) for a, b in pairs))

    first = np.clip(np.log(np.ravel(start)), [b[0] for b in bounds], [b[1] for b in bounds])
    simplex = np.vstack([first, *(first + 0.06 * row for row in np.eye(len(first)))])
    for i, (_, top) in enumerate(bounds):  # step inwards where the start is at its cap
        if simplex[i + 1, i] > top:
            simplex[i + 1, i] -= 0.12
    found = minimize(
        loss,
        first,
        method="Nelder-Mead",
        bounds=bounds,
        options={
            "initial_simplex": simplex,
            "xatol": tolerance,
            "fatol": tolerance / 2000,
            "maxfev": 60 * len(first),
        },
    )
    pairs = np.exp(found.x).reshape(-1, 2)
    # thousandths of a pixel: below that only rounding differs between machines
    return tuple((round(float(a), 3), round(float(b), 3)) for a, b in pairs)


def _bound_names(widths: tuple[float, float], size: int) -> tuple[str, ...]:
    """Which of a size's widths stand on a bound."""
    low, across, along = size_bounds(size)
    names = []
    if not low * (1 + BOUND_TOLERANCE) < widths[0] < across * (1 - BOUND_TOLERANCE):
        names.append("sigma_u_px")
    if not low * (1 + BOUND_TOLERANCE) < widths[1] < along * (1 - BOUND_TOLERANCE):
        names.append("sigma_v_px")
    return tuple(names)


def _refine(table: _Table, structure: Sequence[int], tolerance: float = FINE) -> RefinedWidths:
    start, _ = _best_on_grid(table, structure)
    widths = _polish(table, structure, start, tolerance)
    order = sorted(range(len(structure)), key=lambda i: widths[i])
    sorted_widths = tuple(widths[i] for i in order)
    return RefinedWidths(
        tuple(structure[i] for i in order),
        sorted_widths,
        tuple(_bound_names(w, table.size) for w in sorted_widths),
        table.bank([structure[i] for i in order], sorted_widths),
    )


def _looked_at(atoms: F64) -> F64:
    """An even choice of at most ``ATOM_PIXELS / size ** 2`` atoms, so that cost is bounded."""
    most = max(ATOM_PIXELS // (atoms.shape[1] * atoms.shape[2]), 1)
    if len(atoms) <= most:
        return atoms
    return np.asarray(atoms[np.linspace(0, len(atoms) - 1, most).round().astype(int)])


def refine_widths(atoms: F64, structure: Sequence[int], parity: Parity = "pair") -> RefinedWidths:
    """Find the widths of a lattice bank that cover the atoms best.

    A grid of shapes, coordinate ascent over the sizes from every shape, then Nelder-Mead to
    convergence; widths stay within :func:`size_bounds`.

    Parameters
    ----------
    atoms : ndarray (n, size, size), equally weighted
    structure : orientations of each size
    parity : "pair" or "odd"

    Returns
    -------
    RefinedWidths, sizes sorted finest first; widths to a thousandth of a pixel

    Raises
    ------
    UsageError : an empty structure, or patches below 6 pixels. InputError : every atom is flat.
    """
    if not structure or min(structure) < 1:
        raise UsageError("a bank needs at least one orientation in each size")
    if atoms.shape[-1] < 6:
        raise UsageError("atoms must be at least 6 pixels wide to show widths")
    return _refine(_Table(_unit_atoms(_looked_at(atoms)), parity), structure)


# ---------------------------------------------------------------- nulls and the report


def rotated_basis(atoms: F64, seed: int, turns: int = 1) -> F64:
    """Random rotations of a basis: the same second-order statistics, no learned structure.

    Parameters
    ----------
    atoms : ndarray (k, size, size) of one dictionary, at the scale where coefficients have
        unit variance
    seed : keyed as everywhere
    turns : how many independent rotations to stack

    Returns
    -------
    ndarray (turns * k, size, size)
    """
    k = len(atoms)
    rows = np.asarray(atoms, dtype=np.float64).reshape(k, -1)
    out = []
    for turn in range(turns):
        q, r = np.linalg.qr(rng(seed, "rotated-basis", str(turn)).standard_normal((k, k)))
        out.append((q * np.sign(np.diag(r))) @ rows)  # signs make the draw uniform (Haar)
    return np.concatenate(out).reshape(turns * k, *atoms.shape[1:])


def untrained_widths(sizes: int, side: int) -> Widths:
    """Widths of a sensible bank that saw no photograph: 1.2 by 2.4 px, then 1.8 times that.

    They keep to the bounds that a trained bank keeps to (:func:`size_bounds`).
    """
    _, across, along = size_bounds(side)
    steps = [UNTRAINED_RATIO**i for i in range(sizes)]
    return tuple((min(UNTRAINED[0] * s, across), min(UNTRAINED[1] * s, along)) for s in steps)


def report_coverage(
    pooled: F64,
    basis: F64,
    structure: Sequence[int],
    widths: Widths,
    parity: Parity,
    budgets: Sequence[tuple[int, tuple[int, ...]]],
    seed: int = 0,
) -> Coverage:
    """Coverage of a lattice bank with its nulls and the curve against the budget.

    Parameters
    ----------
    pooled : ndarray (m, size, size), atoms of all restarts
    basis : ndarray (k, size, size), one dictionary's atoms at unit-variance scale, for the
        rotated null
    structure, widths, parity : the bank
    budgets : (kernels, structure) of the points of the curve, each told with the best widths
        of the grid
    seed : of the rotations

    Returns
    -------
    Coverage
    """
    table = _Table(_unit_atoms(_looked_at(pooled)), parity)
    turns = max(1, round(min(len(table.rows), 300) / len(basis)))
    null = _Table(_unit_atoms(_looked_at(rotated_basis(basis, seed, turns))), parity)
    return Coverage(
        learned=table.bank(structure, widths),
        rotated=_refine(null, structure, ROUGH).coverage,
        untrained=table.bank(structure, untrained_widths(len(structure), basis.shape[1])),
        budget=np.array([k for k, _ in budgets], dtype=np.int64),
        curve=np.array([_best_on_grid(table, s)[1] for _, s in budgets]),
    )
