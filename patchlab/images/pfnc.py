"""Raw buffers of machine-vision cameras, by their GenICam PFNC names.

A buffer is a file that ends in ``.raw``: pixels and nothing else. What they are stands in
a sidecar, a TOML file beside it: ``NAME.raw.toml`` for one buffer, ``raw.toml`` for every
buffer of its folder::

    format = "Mono12p"   # a name of FORMATS
    width = 1936
    height = 1216
    offset = 0           # bytes before the first pixel; may be left out
    row_bytes = 2904     # bytes from row to row, where rows are padded; may be left out

Layouts (GenICam Pixel Format Naming Convention, and the camera makers' manuals for the two
``Packed`` ones of GigE Vision): names ending in a number are one byte, or two with the low
byte first and the code in the low bits; ``p`` is a stream of bits, lowest first; ``Packed``
holds two pixels in three bytes, the low bits of both in the middle one.
"""

from __future__ import annotations

import math
import tomllib
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError, UsageError
from patchlab.images.address import Place

SUFFIX = ".raw"
FOLDER_SIDECAR = "raw.toml"
PATTERNS = ("GR", "RG", "GB", "BG")


@dataclass(frozen=True)
class RawFormat:
    """How a PFNC format lays its pixels out.

    Parameters
    ----------
    name : PFNC name
    bits : of a pixel's code
    room : bits that a pixel takes
    packing : "plain", "stream" or "packed"
    pattern : colours of the first two pixels of row 0, or "" for monochrome
    """

    name: str
    bits: int
    room: int
    packing: str
    pattern: str = ""

    def row_bytes(self, pixels: int) -> int:
        """Bytes that a run of pixels takes."""
        return math.ceil(pixels * self.room / 8)


def _formats() -> dict[str, RawFormat]:
    found = []
    for family, pattern in (("Mono", ""), *((f"Bayer{p}", p) for p in PATTERNS)):
        found += [
            RawFormat(f"{family}{bits}", bits, 8 if bits == 8 else 16, "plain", pattern)
            for bits in (8, 10, 12, 16)
        ]
        for bits in (10, 12):
            found.append(RawFormat(f"{family}{bits}p", bits, bits, "stream", pattern))
            found.append(RawFormat(f"{family}{bits}Packed", bits, 12, "packed", pattern))
    return {f.name: f for f in found}


FORMATS = _formats()
"""Every format that is read, by its PFNC name."""


def raw_format(name: str) -> RawFormat:
    """Look up a raw format.

    Raises
    ------
    UsageError : an unknown name, with the nearest known ones.
    """
    import difflib

    if name not in FORMATS:
        near = difflib.get_close_matches(name, FORMATS, n=3) or ["Mono8", "Mono12p", "BayerRG8"]
        raise UsageError(f"unknown raw format {name!r}", remedy=f"known are {', '.join(near)}, ...")
    return FORMATS[name]


@dataclass(frozen=True)
class RawLayout:
    """What a raw buffer holds.

    Parameters
    ----------
    format : PFNC name
    width, height : pixels
    offset : bytes before the first pixel
    row_bytes : bytes from row to row; None where rows follow without a gap

    Raises
    ------
    UsageError : an unknown format, or a number out of range.
    """

    format: str
    width: int
    height: int
    offset: int = 0
    row_bytes: int | None = None

    def __post_init__(self) -> None:
        form = raw_format(self.format)
        if self.width < 1 or self.height < 1:
            raise UsageError(f"a raw buffer of {self.width} x {self.height} pixels holds nothing")
        if self.offset < 0:
            raise UsageError("the offset of a raw buffer must not be negative")
        if self.row_bytes is not None and self.row_bytes < form.row_bytes(self.width):
            raise UsageError(
                f"{self.row_bytes} bytes are too few for a row of {self.width} {form.name} pixels"
            )

    @property
    def size(self) -> int:
        """Bytes of the whole file (the last row's padding may be missing)."""
        form = FORMATS[self.format]
        if self.row_bytes is None:
            return self.offset + form.row_bytes(self.width * self.height)
        return self.offset + self.row_bytes * (self.height - 1) + form.row_bytes(self.width)


def sidecar(path: Place) -> RawLayout | None:
    """The layout beside a raw buffer, or None where there is no sidecar.

    Raises
    ------
    InputError : the sidecar cannot be read, or lacks or misspells something.
    """
    for beside in (path.with_name(path.name + ".toml"), path.with_name(FOLDER_SIDECAR)):
        if beside.is_file():
            return _layout(beside)
    return None


