"""The picture of two results: pairs and their differences, and the crowds of shapes."""

from __future__ import annotations

from collections.abc import Mapping

import numpy as np
from matplotlib.figure import Figure

from patchlab.pipeline.compare import Comparison
from patchlab.report.mosaic import mosaic
from patchlab.report.plots import AMBER, TEAL, _figure
from patchlab.types import F64

SHOWN = 48
"""Pairs that are drawn, the worst first."""
AXES = {
    "orientation_rad": "direction of the wave vector, rad",
    "frequency_cpp": "frequency, cycles per pixel",
    "size_px": "size, px",
    "sigma_u_px": "width across the edge, px",
    "sigma_v_px": "width along the edge, px",
}


def comparison_pictures(found: Comparison) -> Mapping[str, bytes]:
    """``pairs.png`` (first, second, difference) and, where shapes are known, ``shapes.png``."""
    out = {"pairs.png": _pairs(found)}
    if found.distances:
        out["shapes.png"] = _shapes(found)
    return out


def _pairs(found: Comparison) -> bytes:
    size = max(found.first.kernels.shape[1], found.second.kernels.shape[1])
    one = _unit(_padded(_seen(found.first.kernels[found.left[:SHOWN]]), size))
    two = _unit(_padded(_seen(found.second.kernels[found.right[:SHOWN]]), size))
    within = tuple(range(1, one.ndim))
    two = two * np.where((one * two).sum(axis=within, keepdims=True) < 0, -1.0, 1.0)
    labels = [
        f"{i + 1} / {j + 1}  {c:.3f}"
        for i, j, c in zip(found.left, found.right, found.cosine[:SHOWN], strict=False)
    ]
    return mosaic([one, two, one - two], labels, across=6, zoom=max(2, 48 // size), as_is=True)


def _seen(kernels: F64) -> F64:
    """Kernels to be drawn: one plane or three as they are, the samples of a cell added."""
    return kernels.sum(axis=3) if kernels.ndim == 4 and kernels.shape[3] != 3 else kernels


def _unit(kernels: F64) -> F64:
    within = tuple(range(1, kernels.ndim))
    norm = np.sqrt((kernels**2).sum(axis=within, keepdims=True))
    return np.asarray(kernels / np.maximum(norm, 1e-300))


def _padded(kernels: F64, size: int) -> F64:
    missing = size - kernels.shape[1]
    low = missing // 2
    more = ((0, 0),) * (kernels.ndim - 3)
    return np.pad(kernels, ((0, 0), (low, missing - low), (low, missing - low), *more))


def _shapes(found: Comparison) -> bytes:
    def draw(figure: Figure) -> None:
        axes = figure.subplots(1, len(found.distances), squeeze=False)[0]
        for each, (name, (distance, chance)) in zip(axes, found.distances.items(), strict=True):
            for side, colour, label in (
                (found.first, TEAL, "first"),
                (found.second, AMBER, "second"),
            ):
                at = np.sort(side.shapes[name])
                each.step(at, np.linspace(0, 100, at.size), color=colour, label=label)
            each.set(xlabel=AXES[name], title=f"distance {distance:.2f}, by chance {chance:.2f}")
        axes[0].set_ylabel("% of the kernels below")
        axes[0].legend()

    return _figure(draw, 3.2 * len(found.distances), 2.9)
