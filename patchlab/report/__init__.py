"""Pictures for people: mosaics, plots and the page of a run."""

from patchlab.report.compare import comparison_pictures
from patchlab.report.mosaic import edge_pictures
from patchlab.report.page import write, write_survey
from patchlab.report.parts import parts_pages

__all__ = ["comparison_pictures", "edge_pictures", "parts_pages", "write", "write_survey"]
