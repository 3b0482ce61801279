"""Learned components that describe a mark of the camera rather than the scene.

A component is flagged only for a mark that the survey found. Components that follow a
lattice are told by where they answer: the scene does not know where a patch began, so a
coefficient whose power depends on the patch's place on the lattice is the lattice's.
"""

from __future__ import annotations

from collections.abc import Sequence

import numpy as np
from numpy.typing import NDArray

from patchlab.types import F32, F64, Mark

GRID = 8
LOCKED = 0.25
ONE_LINE = 0.7
STRAIGHT = 0.8
WHOLLY_STRAIGHT = 0.97
ROUGH = 1.5
"""Squared steps of a profile over its power, in those of one wave as long as the patch, that lines
of noise have at least: the slow shading of a scene has less."""
LATTICE_LOCKED = 0.05
ERRORS = 5.0
LOOKED = 40_000
WAVES = 64
ALIGNED = 0.15
NYQUIST = 0.4


def flag_components(
    atoms: F64,
    filters: F64,
    patches: F32,
    origin: NDArray[np.int32],
    marks: Sequence[Mark],
) -> tuple[tuple[int, str], ...]:
    """Components that describe a mark which the survey found, each with the mark's name.

    The rules: ``block_grid``: the power of the coefficient varies by more than a quarter (one
    standard deviation over the 8 rows or columns of the grid) with the patch's place on it, and
    by five standard errors. ``interpolation_lattice``: its mean size varies by more than a
    twentieth between odd and even rows or columns or the two colours of the checkerboard, and
    by five standard errors. ``row_noise``, ``column_noise``: 0.97 of the atom's power is
    constant along the lines and changes from line to line, or 0.8 where one line alone holds
    0.7 of that. Other marks flag nothing.

    Parameters
    ----------
    atoms, filters : ndarray (k, size, size)
    patches : ndarray (n, size * size), DC removed
    origin : ndarray (n, 2), top-left (row, column) of each patch in its frame
    marks : of the survey

    Returns
    -------
    tuple of (index, name), by index
    """
    found = {m.name for m in marks if m.found}
    flags: dict[int, str] = {}
    for name in ("row_noise", "column_noise"):
        if name in found:
            alone = lone_lines(atoms if name == "row_noise" else atoms.transpose(0, 2, 1))
            flags |= dict.fromkeys(np.flatnonzero(alone).tolist(), name)
    if found & {"block_grid", "interpolation_lattice"}:
        rows, columns = origin[:LOOKED].T
        size = np.abs(patches[:LOOKED] @ filters.reshape(len(filters), -1).T)
        if "block_grid" in found:
            power = size**2
            locked = locking(power, rows % GRID) | locking(power, columns % GRID)
            flags |= dict.fromkeys(np.flatnonzero(locked).tolist(), "block_grid")
        if "interpolation_lattice" in found:
            # sizes, not powers: heavy tails would drown the lattice's small share
            places = ((rows + columns) % 2, rows % 2, columns % 2)
            locked = np.any([locking(size, p, LATTICE_LOCKED) for p in places], axis=0)
            # what follows the grid of 8 follows one of 2 as well
            flags = dict.fromkeys(np.flatnonzero(locked).tolist(), "interpolation_lattice") | flags
    return tuple(sorted(flags.items()))


def locking(
    power: NDArray[np.floating], place: NDArray[np.int32], share: float = LOCKED
) -> NDArray[np.bool_]:
    """Columns of ``power`` (n, k) whose mean depends on the place (n,) of the patch.

    True where means spread by more than ``share`` of the whole mean, and beyond chance.
    """
    means, errors = [], []
    overall = power.mean(axis=0)
    for value in np.unique(place):
        here = power[place == value]
        if len(here) < 100:
            return np.zeros(power.shape[1], bool)
        means.append(here.mean(axis=0) / overall)
        errors.append(here.std(axis=0) / overall / np.sqrt(len(here)))
    spread = np.std(means, axis=0)
    chance = np.sqrt(np.mean(np.square(errors), axis=0))
    return np.asarray((spread > share) & (spread > ERRORS / np.sqrt(len(means)) * chance))


def lone_lines(atoms: F64) -> NDArray[np.bool_]:
    """Atoms (k, size, size) made of rows of constant value, wholly or with one row alone.

    Wholly straight atoms must also change from row to row: slow shading is the scene's.
    """
    profile = atoms.mean(axis=2)
    straight = atoms.shape[2] * (profile**2).sum(axis=1)
    whole = (atoms**2).sum(axis=(1, 2))
    strongest = (profile**2).max(axis=1)
    alone = strongest > ONE_LINE * np.maximum((profile**2).sum(axis=1), 1e-300)
    steps = (np.diff(profile, axis=1) ** 2).sum(axis=1)
    slow = (2 * np.pi / atoms.shape[1]) ** 2 * (profile**2).sum(axis=1)
    needed = np.where(alone, STRAIGHT, WHOLLY_STRAIGHT)
    return np.asarray((straight > needed * whole) & (alone | (steps > ROUGH * slow)))


def looks(kernel: F64) -> str:
    """A flagged filter in words: where its strongest wave runs, and how long it is.

    >>> looks(np.cos(2 * np.pi * np.arange(16) / 8)[:, None] * np.ones(16))
    'axis-aligned, rows, wavelength 8.0 px'
    """
    power = np.abs(np.fft.fft2(kernel, (WAVES, WAVES)))
    y, x = np.unravel_index(int(power.argmax()), power.shape)
    fy, fx = (abs(np.fft.fftfreq(WAVES)[k]) for k in (y, x))
    f = float(np.hypot(fy, fx))
    if f < 1 / WAVES:
        return "broad"
    along = "rows" if fx < ALIGNED * f else "columns" if fy < ALIGNED * f else ""
    way = f"axis-aligned, {along}" if along else f"at {np.rad2deg(np.arctan2(fy, fx)):.0f} degrees"
    return f"{way}, wavelength {1 / f:.1f} px" + (", near Nyquist" if f > NYQUIST else "")
