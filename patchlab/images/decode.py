"""The only door to picture codecs: bytes in, frames out.

Files are read in Python and their bytes handed to the decoders, so odd paths do
not matter. The format is told by the content, not by the name. A file that is
truncated or corrupt is refused with a plain reason; nothing is ever filled in.
"""

from __future__ import annotations

import contextlib
import io
import logging
import re
import struct
import threading
import warnings
from collections.abc import Callable, Iterator
from pathlib import PurePosixPath
from typing import Any

import numpy as np
import PIL
import tifffile
from numpy.typing import NDArray
from PIL import Image, ImageFile

from patchlab.errors import InputError, PatchlabError
from patchlab.images import extras, formats, pfnc
from patchlab.images.develop import Picture, ReadOptions, check_size, develop
from patchlab.store import sha256
from patchlab.types import Frame

Reader = Callable[[bytes, ReadOptions], list[Picture]]

SUFFIXES = frozenset(
    (
        ".png",
        ".jpg",
        ".jpeg",
        ".jpe",
        ".tif",
        ".tiff",
        ".webp",
        ".bmp",
        ".pgm",
        ".ppm",
        ".pnm",
        ".npy",
        pfnc.SUFFIX,
        *extras.RAW_SUFFIXES,
        *extras.VIDEO_SUFFIXES,
    )
)
"""File name endings (lower case) that are taken for pictures."""


def decode(data: bytes, path: str, options: ReadOptions | None = None) -> tuple[Frame, ...]:
    """Decode one file.

    Parameters
    ----------
    data : the file's bytes
    path : the name its frames carry, relative, with forward slashes; page k of several is
        ``path#k``
    options : ReadOptions

    Returns
    -------
    tuple of Frame, one for each page

    Raises
    ------
    InputError : empty, truncated, corrupt, of an unknown format, or above the pixel limit.
    """
    options = options or ReadOptions()
    try:
        pictures = _read(data, path, options)
        names = [path] if len(pictures) == 1 else [f"{path}#{k}" for k in range(len(pictures))]
        digest = sha256(data)
        return tuple(
            develop(p, name, digest, options) for p, name in zip(pictures, names, strict=True)
        )
    except PatchlabError as error:
        raise InputError(error.what, where=path, remedy=error.remedy) from None


def _read(data: bytes, path: str, options: ReadOptions) -> list[Picture]:
    try:
        with _quiet():
            return _reader(data, path)(data, options)
    except PatchlabError:
        raise
    except MemoryError:
        raise InputError("the picture does not fit into memory") from None
    except Exception as error:  # a codec may raise anything on damaged bytes
        raise InputError(_plain(error)) from None


def decoder_versions() -> dict[str, str]:
    """Versions of the decoders: two of them may read one JPEG differently."""
    return {"pillow": PIL.__version__, "tifffile": tifffile.__version__}


def _reader(data: bytes, path: str) -> Reader:
    """The reader for some bytes: by their first few, or by name where pixels stand alone."""
    if not data:
        raise InputError("the file is empty")
    suffix = PurePosixPath(path).suffix.lower()
    if suffix == pfnc.SUFFIX:
        return _read_raw
    if suffix in extras.RAW_SUFFIXES:
        return extras.read_camera_raw
    if suffix in extras.VIDEO_SUFFIXES:
        return extras.read_video
    for magic, reader in _MAGIC:
        if magic.match(data):
            return reader
    raise InputError("this is not a picture of a known format")


def _plain(error: Exception) -> str:
    text = re.sub(r"<[^>]*>|\s+", " ", str(error)).strip()
    if "truncated" in text.lower():
        return "the file is truncated"
    return f"the file is corrupt ({text or type(error).__name__})"


_LOCK = threading.Lock()


