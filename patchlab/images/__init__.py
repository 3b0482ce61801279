"""Photographs in, patches out: reading a folder, and making pictures whose truth is known.

The way through: ``list_photos`` -> ``take_in`` -> ``iterate`` (frames) or
``sample_folder`` (patches). ``scenes`` and ``demo`` render pictures instead.
"""

from patchlab.images.address import Place, place
from patchlab.images.coloured import make_colour_images
from patchlab.images.decode import SUFFIXES, decode, decoder_versions
from patchlab.images.demo import make_sample_images
from patchlab.images.develop import ReadOptions
from patchlab.images.film import FilmPart, film_parts, is_film, read_part
from patchlab.images.folder import (
    FrameRecord,
    Intake,
    iterate,
    read_file,
    reread,
    take_in,
)
from patchlab.images.listing import Listing, list_photos
from patchlab.images.parts import make_brackets
from patchlab.images.pfnc import RawLayout
from patchlab.images.planes import one_plane
from patchlab.images.sample import SampleSettings, memory_needed, sample, sample_folder

__all__ = [
    "SUFFIXES",
    "FilmPart",
    "FrameRecord",
    "Intake",
    "Listing",
    "Place",
    "RawLayout",
    "ReadOptions",
    "SampleSettings",
    "decode",
    "decoder_versions",
    "film_parts",
    "is_film",
    "iterate",
    "list_photos",
    "make_brackets",
    "make_colour_images",
    "make_sample_images",
    "memory_needed",
    "one_plane",
    "place",
    "read_file",
    "read_part",
    "reread",
    "sample",
    "sample_folder",
    "take_in",
]
