"""Pictures with colours: which planes are kept, and one plane of a picture by itself.

With ``planes="luminance"`` every picture becomes one plane. With ``planes="colour"`` an ordinary
colour picture keeps its three samples a pixel, and of a Bayer sensor each pixel is a cell of
2 x 2 samples: nothing is interpolated, and the place in the cell is a plane of its own, so what
is learned keeps the phase of the mosaic.
"""

from __future__ import annotations

from dataclasses import replace
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import PixelFormat, pixel_format
from patchlab.errors import InputError
from patchlab.types import Frame

Planes = Literal["luminance", "colour"]
PLANES: tuple[Planes, ...] = ("luminance", "colour")


def colour_format(mono: PixelFormat, shape: tuple[int, ...], mosaic: str, asked: str) -> str:
    """Name of the format that a picture keeps its colours in.

    Parameters
    ----------
    mono : of one sample: its depth
    shape : of the decoded samples
    mosaic : Bayer pattern by its first two pixels, or ""
    asked : name of a format that was asked for, or ""

    Raises
    ------
    InputError : a grey picture, floats, or another kind than was asked for.
    """
    if not mono.integer:
        raise InputError(
            "colour needs samples that are whole numbers, not floats",
            remedy="save 8 or 16 bits, or take luminance",
        )
    if not mosaic and len(shape) < 3:
        raise InputError("the picture has no colours", remedy="take luminance for grey pictures")
    family = f"Bayer{mosaic}" if mosaic else "BGR" if asked.startswith("BGR") else "RGB"
    name = f"{family}{mono.bits}"
    if asked and pixel_format(asked).planes > 1 and asked != name:
        raise InputError(f"the file holds {name} pixels, which cannot be {asked}")
    return name


def stored(samples: NDArray[Any], form: PixelFormat) -> NDArray[Any]:
    """Decoded samples, (h, w, 3) in the order R, G, B or a Bayer mosaic, as the format has them."""
    if form.interleaved:
        order = ["RGB".index(letter) for letter in form.colours]
        return samples if order == [0, 1, 2] else np.ascontiguousarray(samples[..., order])
    h, w = (side // form.cell * form.cell for side in samples.shape)
    return samples[:h, :w]


def of_pixels(mask: NDArray[np.bool_], form: PixelFormat) -> NDArray[np.bool_]:
    """A mask of samples (rows, columns) as a mask of pixels: True where any sample is."""
    if form.cell == 1:
        return mask
    cells = form.split(mask[: mask.shape[0] // form.cell * form.cell])
    return np.asarray(cells.any(axis=2))


def one_plane(frame: Frame, sample: int | None = None) -> Frame:
    """One sample of every pixel as a monochrome frame, to measure the camera on.

    Parameters
    ----------
    frame : Frame; a monochrome one is returned as it is
    sample : which; None takes the first green one
    """
    form = frame.contract.format
    if form.planes == 1:
        return frame
    place = form.colours.index("G") if sample is None else sample
    pixels = np.ascontiguousarray(form.split(frame.pixels)[..., place])
    return replace(
        frame, pixels=pixels, contract=replace(frame.contract, pixels=f"Mono{form.bits}")
    )
