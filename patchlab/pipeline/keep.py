"""Where an interrupted learner stands, kept in the run's folder as one hidden file.

The file carries a digest of what the stage was asked for; a learner goes on from it only
where the digest, the environment and the recipe are the same, so it ends with the answer
that it would have given without a break.
"""

from __future__ import annotations

import io
import zipfile
from collections.abc import Callable, Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any, Protocol, TypeVar

import numpy as np
from numpy.typing import NDArray

from patchlab import store
from patchlab.errors import InputError

FILE = ".learning.npz"
"""Name of the file, beside the stages' folders."""


class Standing(Protocol):
    """A learner's state: named arrays."""

    def arrays(self) -> dict[str, NDArray[Any]]:
        """Everything as named arrays."""


S = TypeVar("S")


@dataclass(frozen=True)
class Keeper:
    """Keeps and gives back one stage's state.

    Parameters
    ----------
    folder : the run's
    digest : of what the stage was asked for
    """

    folder: Path
    digest: str

    @staticmethod
    def of(folder: Path, about: Mapping[str, Any]) -> Keeper:
        """For a stage that is asked for ``about``, in this environment."""
        wanted = {"about": dict(about), "environment": store.environment()}
        return Keeper(folder, store.sha256(store.canonical_json(wanted)))

    @property
    def path(self) -> Path:
        """The file."""
        return self.folder / FILE

    def keep(self, standing: Standing) -> None:
        """Write a state whole, over the one before."""
        buffer = io.BytesIO()
        arrays: dict[str, Any] = {"digest": np.array(self.digest), **standing.arrays()}
        np.savez(buffer, **arrays)
        store.write_file(self.path, buffer.getvalue())

    def find(self, rebuild: Callable[[Mapping[str, NDArray[Any]]], S]) -> S | None:
        """The state that was kept, or None where there is none of this very stage.

        A damaged file counts as none: it only saves time.
        """
        try:
            held = io.BytesIO(self.path.read_bytes())
            with np.load(held, allow_pickle=False) as data:
                arrays = {name: data[name] for name in data.files}
            return rebuild(arrays) if str(arrays.get("digest")) == self.digest else None
        except (OSError, ValueError, EOFError, zipfile.BadZipFile, InputError):
            return None

    def drop(self) -> None:
        """Remove the file."""
        self.path.unlink(missing_ok=True)
