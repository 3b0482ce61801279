"""Banks whose kernels are given: learned filters as they are, or an engineer's own.

These kernels have no lattice. They all stand in one scale, the first 256 of them, each with
its index as orientation and the role "odd", so that the bank's strength (``step``) is the
largest absolute response over them and its index, whatever their symmetry.
"""

from __future__ import annotations

from collections.abc import Mapping
from typing import Any, Literal

import numpy as np
from numpy.typing import ArrayLike

from patchlab.bank.lattice import check_name, exact_taps, impulse_response, unit_noise
from patchlab.conventions import BORDERS, DEFAULT_BORDER, pixel_format
from patchlab.errors import InputError, UsageError
from patchlab.families import noise_gain
from patchlab.types import (
    F32,
    F64,
    Bank,
    Dictionary,
    InputContract,
    InputTable,
    Kernel,
    KernelFits,
    Survey,
)

LARGEST = 63
"""Largest side of a given kernel, pixels."""
MOST = 4096
"""Most kernels in one bank."""
COMPARED = 256
"""Kernels that take part in the strength: its winner is one byte."""


def _kernels(
    family: str, stem: str, taps: F32, parameters: list[Mapping[str, float]], r2: list[float | None]
) -> tuple[Kernel, ...]:
    return tuple(
        Kernel(
            name=f"{stem}_{i}",
            family=family,
            parity="odd" if i < COMPARED else "none",
            scale=0 if i < COMPARED else None,
            orientation=i if i < COMPARED else None,
            parameters=parameters[i],
            gain=impulse_response(plane),
            r2=r2[i],
        )
        for i, plane in enumerate(taps)
    )


def _left_out(count: int) -> list[str]:
    if count <= COMPARED:
        return []
    return [f"only the first {COMPARED} of {count} kernels take part in the edge strength"]


# ---------------------------------------------------------------- as learned


def _odd_side(filters: F64) -> tuple[F64, float]:
    """Filters on an odd side, and where their middle then lies from the anchor, pixels."""
    if filters.shape[1] % 2:
        return filters, 0.0
    return np.pad(filters, ((0, 0), (0, 1), (0, 1))), -0.5


def _fitted(
    fits: KernelFits | None, i: int, offset: float
) -> tuple[Mapping[str, float], float | None]:
    """Parameters of filter i from its fit, moved with its middle; only the offset without one."""
    if fits is None:
        return {"x_px": offset, "y_px": offset}, None
    fit = fits.fits[i]
    found = {k: float(v) for k, v in fit.parameters.items() if k != "amplitude"}
    for key in ("x_px", "y_px"):
        found[key] = found.get(key, 0.0) + offset
    return found, fit.r2


def bank_as_learned(
    dictionary: Dictionary,
    survey: Survey,
    name: str = "bank",
    border: str = DEFAULT_BORDER,
    fits: KernelFits | None = None,
) -> Bank:
    """Make a bank of the learned filters themselves.

    Filters (not atoms) are what is dotted with a picture. Filters of even side get a row and a
    column of zeros at the bottom and the right: their middle then lies half a pixel up and to
    the left of the anchor, which ``x_px`` and ``y_px`` of each kernel say (-0.5), so a response
    at (x, y) belongs to (x - 0.5, y - 0.5). DC is removed over the filter's own window.

    Parameters
    ----------
    dictionary : Dictionary, in its canonical order
    survey : the camera's table and noise; kernels have unit noise gain where it is known
    name : C identifier
    border : one of the five names
    fits : of the filters, whose parameters and R2 the kernels then carry

    Returns
    -------
    Bank of purpose "learned", kernels ``filter_0``, ``filter_1``, ...

    Raises
    ------
    UsageError : a bad name or border, fits of something else.
    """
    check_name(name)
    _check_border(border)
    if fits is not None and (fits.of != "filters" or len(fits) != len(dictionary)):
        raise UsageError("these fits are not of this dictionary's filters")
    filters = np.asarray(dictionary.filters, dtype=np.float64)
    filters, offset = _odd_side(filters - filters.mean(axis=(1, 2), keepdims=True))
    sd = survey.table.noise_sd if (survey.table.noise_sd or 0) > 0 else None
    covariance = survey.noise.autocovariance
    taps = np.stack([exact_taps(unit_noise(f, covariance, sd)) for f in filters])
    described = [_fitted(fits, i, offset) for i in range(len(taps))]
    warnings = _left_out(len(taps))
    if sd is None:
        warnings.append(
            "the camera's noise is not known, so kernels have unit norm and responses no unit"
        )
    return Bank(
        name=name,
        kernels=_kernels(
            "learned", "filter", taps, [p for p, _ in described], [r for _, r in described]
        ),
        taps=taps,
        table=survey.table,
        border=border,
        purpose="learned",
        noise_autocovariance=covariance,
        provenance={"settings": {"as_learned": True, "border": border, "name": name}},
        warnings=tuple(warnings),
    )


# ---------------------------------------------------------------- an engineer's own


def _check_border(border: str) -> None:
    if border not in BORDERS:
        raise UsageError(f"unknown border {border!r}", remedy=f"choose one of {', '.join(BORDERS)}")


