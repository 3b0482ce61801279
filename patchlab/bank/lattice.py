"""Kernels on a mirrored orientation lattice, and the last touches every bank's taps get.

The directions are ``pi j / n``. Kernels are drawn once in the first eighth of a turn and
carried to the others by exact reflections of the array, so that the kernel at pi - theta is
the mirror image of the one at theta, tap for tap: that is what lets a plan share their work.

Taps are whole multiples of a power of two, at most 2^-23 of the largest tap's power of two.
So they are exact in float32, and a kernel without DC sums to exactly zero in any order.
"""

from __future__ import annotations

import math
import re
from collections.abc import Sequence
from typing import Literal

import numpy as np

from patchlab.conventions import grid
from patchlab.errors import UsageError
from patchlab.families import noise_gain, render, without_dc
from patchlab.types import F32, F64, Kernel

LARGEST = 31
"""Largest kernel side, pixels."""
REACH = 3.0
"""Standard deviations of the widest envelope that a kernel holds."""

STEPS: dict[int, tuple[int, ...]] = {
    4: (4,), 6: (6,), 8: (8,), 12: (6, 6), 16: (8, 8), 24: (8, 8, 8),
    32: (8, 8, 8, 8), 48: (12, 12, 12, 12), 64: (16, 16, 16, 16),
}  # fmt: skip
"""Orientations of each size of a step bank, by its number of kernels."""
PAIRS: dict[int, tuple[int, ...]] = {
    8: (4,), 12: (6,), 16: (8,), 24: (8, 4), 32: (8, 8), 48: (12, 12), 64: (16, 16),
}  # fmt: skip
"""Orientations of each size of a bank of quadrature pairs, by its number of kernels."""
LINES: dict[int, tuple[int, ...]] = {
    2 * kernels: structure for kernels, structure in STEPS.items() if 2 * kernels <= 64
}
"""As STEPS, with a line kernel beside each step kernel."""

_C_WORDS = """
alignas alignof and and_eq asm auto bitand bitor bool break case catch char class compl const
constexpr continue default delete do double else enum explicit export extern false float for
friend goto if inline int long mutable namespace new noexcept not not_eq nullptr operator or
or_eq private protected public register restrict return short signed sizeof static struct switch
template this throw true try typedef typeid typename union unsigned using virtual void volatile
while xor xor_eq
"""
C_WORDS = frozenset(_C_WORDS.split())
"""Words that C99 or C++ keep for themselves."""


def check_name(name: str) -> str:
    """Return a bank's or kernel's name, or refuse one that cannot stand in C and in a path.

    Raises
    ------
    UsageError : not a C identifier of at most 48 ASCII letters, digits and underscores that
        begins with a letter, or a word that C or C++ keeps for itself.
    """
    if not re.fullmatch(r"[A-Za-z][A-Za-z0-9_]{0,47}", name) or name in C_WORDS:
        raise UsageError(
            f"{name!r} cannot be the name of a bank",
            remedy="use up to 48 letters, digits and underscores, beginning with a letter, "
            "and no word of the C language",
        )
    return name


def structure_for(budget: int, table: dict[int, tuple[int, ...]]) -> tuple[int, tuple[int, ...]]:
    """The largest structure of a table that a budget of kernels holds.

    Returns
    -------
    (kernels, orientations of each size)

    Raises
    ------
    UsageError : the budget is below the smallest structure.

    >>> structure_for(20, PAIRS)
    (16, (8,))
    """
    fitting = [k for k in table if k <= budget]
    if not fitting:
        raise UsageError(
            f"{budget} kernels are too few for this kind of bank",
            remedy=f"ask for at least {min(table)}",
        )
    return max(fitting), table[max(fitting)]


def support(widest: float) -> int:
    """Odd kernel side that holds three standard deviations, at most 31.

    >>> support(1.2), support(2.2), support(9.0)
    (9, 15, 31)
    """
    return min(2 * math.ceil(REACH * widest - 1e-9) + 1, LARGEST)


# ---------------------------------------------------------------- finishing taps


def without_mirror_bias(autocovariance: F64 | None) -> F64 | None:
    """An autocovariance averaged with its mirror image.

    Noise of a sensor has no handedness beyond what sampling error leaves in the estimate; with
    it the gains of mirrored kernels would differ and their taps could not be shared.
    """
    if autocovariance is None:
        return None
    return np.asarray((autocovariance + autocovariance[:, ::-1]) / 2)


def exact_taps(kernel: F64, *, zero_dc: bool = True) -> F32:
    """Round a kernel to float32 so that, if asked, its taps sum to exactly zero.

    Taps become whole multiples of one power of two; what rounding left of the sum is taken
    from the centre tap, a few units in the last place of the largest one. Point and mirror
    symmetries are kept.

    Parameters
    ----------
    kernel : ndarray (h, h), h odd; with ``zero_dc`` its mean should be zero already
    zero_dc : take the rest of the sum from the centre

    Returns
    -------
    float32 ndarray (h, h)
    """
    largest = float(np.abs(kernel).max())
    if largest == 0:
        return np.zeros(kernel.shape, dtype=np.float32)
    quantum = 2.0 ** (math.frexp(largest)[1] - 23)
    units = np.rint(kernel / quantum)
    if zero_dc:
        c = kernel.shape[0] // 2
        units[c, c] -= units.sum()
    return np.asarray(units * quantum, dtype=np.float32) + np.float32(0)  # no minus zeros


