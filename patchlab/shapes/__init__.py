"""Dictionary to kernel fits: which parametric shape each component has."""

from patchlab.shapes.colour import (
    AXES,
    colour_axis,
    fit_colour_kernels,
    rgb_direction,
    separate,
    share_by_axis,
)
from patchlab.shapes.fit import fit_kernels
from patchlab.shapes.table import fits_csv, fits_json

__all__ = [
    "AXES",
    "colour_axis",
    "fit_colour_kernels",
    "fit_kernels",
    "fits_csv",
    "fits_json",
    "rgb_direction",
    "separate",
    "share_by_axis",
]
