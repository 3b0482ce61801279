"""Photographs in, patches out: reading a folder, and making pictures whose truth is known.

The way through: ``list_photos`` -> ``take_in`` -> ``iterate`` (frames) or
``sample_folder`` (patches). ``scenes`` and ``demo`` render pictures instead.
"""

from patchlab.images.decode import SUFFIXES, decode, decoder_versions
from patchlab.images.demo import make_sample_images
from patchlab.images.develop import ReadOptions
from patchlab.images.film import FilmPart, film_parts, is_film, read_part
from patchlab.images.folder import (
    FrameRecord,
    Intake,
    Listing,
    iterate,
    list_photos,
    read_file,
    reread,
    take_in,
)
from patchlab.images.pfnc import RawLayout
from patchlab.images.sample import SampleSettings, memory_needed, sample, sample_folder

__all__ = [
    "SUFFIXES",
    "FilmPart",
    "FrameRecord",
    "Intake",
    "Listing",
    "RawLayout",
    "ReadOptions",
    "SampleSettings",
    "decode",
    "decoder_versions",
    "film_parts",
    "is_film",
    "iterate",
    "list_photos",
    "make_sample_images",
    "memory_needed",
    "read_file",
    "read_part",
    "reread",
    "sample",
    "sample_folder",
    "take_in",
]