@contextlib.contextmanager
def _quiet() -> Iterator[None]:
    """Decoders on our terms: no warnings, no log lines, no filling in, our own pixel limit."""
    log = logging.getLogger("tifffile")
    with _LOCK, warnings.catch_warnings():
        warnings.simplefilter("ignore")
        kept = Image.MAX_IMAGE_PIXELS, ImageFile.LOAD_TRUNCATED_IMAGES, log.disabled
        try:
            Image.MAX_IMAGE_PIXELS, ImageFile.LOAD_TRUNCATED_IMAGES, log.disabled = (
                None,
                False,
                True,
            )
            yield
        finally:
            Image.MAX_IMAGE_PIXELS, ImageFile.LOAD_TRUNCATED_IMAGES, log.disabled = kept


# ---------------------------------------------------------------- Pillow: PNG, JPEG, WebP, BMP


def _open(data: bytes, kind: str, options: ReadOptions) -> Image.Image:
    try:
        image = Image.open(io.BytesIO(data), formats=[kind])
    except PIL.UnidentifiedImageError:
        raise InputError("the file is truncated or corrupt") from None
    check_size(*image.size, options)
    return image


def _orientation(image: Image.Image) -> int:
    value = image.getexif().get(274, 1)
    return value if isinstance(value, int) else 1


def _picture(image: Image.Image, *, coded: bool = False) -> Picture:
    """A Pillow image, whatever its mode, as samples."""
    orientation = _orientation(image)  # before loading: a file may carry it behind the pixels
    image.load()
    orientation = orientation if orientation != 1 else _orientation(image)
    mode, notes = image.mode, []
    if mode == "1":
        raise InputError("1-bit pictures are not photographs")
    if mode in ("I;16", "I;16B", "I;16L", "I"):
        return _deep_grey(image, orientation)
    if mode in ("P", "PA"):
        notes.append("palette expanded")
        grey = _grey_palette(image)
        image = image.convert("RGBA")
        image = image.convert("LA") if grey else image
    elif "transparency" in image.info and mode in ("L", "RGB"):
        image = image.convert(mode + "A")
    elif mode not in ("L", "LA", "RGB", "RGBA", "CMYK", "F"):
        notes.append(f"{mode} converted to RGB")
        image = image.convert("RGB")
    array = np.asarray(image)
    if image.mode == "CMYK":
        notes.append("CMYK converted without a colour profile")
        array = _from_cmyk(array)
    hidden = None
    if image.mode in ("LA", "RGBA"):
        array, hidden = array[..., :-1], array[..., -1] == 0
        hidden = hidden if hidden.any() else None
        array = array[..., 0] if image.mode == "LA" else array
    top = None if array.dtype.kind == "f" else 255
    return Picture(array, top, hidden, orientation, coded, tuple(notes))


def _deep_grey(image: Image.Image, orientation: int) -> Picture:
    array = np.asarray(image)
    if array.min() < 0 or array.max() > 65535:
        raise InputError("32-bit integer pixels are not supported")
    key = image.info.get("transparency")
    hidden = array == key if isinstance(key, int) else None
    return Picture(array.astype(np.uint16), 65535, hidden, orientation)


def _grey_palette(image: Image.Image) -> bool:
    entries = np.array(image.getpalette("RGB") or [], dtype=np.uint8).reshape(-1, 3)
    return bool((entries == entries[:, :1]).all())


def _from_cmyk(array: NDArray[Any]) -> NDArray[Any]:
    """Ink to light, (1 - c)(1 - k) for each channel, at the samples' own depth."""
    top = np.iinfo(array.dtype).max
    light = 1 - array.astype(np.float32) / top
    return np.rint(light[..., :3] * light[..., 3:4] * top).astype(array.dtype)


def _read_png(data: bytes, options: ReadOptions) -> list[Picture]:
    chunks = formats.png_chunks(data)
    image = _open(data, "PNG", options)
    if formats.png_is_deep_colour(chunks):
        return [formats.read_deep_png(chunks, _orientation(image))]
    return [_noted(_picture(image), image)]


