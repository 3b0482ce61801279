"""From decoded samples to one plane of camera codes.

A reader hands over a :class:`Picture`: samples as they are stored, with what the
file declares about them. :func:`develop` decides the pixel format by that
declaration (never by the largest value seen), brings colour to luminance, masks
what must not be used, turns the picture upright, and says what it did.
"""

from __future__ import annotations

import math
from dataclasses import dataclass, replace
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import (
    PIXEL_FORMATS,
    REC709,
    PixelFormat,
    pixel_format,
    srgb_decode,
    srgb_encode,
)
from patchlab.errors import InputError, UsageError
from patchlab.images.bayer import PLANES, Plane, colours, green
from patchlab.images.pfnc import RawLayout
from patchlab.images.planes import PLANES as KEPT
from patchlab.images.planes import Planes, colour_format, of_pixels, stored
from patchlab.types import F64, Frame, InputContract

_BAND = 1 << 20  # pixels converted at a time, so that colour needs no full float64 planes
_DEPTHS = tuple(f for f in PIXEL_FORMATS.values() if f.integer)


@dataclass(frozen=True)
class ReadOptions:
    """How files are read; what is None is taken from the file.

    Parameters
    ----------
    white, black : codes of full scale and of no light
    transfer : "linear", "srgb", or "auto": 8-bit colour, JPEG and WebP are sRGB-coded, all
        else is linear
    pixels : PFNC name of the depth (Mono12 for twelve bits kept in a 16-bit file)
    pixel_limit : pictures of more pixels are refused before their pixels are decoded
    raw : what ``.raw`` buffers hold; a sidecar goes before it
    bayer : what is taken of a Bayer sensor: "green", "luminance" or "mosaic"
    planes : "luminance" makes one plane of every picture; "colour" keeps its colours (then a
        Bayer sensor's pixels are its cells, and ``bayer`` has no say)
    cache : folder where a video's frames are kept once they were decoded, or None

    Raises
    ------
    UsageError : an unknown transfer or format, levels in the wrong order, a limit below 1.
    """

    white: float | None = None
    black: float | None = None
    transfer: Literal["auto", "linear", "srgb"] = "auto"
    pixels: str | None = None
    pixel_limit: float = 200e6
    raw: RawLayout | None = None
    bayer: Plane = "green"
    planes: Planes = "luminance"
    cache: str | None = None

    def __post_init__(self) -> None:
        if self.transfer not in ("auto", "linear", "srgb"):
            raise UsageError(
                f"unknown transfer {self.transfer!r}", remedy="choose auto, linear or srgb"
            )
        for name, level in (("white", self.white), ("black", self.black)):
            if level is not None and not (np.isfinite(level) and level >= 0):
                raise UsageError(f"the {name} level must be a number from 0 up, not {level}")
        if self.white is not None and self.white <= (self.black or 0.0):
            raise UsageError("the white level must exceed the black level")
        if self.bayer not in PLANES:
            raise UsageError(f"unknown plane {self.bayer!r}", remedy=f"one of {', '.join(PLANES)}")
        if self.planes not in KEPT:
            raise UsageError(f"unknown planes {self.planes!r}", remedy=f"one of {', '.join(KEPT)}")
        if not self.pixel_limit >= 1:
            raise UsageError("the pixel limit must be at least 1")
        if self.pixels is not None:
            form = pixel_format(self.pixels)
            if form.planes > 1 and self.planes == "luminance":
                raise UsageError(f"{form.name} pixels have colours", remedy="add --planes colour")
            if form.integer and max(self.white or 0, self.black or 0) > form.full_scale:
                raise UsageError(f"a level is beyond the {form.bits} bits of {form.name}")


