"""Mosaics of kernels and pictures of edges: arrays to PNG, no axes, nothing resampled.

Tiles of one mosaic share a grey scale that is symmetric about zero: mid-grey is
zero, and every tile is scaled to unit norm first, so shapes can be compared. Colour
tiles share one scale for red, green and blue, so what is grey in them has no colour.
"""

from __future__ import annotations

import io
from collections.abc import Sequence
from typing import Any

import numpy as np
from numpy.typing import NDArray
from PIL import Image, ImageDraw, ImageFont

from patchlab.conventions import rgb_weights
from patchlab.types import Bank, EdgeMap, Frame

Bytes = NDArray[np.uint8]
PAPER, INK, FAINT = (255, 255, 255), (31, 41, 51), (120, 130, 140)
VERDICT = {"good": (15, 118, 110), "poor": (180, 83, 9), "failed": (185, 28, 28)}
GAP, LABEL = 8, 13


def png(image: Image.Image) -> bytes:
    """An image as the bytes of a PNG file."""
    buffer = io.BytesIO()
    image.save(buffer, "PNG", optimize=True)
    return buffer.getvalue()


def grey(tile: NDArray[Any], limit: float, zoom: int) -> Bytes:
    """A kernel as grey values: -limit black, 0 mid-grey, limit white; pixels repeated.

    A colour kernel (h, w, 3) as red, green and blue on the same scale.
    """
    scaled = np.clip(tile / (limit or 1.0), -1, 1) * 127.5 + 127.5
    return np.repeat(np.repeat(np.rint(scaled).astype(np.uint8), zoom, 0), zoom, 1)


def _unit(tiles: NDArray[Any]) -> NDArray[Any]:
    norms = np.sqrt((tiles**2).sum(axis=tuple(range(1, tiles.ndim)), keepdims=True))
    return np.asarray(tiles / np.where(norms > 0, norms, 1.0))


def limit_of(tiles: NDArray[Any]) -> float:
    """The shared end of the grey scale: what 99.7 % of the absolute values stay below."""
    return float(np.quantile(np.abs(tiles), 0.997)) if tiles.size else 1.0