def _layout(beside: Place) -> RawLayout:
    known = {"format": str, "width": int, "height": int, "offset": int, "row_bytes": int}
    try:
        found: dict[str, Any] = tomllib.loads(beside.read_bytes().decode("utf-8"))
        for key, value in found.items():
            if key not in known:
                raise UsageError(f"unknown key {key!r}", remedy=f"known are {', '.join(known)}")
            if type(value) is not known[key]:
                raise UsageError(f"{key} takes a value of type {known[key].__name__}")
        missing = [key for key in ("format", "width", "height") if key not in found]
        if missing:
            raise UsageError(f"{missing[0]} is missing")
        return RawLayout(**found)
    except OSError as error:
        raise InputError(f"{beside.name} cannot be read ({error.strerror})") from None
    except ValueError as error:  # TOML's and Unicode's errors are both of this kind
        raise InputError(f"{beside.name} is not valid TOML: {error}") from None
    except UsageError as error:
        raise InputError(f"{beside.name}: {error.what}", remedy=error.remedy) from None


# ---------------------------------------------------------------- bytes to codes


def unpack(data: bytes, layout: RawLayout) -> NDArray[Any]:
    """Pixel codes of a raw buffer.

    Parameters
    ----------
    data : the whole file
    layout : RawLayout

    Returns
    -------
    ndarray (height, width): uint8 for 8 bits, else uint16

    Raises
    ------
    InputError : the file is not of the size that the layout says.

    Examples
    --------
    >>> unpack(bytes.fromhex("ab3c12"), RawLayout("Mono12Packed", 2, 1)).tolist()
    [[2748, 291]]
    >>> unpack(bytes.fromhex("bc3a12"), RawLayout("Mono12p", 2, 1)).tolist()
    [[2748, 291]]
    """
    form = FORMATS[layout.format]
    padded = layout.size if layout.row_bytes is None else (
        layout.offset + layout.row_bytes * layout.height
    )  # fmt: skip
    if len(data) not in (layout.size, padded):
        raise InputError(
            f"the raw buffer holds {len(data)} bytes; {layout.width} x {layout.height} pixels of "
            f"{form.name} take {layout.size}",
            remedy="check format, width and height, and the sidecar's offset and row_bytes",
        )
    body = np.frombuffer(data, np.uint8)[layout.offset :]
    if layout.row_bytes is None:
        codes = _codes(body, form, layout.width * layout.height)
        return codes.reshape(layout.height, layout.width)
    rows = np.pad(body, (0, layout.row_bytes * layout.height - body.size))
    rows = rows.reshape(layout.height, layout.row_bytes)[:, : form.row_bytes(layout.width)]
    return np.stack([_codes(row, form, layout.width) for row in rows])


def _codes(body: NDArray[np.uint8], form: RawFormat, count: int) -> NDArray[Any]:
    """The first ``count`` pixels of some bytes."""
    if form.packing == "plain":
        stored = np.dtype("u1" if form.room == 8 else "<u2")
        return np.frombuffer(body.tobytes(), stored, count).astype(stored.newbyteorder("="))
    if form.packing == "packed":
        return _packed(body, form.bits)[:count]
    return _stream(body, form.bits)[:count]


def _packed(body: NDArray[np.uint8], bits: int) -> NDArray[np.uint16]:
    """GigE Vision's two pixels in three bytes."""
    three = np.pad(body, (0, -body.size % 3)).reshape(-1, 3).astype(np.uint16)
    low = bits - 8
    mask = (1 << low) - 1
    out = np.empty((len(three), 2), np.uint16)
    # an odd last pixel has its high bits in the first byte, its low bits in the second
    out[:, 0] = three[:, 0] << low | three[:, 1] & mask
    out[:, 1] = three[:, 2] << low | three[:, 1] >> 4 & mask
    return out.ravel()


def _stream(body: NDArray[np.uint8], bits: int) -> NDArray[np.uint16]:
    """A stream of bits, lowest first: 4 pixels of 10 bits in 5 bytes, 2 of 12 in 3."""
    group = math.lcm(bits, 8) // 8
    rows = np.pad(body, (0, -body.size % group)).reshape(-1, group)
    word = np.zeros(len(rows), np.uint64)
    for k in range(group):
        word |= rows[:, k].astype(np.uint64) << np.uint64(8 * k)
    shifts = np.arange(0, 8 * group, bits, dtype=np.uint64)
    mask = np.uint64((1 << bits) - 1)
    return np.asarray((word[:, None] >> shifts & mask).astype(np.uint16)).ravel()
