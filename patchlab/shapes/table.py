"""Fits as a table for people and as plain data for programs.

Numbers are written with ``repr``, so they come back bit for bit, and never through the
locale. A column name carries its unit; a parameter that a family lacks is an empty cell.
"""

from __future__ import annotations

import csv
import io
import math
from typing import Any

from patchlab.families import PARAMETERS
from patchlab.shapes.colour import colour_axis
from patchlab.types import KernelFit, KernelFits

PARAMETER_COLUMNS = tuple(dict.fromkeys(name for names in PARAMETERS.values() for name in names))
"""Every parameter of every family once, in a fixed order."""

COLUMNS = (
    "index",
    "of",
    "size_px",
    "family",
    "verdict",
    "r2",
    "bic",
    "bandwidth_octaves",
    "orientation_bandwidth_rad",
    *PARAMETER_COLUMNS,
    *(f"{name}_error" for name in PARAMETER_COLUMNS),
)
"""Columns of the table; ``NAME_error`` is one standard error in the unit of ``NAME``."""


def fits_csv(fits: KernelFits) -> bytes:
    """The fits as comma-separated values, UTF-8, one line a kernel under one line of names.

    Columns are :data:`COLUMNS`. An error that is not determined is written ``inf``; an open
    bandwidth is an empty cell. Colour kernels have :func:`colour_columns` besides.
    """
    out = io.StringIO(newline="")
    columns = (*COLUMNS, *colour_columns(fits.colours))
    writer = csv.DictWriter(out, columns, restval="", lineterminator="\n")
    writer.writeheader()
    for fit in fits.fits:
        row = _head(fit)
        row |= {"of": fits.of, "size_px": fits.size, **fit.parameters}
        row |= {f"{name}_error": value for name, value in fit.errors.items()}
        row |= _colour(fit, fits.colours)
        writer.writerow({k: _cell(v) for k, v in row.items()})
    return out.getvalue().encode()


def fits_json(fits: KernelFits) -> dict[str, Any]:
    """The fits as plain JSON data, without NaN or infinity.

    An error that is not determined and an open bandwidth are None.

    Returns
    -------
    dict : of, size_px, effective_samples, median_r2, good, poor, failed, and ``fits``, one
        entry a kernel with index, family, verdict, r2, bic, bandwidth_octaves,
        orientation_bandwidth_rad, parameters and errors (names carry their units)
    """
    return {
        "of": fits.of,
        "size_px": fits.size,
        "effective_samples": fits.effective_samples,
        "median_r2": _number(fits.median_r2),
        **{name: fits.count(name) for name in ("good", "poor", "failed")},
        "fits": [
            _head(fit)
            | _colour(fit, fits.colours)
            | {
                "parameters": {k: _number(v) for k, v in fit.parameters.items()},
                "errors": {k: _number(v) for k, v in fit.errors.items()},
            }
            for fit in fits.fits
        ],
    }


def colour_columns(colours: str) -> tuple[str, ...]:
    """Columns that fits of colour kernels have besides; none for one plane.

    ``colour_share``: of the energy, held by the profile times its direction; ``colour_axis``:
    grey, blue-yellow or red-green; ``grey_deg``: angle to grey, degrees; then the direction.
    """
    if not colours:
        return ()
    samples = (f"direction_{i}_{letter}" for i, letter in enumerate(colours))
    return ("colour_share", "colour_axis", "grey_deg", *samples)


def _colour(fit: KernelFit, colours: str) -> dict[str, Any]:
    if fit.direction is None:
        return {}
    name, angle = colour_axis(fit.direction, colours)
    values = (fit.colour_share, name, angle, *fit.direction)
    return dict(zip(colour_columns(colours), values, strict=True))


def _head(fit: KernelFit) -> dict[str, Any]:
    return {
        "index": fit.index,
        "family": fit.family,
        "verdict": fit.verdict,
        "r2": fit.r2,
        "bic": fit.bic,
        "bandwidth_octaves": fit.octaves,
        "orientation_bandwidth_rad": fit.orientation_rad,
    }


def _cell(value: Any) -> str:
    if value is None:
        return ""
    return repr(float(value)) if isinstance(value, float) else str(value)


def _number(value: float) -> float | None:
    return value if math.isfinite(value) else None