@dataclass(frozen=True, eq=False)
class Picture:
    """Samples as a file stores them.

    Parameters
    ----------
    samples : ndarray (h, w) or (h, w, 3): uint8, uint16 or floats
    top : the largest code that the file declares; None for floats
    hidden : bool ndarray (h, w), True where the picture is fully transparent, or None
    orientation : the Exif orientation tag, 1 to 8
    coded : True when the file format says that codes follow sRGB
    notes : what the reader did
    mosaic : Bayer pattern by its first two pixels ("RG"), or "" where pixels have no colours
    black : code of no light that the file declares
    """

    samples: NDArray[Any]
    top: int | None
    hidden: NDArray[np.bool_] | None = None
    orientation: int = 1
    coded: bool = False
    notes: tuple[str, ...] = ()
    mosaic: str = ""
    black: float = 0.0


def check_size(width: int, height: int, options: ReadOptions) -> None:
    """Refuse an empty picture, or one above the pixel limit.

    Raises
    ------
    InputError : without a place; whoever knows the file's name adds it.
    """
    if width < 1 or height < 1:
        raise InputError("the picture has no pixels")
    if width * height > options.pixel_limit:
        raise InputError(
            f"{width} x {height} pixels are above the limit of {options.pixel_limit:.0f}",
            remedy="raise the pixel limit if the file is trusted",
        )


def upright(plane: NDArray[Any], orientation: int) -> NDArray[Any]:
    """Turn a (h, w) plane, or a picture (h, w, 3), so that it stands as it was seen.

    ``orientation`` is the tag of the Exif standard (JEITA CP-3451, tag 274): what the file's
    first row and first column show. Values outside 2 to 8 change nothing.
    """
    across = plane.swapaxes(0, 1)
    turned: dict[int, NDArray[Any]] = {
        2: plane[:, ::-1],
        3: plane[::-1, ::-1],
        4: plane[::-1],
        5: across,
        6: across[:, ::-1],
        7: across[::-1, ::-1],
        8: across[::-1],
    }
    return np.ascontiguousarray(turned.get(orientation, plane))


def develop(picture: Picture, path: str, digest: str, options: ReadOptions) -> Frame:
    """Make a frame of a picture.

    Parameters
    ----------
    picture : Picture
    path : the frame's name, relative, with forward slashes
    digest : SHA-256 of the file's bytes
    options : ReadOptions

    Returns
    -------
    Frame : upright codes of one depth. Unless its planes are kept, colour becomes luminance with
        the Rec. 709 weights in linear light, coded again by the same transfer and rounded to the
        same depth.

    Raises
    ------
    InputError : the file cannot hold the declared depth, or a code is beyond it.
    """
    contract = _contract(picture, options)
    kept = contract.format.planes > 1
    if picture.mosaic and not kept:
        picture = _plane(picture, options.bayer)
    notes = list(picture.notes)
    samples = picture.samples
    bad = picture.hidden
    if bad is not None:
        notes.append(f"transparent on {bad.mean():.2%} of the pixels")
    if contract.format.integer:
        notes += _depth_notes(samples, picture, options)
        if samples.ndim == 3:
            top = math.ceil(contract.white)  # a whole number: compared without conversion
            clipped = np.logical_or.reduce([samples[..., c] >= top for c in range(3)])
            if clipped.any():
                bad = clipped if bad is None else bad | clipped
                notes.append(f"a colour channel is clipped on {clipped.mean():.2%} of the pixels")
    if kept:
        plane = stored(samples, contract.format)
        bad = None if bad is None else of_pixels(bad, contract.format)
    elif samples.ndim == 3:
        notes.append("colour to luminance")
        plane = _luminance(samples, contract)
    else:
        with np.errstate(over="ignore"):  # beyond float32 is infinite, and masked as that
            plane = samples.astype(contract.format.dtype, copy=False)
    if not contract.format.integer:
        plane, bad = _finite(plane, bad, notes)
    if 2 <= picture.orientation <= 8:
        notes.append(f"orientation {picture.orientation} applied")
    if bad is not None and not bad.any():
        bad = None
    return Frame(
        path=path,
        pixels=upright(plane, picture.orientation),
        contract=contract,
        invalid=None if bad is None else upright(bad, picture.orientation),
        sha256=digest,
        notes=tuple(notes),
    )


