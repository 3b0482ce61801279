"""Pictures for people: mosaics, plots and the page of a run."""

from patchlab.report.mosaic import edge_pictures
from patchlab.report.page import write

__all__ = ["edge_pictures", "write"]
