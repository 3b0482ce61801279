"""Readers that need no codec: PNM, .npy, and PNG of 16-bit colour.

PNM and ``.npy`` are read here because their declared depth must be kept as it is;
16-bit colour PNG because general readers reduce it to 8 bits without a word.
"""

from __future__ import annotations

import io
import re
import struct
import zlib
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError
from patchlab.images.develop import Picture, ReadOptions, check_size

# ---------------------------------------------------------------- PNM

_PNM_HEAD = re.compile(rb"P([2356])" + rb"(?:\s|#[^\n\r]*[\n\r])+(\d+)" * 3 + rb"\s")


def read_pnm(data: bytes, options: ReadOptions) -> list[Picture]:
    """PGM and PPM, plain or binary, one picture after another; the maxval is the depth."""
    pictures: list[Picture] = []
    while data.strip():
        picture, data = _one_pnm(data.lstrip() if pictures else data, options)
        pictures.append(picture)
    return pictures


def _one_pnm(data: bytes, options: ReadOptions) -> tuple[Picture, bytes]:
    head = _PNM_HEAD.match(data)
    if head is None:
        raise InputError("the PNM header is corrupt or of an unsupported kind")
    kind, width, height, maxval = (int(g) for g in head.groups())
    check_size(width, height, options)
    if not 0 < maxval < 65536:
        raise InputError(f"the PNM header declares a largest code of {maxval}")
    shape = (height, width, 3) if kind in (3, 6) else (height, width)
    count, body = int(np.prod(shape)), data[head.end() :]
    if kind in (2, 3):
        words, rest = body.split(), b""
        if len(words) != count:
            raise InputError("the file is truncated" if len(words) < count else "corrupt PNM")
        samples = np.array([int(w) for w in words], dtype=np.int64)
    else:
        stored = np.dtype(">u2" if maxval > 255 else "u1")
        if len(body) < count * stored.itemsize:
            raise InputError("the file is truncated")
        samples = np.frombuffer(body, stored, count)
        rest = body[count * stored.itemsize :]
    if samples.min() < 0 or samples.max() > maxval:
        raise InputError(f"a pixel code {int(samples.max())} is beyond the declared {maxval}")
    dtype = np.uint16 if maxval > 255 else np.uint8
    return Picture(samples.astype(dtype).reshape(shape), maxval), rest


# ---------------------------------------------------------------- npy

_NPY_TYPES = ("u1", "u2", "f2", "f4", "f8")


def read_npy(data: bytes, options: ReadOptions) -> list[Picture]:
    """A NumPy array (h, w), (h, w, 3 or 4), or a stack (n, h, w) or (n, h, w, 3 or 4)."""
    stream = io.BytesIO(data)
    version = np.lib.format.read_magic(stream)
    reader = (
        np.lib.format.read_array_header_1_0
        if version == (1, 0)
        else np.lib.format.read_array_header_2_0
    )
    shape, _, dtype = reader(stream)
    if dtype.hasobject or dtype.str[1:] not in _NPY_TYPES:
        raise InputError(
            f"arrays of {dtype} are not pictures", remedy="save uint8, uint16 or float32"
        )
    colour = len(shape) > 2 and shape[-1] in (3, 4)
    if len(shape) - (3 if colour else 2) not in (0, 1):
        raise InputError(f"an array of shape {shape} is not a picture")
    plane = shape[-3:-1] if colour else shape[-2:]
    check_size(plane[1], plane[0], options)
    if len(data) - stream.tell() < int(np.prod(shape, dtype=object)) * dtype.itemsize:
        raise InputError("the file is truncated")
    stream.seek(0)
    array = np.lib.format.read_array(stream, allow_pickle=False)
    pages = array[None] if array.ndim == (3 if colour else 2) else array
    return [array_picture(page) for page in pages]


def array_picture(page: NDArray[Any]) -> Picture:
    """A (h, w), (h, w, 3) or (h, w, 4) array in native byte order; a fourth plane is alpha."""
    native = page.astype(page.dtype.newbyteorder("="), copy=False)
    top = None if native.dtype.kind == "f" else int(np.iinfo(native.dtype).max)
    hidden = None
    if native.ndim == 3 and native.shape[2] == 4:
        native, hidden = native[..., :3], native[..., 3] == 0
    return Picture(native, top, hidden)


# ---------------------------------------------------------------- PNG

PNG_MAGIC = b"\x89PNG\r\n\x1a\n"


def png_chunks(data: bytes) -> list[tuple[bytes, bytes]]:
    """The chunks of a PNG, each with its checksum verified, down to the end chunk.

    Raises
    ------
    InputError : the file stops early, or a checksum differs.
    """
    chunks, at = [], len(PNG_MAGIC)
    while True:
        if at + 12 > len(data):
            raise InputError("the file is truncated")
        (length,) = struct.unpack_from(">I", data, at)
        kind, end = data[at + 4 : at + 8], at + 8 + length
        if end + 4 > len(data):
            raise InputError("the file is truncated")
        body = data[at + 8 : end]
        if zlib.crc32(kind + body) != struct.unpack_from(">I", data, end)[0]:
            raise InputError("the file is corrupt (a checksum differs)")
        chunks.append((kind, body))
        if kind == b"IEND":
            return chunks
        at = end + 4


