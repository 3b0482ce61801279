"""The one door to numba: the flags and the cache policy of every compiled loop.

Only modules that learn or fit import this one, so a bank loads and runs where
numba is absent. ``nogil`` lets callers thread; fast-math and parallel
reductions stay off, so a sum has one order on every machine. Compiled code is
kept in the user's cache folder; where that cannot be written, every process
compiles anew and nothing fails.
"""

from __future__ import annotations

import hashlib
import os
import sys
from collections.abc import Callable
from pathlib import Path
from typing import Any, TypeVar

import numba

F = TypeVar("F", bound=Callable[..., Any])


def _sources() -> str:
    """A digest of the modules with compiled loops.

    numba looks only at a function's own file when it decides whether its cache is stale,
    but loops call loops of other files.
    """
    rooms = (Path(__file__).parent / room for room in ("learn", "shapes"))
    digest = hashlib.sha256()
    for path in sorted(p for room in rooms for p in room.glob("*.py")):
        digest.update(path.read_bytes())
    return digest.hexdigest()[:12]


def cache_folder() -> Path | None:
    """Where compiled loops are kept, or None where no folder can be written."""
    if sys.platform == "win32":
        root = os.environ.get("LOCALAPPDATA", "")
    else:
        root = os.environ.get("XDG_CACHE_HOME", "") or os.path.join(
            os.path.expanduser("~"), ".cache"
        )
    if not root:
        return None
    folder = Path(root) / "patchlab" / f"numba-{numba.__version__}-{_sources()}"
    try:
        folder.mkdir(parents=True, exist_ok=True)
    except OSError:
        return None
    return folder if os.access(folder, os.W_OK) else None


_FOLDER = cache_folder()
if _FOLDER is not None and not os.environ.get("NUMBA_CACHE_DIR"):
    numba.config.CACHE_DIR = str(_FOLDER)


def jit(function: F) -> F:
    """Compile ``function`` with the house flags at its first call."""
    if _FOLDER is not None or os.environ.get("NUMBA_CACHE_DIR"):
        try:
            return numba.njit(nogil=True, cache=True)(function)  # type: ignore[no-any-return]
        except RuntimeError:  # numba's own check of the folder failed after all
            pass
    return numba.njit(nogil=True)(function)  # type: ignore[no-any-return]
