"""A bank that stands in a folder, ready to be called: what ``patchlab.load_bank`` gives.

Neither the learner nor numba is imported here, nor what reads photographs.
"""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass
from pathlib import Path
from typing import Any

import numpy as np
from numpy.typing import ArrayLike, NDArray

from patchlab import bank as banks
from patchlab import edges
from patchlab.errors import InputError
from patchlab.pipeline.bundle import open_native, own_library
from patchlab.pipeline.edgel_rules import compiled_edgels
from patchlab.types import F32, Bank, EdgeMap, Plan


@dataclass(frozen=True, eq=False)
class LoadedBank:
    """A bank, its plan, and the engine that runs it.

    Parameters
    ----------
    bank, plan, manifest : as read from ``folder``
    folder : where it stands
    native : the compiled library, or None: then numpy runs the plan
    """

    bank: Bank
    plan: Plan
    manifest: Mapping[str, Any]
    folder: Path
    native: banks.NativeBank | None = None

    def __repr__(self) -> str:
        b = self.bank
        how = "compiled" if self.native else "numpy"
        pixels = b.contract.pixels
        return f"<bank {b.name}: {len(b)} kernels of {b.size} x {b.size}, {pixels}, {how}>"

    def responses(self, image: ArrayLike) -> F32:
        """Responses of every kernel.

        Parameters
        ----------
        image : (h, w) of the contract's dtype in any byte order, both sides at least the
            kernels'; for a contract of floats, of any real dtype

        Returns
        -------
        float32 ndarray (n, h, w), within ``plan.error_bound`` of the exact responses

        Raises
        ------
        InputError : the picture does not fit the bank.
        """
        pixels = self._pixels(image)
        if self.native is not None:
            return self.native.responses(pixels)
        return banks.responses(self.bank, pixels, self.plan)

    def edges(
        self,
        image: ArrayLike,
        *,
        rate: float | None = None,
        threshold: float | None = None,
        invalid: NDArray[np.bool_] | None = None,
    ) -> EdgeMap:
        """Edges of one picture: strength, winning direction, thinned elements.

        Parameters
        ----------
        image : as :meth:`responses`
        rate : false elements per megapixel of flat picture; 10 when nothing is given
        threshold : a strength in place of a rate
        invalid : bool ndarray (h, w); elements whose kernel touches such a pixel are dropped

        Raises
        ------
        InputError : the picture does not fit the bank.
        UsageError : the bank finds no edges, both a rate and a threshold, a rate that its table
            does not hold.
        """
        return edges.detect(
            self.bank,
            self._pixels(image),
            self.responses,
            rate=rate,
            threshold=threshold,
            invalid=invalid,
        )

    def edgels(
        self,
        image: ArrayLike,
        *,
        rate: float | None = None,
        threshold: float | None = None,
        invalid: NDArray[np.bool_] | None = None,
    ) -> NDArray[np.void]:
        """Edge elements placed below the pixel; parameters and failures as :meth:`edges`.

        Returns
        -------
        structured ndarray of :data:`patchlab.types.EDGEL`
        """
        pixels = self._pixels(image)
        if invalid is None:
            levels = edges.levels_of(self.bank, None, rate, threshold)
            compiled = compiled_edgels(self.bank, self.native, levels)
            if compiled is not None:
                return compiled(pixels)
        _, found = edges.detect_edgels(
            self.bank,
            pixels,
            self.responses,
            rate=rate,
            threshold=threshold,
            invalid=invalid,
            blur_px=self.bank.provenance.get("blur_sigma_px"),
        )
        return found

    def _pixels(self, image: ArrayLike) -> NDArray[Any]:
        """The picture in the contract's dtype, where that changes no value beyond its rounding."""
        if isinstance(image, np.ma.MaskedArray) and np.ma.is_masked(image):
            raise InputError(
                "the picture has masked pixels, which an array of codes cannot say",
                remedy="give its filled data, and its mask as invalid",
            )
        pixels, wanted = np.asarray(image), np.dtype(self.bank.contract.format.dtype)
        same = pixels.dtype.newbyteorder("=") == wanted
        real = pixels.dtype.kind in "iuf" and wanted.kind == "f"
        if not (same or real):
            return pixels  # refused with a sentence where it is used
        with np.errstate(over="ignore"):  # beyond float32 is infinite, and refused as that
            return np.asarray(pixels, dtype=wanted)


def load_bank(path: str | Path, *, library: bool = False) -> LoadedBank:
    """Read a bank from its folder, or from a run's folder.

    Nothing of the folder is run unless ``library`` asks for its compiled code, and then only
    after its hash was checked; numpy gives responses within the same bound, more slowly.

    Parameters
    ----------
    path : the folder
    library : load this machine's library

    Raises
    ------
    InputError : no bank here, a damaged one, one of a newer format; no library for this machine.
    VerificationError : a file was changed after it was written.
    """
    folder = bank_folder(Path(path))
    bank, plan, head = banks.read_bank(folder)
    native = open_native(folder, bank, plan, head) if library else None
    if library and native is None:
        raise InputError(
            f"there is no {own_library(bank)}",
            where=str(folder),
            remedy="load it without library, or export the bank on this machine",
        )
    return LoadedBank(bank, plan, head, folder, native)


def bank_folder(path: Path) -> Path:
    """The bank at a path: the folder itself, or the bank inside a run's folder."""
    if not (path / "bank.json").is_file() and (path / "bank" / "bank.json").is_file():
        return path / "bank"
    return path
