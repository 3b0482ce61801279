"""What the camera itself does to pictures: noise, blur, spectrum, marks; the input table."""

from patchlab.camera.blur import measure_blur
from patchlab.camera.chart import slanted_edge
from patchlab.camera.drift import (
    Change,
    NoiseKeeper,
    blur_change,
    colour_change,
    new_marks,
    verdict_of,
)
from patchlab.camera.flags import flag_components
from patchlab.camera.marks import find_marks
from patchlab.camera.noise import measure_noise
from patchlab.camera.pixels import MAX_FRAMES
from patchlab.camera.samples import sample_noise
from patchlab.camera.spectrum import Spectrum, measure_spectrum
from patchlab.camera.static import measure_noise_dark, measure_noise_static
from patchlab.camera.survey import survey
from patchlab.camera.table import default_kind, make_table, noise_of_table

__all__ = [
    "MAX_FRAMES",
    "Change",
    "NoiseKeeper",
    "Spectrum",
    "blur_change",
    "colour_change",
    "default_kind",
    "find_marks",
    "flag_components",
    "make_table",
    "measure_blur",
    "measure_noise",
    "measure_noise_dark",
    "measure_noise_static",
    "measure_spectrum",
    "new_marks",
    "noise_of_table",
    "sample_noise",
    "slanted_edge",
    "survey",
    "verdict_of",
]