def _read_jpeg(data: bytes, options: ReadOptions) -> list[Picture]:
    scan = data.find(b"\xff\xda")
    if scan < 0 or data.find(b"\xff\xd9", scan) < 0:
        raise InputError("the file is truncated (it has no end marker)")
    return [_picture(_open(data, "JPEG", options), coded=True)]


def _read_webp(data: bytes, options: ReadOptions) -> list[Picture]:
    if len(data) < 12 or struct.unpack_from("<I", data, 4)[0] + 8 > len(data):
        raise InputError("the file is truncated")
    image = _open(data, "WEBP", options)
    return [_noted(_picture(image, coded=True), image)]


def _read_bmp(data: bytes, options: ReadOptions) -> list[Picture]:
    if len(data) < 26 or struct.unpack_from("<I", data, 2)[0] > len(data):
        raise InputError("the file is truncated")
    return [_picture(_open(data, "BMP", options))]


def _noted(picture: Picture, image: Image.Image) -> Picture:
    if getattr(image, "n_frames", 1) == 1:
        return picture
    notes = (*picture.notes, "animation: its first picture used")
    return Picture(
        picture.samples, picture.top, picture.hidden, picture.orientation, picture.coded, notes
    )


# ---------------------------------------------------------------- raw buffers


def _read_raw(data: bytes, options: ReadOptions) -> list[Picture]:
    layout = options.raw
    if layout is None:
        raise InputError(
            "nothing says what this raw buffer holds",
            remedy="give --raw-format, --raw-width and --raw-height, or put a sidecar beside it",
        )
    check_size(layout.width, layout.height, options)
    form = pfnc.raw_format(layout.format)
    note = f"raw buffer: {form.name}, {layout.width} x {layout.height}"
    codes = pfnc.unpack(data, layout)
    return [Picture(codes, (1 << form.bits) - 1, notes=(note,), mosaic=form.pattern)]


# ---------------------------------------------------------------- TIFF


def _read_tiff(data: bytes, options: ReadOptions) -> list[Picture]:
    _check_directories(data)
    with tifffile.TiffFile(io.BytesIO(data)) as tif:
        pages = [(k, p) for k, p in enumerate(tif.pages) if not p.is_reduced]
        if not pages:
            raise InputError("the file holds no picture")
        return [_tiff_page(data, k, page, options) for k, page in pages]


_TAG_BYTES = {3: 2, 4: 4, 5: 8, 8: 2, 9: 4, 10: 8, 11: 4, 12: 8, 13: 4, 16: 8, 17: 8, 18: 8}


def _check_directories(data: bytes) -> None:
    """Follow the chain of page directories and their values (TIFF 6.0, section 2)."""
    order = "<" if data[:2] == b"II" else ">"
    big = struct.unpack_from(order + "H", data, 2)[0] == 43
    word, counter, inline, entry = ("Q", "Q", 8, 20) if big else ("I", "H", 4, 12)
    seen: set[int] = set()
    try:
        (at,) = struct.unpack_from(order + word, data, 8 if big else 4)
        while at and at not in seen:
            seen.add(at)
            (entries,) = struct.unpack_from(order + counter, data, at)
            at += struct.calcsize(order + counter)
            for tag in range(at, at + entries * entry, entry):
                _, kind, count, value = struct.unpack_from(order + "HH" + 2 * word, data, tag)
                size = _TAG_BYTES.get(kind, 1) * count
                if size > inline and value + size > len(data):
                    raise InputError("the file is truncated")
            (at,) = struct.unpack_from(order + word, data, at + entries * entry)
    except struct.error:
        raise InputError("the file is truncated") from None
    if not seen:
        raise InputError("the file holds no picture")


