"""Colour components: a spatial profile times a direction of colour, and what that leaves out.

The samples of a component (size, size, samples) form a matrix of pixels by samples. Its first
singular vectors are the one profile and the one direction that rebuild it best; the share of the
energy that they hold says how far the component is such a product. The families are fitted to
the profile, as to any other kernel.
"""

from __future__ import annotations

import math
from collections.abc import Mapping
from dataclasses import dataclass, replace
from typing import Literal

import numpy as np

from patchlab.conventions import Array, rgb_weights
from patchlab.errors import UsageError
from patchlab.progress import Progress, silent
from patchlab.shapes.fit import fit_kernels, verdict
from patchlab.types import KernelFits

AXES: Mapping[str, tuple[float, float, float]] = {
    "grey": (1 / math.sqrt(3), 1 / math.sqrt(3), 1 / math.sqrt(3)),
    "blue-yellow": (-1 / math.sqrt(6), -1 / math.sqrt(6), 2 / math.sqrt(6)),
    "red-green": (1 / math.sqrt(2), -1 / math.sqrt(2), 0.0),
}
"""Three orthogonal directions in (R, G, B): grey, and the two opponent ones on which independent
components of natural colour patches gather (Hoyer and Hyvarinen 2000, Network 11:191-210; Tailor,
Finkel and Buchsbaum 2000, Vision Res. 40:2671-2676)."""

GREY_DEG = 20.0
"""Angle to grey up to which a direction counts as grey (common practice, no source)."""


@dataclass(frozen=True, eq=False)
class Separated:
    """Kernels as profiles times directions.

    Parameters
    ----------
    profiles : ndarray (k, size, size), in the kernels' own scale
    directions : ndarray (k, samples), of unit norm, the largest absolute entry positive
    share : ndarray (k,), of each kernel's energy that the product holds, in (0, 1]
    """

    profiles: Array
    directions: Array
    share: Array


def separate(kernels: Array) -> Separated:
    """The nearest product of a profile and a direction to each colour kernel.

    Parameters
    ----------
    kernels : ndarray (k, size, size, samples)

    Returns
    -------
    Separated

    Raises
    ------
    UsageError : kernels of another shape.

    Examples
    --------
    >>> blue_step = np.multiply.outer(np.outer(np.ones(4), [-1.0, -1, 1, 1]), [0, 0, 2.0])
    >>> found = separate(blue_step[None])
    >>> found.directions.tolist(), round(float(found.share[0]), 12)
    ([[0.0, 0.0, 1.0]], 1.0)
    """
    if kernels.ndim != 4 or kernels.shape[1] != kernels.shape[2]:
        raise UsageError(f"colour kernels must be (k, size, size, samples), not {kernels.shape}")
    k, size, _, samples = kernels.shape
    flat = np.asarray(kernels, dtype=np.float64).reshape(k, size * size, samples)
    # the small matrix of samples by samples is enough, and exact for a kernel that is a product
    values, vectors = np.linalg.eigh(flat.swapaxes(1, 2) @ flat)
    directions = vectors[..., -1]
    large = np.abs(directions)
    first = np.argmax(large >= large.max(axis=1, keepdims=True) * (1 - 1e-6), axis=1)
    directions = directions * np.where(directions[np.arange(k), first] < 0, -1.0, 1.0)[:, None]
    directions = directions + 0.0  # no minus zeros
    total = np.maximum(values.sum(axis=1), 1e-300)
    profiles = np.einsum("kpc,kc->kp", flat, directions).reshape(k, size, size)
    return Separated(profiles, directions, np.clip(values[:, -1] / total, 0.0, 1.0))


def fit_colour_kernels(
    kernels: Array,
    of: Literal["atoms", "filters"],
    colours: str,
    *,
    progress: Progress = silent,
) -> KernelFits:
    """Fit the profile of every colour kernel; each fit carries its direction.

    Parameters
    ----------
    kernels : ndarray (k, size, size, samples)
    of : "atoms" or "filters"
    colours : a letter for each sample of a pixel, as :attr:`PixelFormat.colours`
    progress : as :func:`fit_kernels`

    Returns
    -------
    KernelFits : ``r2`` is that of the whole kernel, the profile's R2 times the product's share
        of the energy, and the verdict follows it

    Raises
    ------
    UsageError, InputError : as :func:`fit_kernels` and :func:`separate`.
    """
    if kernels.ndim == 4 and kernels.shape[3] != len(colours):
        raise UsageError(f"{kernels.shape[3]} samples a pixel are not {colours}")
    parts = separate(kernels)
    plain = fit_kernels(parts.profiles, of, progress=progress)
    fits = []
    for fit, direction, share in zip(plain.fits, parts.directions, parts.share, strict=True):
        r2 = float(share) * fit.r2
        fits.append(
            replace(
                fit,
                r2=r2,
                verdict=verdict(r2, fit.verdict == "good"),
                direction=tuple(map(float, direction)),
                colour_share=float(share),
            )
        )
    return replace(plain, fits=tuple(fits), colours=colours)


def rgb_direction(direction: Array | tuple[float, ...], colours: str) -> Array:
    """Unit vector in (R, G, B) of a direction over a pixel's samples (one or more of them)."""
    found = np.asarray(direction, dtype=np.float64) @ rgb_weights(colours).T
    return np.asarray(found / np.maximum(np.linalg.norm(found, axis=-1, keepdims=True), 1e-300))


def colour_axis(direction: Array | tuple[float, ...], colours: str) -> tuple[str, float]:
    """Which of :data:`AXES` a direction belongs to, and its angle to grey in degrees.

    Grey within :data:`GREY_DEG`; beyond, the opponent axis that is nearer once grey is taken out
    (an atom of a coloured surface carries some grey with it; its filter does not).

    >>> colour_axis((0.6, 0.6, 0.55), "RGB")[0], colour_axis((0.1, 0.1, 0.9), "RGB")[0]
    ('grey', 'blue-yellow')
    """
    unit = rgb_direction(direction, colours)
    size = {name: abs(float(unit @ np.array(axis))) for name, axis in AXES.items()}
    angle = math.degrees(math.acos(min(size["grey"], 1.0)))
    opponent = "blue-yellow" if size["blue-yellow"] >= size["red-green"] else "red-green"
    return ("grey" if angle <= GREY_DEG else opponent), angle


def share_by_axis(fits: KernelFits) -> dict[str, int]:
    """How many kernels belong to each of :data:`AXES`, see :func:`colour_axis`."""
    names = [colour_axis(f.direction, fits.colours)[0] for f in fits.fits if f.direction]
    return {name: names.count(name) for name in AXES}