def mosaic(
    columns: Sequence[NDArray[Any]],
    labels: Sequence[str],
    *,
    verdicts: Sequence[str] = (),
    across: int = 8,
    zoom: int = 4,
    as_is: bool = False,
) -> bytes:
    """Draw cells of tiles side by side (an atom beside its fit), numbered.

    Parameters
    ----------
    columns : arrays (k, h, w) or (k, h, w, 3); cell i shows tile i of each, left to right
    labels : k short texts above the cells
    verdicts : k of good, poor, failed: the colour of the line under each cell
    across : cells in a row
    zoom : picture pixels for a tap
    as_is : the tiles are on one scale already; otherwise each is brought to unit norm

    Returns
    -------
    bytes of a PNG
    """
    scaled = [np.asarray(tiles, dtype=np.float64) for tiles in columns]
    scaled = scaled if as_is else [_unit(tiles) for tiles in scaled]
    limit = max(limit_of(tiles) for tiles in scaled)
    k, h, w = scaled[0].shape[:3]
    cell_w, cell_h = len(scaled) * (w * zoom + 2) - 2, h * zoom
    across = min(across, k)
    rows = -(-k // across)
    sheet = Image.new(
        "RGB",
        (across * (cell_w + 2 * GAP), rows * (cell_h + LABEL + 2 * GAP)),
        PAPER,
    )
    draw, font = ImageDraw.Draw(sheet), ImageFont.load_default(10)
    for i in range(k):
        x = (i % across) * (cell_w + 2 * GAP) + GAP
        y = (i // across) * (cell_h + LABEL + 2 * GAP) + GAP
        draw.text((x, y - 2), labels[i], FAINT, font=font)
        for c, tiles in enumerate(scaled):
            tile = Image.fromarray(grey(tiles[i], limit, zoom))
            sheet.paste(tile, (x + c * (w * zoom + 2), y + LABEL))
        if verdicts:
            foot = y + LABEL + cell_h + 1
            draw.rectangle((x, foot, x + cell_w - 1, foot + 1), VERDICT[verdicts[i]])
    return png(sheet)


def bank_sheet(bank: Bank, zoom: int = 5, taps: NDArray[Any] | None = None) -> bytes:
    """Each kernel of a bank above the magnitude of its spectrum, one row a scale and parity.

    ``taps`` are (n, h, h, 3) in red, green and blue, to show a colour bank's kernels.
    """
    taps = bank.taps.astype(np.float64) if taps is None else taps
    groups: dict[tuple[Any, str], list[int]] = {}
    for i, kernel in enumerate(bank.kernels):
        groups.setdefault((kernel.scale, kernel.parity), []).append(i)
    size = bank.size
    zoom = max(2, min(zoom, 72 // size))
    side = size * zoom
    across = min(max(len(members) for members in groups.values()), 12)
    lines = [
        members[i : i + across]
        for members in groups.values()
        for i in range(0, len(members), across)
    ]
    height = 2 * side + LABEL + 3 * GAP
    sheet = Image.new("RGB", (across * (side + GAP) + GAP, len(lines) * height), PAPER)
    draw, font = ImageDraw.Draw(sheet), ImageFont.load_default(10)
    for row, members in enumerate(lines):
        limit = float(np.abs(taps[members]).max())
        for column, i in enumerate(members):
            x, y = GAP + column * (side + GAP), row * height + GAP
            name = bank.kernels[i].name  # the tile itself shows which plane it is of
            label = name[-10:].lstrip("_") if bank.planes > 1 else name
            draw.text((x, y - 2), label, FAINT, font=font)
            sheet.paste(Image.fromarray(grey(taps[i], limit, zoom)), (x, y + LABEL))
            sheet.paste(_spectrum(taps[i], side), (x, y + LABEL + side + 3))
    return png(sheet)


def _spectrum(kernel: NDArray[Any], side: int) -> Image.Image:
    planes = kernel.reshape(*kernel.shape[:2], -1)
    whole = np.linalg.norm(np.fft.fft2(planes, (side, side), axes=(0, 1)), axis=2)
    magnitude = np.fft.fftshift(whole)
    shown = np.rint(255 * magnitude / (magnitude.max() or 1.0)).astype(np.uint8)
    return Image.fromarray(255 - shown)


def preview(frame: Frame) -> Bytes:
    """A frame's codes as an 8-bit picture for the eye: square-root tone, 99.8 % stretch.

    (h, w), or (h, w, 3) of colours.
    """
    form = frame.contract.format
    codes = frame.pixels
    if form.planes > 1:
        codes = form.split(codes).astype(np.float64) @ rgb_weights(form.colours).T
    light = np.sqrt(frame.contract.light(codes))
    low, high = np.quantile(light, (0.002, 0.998))
    span = high - low or 1.0
    return np.asarray(np.rint(255 * np.clip((light - low) / span, 0, 1)), dtype=np.uint8)


def wheel(count: int) -> NDArray[np.uint8]:
    """A colour for each of ``count`` orientations: hue runs once round over 180 degrees."""
    turn = 2 * np.pi * np.arange(count)[:, None] / max(count, 1)
    waves = 0.5 + 0.5 * np.cos(turn - np.array([0.0, 2.1, 4.2]))
    return np.asarray(np.rint(70 + 165 * waves), dtype=np.uint8)


def overlay(frame: Frame, found: EdgeMap, orientations: int) -> Image.Image:
    """The picture, dimmed, with its edge elements coloured by the direction of their normal."""
    base = (0.35 * preview(frame) + 20).astype(np.uint8)
    colour = np.stack([base] * 3, axis=-1) if base.ndim == 2 else base
    colour[found.edges] = wheel(orientations)[found.orientation[found.edges] % orientations]
    return Image.fromarray(colour)


def edge_pictures(frame: Frame, found: EdgeMap, orientations: int) -> dict[str, bytes]:
    """The PNG files of one detected picture: strength, orientation, edges and overlay.

    ``strength`` is scaled so that 4 times the threshold is white; ``orientation`` holds
    the winner's index; ``edges`` is 255 on an element and 0 elsewhere.
    """
    strength = np.clip(found.strength / (4 * found.threshold or 1.0), 0, 1)
    return {
        "strength": png(Image.fromarray(np.rint(255 * strength).astype(np.uint8))),
        "orientation": png(Image.fromarray(found.orientation)),
        "edges": png(Image.fromarray(np.where(found.edges, 255, 0).astype(np.uint8))),
        "overlay": png(overlay(frame, found, orientations)),
    }


def before_and_after(frame: Frame, found: EdgeMap, orientations: int) -> bytes:
    """A frame and its edges side by side."""
    left = Image.fromarray(preview(frame)).convert("RGB")
    right = overlay(frame, found, orientations)
    sheet = Image.new("RGB", (left.width * 2 + GAP, left.height), PAPER)
    sheet.paste(left, (0, 0))
    sheet.paste(right, (left.width + GAP, 0))
    if sheet.width > 1600:
        sheet = sheet.resize(
            (1600, round(sheet.height * 1600 / sheet.width)), Image.Resampling.LANCZOS
        )
    return png(sheet)