def _check_shape(taps: np.ndarray[Any, Any], where: str, planes: int) -> None:
    """Refuse what cannot be a stack of kernels."""
    if taps.dtype.kind not in "buif":
        raise InputError(
            f"taps of type {taps.dtype} are not real numbers", where=where,
            remedy="give an array of integers or floats",
        )  # fmt: skip
    if taps.ndim != (3 if planes == 1 else 4) or (planes > 1 and taps.shape[3] != planes):
        last = "" if planes == 1 else f", {planes}"
        raise InputError(
            f"taps of shape {taps.shape} are not kernels", where=where,
            remedy=f"give one kernel (h, h{last}) or several (n, h, h{last})",
        )  # fmt: skip
    if taps.size == 0:
        raise InputError("there are no taps in it", where=where)
    n, h, w = taps.shape[:3]
    if h != w:
        raise InputError(
            f"kernels of {h} x {w} are not square", where=where,
            remedy="pad them with zeros to a square of odd side",
        )  # fmt: skip
    if h % 2 == 0:
        raise InputError(
            f"kernels of even side {h} have no centre pixel", where=where,
            remedy=f"pad them with zeros to {h + 1} x {h + 1}",
        )  # fmt: skip
    if h > LARGEST:
        raise InputError(f"kernels of side {h} are beyond the limit of {LARGEST}", where=where)
    if n > MOST:
        raise InputError(f"{n} kernels are beyond the limit of {MOST}", where=where)


def _as_float32(taps: np.ndarray[Any, Any], where: str) -> F32:
    """The taps as float32, refusing what does not survive it."""
    if not bool(np.isfinite(taps).all()):
        raise InputError("a tap is not a finite number", where=where)
    with np.errstate(over="ignore"):
        out = np.asarray(taps, dtype=np.float32)
    if not bool(np.isfinite(out).all()):
        raise InputError("a tap is too large for float32", where=where)
    empty = np.flatnonzero(~out.reshape(len(out), -1).any(axis=1))
    if len(empty):
        raise InputError(f"kernel {int(empty[0])} is zero everywhere", where=where)
    return np.ascontiguousarray(out)


def identity_table(contract: InputContract) -> InputTable:
    """The table that leaves pixel codes as they are."""
    form = contract.format
    values = np.arange(1 << form.bits, dtype=np.float32) if form.integer else None
    return InputTable("identity", contract, values, noise_sd=None)


def bank_from_taps(
    taps: ArrayLike,
    pixels: str,
    name: str = "bank",
    border: str = DEFAULT_BORDER,
    *,
    black: float = 0.0,
    white: float | None = None,
    transfer: Literal["linear", "srgb"] = "linear",
    where: str = "",
) -> Bank:
    """Make a bank of an engineer's own kernels, used as they are.

    Nothing is normalised, centred or flipped: responses are correlations of the pixel codes
    with these taps, rounded to float32.

    Parameters
    ----------
    taps : array (n, h, h) or (h, h) of integers or floats, h odd, at most 63; for colour pixels
        (n, h, h, samples) or (h, h, samples), in the order of the samples
    pixels : Mono8, Mono10, Mono12, Mono16 or float32; RGB8, BGR8 to 16, or BayerRG8 to 16, whose
        four samples are those of a 2 x 2 cell, row by row
    name : C identifier
    border : one of the five names
    black, white : codes of no light and of full scale, for the contract; full scale by default
    transfer : how codes follow light, for the contract
    where : what errors name, usually the file

    Returns
    -------
    Bank of purpose "taps", kernels ``kernel_0``, ``kernel_1``, ..., identity table

    Raises
    ------
    UsageError : a bad name, pixel format, border or level. InputError : taps that are empty,
        complex, not square, of even side, too large, not finite, or zero everywhere.

    Examples
    --------
    >>> import numpy as np
    >>> sobel = np.outer([1, 2, 1], [-1, 0, 1])
    >>> bank_from_taps([sobel, sobel.T], "Mono8", "sobel").kernels[1].name
    'kernel_1'
    """
    check_name(name)
    _check_border(border)
    form = pixel_format(pixels)
    top = float(form.full_scale) if white is None else white
    if not black < top:
        raise UsageError(f"white level {top:g} does not exceed black level {black:g}")
    try:
        array = np.asarray(taps)
    except ValueError:
        raise InputError("kernels of one bank must have one size", where=where) from None
    array = array[None] if array.ndim == 2 + (form.planes > 1) else array
    _check_shape(array, where, form.planes)
    planes = _as_float32(array, where)
    nothing: list[Mapping[str, float]] = [{} for _ in planes]
    return Bank(
        name=name,
        kernels=_kernels("given", "kernel", planes, nothing, [None] * len(planes)),
        taps=planes,
        table=identity_table(InputContract(pixels, black, top, transfer)),
        border=border,
        purpose="taps",
        provenance={"settings": {"border": border, "name": name, "pixels": pixels}},
        warnings=tuple(_left_out(len(planes))),
    )


def norm_of(bank: Bank, index: int) -> float:
    """Standard deviation of a kernel's response to noise of sd 1 in working values."""
    return noise_gain(bank.taps[index].astype(np.float64), bank.noise_autocovariance)