def _plane(picture: Picture, wanted: Plane) -> Picture:
    """The plane that is taken of a mosaic; colours are brought to luminance later."""
    samples = picture.samples
    if wanted == "green":
        samples = green(samples, picture.mosaic)
    elif wanted == "luminance":
        samples = colours(samples, picture.mosaic)
    note = f"Bayer{picture.mosaic}: {wanted}"
    return replace(picture, samples=samples, notes=(*picture.notes, note))


def conform(frame: Frame, contract: InputContract) -> Frame:
    """The same frame with its codes scaled to another contract, black to black, white to white.

    Parameters
    ----------
    frame : Frame
    contract : InputContract of the same transfer

    Returns
    -------
    Frame : the frame itself when the contracts agree; codes beyond the new depth are clipped.
    """
    own = frame.contract
    if own == contract:
        return frame
    scale = (contract.white - contract.black) / (own.white - own.black)
    scaled = contract.black + (frame.pixels.astype(np.float64) - own.black) * scale
    form = contract.format
    if form.integer:
        scaled = np.clip(np.rint(scaled), 0, form.full_scale)
    return Frame(
        frame.path,
        scaled.astype(form.dtype),
        contract,
        frame.invalid,
        frame.sha256,
        (*frame.notes, f"codes scaled from {own.pixels} to {contract.pixels}"),
    )


# ---------------------------------------------------------------- depth


def _contract(picture: Picture, options: ReadOptions) -> InputContract:
    transfer = options.transfer
    if transfer == "auto":
        eight_bit = picture.top is not None and picture.top <= 255
        coded = picture.coded or (picture.samples.ndim == 3 and eight_bit)
        coded = coded and not picture.mosaic
        transfer = "srgb" if coded else "linear"
    if picture.top is None:
        form = _float_format(options)
        white = 1.0 if options.white is None else float(options.white)
    else:
        form, white = _integer_format(picture, picture.top, options)
    black = picture.black if options.black is None else float(options.black)
    if white <= black:
        raise InputError(
            f"black level {black:g} is not below its white level {white:g}",
            remedy="give --white as well",
        )
    if options.planes == "colour":
        shape, asked = picture.samples.shape, options.pixels or ""
        name = colour_format(form, shape, picture.mosaic, asked)
        return InputContract(name, black, white, transfer)
    plane = f"Bayer{picture.mosaic} {options.bayer}" if picture.mosaic else ""
    return InputContract(form.name, black, white, transfer, plane)


def _float_format(options: ReadOptions) -> PixelFormat:
    if options.pixels not in (None, "float32"):
        raise InputError(f"the file holds floats, which cannot be {options.pixels}")
    return PIXEL_FORMATS["float32"]


def _integer_format(picture: Picture, top: int, options: ReadOptions) -> tuple[PixelFormat, float]:
    room = 8 * picture.samples.dtype.itemsize
    if options.pixels is not None:
        form = pixel_format(options.pixels)
        if not form.integer or form.bits > room:
            raise InputError(f"a file of {room}-bit samples cannot be {form.name}")
        declared = float(form.full_scale)
    else:
        declared = float(top)
    white = declared if options.white is None else float(options.white)
    if options.pixels is None:
        if white >= 1 << room:
            raise InputError(f"white level {white:g} is beyond the file's {room} bits")
        form = next(f for f in _DEPTHS if white <= f.full_scale)
    largest = int(picture.samples.max())
    if largest > form.full_scale:
        raise InputError(
            f"a pixel code {largest} is beyond {form.name}", remedy="check the white level"
        )
    return form, white


