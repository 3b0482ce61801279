"""The survey's plots: noise, spectrum, edge spread, and found marks on crops of a frame."""

from __future__ import annotations

from typing import Any

import numpy as np
from matplotlib.axes import Axes
from matplotlib.figure import Figure
from numpy.typing import NDArray
from scipy import ndimage

from patchlab.camera.grid import GridMeter
from patchlab.camera.pixels import regions
from patchlab.report.plots import AMBER, RED, SLATE, TEAL, _figure, _plot
from patchlab.types import F64, Frame, Mark, NoiseModel, SlantedEdge, Survey

CROP = 72
"""Side of a crop that shows a mark, pixels."""
SHOWN = ("block_grid", "row_noise", "column_noise", "interpolation_lattice", "sharpening",
         "clipped_levels", "missing_levels", "posterised_depth", "fixed_spots")  # fmt: skip
"""Marks that a crop can show."""
FINE = {"row_noise", "column_noise", "interpolation_lattice", "sharpening", "block_grid"}
"""Marks best seen where the scene is calm."""


# ---------------------------------------------------------------- noise


def _law(noise: NoiseModel, light: F64, quantum: float, errors: float = 0.0) -> F64:
    """Standard deviation by the straight law, some standard errors up or down."""
    assert noise.gain is not None
    gain = noise.gain + errors * (noise.gain_error or 0.0)
    if noise.read_noise is None:
        return np.asarray(np.sqrt(np.maximum(gain * light + noise.sd[0] ** 2, 0)))
    read = max(noise.read_noise + errors * (noise.read_noise_error or 0.0), 0.0)
    return np.sqrt(np.maximum(gain * light + read**2 + quantum, 0))


def noise_curve(survey: Survey) -> bytes:
    """Noise against level: what was measured, the law, and two standard errors on either side."""
    noise, contract = survey.noise, survey.contract

    def draw(axes: Axes) -> None:
        quantum = 1 / 12 if contract.format.integer else 0.0
        if noise.gain is not None and noise.levels.size:
            level = np.linspace(contract.black, noise.levels.max(), 200)
            light = level - contract.black
            low, high = (_law(noise, light, quantum, e) for e in (-2, 2))
            axes.fill_between(level, low, high, color=TEAL, alpha=0.2, lw=0, label="two se")
            above = "level" if contract.black == 0 else "(level - black)"
            tail = " + 1/12}$" if quantum else "}$"
            formula = rf"sd = $\sqrt{{K\,{above} + read^2{tail}"
            axes.plot(level, _law(noise, light, quantum), color=TEAL, label=formula)
            told = f"K = {noise.gain:.4g} ± {noise.gain_error or 0:.1g} DN/e⁻"
            if noise.read_noise is None:
                told += "\nread noise not told"
            else:
                told += f"\nread = {noise.read_noise:.3g} ± {noise.read_noise_error or 0:.1g} DN"
            axes.text(0.97, 0.05, told, transform=axes.transAxes, ha="right", va="bottom")
        else:
            axes.plot(noise.levels, noise.sd, color=TEAL, label="curve")
        measured = noise.points if len(noise.points) else np.empty((0, 2))
        axes.plot(measured[:, 0], measured[:, 1], ".", color=SLATE, label="measured, by level")
        source = {"static": "static scenes", "photos": "photographs"}.get(noise.source, "")
        axes.set(xlabel="level, DN", ylabel="noise, DN (1 sd)")
        axes.set_title(f"Noise against level, from {source or noise.source}")
        axes.set_ylim(bottom=0)
        axes.legend(loc="upper left", fontsize=8)

    return _plot(draw)


# ---------------------------------------------------------------- spectrum


def spectrum(survey: Survey) -> bytes:
    """Radial power of the photographs, its power law, and the noise floor under it."""
    frequency, power = survey.spectrum_frequency, survey.spectrum_power
    good = (frequency > 0) & (power > 0)

    def draw(axes: Axes) -> None:
        axes.loglog(frequency[good], power[good], color=TEAL, label="photographs and noise")
        exponent = survey.spectrum_exponent
        if exponent is not None and good.any():
            # through the middle of the decade that scenes fill
            f = np.geomspace(frequency[good][0], 0.5, 50)
            anchor = np.sqrt(0.03 * 0.1)
            at = np.exp(np.interp(np.log(anchor), np.log(frequency[good]), np.log(power[good])))
            fall = at * (f / anchor) ** -exponent
            axes.loglog(f, fall, "--", color=SLATE, lw=1, label=f"power law, {exponent:.2f}")
        if survey.noise_power is not None:
            axes.axhline(survey.noise_power, color=AMBER, label="noise floor (mean light)")
        over = survey.noise_overtakes_cpp
        if over is not None:
            reach = (power[good].min() / 2, 30 * power[good].min())
            label = f"noise takes over at {over:.2f}"
            axes.plot([over, over], reach, color=RED, lw=1.4, ls=":", label=label)
        axes.set(xlabel="frequency, cycles/px", ylabel="power over mean² ", title="Spectrum")
        axes.set_xlim(right=0.55)
        axes.legend(loc="upper right", fontsize=8)

    return _plot(draw)


# ---------------------------------------------------------------- edges


def edge_spread(survey: Survey) -> bytes:
    """Widths of the photographs' edges; or the slanted edge's spread and transfer."""
    edge = survey.slanted_edge
    if edge is not None:
        return _figure(lambda figure: _chart(figure, edge), 7.4, 3.2)

    def draw(axes: Axes) -> None:
        widths = survey.edge_widths_px
        axes.hist(widths, bins=[k / 20 for k in range(51)], color=SLATE, alpha=0.75)
        if survey.blur_sigma_px is not None:
            sigma = survey.blur_sigma_px
            axes.axvline(sigma, color=AMBER, label=f"the camera's: {sigma:.2f} px")
            axes.legend()
        axes.set(xlabel="spread of an edge, px (1 sd)", ylabel="edges", title="Edge spread")

    return _plot(draw)


