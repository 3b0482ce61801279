"""The plots of the page: one function a plot, nouns in, bytes of a PNG out."""

from __future__ import annotations

import io
from collections.abc import Callable
from typing import Any

import numpy as np
from matplotlib import rc_context
from matplotlib.axes import Axes
from matplotlib.figure import Figure

from patchlab.report.mosaic import wheel
from patchlab.types import Bank, Dictionary, KernelFits, Survey, Whitening

TEAL, AMBER, SLATE, RED = "#0f766e", "#b45309", "#64748b", "#b91c1c"
STYLE: dict[str, Any] = {
    "font.size": 9.5,
    "axes.titlesize": 10.5,
    "axes.titlelocation": "left",
    "axes.spines.top": False,
    "axes.spines.right": False,
    "axes.edgecolor": "#94a3b8",
    "axes.labelcolor": "#334155",
    "text.color": "#1f2933",
    "xtick.color": "#475569",
    "ytick.color": "#475569",
    "axes.grid": True,
    "grid.color": "#e2e8f0",
    "axes.axisbelow": True,
    "legend.frameon": False,
    "lines.linewidth": 1.6,
    "figure.dpi": 110,
}


def _figure(draw: Callable[[Figure], None], width: float = 5.2, height: float = 3.3) -> bytes:
    with rc_context(STYLE):
        figure = Figure(figsize=(width, height), layout="constrained")
        draw(figure)
        buffer = io.BytesIO()
        figure.savefig(buffer, format="png", metadata={"Software": None})
    return buffer.getvalue()


def _plot(draw: Callable[[Axes], None], width: float = 5.2, height: float = 3.3) -> bytes:
    return _figure(lambda figure: draw(figure.add_subplot()), width, height)


plot = _plot
"""One pair of axes, drawn by the function given, as bytes of a PNG."""


def table_curve(survey: Survey) -> bytes:
    """The input table, code to working value."""
    table = survey.table

    def draw(axes: Axes) -> None:
        if table.values is not None:
            codes = np.arange(table.values.size, dtype=np.float64)
            values = table.values
        else:
            codes = np.linspace(table.contract.black, table.contract.white, 300)
            values = table.apply(codes.astype(np.float32))
        axes.plot(codes, values, color=TEAL)
        low, high = table.valid_codes
        for end, inside in ((low, low > codes[0]), (high, high < codes[-1])):
            if np.isfinite(end) and inside:
                axes.axvline(end, color=AMBER, lw=1, ls="--")
        axes.set(
            xlabel=f"{table.contract.pixels} code",
            ylabel="working value",
            title=f"Input table: {table.kind} (dashed: last trusted code)",
        )

    return _plot(draw)


def autocovariance(survey: Survey) -> bytes:
    """The noise's autocovariance, lag by lag."""
    acov = survey.noise.autocovariance
    values = np.ones((1, 1)) if acov is None else acov
    if acov is None:
        values = np.zeros((7, 7))
        values[3, 3] = 1.0

    def draw(axes: Axes) -> None:
        m = values.shape[0] // 2
        axes.imshow(
            values, cmap="BrBG", vmin=-1, vmax=1, extent=(-m - 0.5, m + 0.5, m + 0.5, -m - 0.5)
        )
        for (j, i), value in np.ndenumerate(values):
            if abs(value) >= 0.005:
                colour = "white" if abs(value) > 0.6 else "#1f2933"
                axes.text(
                    i - m, j - m, f"{value:.2f}", ha="center", va="center", fontsize=7, color=colour
                )
        axes.grid(False)
        kind = "white" if acov is None else "coloured"
        axes.set(xlabel="lag x, px", ylabel="lag y, px", title=f"Noise autocovariance ({kind})")

    return _plot(draw, 3.6, 3.3)


def whitening_spectrum(whitening: Whitening) -> bytes:
    """Eigenvalues of the patches' covariance, with the cut."""

    def draw(axes: Axes) -> None:
        values = np.maximum(whitening.spectrum, whitening.spectrum.max() * 1e-9)
        index = np.arange(1, values.size + 1)
        axes.semilogy(
            index[: whitening.rank], values[: whitening.rank], ".", color=TEAL, label="kept"
        )
        axes.semilogy(
            index[whitening.rank :], values[whitening.rank :], ".", color=SLATE, label="cut"
        )
        axes.axvline(whitening.rank + 0.5, color=AMBER, ls="--", lw=1)
        axes.set(
            xlabel="direction",
            ylabel="variance",
            title=f"Whitening: {whitening.rank} of {values.size} directions kept",
        )
        axes.set_ylim(bottom=values[: whitening.rank].min() / 30)
        axes.legend()

    return _plot(draw)


def convergence(dictionary: Dictionary) -> bytes:
    """The learner's curve, iteration by iteration, and what held-out patches say to it."""

    def draw(axes: Axes) -> None:
        curve = np.asarray(dictionary.curve, dtype=np.float64)
        left = np.maximum(curve - curve.min(), 0)[:-1]
        label = "what was still to be gained"
        axes.semilogy(np.arange(1, left.size + 1), np.maximum(left, 1e-12), color=TEAL, label=label)
        state = "converged" if dictionary.converged else "NOT converged"
        steps, held = dictionary.held_out_curve.T
        if held.size:
            lost = np.maximum(held.max() - held, 1e-12)
            some = steps != steps[held.argmax()]
            axes.semilogy(
                steps[some], lost[some], ".-", color=AMBER, lw=1, label="held out, below its best"
            )
            axes.legend(fontsize=8)
        if dictionary.stopped_at is not None:
            state = "stopped before overfitting,"
            axes.axvline(dictionary.stopped_at, color=AMBER, ls="--", lw=1)
        axes.set(
            xlabel="iteration of the last stage",
            ylabel="objective above its end",
            title=f"Learning: {state} after {dictionary.iterations} iterations",
        )

    return _plot(draw)


