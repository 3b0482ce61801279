"""Dictionary to kernel fits: which parametric shape each component has."""

from patchlab.shapes.fit import fit_kernels
from patchlab.shapes.table import fits_csv, fits_json

__all__ = ["fit_kernels", "fits_csv", "fits_json"]