def _tiff_page(data: bytes, index: int, page: Any, options: ReadOptions) -> Picture:
    check_size(page.imagewidth, page.imagelength, options)
    ends = (o + n for o, n in zip(page.dataoffsets, page.databytecounts, strict=False))
    if not page.dataoffsets or max(ends) > len(data):
        raise InputError("the file is truncated")
    photometric = int(page.photometric) if page.photometric is not None else 1
    if photometric in (32803, 34892):
        raise InputError("a raw sensor mosaic is not an ordinary TIFF")
    tag = page.tags.get(274)
    orientation = int(tag.value) if tag is not None else 1
    if photometric == 6 or page.bitspersample not in (8, 16, 32, 64):
        return _tiff_by_pillow(data, index, page, options)
    try:
        array = page.asarray()
    except (ValueError, KeyError) as error:
        if "imagecodecs" not in str(error):
            raise
        return _tiff_by_pillow(data, index, page, options)
    return _tiff_samples(array, page, photometric, orientation)


def _tiff_by_pillow(data: bytes, index: int, page: Any, options: ReadOptions) -> Picture:
    """Compressions that need a codec: by Pillow, where it keeps the depth."""
    image = _open(data, "TIFF", options)
    image.seek(index)
    check_size(*image.size, options)
    deep = page.bitspersample != 8
    if deep and image.mode not in ("I;16", "I;16B", "I;16L", "F"):
        raise InputError(
            f"TIFF of {page.bitspersample}-bit samples with this compression is not supported",
            remedy="save it uncompressed, or with deflate",
        )
    return _picture(image)


def _tiff_samples(array: NDArray[Any], page: Any, photometric: int, orientation: int) -> Picture:
    """Samples of a page as tifffile gives them, by their photometric interpretation."""
    if array.dtype.str[1:] not in ("u1", "u2", "f2", "f4", "f8"):
        raise InputError(
            f"pixels of {array.dtype} are not supported", remedy="save uint16 or float32"
        )
    notes: list[str] = []
    if page.samplesperpixel > 1 and int(page.planarconfig) == 2:
        array = np.moveaxis(array, 0, -1)
    if array.ndim not in (2, 3):
        raise InputError(f"a page of shape {array.shape} is not a picture")
    top = None if array.dtype.kind == "f" else int(np.iinfo(array.dtype).max)
    colours = {2: 3, 5: 4}.get(photometric, 1)
    hidden = None
    if array.ndim == 3:
        extra = [int(e) for e in page.extrasamples]
        if extra and extra[0] in (1, 2) and array.shape[2] > colours:
            hidden = array[..., colours] == 0
        array = array[..., 0] if colours == 1 else array[..., :colours]
    if photometric == 0 and top is not None:
        notes.append("white is zero: codes inverted")
        array = top - array
    elif photometric == 3 and page.colormap is not None:
        notes.append("palette expanded")
        array = _tiff_palette(array, page.colormap)
    elif photometric == 5:
        notes.append("CMYK converted without a colour profile")
        array = _from_cmyk(array)
    return Picture(array, top, hidden, orientation, notes=tuple(notes))


def _tiff_palette(array: NDArray[Any], palette: NDArray[Any]) -> NDArray[Any]:
    """Expand 8-bit indices by a (3, 256) table of 16-bit values to 8-bit colour, or grey."""
    table = np.rint(np.asarray(palette, dtype=np.float64) / 257).astype(np.uint8)
    grey = (table[0] == table[1]).all() and (table[1] == table[2]).all()
    return table[0][array] if grey else np.moveaxis(table[:, array], 0, -1)


_MAGIC: tuple[tuple[re.Pattern[bytes], Reader], ...] = (
    (re.compile(re.escape(formats.PNG_MAGIC)), _read_png),
    (re.compile(rb"\xff\xd8\xff"), _read_jpeg),
    (re.compile(rb"RIFF.{4}WEBP", re.DOTALL), _read_webp),
    (re.compile(rb"BM"), _read_bmp),
    (re.compile(rb"II[*+]\0|MM\0[*+]"), _read_tiff),
    (re.compile(rb"P[2356][\s#]"), formats.read_pnm),
    (re.compile(rb"\x93NUMPY"), formats.read_npy),
)
