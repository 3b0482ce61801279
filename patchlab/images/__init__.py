"""Photographs in, patches out: reading a folder, and making pictures whose truth is known.

The way through: ``list_photos`` -> ``take_in`` -> ``iterate`` (frames) or
``sample_folder`` (patches). ``scenes`` and ``demo`` render pictures instead.
"""

from patchlab.images.decode import SUFFIXES, decode, decoder_versions
from patchlab.images.demo import make_sample_images
from patchlab.images.develop import ReadOptions
from patchlab.images.folder import (
    FrameRecord,
    Intake,
    iterate,
    read_file,
    reread,
    take_in,
)
from patchlab.images.listing import Listing, list_photos
from patchlab.images.pfnc import RawLayout
from patchlab.images.sample import SampleSettings, memory_needed, sample, sample_folder

__all__ = [
    "SUFFIXES",
    "FrameRecord",
    "Intake",
    "Listing",
    "RawLayout",
    "ReadOptions",
    "SampleSettings",
    "decode",
    "decoder_versions",
    "iterate",
    "list_photos",
    "make_sample_images",
    "memory_needed",
    "read_file",
    "reread",
    "sample",
    "sample_folder",
    "take_in",
]