def fit_quality(atoms: KernelFits, filters: KernelFits) -> bytes:
    """How well parametric kernels describe atoms and filters."""

    def draw(axes: Axes) -> None:
        bins = np.linspace(0, 1, 26)
        for fits, colour in ((filters, SLATE), (atoms, TEAL)):
            r2 = np.clip([f.r2 for f in fits.fits], 0, 1)
            axes.hist(
                r2,
                bins.tolist(),
                color=colour,
                alpha=0.75,
                label=f"{fits.of}, median {np.median(r2):.2f}",
            )
        axes.axvline(0.8, color=AMBER, ls="--", lw=1)
        axes.set(
            xlabel="R² of the best kernel", ylabel="components", title="Fit quality (dashed: good)"
        )
        axes.legend(loc="upper left")

    return _plot(draw)


def _oriented(fits: KernelFits) -> list[Any]:
    return [f for f in fits.fits if f.verdict == "good" and "theta_rad" in f.parameters]


def _peak_frequency(fit: Any) -> float:
    p = fit.parameters
    if fit.family == "gabor":
        return float(p["frequency_cpp"])
    order = 1 if fit.family == "gd1" else 2
    return float(np.sqrt(order) / (2 * np.pi * p["sigma_u_px"]))


def orientation_and_frequency(fits: KernelFits) -> bytes:
    """Where the good fits look: direction and peak frequency, on the frequency plane."""
    good = _oriented(fits)

    def draw(figure: Figure) -> None:
        axes: Any = figure.add_subplot(projection="polar")
        theta = np.array([f.parameters["theta_rad"] for f in good])
        radius = np.array([_peak_frequency(f) for f in good])
        for turn in (0.0, np.pi):
            axes.scatter(
                theta + turn, radius, s=22, c=[TEAL if f.family != "gabor" else AMBER for f in good]
            )
        axes.set_theta_direction(-1)  # y runs down in pictures
        axes.set_rlim(0, 0.5)
        axes.set_title("Direction and peak frequency, cycles/px")
        axes.set_rticks([0.1, 0.2, 0.3, 0.4])
        axes.scatter([], [], c=TEAL, s=22, label="derivative")
        axes.scatter([], [], c=AMBER, s=22, label="gabor")
        axes.legend(loc="lower left", bbox_to_anchor=(-0.2, -0.08))

    return _figure(draw, 4.6, 4.2)


def sizes(fits: KernelFits, bank: Bank) -> bytes:
    """Widths across and along the edge, with the bank's own."""
    good = _oriented(fits)

    def draw(axes: Axes) -> None:
        axes.scatter(
            [f.parameters["sigma_u_px"] for f in good],
            [f.parameters["sigma_v_px"] for f in good],
            s=20, color=SLATE, label=f"good fits of {fits.of}",
        )  # fmt: skip
        chosen = {
            (k.parameters["sigma_u_px"], k.parameters["sigma_v_px"])
            for k in bank.kernels
            if "sigma_u_px" in k.parameters
        }
        if chosen:
            across, along = np.array(sorted(chosen)).T
            axes.scatter(across, along, s=90, marker="D", color=AMBER, label="bank")
        axes.set(xlabel="sigma across the edge, px", ylabel="sigma along it, px", title="Sizes")
        axes.set_xlim(0, fits.size / 2)
        axes.set_ylim(0, fits.size)
        axes.legend()

    return _plot(draw)


def coverage_curve(bank: Bank) -> bytes:
    """Coverage against the budget, with what chance and an untrained bank reach."""
    coverage = bank.coverage
    assert coverage is not None

    def draw(axes: Axes) -> None:
        axes.plot(coverage.budget, coverage.curve, "o-", color=TEAL, label="refined on these atoms")
        axes.plot([len(bank)], [coverage.learned], "D", color=AMBER, ms=9, label="this bank")
        axes.axhline(coverage.untrained, color=SLATE, ls="--", lw=1.2, label="an untrained bank")
        axes.axhline(coverage.rotated, color=RED, ls=":", lw=1.4, label="best on a rotated basis")
        axes.set(xlabel="kernels", ylabel="share of the atoms", title="Coverage against budget")
        axes.set_ylim(0, 1)
        axes.legend(loc="lower right", fontsize=8)

    return _plot(draw)


def thresholds(bank: Bank) -> bytes:
    """Promised false elements per megapixel against the strength threshold."""
    found = bank.thresholds
    assert found is not None

    def draw(axes: Axes) -> None:
        axes.semilogy(
            found.strength, found.rate, "o-", color=TEAL, label="whole chain, Monte Carlo"
        )
        axes.semilogy(
            found.strength, found.rice, ".--", color=SLATE, label="Rice sum, one scale, no linking"
        )
        axes.set(
            xlabel="strength threshold, noise sd",
            ylabel="false elements / Mpx",
            title="Threshold against promise (flat areas)",
        )
        axes.legend()

    return _plot(draw)


def orientation_key(count: int) -> bytes:
    """The colours of the overlay: the direction of an edge's normal."""

    def draw(figure: Figure) -> None:
        axes: Any = figure.add_subplot(projection="polar")
        colours = wheel(count) / 255
        for turn in (0.0, np.pi):
            axes.bar(
                np.pi * np.arange(count) / count + turn,
                1,
                np.pi / count,
                color=colours,
                align="center",
            )
        axes.set_theta_direction(-1)
        axes.set_yticks([])
        axes.grid(False)

    return _figure(draw, 1.9, 1.9)