def unit_noise(kernel: F64, autocovariance: F64 | None, noise_sd: float | None) -> F64:
    """Scale a kernel so that the camera's noise gives a response of sd 1.

    Parameters
    ----------
    kernel : ndarray (h, h)
    autocovariance : of the working values' noise, centre 1; None means white
    noise_sd : of the working values; None gives a kernel of unit norm

    Returns
    -------
    ndarray (h, h)
    """
    if noise_sd is None:
        return np.asarray(kernel / np.linalg.norm(kernel))
    return np.asarray(kernel / (noise_gain(kernel, autocovariance) * noise_sd))


# ---------------------------------------------------------------- the lattice


def _first_eighth(family: str, widths: tuple[float, float], j: int, n: int, size: int) -> F64:
    """Draw orientation j of n, in [0, pi/4] if n is even, with its exact symmetries."""
    p = {"theta_rad": math.pi * j / n, "sigma_u_px": widths[0], "sigma_v_px": widths[1]}
    kernel = render(family, p, size)
    if family == "gd2":
        envelope = render("gabor", {**p, "frequency_cpp": 0.0, "phase_rad": 0.0}, size)
        kernel = without_dc(kernel, envelope)
    sign = -1 if family == "gd1" else 1
    kernel = (kernel + sign * kernel[::-1, ::-1]) / 2
    if j == 0:
        kernel = (kernel + kernel[::-1]) / 2
    if 4 * j == n:
        kernel = (kernel + kernel.T) / 2
    return kernel


def lattice_taps(
    family: Literal["gd1", "gd2"],
    widths: tuple[float, float],
    count: int,
    size: int,
    autocovariance: F64 | None = None,
    noise_sd: float | None = None,
) -> list[F32]:
    """Taps of one family and size on all orientations ``pi j / count``.

    Parameters
    ----------
    family : gd1 (step) or gd2 (line)
    widths : (across, along), pixels
    count : orientations
    size : kernel side, odd
    autocovariance, noise_sd : of the working values' noise, for :func:`unit_noise`

    Returns
    -------
    list of float32 ndarray (size, size); entry ``count - j`` is the mirror image of entry j
    """
    even_handed = without_mirror_bias(autocovariance)
    taps: list[F32] = []
    for j in range(count):
        if 2 * j > count:  # pi - theta: x runs backwards
            taps.append(np.ascontiguousarray(taps[count - j][:, ::-1]))
            continue
        if count % 2 == 0 and 4 * j > count:  # pi / 2 - theta: x and y change places
            kernel = _first_eighth(family, widths, count // 2 - j, count, size).T
        else:
            kernel = _first_eighth(family, widths, j, count, size)
        taps.append(np.ascontiguousarray(exact_taps(unit_noise(kernel, even_handed, noise_sd))))
    return taps


def step_response(taps: F32, theta: float) -> float:
    """Response of an odd kernel to a unit step through its centre, brighter along theta."""
    x, y = grid(taps.shape[0])
    u = x * math.cos(theta) + y * math.sin(theta)
    bright = np.where(np.abs(u) < 1e-9, 0.5, (u > 0).astype(np.float64))
    return float((taps.astype(np.float64) * bright).sum())


def impulse_response(taps: F32) -> float:
    """Largest response, in size, to a unit impulse, with its sign."""
    flat = taps.ravel()
    return float(flat[int(np.abs(flat).argmax())])


PARITY_NAMES: dict[str, tuple[Literal["gd1", "gd2"], str]] = {
    "odd": ("gd1", "step"),
    "even": ("gd2", "line"),
}


def lattice_bank(
    structure: Sequence[int],
    widths: Sequence[tuple[float, float]],
    parities: Sequence[Literal["odd", "even"]],
    autocovariance: F64 | None = None,
    noise_sd: float | None = None,
    size: int | None = None,
) -> tuple[tuple[Kernel, ...], F32]:
    """All kernels of a lattice bank, sizes finest first, with their taps.

    Parameters
    ----------
    structure : orientations of each size
    widths : (across, along) of each size, pixels
    parities : which kernels each size has
    autocovariance, noise_sd : of the working values' noise
    size : kernel side, odd; by default :func:`support` of the widest

    Returns
    -------
    kernels, and float32 taps (n, h, h)
    """
    size = size or support(max(max(w) for w in widths))
    kernels: list[Kernel] = []
    taps: list[F32] = []
    for scale, (count, (across, along)) in enumerate(zip(structure, widths, strict=True)):
        for parity in parities:
            family, kind = PARITY_NAMES[parity]
            planes = lattice_taps(family, (across, along), count, size, autocovariance, noise_sd)
            for j, plane in enumerate(planes):
                theta = math.pi * j / count
                gain = step_response(plane, theta) if parity == "odd" else impulse_response(plane)
                place = {"theta_rad": theta, "sigma_u_px": across, "sigma_v_px": along}
                place |= {"x_px": 0.0, "y_px": 0.0}
                name = f"{kind}_s{scale}_o{j}"
                kernels.append(Kernel(name, family, parity, scale, j, place, gain))
                taps.append(plane)
    return tuple(kernels), np.stack(taps)
