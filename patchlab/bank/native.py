"""A compiled bank called from Python through ctypes.

The library is code: it is loaded only on request, and only from bytes whose hash
was checked. Those very bytes go to a private file that is loaded and removed, so
a file changed in between is never run.
"""

from __future__ import annotations

import contextlib
import ctypes
import os
import tempfile
from collections.abc import Mapping
from itertools import pairwise
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.bank.bands import Band, side_by_side
from patchlab.bank.reference import check_picture
from patchlab.errors import InputError, UsageError, VerificationError
from patchlab.store import read_file, sha256
from patchlab.types import EDGEL, F32, Bank, Plan

_POINTER, _STRIDE, _INT = ctypes.c_void_p, ctypes.c_ssize_t, ctypes.c_int
_SIZE, _REAL = ctypes.c_size_t, ctypes.c_double
_EDGEL = np.dtype(
    {
        "names": ["x", "y", "theta", "strength", "sd", "width", "scale", "kind"],
        "formats": ["f4"] * 6 + ["u1"] * 2,
        "offsets": [0, 4, 8, 12, 16, 20, 24, 25],
        "itemsize": 28,
    }
)
"""An edgel as the C interface lays it out."""
_PICTURE = [_POINTER, _STRIDE, _INT, _INT, _INT, _INT]