def _depth_notes(samples: NDArray[Any], picture: Picture, options: ReadOptions) -> list[str]:
    """Findings about a 16-bit file whose depth nobody declared; they change nothing."""
    if picture.top != 65535 or options.white is not None or options.pixels is not None:
        return []
    largest = int(samples.max())
    for bits in (10, 12):
        if 0 < largest < 1 << bits:
            return [f"looks {bits}-bit; give --white {(1 << bits) - 1}"]
    used = int(np.bitwise_or.reduce(samples, axis=None))
    for bits, idle in ((10, 63), (12, 15)):
        if used and not used & idle:
            white = 65535 - idle
            return [f"looks {bits}-bit, shifted to the upper bits; give --white {white}"]
    return []


# ---------------------------------------------------------------- values


def _luminance(samples: NDArray[Any], contract: InputContract) -> NDArray[Any]:
    """Rec. 709 luminance in linear light, coded again by the contract's transfer."""
    form = contract.format
    if form.bits == 8 and contract.transfer == "srgb":
        return _luminance_by_tables(samples, contract)
    height, width = samples.shape[:2]
    out = np.empty((height, width), dtype=form.dtype)
    step = max(1, _BAND // width)
    tables = [w * contract.light(np.arange(form.full_scale + 1)) for w in REC709]
    span = contract.white - contract.black
    for top in range(0, height, step):
        band = samples[top : top + step]
        if form.integer:
            light: F64 = sum(t[band[..., c]] for c, t in enumerate(tables))
        elif contract.transfer == "linear":  # floats stay as they are: nothing is clipped
            out[top : top + step] = band.astype(np.float64) @ np.array(REC709)
            continue
        else:
            light = np.asarray(contract.light(band) @ np.array(REC709))
        unit = srgb_encode(light) if contract.transfer == "srgb" else light
        codes = contract.black + unit * span
        out[top : top + step] = np.rint(codes) if form.integer else codes
    return out


_ONE = 1 << 28  # full light as a whole number


def _luminance_by_tables(samples: NDArray[Any], contract: InputContract) -> NDArray[Any]:
    """The common case, 8-bit sRGB, without a power per pixel.

    Light is a whole number, so equal channels come back as the same code. Its upper bits give
    the code or the one below; one comparison with the light between the two decides.
    """
    codes = np.arange(256)
    tables = [np.rint(_ONE * w * contract.light(codes)).astype(np.int32) for w in REC709]
    middle = np.asarray(codes + 0.5 - contract.black, dtype=np.float64)
    between = srgb_decode(middle / (contract.white - contract.black))
    steps = np.rint(np.clip(_ONE * between, -_ONE, 2.0 * _ONE)).astype(np.int32)
    bins = np.arange((_ONE >> 12) + 2, dtype=np.int64) << 12
    floor = np.minimum(np.searchsorted(steps, bins, side="right"), 255).astype(np.uint8)
    flat = samples.reshape(-1, 3)
    out = np.empty(len(flat), dtype=np.uint8)
    for start in range(0, len(flat), _BAND >> 4):
        band = flat[start : start + (_BAND >> 4)]
        light = tables[0].take(band[:, 0])
        light += tables[1].take(band[:, 1])
        light += tables[2].take(band[:, 2])
        code = floor.take(light >> 12)
        out[start : start + len(band)] = code + (light >= steps.take(code))
    return out.reshape(samples.shape[:2])


def _finite(
    plane: NDArray[Any], bad: NDArray[np.bool_] | None, notes: list[str]
) -> tuple[NDArray[Any], NDArray[np.bool_] | None]:
    """Mask NaN and infinities, and put 0 in their place so that no sum downstream is spoiled."""
    wrong = ~np.isfinite(plane)
    if not wrong.any():
        return plane, bad
    notes.append(f"not a finite number on {wrong.mean():.2%} of the pixels")
    return np.where(wrong, np.float32(0), plane), wrong if bad is None else bad | wrong
