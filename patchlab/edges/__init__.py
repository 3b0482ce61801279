"""Edges: responses to thin edge maps and sub-pixel edgels at a promised false-alarm rate."""

from patchlab.edges.detect import (
    Found,
    What,
    detect,
    detect_edgels,
    find,
    find_on,
    levels_of,
    threshold_of,
)
from patchlab.edges.locate import CSV_COLUMNS, edgels, edgels_csv
from patchlab.edges.matching import Matching, direction_error, match, pratt_merit, spaced
from patchlab.edges.thin import edge_map, shapes_of
from patchlab.edges.threshold import calibrate, rate_for, strength_for

__all__ = [
    "CSV_COLUMNS",
    "Found",
    "Matching",
    "What",
    "calibrate",
    "detect",
    "detect_edgels",
    "direction_error",
    "edge_map",
    "edgels",
    "edgels_csv",
    "find",
    "find_on",
    "levels_of",
    "match",
    "pratt_merit",
    "rate_for",
    "shapes_of",
    "spaced",
    "strength_for",
    "threshold_of",
]