class NativeBank:
    """The compiled code of a bank.

    Parameters
    ----------
    bank, plan : what the library was made from
    library : bytes of the shared library
    digest : SHA-256 that the bytes must have

    Raises
    ------
    VerificationError : the bytes have another hash, or the library is not this bank's.
    InputError : the library does not load on this machine.

    Notes
    -----
    Calls release the interpreter lock and share nothing, so bands may run in threads.
    """

    def __init__(self, bank: Bank, plan: Plan, library: bytes, digest: str) -> None:
        if sha256(library) != digest:
            raise VerificationError(
                "the shared library was changed after it was written (its hash differs)",
                where=bank.name,
                remedy="export the bank again",
            )
        self.bank = bank
        self._library = _load(library, bank.name)
        self._plan = plan
        self._declare()
        if self._call("abi", _INT)() != plan.detail["abi"]:
            raise VerificationError("the shared library belongs to another bank", where=bank.name)

    def _call(self, name: str, result: Any, *arguments: Any) -> Any:
        try:
            function = getattr(self._library, f"{self.bank.name}_{name}")
        except AttributeError:
            raise VerificationError(
                f"the shared library has no {self.bank.name}_{name}", where=self.bank.name
            ) from None
        function.restype, function.argtypes = result, list(arguments)
        return function

    def _declare(self) -> None:
        self._scratch = self._call("scratch_bytes", ctypes.c_size_t, _INT, _INT)
        self._message = self._call("message", ctypes.c_char_p, _INT)
        self._responses = self._call(
            "responses_rows", _INT, *_PICTURE, _POINTER, _STRIDE, _STRIDE, _POINTER
        )
        self._edges = self._call(
            "edges_rows", _INT, *_PICTURE, _INT, _POINTER, _STRIDE, _POINTER, _STRIDE, _POINTER
        )
        self._edges_all = self._call(
            "edges_all_rows", _INT, *_PICTURE, _POINTER, _STRIDE, _STRIDE, _POINTER, _STRIDE,
            _STRIDE, _POINTER,
        )  # fmt: skip
        self._edges_above = self._call(
            "edges_above_rows", _INT, *_PICTURE, _INT, ctypes.c_float, _POINTER, _STRIDE, _POINTER,
            _STRIDE, _POINTER, _POINTER,
        )  # fmt: skip

        # a library of an earlier version has no edgels
        name = f"{self.bank.name}_edgels"
        self.has_edgels = hasattr(self._library, name)
        if self.has_edgels:
            self._edgels_scratch = self._call("edgels_scratch_bytes", _SIZE, _INT, _INT)
            self._edgels = self._call(
                "edgels", _INT, *_PICTURE[:4], _REAL, _REAL, _POINTER, _SIZE, _POINTER, _POINTER
            )
        fixed = self._fixed = self._plan.detail["fixed"]
        if fixed is not None:
            self._responses_q = self._call(
                "responses_q_rows", _INT, *_PICTURE, _POINTER, _STRIDE, _STRIDE, _POINTER, _POINTER
            )
            self._edges_q = self._call(
                "edges_q_rows", _INT, *_PICTURE, _INT, _POINTER, _STRIDE, _POINTER, _STRIDE,
                _POINTER,
            )  # fmt: skip

    def responses(
        self,
        pixels: NDArray[Any],
        *,
        rows: tuple[int, int] | None = None,
        out: F32 | None = None,
        threads: int = 1,
    ) -> F32:
        """Responses of every kernel.

        Parameters
        ----------
        pixels : ndarray (h, w) of the contract's dtype; rows may have any stride
        rows : (first, count), a band to compute alone; the whole picture when not given
        out : float32 ndarray (n, count, w) to write to, unit stride along x; made when not given
        threads : how many bands are computed side by side; the result is the same bits for any

        Returns
        -------
        float32 ndarray (n, count, w)

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : a wrong band, ``out`` or number of threads.
        """
        pixels, (first, count) = self._picture(pixels, rows)
        width = self.bank.contract.format.size_of(pixels)[1]
        planes = _output(out, (len(self.bank), count, width), np.float32)

        def band(start: int, height: int) -> int:
            part = planes[:, start - first :]
            scratch = self._memory(pixels)  # a name of its own: it must outlive the call
            return int(
                self._responses(
                    *self._address(pixels), start, height,
                    part.ctypes.data, planes.strides[1], planes.strides[0], scratch.ctypes.data,
                )
            )  # fmt: skip

        self._in_bands(band, first, count, threads)
        return planes

    def edges(
        self,
        pixels: NDArray[Any],
        scale: int,
        *,
        rows: tuple[int, int] | None = None,
        threads: int = 1,
    ) -> tuple[F32, NDArray[np.uint8]]:
        """Strength of one scale and the index of the winning orientation.

        Parameters
        ----------
        pixels : ndarray (h, w) of the contract's dtype; rows may have any stride
        scale : position among ``bank.scales``, 0 the finest
        rows : (first, count), a band to compute alone; the whole picture when not given
        threads : how many bands are computed side by side; the result is the same bits for any

        Returns
        -------
        float32 ndarray (count, w), uint8 ndarray (count, w)

        Raises
        ------
        InputError : the picture does not fit the bank. UsageError : no such scale or band.
        """
        pixels, (first, count) = self._picture(pixels, rows)
        return self._strongest(self._edges, pixels, first, count, scale, threads)

    def edges_all(
        self, pixels: NDArray[Any], *, rows: tuple[int, int] | None = None, threads: int = 1
    ) -> tuple[F32, NDArray[np.uint8]]:
        """Strengths and winning orientations of all scales in one pass: the bits of :meth:`edges`.

        Parameters
        ----------
        pixels, rows, threads : as in :meth:`edges`

        Returns
        -------
        float32 ndarray (scales, count, w), uint8 ndarray (scales, count, w)

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : no such band, or a bank without scales.
        """
        pixels, (first, count) = self._picture(pixels, rows)
        width = self.bank.contract.format.size_of(pixels)[1]
        strength = np.empty((len(self.bank.scales), count, width), dtype=np.float32)
        turn = np.empty(strength.shape, dtype=np.uint8)

        def band(start: int, height: int) -> int:
            to, who = strength[:, start - first :], turn[:, start - first :]
            scratch = self._memory(pixels)
            return int(
                self._edges_all(
                    *self._address(pixels), start, height, to.ctypes.data, strength.strides[1],
                    strength.strides[0], who.ctypes.data, turn.strides[1], turn.strides[0],
                    scratch.ctypes.data,
                )
            )  # fmt: skip

        self._in_bands(band, first, count, threads)
        return strength, turn

    def edges_above(
        self,
        pixels: NDArray[Any],
        scale: int,
        threshold: float,
        *,
        rows: tuple[int, int] | None = None,
        threads: int = 1,
    ) -> tuple[F32, NDArray[np.uint8], int]:
        """As :meth:`edges`, without the stretches that are provably too flat for a threshold.

        Parameters
        ----------
        pixels, scale, rows, threads : as in :meth:`edges`
        threshold : a strength; what reaches it, and its eight neighbours, are as by :meth:`edges`

        Returns
        -------
        float32 ndarray (count, w), uint8 ndarray (count, w) : 0 where pixels were skipped
        int : how many pixels were skipped

        Raises
        ------
        InputError : the picture does not fit the bank. UsageError : no such scale or band.
        """
        pixels, (first, count) = self._picture(pixels, rows)
        found: list[int] = []
        limit = float(np.float32(threshold))
        limit = (
            float(np.nextafter(np.float32(limit), np.float32(0))) if limit > threshold else limit
        )

        def call(*given: Any) -> int:
            *before, to, row, who, turn_row, scratch = given
            skipped = ctypes.c_uint64(0)
            code = self._edges_above(
                *before, float(limit), to, row, who, turn_row, ctypes.addressof(skipped), scratch
            )
            found.append(int(skipped.value))
            return int(code)

        strength, turn = self._strongest(call, pixels, first, count, scale, threads)
        return strength, turn, sum(found)

    def responses_q(
        self,
        pixels: NDArray[Any],
        *,
        rows: tuple[int, int] | None = None,
        out: NDArray[np.int16] | None = None,
        threads: int = 1,
    ) -> tuple[NDArray[np.int16], int]:
        """Responses of every kernel in 16-bit fixed point.

        Parameters
        ----------
        pixels, rows, threads : as in :meth:`responses`
        out : int16 ndarray (n, count, w) to write to, unit stride along x; made when not given

        Returns
        -------
        int16 ndarray (n, count, w) : counts; times ``plan.detail["fixed"].step`` they are responses
        int : how many counts stand at the ends of the range

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : a wrong band or ``out``, or a bank without fixed point.
        """
        self._need_fixed()
        pixels, (first, count) = self._picture(pixels, rows)
        planes = _output(out, (len(self.bank), count, pixels.shape[1]), np.int16)
        ends: list[int] = []

        def band(start: int, height: int) -> int:
            part = planes[:, start - first :]
            scratch = self._memory(pixels)
            found = ctypes.c_uint64(0)
            code = self._responses_q(
                *self._address(pixels), start, height, part.ctypes.data, planes.strides[1],
                planes.strides[0], ctypes.addressof(found), scratch.ctypes.data,
            )  # fmt: skip
            ends.append(int(found.value))
            return int(code)

        self._in_bands(band, first, count, threads)
        return planes, sum(ends)

    def edges_q(
        self,
        pixels: NDArray[Any],
        scale: int,
        *,
        rows: tuple[int, int] | None = None,
        threads: int = 1,
    ) -> tuple[F32, NDArray[np.uint8]]:
        """As :meth:`edges`, computed in 16-bit fixed point.

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : no such scale or band, or a bank without fixed point.
        """
        self._need_fixed()
        pixels, (first, count) = self._picture(pixels, rows)
        return self._strongest(self._edges_q, pixels, first, count, scale, threads)

    def _strongest(
        self, call: Any, pixels: NDArray[Any], first: int, count: int, scale: int, threads: int
    ) -> tuple[F32, NDArray[np.uint8]]:
        width = self.bank.contract.format.size_of(pixels)[1]
        strength = np.empty((count, width), dtype=np.float32)
        turn = np.empty(strength.shape, dtype=np.uint8)

        def band(start: int, height: int) -> int:
            to, who = strength[start - first :], turn[start - first :]
            scratch = self._memory(pixels)
            return int(
                call(
                    *self._address(pixels), start, height, scale,
                    to.ctypes.data, strength.strides[0], who.ctypes.data, turn.strides[0],
                    scratch.ctypes.data,
                )
            )  # fmt: skip

        self._in_bands(band, first, count, threads)
        return strength, turn

    def _in_bands(self, band: Band, first: int, count: int, threads: int) -> None:
        """Compute a band in one call, or its parts side by side."""
        if threads < 1:
            raise UsageError(f"{threads} threads: at least one is needed")
        if not 1 <= threads <= count // self.bank.size or first < 0:
            threads = 1  # too few rows to share, or a band that the code refuses itself
        if threads == 1:
            self._check(band(first, count))
            return
        # a few bands a thread, so that a thread that was held up does not hold up all;
        # each costs the rows of its halo once more
        parts = min(4 * threads, max(threads, count // (4 * self.bank.size)))
        tiles = self._plan.detail["fft"]
        unit = tiles.rows if tiles else 1  # no block is computed twice
        inner = {(first + count * i // parts) // unit * unit for i in range(1, parts)}
        tops = [first, *sorted(top for top in inner if top > first), first + count]
        self._check(max(side_by_side(band, list(pairwise(tops)), threads)))

    def edgels(
        self, pixels: NDArray[Any], threshold: float, line_threshold: float = 0.0
    ) -> NDArray[np.void]:
        """Edge elements of one picture, placed below the pixel.

        Parameters
        ----------
        pixels : ndarray (h, w) of the contract's dtype; rows may have any stride
        threshold : strength for the bank's own kind of edges; 0 looks for none
        line_threshold : the same for lines beside steps

        Returns
        -------
        structured ndarray of :data:`patchlab.types.EDGEL`: what Python finds on this library's
        responses, positions within 1e-6 px and one rounding to float32

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : the library has no edgels, or the thresholds cannot serve.
        """
        if not self.has_edgels:
            raise UsageError("this library finds no edgels", where=self.bank.name)
        pixels, _ = self._picture(pixels, None)
        h, w = pixels.shape
        scratch = np.empty(self._edgels_scratch(w, h), dtype=np.uint8)
        count = ctypes.c_size_t(0)
        capacity = pixels.size // 2  # pages that are not written take no memory
        while True:
            out = np.empty(capacity, _EDGEL)
            code = self._edgels(
                *self._address(pixels), threshold, line_threshold, out.ctypes.data, capacity,
                ctypes.addressof(count), scratch.ctypes.data,
            )  # fmt: skip
            if count.value <= capacity:
                break
            capacity = count.value
        self._check(code)
        return as_edgels(out[: count.value])

    def _need_fixed(self) -> None:
        if self._fixed is None:
            raise UsageError(
                "fixed point needs integer pixels of one plane and at most 12 bits",
                where=self.bank.name,
            )

    def _picture(
        self, pixels: NDArray[Any], rows: tuple[int, int] | None
    ) -> tuple[NDArray[Any], tuple[int, int]]:
        check_picture(self.bank, pixels)
        inside = pixels[0].nbytes
        if not pixels[0].flags.c_contiguous or abs(pixels.strides[0]) < inside:
            pixels = np.ascontiguousarray(pixels)
        return pixels, rows or (0, self.bank.contract.format.size_of(pixels)[0])

    def scratch_bytes(self, width: int, height: int) -> int:
        """Bytes of working memory that a call on a picture of this size takes."""
        return int(self._scratch(width, height))

    def _memory(self, pixels: NDArray[Any]) -> NDArray[np.uint8]:
        height, width = self.bank.contract.format.size_of(pixels)
        return np.empty(self._scratch(width, height), dtype=np.uint8)

    def _address(self, pixels: NDArray[Any]) -> tuple[int, int, int, int]:
        height, width = self.bank.contract.format.size_of(pixels)
        return pixels.ctypes.data, pixels.strides[0], width, height

    def _check(self, code: int) -> None:
        if code:
            message = self._message(code).decode("ascii", "replace")
            kind = InputError if "pixel code" in message else UsageError
            raise kind(message, where=self.bank.name)


def as_edgels(found: NDArray[np.void]) -> NDArray[np.void]:
    """Records of the C interface as :data:`patchlab.types.EDGEL`."""
    out = np.empty(found.shape, EDGEL)
    for name in EDGEL.names or ():
        out[name] = found[name]
    return out


def _output(out: NDArray[Any] | None, shape: tuple[int, ...], dtype: Any) -> NDArray[Any]:
    if out is None:
        return np.empty(shape, dtype=dtype)
    if out.shape != shape or out.dtype != dtype or out.strides[-1] != out.itemsize:
        raise UsageError(f"out must be {np.dtype(dtype)} {shape} with unit stride along x")
    if not out.flags.writeable:
        raise UsageError("out must be writeable")
    return out


def _load(library: bytes, name: str) -> ctypes.CDLL:
    """Load a library from bytes; its file is private and gone afterwards where that is possible."""
    handle, path = tempfile.mkstemp(prefix=f"{name}-", suffix=".dll" if os.name == "nt" else ".so")
    try:
        with os.fdopen(handle, "wb") as file:
            file.write(library)
        return ctypes.CDLL(path)
    except OSError as error:
        raise InputError(
            f"the shared library does not load here: {error}",
            where=name,
            remedy="compile the bank's C source on this machine, or use the in-process engine",
        ) from None
    finally:
        with contextlib.suppress(OSError):  # Windows keeps a loaded file until the process ends
            Path(path).unlink()


def load_native(
    folder: Path, bank: Bank, plan: Plan, head: Mapping[str, Any], path: str
) -> NativeBank:
    """Load one library of a bank folder after its hash was checked.

    Parameters
    ----------
    folder : the bank's folder
    bank, plan, head : as :func:`patchlab.bank.disk.read_bank` gave them
    path : the library's path in the folder, as in ``head["files"]``

    Raises
    ------
    VerificationError : the file is unknown, missing or changed, or another bank's.
    InputError : it does not load on this machine.
    """
    data = read_file(folder, head, path)
    return NativeBank(bank, plan, data, head["files"][path])
