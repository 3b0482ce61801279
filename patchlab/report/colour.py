"""Pictures of colour components: tiles in colour, and where their directions lie."""

from __future__ import annotations

from typing import Any

import numpy as np
from matplotlib.axes import Axes
from numpy.typing import NDArray

from patchlab import shapes
from patchlab.conventions import rgb_weights
from patchlab.report.plots import SLATE, plot
from patchlab.types import F64, Bank, KernelFits


def in_rgb(tiles: NDArray[Any], colours: str) -> NDArray[Any]:
    """Tiles over a pixel's samples (..., samples) in (R, G, B); monochrome ones as they are."""
    return np.asarray(tiles @ rgb_weights(colours).T) if colours else tiles


def drawn_fits(profiles: F64, fits: KernelFits) -> F64:
    """Rendered profiles (k, size, size) with each fit's direction, (k, size, size, samples)."""
    directions = np.array([f.direction for f in fits.fits[: len(profiles)]])
    return np.asarray(profiles[..., None] * directions[:, None, None, :])


def bank_taps(bank: Bank) -> F64:
    """Taps as the weights of a pixel's samples, in (R, G, B); monochrome ones as they are."""
    taps = bank.taps.astype(np.float64)
    if bank.planes == 1:
        return taps
    samples = taps if bank.mix is None else taps @ bank.mix.astype(np.float64)
    return in_rgb(samples, bank.contract.format.colours)


def in_words(fits: KernelFits) -> str:
    """How many components are grey and how many opponent, in a sentence; "" for one plane."""
    if not fits.colours:
        return ""
    counts = shapes.share_by_axis(fits)
    told = ", ".join(f"{count} {name}" for name, count in counts.items())
    share = float(np.median([f.colour_share or 0.0 for f in fits.fits]))
    return f"{told}; a median of {100 * share:.1f} % of a component is one profile in one colour"


def directions(atoms: KernelFits, filters: KernelFits) -> bytes:
    """Directions of atoms and filters in the plane of the two opponent axes.

    The middle is grey; the rim is a colour without any grey in it.
    """

    def draw(axes: Axes) -> None:
        turn = np.linspace(0, 2 * np.pi, 181)
        axes.plot(np.cos(turn), np.sin(turn), color=SLATE, lw=0.8)
        for fits, mark, label in ((atoms, "o", "atoms"), (filters, "^", "filters")):
            unit = np.array([shapes.rgb_direction(f.direction or (), fits.colours)
                             for f in fits.fits])  # fmt: skip
            x = unit @ np.array(shapes.AXES["red-green"])
            y = unit @ np.array(shapes.AXES["blue-yellow"])
            shown = np.clip(0.5 + 0.5 * unit / np.abs(unit).max(axis=1, keepdims=True), 0, 1)
            for sign in (1, -1):  # a direction and its opposite are one
                face = shown if sign > 0 else 1 - shown
                axes.scatter(
                    sign * x,
                    sign * y,
                    s=18,
                    c=face,
                    marker=mark,
                    edgecolors=SLATE,
                    linewidths=0.4,
                    label=label if sign > 0 else None,
                )
        axes.set_aspect("equal")
        axes.set(xlabel="green to red", ylabel="yellow to blue", title="Directions of colour")
        axes.legend(loc="upper right", fontsize=8)

    return plot(draw, 4.2, 4.2)
