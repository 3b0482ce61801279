"""The page of an assessment: four plots and the tables behind them."""

from __future__ import annotations

import base64
from collections.abc import Callable, Mapping
from typing import Any

import jinja2
from matplotlib.axes import Axes
from matplotlib.ticker import FormatStrFormatter, NullFormatter

from patchlab.report.plots import AMBER, RED, SLATE, TEAL, plot

Result = Mapping[str, Any]
COLOURS = (AMBER, RED, SLATE, "#7c3aed")
NONE_SEEN = 3.0
"""Events that a Poisson law with none seen stays below, 95 % sure."""


def _rates(result: Result) -> bytes:
    """Rate asked against rate found."""
    rows = result["rates"]

    def draw(axes: Axes) -> None:
        asked = [r["asked"] for r in rows]
        axes.loglog(asked, asked, color=SLATE, ls="--", lw=1, label="as promised")
        for name, label, style, colour in (
            ("found", "elements", "o-", TEAL),
            ("groups", "groups", ".:", AMBER),
        ):
            seen = [(r["asked"], r[name]) for r in rows if r[name] > 0]
            if seen:
                axes.loglog(*zip(*seen, strict=True), style, color=colour, label=label)
        none = [(r["asked"], NONE_SEEN / r["megapixels"]) for r in rows if not r["found"] > 0]
        if none:
            axes.loglog(
                *zip(*none, strict=True), "v", color=TEAL, mfc="none", label="none seen: below"
            )
        axes.set(
            xlabel="asked, false / Mpx", ylabel="found", title="False elements on flat pictures"
        )
        axes.legend()

    return plot(draw)


def _location(result: Result) -> bytes:
    """Errors of edgels against their bound."""
    rows = [r for r in result["location"] if r["rms_px"] is not None]

    def draw(axes: Axes) -> None:
        contrast = [r["contrast"] for r in rows]
        axes.loglog(contrast, [r["rms_px"] for r in rows], "o-", color=TEAL, label="edgels, rms")
        axes.loglog(
            contrast, [r["bound_px"] for r in rows], "--", color=SLATE, label="Cramér-Rao bound"
        )
        axes.set(
            xlabel="step height, noise sd", ylabel="error along the normal, px", title="Location"
        )
        axes.set_xticks(contrast, [f"{c:g}" for c in contrast])
        axes.xaxis.set_minor_formatter(NullFormatter())
        for which in (axes.yaxis.set_major_formatter, axes.yaxis.set_minor_formatter):
            which(FormatStrFormatter("%g"))
        axes.legend()

    return plot(draw)


def _best(rows: list[dict[str, Any]], kind: str) -> dict[str, Any]:
    return max((r for r in rows if r["picture"] == kind), key=lambda r: float(r["mean_f"]))


def _mine(result: Result) -> dict[str, Any]:
    wanted = f"{result['rate']:g} "
    mine: dict[str, Any] = next(
        r for r in result["detection"]["ours"] if r["setting"].startswith(wanted)
    )
    return mine


def _shown(result: Result) -> list[tuple[str, dict[str, Any]]]:
    """The bank's row and the best of each kind of rival."""
    found = result["detection"]
    rows = [("this bank, one setting", _mine(result))]
    for kind in ("raw", "stretched", "tabled"):
        best = _best(found["fixed"], kind)
        rows.append((f"{best['detector']}, {kind}, one setting", best))
    best = max(found["tuned"], key=lambda r: float(r["mean_f"]))
    return [*rows, (f"{best['detector']}, {best['picture']}, tuned by the truth", best)]


def _light(result: Result) -> bytes:
    """F against light level, ours beside the libraries."""
    lights = result["detection"]["light_electrons"]

    def draw(axes: Axes) -> None:
        for (name, row), colour in zip(_shown(result), (TEAL, *COLOURS), strict=True):
            style = "--" if "tuned" in name else "-"
            axes.semilogx(lights, row["f"], "o" + style, ms=4, color=colour, label=name)
        axes.set(xlabel="light, electrons of white", ylabel="F", title="F against light level")
        axes.set_ylim(0, 1)
        axes.legend(fontsize=7.5, loc="lower right")

    return plot(draw, 6.4, 3.8)


def _precision(result: Result) -> bytes:
    """Precision and recall of the bank at its rates, and of the best fixed rivals."""

    def draw(axes: Axes) -> None:
        for row in result["detection"]["ours"]:
            own = row["setting"] == _mine(result)["setting"]
            axes.plot(row["recall"], row["precision"], "o-" if own else ".:", color=TEAL)
            axes.annotate(row["setting"].split()[0], (row["recall"][0], row["precision"][0]))
        for (name, row), colour in zip(_shown(result)[1:4], COLOURS, strict=False):
            axes.plot(row["recall"], row["precision"], ".-", color=colour, lw=1, label=name)
        axes.plot([], [], "o-", color=TEAL, label="this bank (false / Mpx beside it)")
        axes.set(
            xlabel="recall", ylabel="precision", title="Precision and recall, a point a light level"
        )
        axes.set(xlim=(0, 1), ylim=(0, 1))
        axes.legend(fontsize=7.5, loc="lower left")

    return plot(draw, 5.2, 4.2)


PLOTS: Mapping[str, tuple[Callable[[Result], bytes], str]] = {
    "rates": (_rates, "Rate asked against rate found, over sixteen grey levels."),
    "location": (_location, "Edgels of straight steps at random places and directions."),
    "light": (_light, "One setting of the bank beside the best of each kind of rival."),
    "precision": (_precision, "Each line runs over the light levels."),
}


def pictures(result: Result) -> dict[str, bytes]:
    """Files of an assessment for people: plots as PNG and one page that holds them.

    Parameters
    ----------
    result : what :func:`patchlab.pipeline.assess.assess_bank` measured
    """
    drawn = {name: make(result) for name, (make, _) in PLOTS.items()}
    shown = {
        name: ("data:image/png;base64," + base64.b64encode(data).decode(), PLOTS[name][1])
        for name, data in drawn.items()
    }
    environment = jinja2.Environment(
        loader=jinja2.PackageLoader("patchlab.report", "."),
        autoescape=True,
        undefined=jinja2.StrictUndefined,
        trim_blocks=True,
        lstrip_blocks=True,
    )
    page = environment.get_template("assess.html").render(r=result, plots=shown)
    return {f"{name}.png": data for name, data in drawn.items()} | {"index.html": page.encode()}