def _chart(figure: Figure, edge: SlantedEdge) -> None:
    left, right = figure.subplots(1, 2)
    near = np.abs(edge.distance_px) <= 6
    left.plot(edge.distance_px[near], edge.spread[near], ".-", color=TEAL, ms=4, lw=1)
    left.set(xlabel="distance from the edge, px", ylabel="light", title="Edge spread")
    right.plot(edge.frequency_cpp, edge.mtf, color=TEAL)
    right.axhline(0.5, color=SLATE, lw=0.8, ls="--")
    right.axvline(0.5, color=SLATE, lw=0.8, ls=":")
    if np.isfinite(edge.mtf50_cpp):
        right.plot([edge.mtf50_cpp], [0.5], "D", color=AMBER)
        right.annotate(
            f"MTF50 {edge.mtf50_cpp:.3f}", (edge.mtf50_cpp, 0.5), (6, 6), textcoords="offset points"
        )
    right.set(xlabel="frequency, cycles/px", ylabel="transfer", title="Transfer (dotted: Nyquist)")
    right.set_ylim(0, 1.1)
    right.set_xlim(0, 1)


# ---------------------------------------------------------------- marks on crops


def mark_crops(survey: Survey, frame: Frame) -> bytes | None:
    """Each found mark on a crop of the example frame, and what lies under the scene there.

    None where no mark was found that a crop can show.
    """
    found = [m for m in survey.marks if m.found and m.name in SHOWN]
    if not found or min(frame.pixels.shape) < CROP:
        return None
    codes = frame.pixels.astype(np.float64)
    fine = codes - ndimage.gaussian_filter(codes, 2.0)

    def draw(figure: Figure) -> None:
        axes = figure.subplots(2, len(found), squeeze=False)
        for column, mark in enumerate(found):
            rows, cols = _where(mark, codes, fine, frame)
            _crop(axes[0, column], codes[rows, cols], mark, frame)
            _beneath(axes[1, column], fine[rows, cols])
            if mark.name == "block_grid":
                y, x = grid_phase(frame)
                _ticks(axes[1, column], (y - rows.start) % 8, (x - cols.start) % 8)
        axes[0, 0].set_ylabel("as it is")
        axes[1, 0].set_ylabel("fine detail, stretched")

    return _figure(draw, max(2.0 * len(found) + 0.5, 3.0), 4.5)


def _where(mark: Mark, codes: F64, fine: F64, frame: Frame) -> tuple[slice, slice]:
    """The crop that shows a mark best."""
    contract = frame.contract
    clipped = (codes >= contract.white) | (codes <= 0)
    if mark.name == "clipped_levels":
        score = -ndimage.uniform_filter(np.where(clipped, 1.0, 0.0), CROP)
    elif mark.name == "fixed_spots":
        alone = np.abs(codes - ndimage.median_filter(codes, 5))
        score = -ndimage.maximum_filter(alone, CROP // 3)
    else:
        # calm and well exposed
        score = np.sqrt(ndimage.uniform_filter(fine**2, CROP))
        if mark.name not in FINE:  # steps are seen on a slope
            score = -ndimage.uniform_filter(ndimage.gaussian_gradient_magnitude(codes, 6), CROP)
        score = score + 1e6 * ndimage.uniform_filter(np.where(clipped, 1.0, 0.0), CROP)
    half = CROP // 2
    inside = score[half : codes.shape[0] - half + 1, half : codes.shape[1] - half + 1]
    y, x = np.unravel_index(int(np.argmin(inside)), inside.shape)
    return slice(int(y), int(y) + CROP), slice(int(x), int(x) + CROP)


def _crop(axes: Any, crop: F64, mark: Mark, frame: Frame) -> None:
    """The crop in grey, clipped pixels in red."""
    low, high = np.quantile(crop, [0.002, 0.998])
    axes.imshow(crop, cmap="gray", vmin=low, vmax=max(high, low + 1), interpolation="nearest")
    if mark.name == "clipped_levels":
        over: NDArray[np.bool_] = (crop >= frame.contract.white) | (crop <= 0)
        tint = np.zeros((*crop.shape, 4))
        tint[over] = (0.73, 0.11, 0.11, 0.8)
        axes.imshow(tint, interpolation="nearest")
    axes.set_title(mark.name.replace("_", " "), fontsize=9)
    _bare(axes)


def grid_phase(frame: Frame) -> tuple[int, int]:
    """Row and column, 0 to 7, where the blocks of a frame's compression begin."""
    meter = GridMeter()
    for region in regions(frame):
        meter.add(region)
    return meter.place


def _beneath(axes: Any, fine: F64) -> None:
    """The crop without its coarse part."""
    limit = 2.5 * float(fine.std()) or 1.0
    axes.imshow(fine, cmap="gray", vmin=-limit, vmax=limit, interpolation="nearest")
    _bare(axes)


def _ticks(axes: Any, y: int, x: int) -> None:
    """A tick where each block begins."""
    axes.set_xticks(np.arange(x, CROP, 8) - 0.5)
    axes.set_yticks(np.arange(y, CROP, 8) - 0.5)
    axes.set_xticklabels([])
    axes.set_yticklabels([])


def _bare(axes: Any) -> None:
    axes.set_xticks([])
    axes.set_yticks([])
    axes.grid(False)
    for side in axes.spines.values():
        side.set_visible(False)
