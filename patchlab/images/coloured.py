"""Made pictures with colours: leaves with invented glazes, seen by a colour camera or a mosaic.

A scene's leaves keep their place and their shading; each gets a glaze, which multiplies what it
reflects of red, green and blue. Most glazes are nearly grey and few are strong, as surfaces are.
The three pictures are exposed by the same camera, sample by sample, with noise of their own.
"""

from __future__ import annotations

import math
from dataclasses import replace
from pathlib import Path

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import pixel_format, rng
from patchlab.errors import UsageError
from patchlab.images.canvas import Scene, blur, grain_tile, paint
from patchlab.images.demo import LIGHTS, OMBREL_K2, SHAPE, VIEWS, tile_works
from patchlab.images.formats import png_bytes
from patchlab.images.pfnc import FOLDER_SIDECAR
from patchlab.images.scenes import Camera
from patchlab.progress import Progress, silent
from patchlab.store import write_file
from patchlab.types import F64, Frame, InputContract

STRONGEST = 0.7
"""Largest relative change of a sample by a glaze."""


def glazed(scene: Scene, strength: float = STRONGEST) -> tuple[Scene, Scene, Scene]:
    """The scene as it is in red, in green and in blue light.

    Parameters
    ----------
    scene : Scene
    strength : of the strongest glaze, 0 to 1; 0 leaves all surfaces grey

    Returns
    -------
    three Scene of the same shapes
    """
    if not 0 <= strength <= 1:
        raise UsageError(f"a glaze of strength {strength:g} is outside 0 to 1")
    draw = rng(scene.seed, "glazes")
    count = len(scene.leaves)
    turn = 2 * math.pi * draw.random(count)
    much = strength * draw.random(count) ** 2
    scenes = []
    for colour in range(3):
        tint = 1 + much * np.cos(turn - 2 * math.pi * colour / 3)
        leaves = tuple(
            replace(leaf, paint=replace(leaf.paint, tone=min(leaf.paint.tone * float(t), 1.0)))
            for leaf, t in zip(scene.leaves, tint, strict=True)
        )
        scenes.append(replace(scene, leaves=leaves))
    return scenes[0], scenes[1], scenes[2]


def expose_colour(
    scene: Scene,
    camera: Camera,
    *,
    light: float,
    pixels: str = "RGB8",
    gains: tuple[float, float, float] = (1.0, 1.0, 1.0),
    strength: float = STRONGEST,
    seed: int = 0,
    path: str = "scene",
) -> tuple[Frame, F64]:
    """Take a colour picture of a scene.

    Parameters
    ----------
    scene : Scene
    camera : Camera of the pixels' depth
    light : electrons that a reflectance of 1 gives in every colour
    pixels : RGB8 to 16: three exposures, one a colour; BayerRG8 to 16: one sample a place
    gains : a white balance by amplifying red, green and blue (and their noise)
    strength : as :func:`glazed`
    seed : of the noise
    path : the frame's name

    Returns
    -------
    Frame, and float64 (h, w, 3), electrons expected at every place in red, green and blue

    Raises
    ------
    UsageError : pixels without colours, or of another depth than the camera's.
    """
    form = pixel_format(pixels)
    if form.planes == 1 or form.bits != camera.bits:
        raise UsageError(f"a camera of {camera.bits} bits gives no {pixels} pixels")
    margin = math.ceil(4.5 * camera.blur_sigma_px) + 1
    grain = grain_tile(scene.seed)
    lit = (blur(paint(s, margin, grain).level, camera.blur_sigma_px, margin)
           for s in glazed(scene, strength))  # fmt: skip
    clean = light * np.stack(list(lit), axis=2)
    samples = [_sample(clean, camera, form.colours, c, gains, seed) for c in range(form.planes)]
    if form.interleaved:
        codes = np.stack(samples, axis=2)
    else:
        codes = np.zeros(clean.shape[:2], form.dtype)
        for c, plane in enumerate(samples):
            row, column = divmod(c, form.cell)
            codes[row :: form.cell, column :: form.cell] = plane[
                row :: form.cell, column :: form.cell
            ]
    own = camera.contract
    contract = InputContract(pixels, own.black, own.white, own.transfer)
    return Frame(path, codes, contract, notes=("made by the scene maker",)), clean


def _sample(
    clean: F64,
    camera: Camera,
    colours: str,
    sample: int,
    gains: tuple[float, float, float],
    seed: int,
) -> NDArray[np.generic]:
    """Codes of one sample everywhere, amplified by its colour's gain."""
    place = "RGB".index(colours[sample])
    amplified = replace(
        camera,
        gain=camera.gain * gains[place],
        read_noise=camera.read_noise,
        full_well=camera.full_well / gains[place],
    )
    draw = rng(seed, "colour", str(sample))
    return amplified.capture(clean[..., place] / gains[place], draw)


# ---------------------------------------------------------------- frames to try colour on

NOTE = """\
# Sample images with colours

The {count} pictures in this folder are invented: rendered by patchlab's scene maker, not taken
by any camera. Camera "Ombrel K2" and the place, "Tessary tile works, Port Hallan", do not exist.
Its surfaces carry invented glazes.

- {width} x {height} samples, 8 bit, linear: {how}
- gain {camera.gain} DN per electron, read noise {camera.read_noise:g} electrons, blur
  {camera.blur_sigma_px} pixels (one standard deviation, pixel aperture included), black level 0

They are dedicated to the public domain under CC0 1.0; use them for anything.

    patchlab run THIS_FOLDER -o OUT {options}
"""
WAYS = {
    "RGB8": ("red, green and blue in every pixel", "--planes colour --transfer linear"),
    "BayerRG8": ("one sample a place, red and green over green and blue", "--planes colour"),
}
"""Pixels of frames to try colour on, with what a reader of them needs to know."""


def make_colour_images(
    folder: Path, count: int = 24, pixels: str = "RGB8", *, progress: Progress = silent
) -> list[Path]:
    """Write frames of the invented tile works, glazed, and the note that says what they are.

    Parameters
    ----------
    folder : where; files of the same names are replaced
    count : frames
    pixels : one of :data:`WAYS`; a mosaic is written as raw buffers with a sidecar
    progress : as everywhere

    Returns
    -------
    list of Path : the pictures

    Raises
    ------
    UsageError : other pixels.
    """
    if pixels not in WAYS:
        raise UsageError(f"no frames of {pixels} pixels", remedy=f"choose of {', '.join(WAYS)}")
    written, views = [], list(VIEWS)
    height, width = SHAPE
    for k in range(count):
        view, number = views[k % len(views)], k // len(views) + 1
        light = LIGHTS[(k + number) % len(LIGHTS)]
        scene = tile_works(view, number)
        frame, _ = expose_colour(scene, OMBREL_K2, light=light, pixels=pixels, seed=k)
        interleaved = frame.contract.format.interleaved
        data = png_bytes(frame.pixels) if interleaved else frame.pixels.tobytes()
        path = folder / f"{view}-{number:02d}.{'png' if interleaved else 'raw'}"
        write_file(path, data)
        written.append(path)
        progress("rendering", k + 1, count)
    if pixels != "RGB8":
        layout = f'format = "{pixels}"\nwidth = {width}\nheight = {height}\n'
        write_file(folder / FOLDER_SIDECAR, layout.encode())
    how, options = WAYS[pixels]
    note = NOTE.format(
        count=count, width=width, height=height, camera=OMBREL_K2, how=how, options=options
    )
    write_file(folder / "NOTE.md", note.encode())
    return written
