"""patchlab: learn a camera's own edge and feature kernels, export them compiled."""

from __future__ import annotations

__version__ = "0.1.0"