def png_is_deep_colour(chunks: list[tuple[bytes, bytes]]) -> bool:
    """True for 16-bit colour, or 16-bit grey with alpha."""
    kind, head = chunks[0]
    return kind == b"IHDR" and len(head) == 13 and head[8] == 16 and head[9] in (2, 4, 6)


def read_deep_png(chunks: list[tuple[bytes, bytes]], orientation: int) -> Picture:
    """16-bit colour or grey with alpha, without interlacing (ISO/IEC 15948, clause 9)."""
    width, height, _, colour, _, _, interlace = struct.unpack(">IIBBBBB", chunks[0][1])
    if interlace:
        raise InputError("interlaced 16-bit colour PNG is not supported")
    planes = {2: 3, 4: 2, 6: 4}[colour]
    room = height * (1 + 2 * planes * width)
    unpacker = zlib.decompressobj()
    packed = b"".join(body for kind, body in chunks if kind == b"IDAT")
    raw = np.frombuffer(unpacker.decompress(packed, room), np.uint8)
    if raw.size < room:
        raise InputError("the file is truncated")
    rows = raw.reshape(height, -1)
    restored = unfilter(rows[:, 1:].reshape(height, width, 2 * planes), rows[:, 0])
    samples = restored.view(">u2").astype(np.uint16)
    hidden = None if planes == 3 else samples[..., -1] == 0
    samples = samples[..., 0] if planes == 2 else samples[..., :3]
    return Picture(np.ascontiguousarray(samples), 65535, hidden, orientation)


def png_bytes(codes: NDArray[Any], *, packed: bool = False) -> bytes:
    """A PNG of uint8 or uint16 codes, grey (h, w) or red, green and blue (h, w, 3).

    Unpacked (stored deflate blocks, RFC 1951 section 3.2.4) the same codes give the same bytes
    everywhere; packed bytes depend on the zlib at hand.
    """
    height, width = codes.shape[:2]
    depth = 8 * codes.dtype.itemsize
    rows = codes.astype(codes.dtype.newbyteorder(">")).view(np.uint8).reshape(height, -1)
    raw = np.pad(rows, ((0, 0), (1, 0))).tobytes()  # filter 0 before every row
    body = zlib.compress(raw, 9) if packed else _stored(raw)
    head = struct.pack(">IIBBBBB", width, height, depth, 2 * (codes.ndim == 3), 0, 0, 0)
    return PNG_MAGIC + b"".join(
        struct.pack(">I", len(part)) + kind + part + struct.pack(">I", zlib.crc32(kind + part))
        for kind, part in ((b"IHDR", head), (b"IDAT", body), (b"IEND", b""))
    )


def _stored(raw: bytes) -> bytes:
    blocks = [raw[at : at + 65535] for at in range(0, len(raw), 65535)]
    out = [b"\x78\x01"]
    for number, block in enumerate(blocks, 1):
        last = number == len(blocks)
        out += [struct.pack("<BHH", last, len(block), len(block) ^ 0xFFFF), block]
    return b"".join(out) + struct.pack(">I", zlib.adler32(raw))


def unfilter(filtered: NDArray[np.uint8], kinds: NDArray[np.uint8]) -> NDArray[np.uint8]:
    """Undo the five PNG row filters (ISO/IEC 15948, 9.2).

    Parameters
    ----------
    filtered : uint8 ndarray (h, w, bytes per pixel)
    kinds : uint8 ndarray (h,), the filter of each row, 0 to 4

    A pixel needs its left, upper and upper-left neighbours, so all pixels of one
    anti-diagonal can be restored at once.
    """
    if kinds.max() > 4:
        raise InputError("the file is corrupt (an unknown row filter)")
    height, width, depth = filtered.shape
    out = np.zeros((height + 1, width + 1, depth), dtype=np.int16)
    for diagonal in range(height + width - 1):
        r = np.arange(max(0, diagonal - width + 1), min(height, diagonal + 1))
        c = diagonal - r
        left, up, corner = out[r + 1, c], out[r, c + 1], out[r, c]
        kind = kinds[r][:, None]
        guess = left + up - corner
        dl, du, dc = abs(guess - left), abs(guess - up), abs(guess - corner)
        paeth = np.where((dl <= du) & (dl <= dc), left, np.where(du <= dc, up, corner))
        base = np.choose(kind, [0, left, up, (left + up) >> 1, paeth])
        out[r + 1, c + 1] = (filtered[r, c] + base) & 255
    return np.ascontiguousarray(out[1:, 1:].astype(np.uint8))
