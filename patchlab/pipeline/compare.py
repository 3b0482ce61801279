"""Two results side by side: dictionaries, fits or banks, of one camera or of two."""

from __future__ import annotations

from collections import Counter
from dataclasses import dataclass, field
from pathlib import Path
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab import bank as banks
from patchlab import store
from patchlab.conventions import shift_cosine
from patchlab.errors import UsageError
from patchlab.families import render
from patchlab.types import F64, KernelFits

Kind = Literal["bank", "dictionary", "fits"]
EQUIVALENT = 0.999
"""|cos| of every pair at which two results count as one."""


@dataclass(frozen=True, eq=False)
class Side:
    """One of the two: its kernels and what is known of their shapes.

    Parameters
    ----------
    kernels : ndarray (k, size, size), of colour pixels (k, size, size, samples)
    shapes : name with its unit to ndarray (m,)
    families : how many kernels each family describes
    digest : of the kernels' bytes
    """

    kernels: F64
    shapes: dict[str, F64]
    families: dict[str, int]
    digest: str


@dataclass(frozen=True, eq=False)
class Comparison:
    """Two results, matched.

    Parameters
    ----------
    kind : what they are
    first, second : Side; the pairs are ``first.kernels[left[i]]`` and ``second.kernels[right[i]]``
    left, right : int64 ndarray (n,), the pairs, worst first
    cosine : ndarray (n,), |cos| of each pair, over whole-pixel shifts for banks
    """

    kind: Kind
    first: Side
    second: Side
    left: NDArray[np.int64]
    right: NDArray[np.int64]
    cosine: F64
    distances: dict[str, tuple[float, float]] = field(default_factory=dict)

    @property
    def verdict(self) -> str:
        """bit-equal, equivalent or different."""
        if self.first.digest == self.second.digest:
            return "bit-equal"
        same = self.first.kernels.shape == self.second.kernels.shape
        return "equivalent" if same and (self.cosine >= EQUIVALENT).all() else "different"

    def plain(self) -> dict[str, Any]:
        """As plain data: what the command prints."""
        return {
            "kind": self.kind,
            "verdict": self.verdict,
            "first": len(self.first.kernels),
            "second": len(self.second.kernels),
            "worst_cosine": round(float(self.cosine.min()), 6),
            "median_cosine": round(float(np.median(self.cosine)), 6),
            "matched_at_0.95": round(float((self.cosine >= 0.95).mean()), 4),
            "shapes": {
                name: {
                    "first_median": round(float(np.median(self.first.shapes[name])), 5),
                    "second_median": round(float(np.median(self.second.shapes[name])), 5),
                    "distance": round(distance, 4),
                    "chance": round(chance, 4),
                }
                for name, (distance, chance) in self.distances.items()
            },
            "families": {"first": self.first.families, "second": self.second.families},
        }


def compare(first: Path, second: Path) -> Comparison:
    """Match two dictionaries, fits or banks, and measure how their shapes differ as crowds.

    Dictionaries and fits are matched one to one at the same place in the patch, each kernel
    of a bank with its best counterpart over shifts. ``distances`` holds, for each shape,
    Kolmogorov-Smirnov's distance (Kuiper's for directions) and what two draws of as many
    kernels from one camera exceed once in twenty.

    Raises
    ------
    UsageError : two kinds of results, or patches of two sizes.
    """
    kind, one = _side(first)
    other, two = _side(second)
    if kind != other:
        raise UsageError(f"cannot compare a {kind} with a {other}")
    left, right, cosine = _pairs(kind, one.kernels, two.kernels)
    order = np.argsort(cosine, kind="stable")
    return Comparison(
        kind, one, two, left[order], right[order], cosine[order], _distances(kind, one, two)
    )


def _pairs(kind: Kind, a: F64, b: F64) -> tuple[NDArray[np.int64], NDArray[np.int64], F64]:
    left = np.arange(len(a))
    if kind == "bank":
        table = np.array([[shift_cosine(k, m) for m in b] for k in a])
        return left, table.argmax(axis=1), table.max(axis=1)
    from patchlab import learn  # only here: a bank is compared without the learner

    if len(a) <= len(b):
        right, signed = learn.match(a, b)
        return left, right, np.abs(signed)
    chosen, signed = learn.match(b, a)
    return chosen, np.arange(len(b)), np.abs(signed)


def _distances(kind: Kind, one: Side, two: Side) -> dict[str, tuple[float, float]]:
    if kind == "bank":  # its few widths were chosen: no draw of many
        return {}
    from patchlab import learn

    return {
        name: learn.crowd_distance(one.shapes[name], two.shapes[name], "orientation" in name)
        for name in one.shapes
        if one.shapes[name].size and two.shapes[name].size
    }


# ---------------------------------------------------------------- what stands at a path


def _side(path: Path) -> tuple[Kind, Side]:
    for folder in (path, path / "bank"):
        if (folder / "bank.json").is_file():
            return "bank", _bank(folder)
    if (path / "dictionary").is_dir():
        path = path / "dictionary"
    if _kind_at(path) == "fits":
        return "fits", _fits(path)
    return "dictionary", _dictionary(path)


def _kind_at(path: Path) -> str:
    try:
        store.read_manifest(path, "fits")
    except Exception:  # whatever else stands there is named by the next reader
        return ""
    return "fits"


def _bank(folder: Path) -> Side:
    bank, _, head = banks.read_bank(folder)
    families = dict(sorted(Counter(k.family for k in bank.kernels).items()))
    taps = bank.taps.astype(np.float64)
    if bank.mix is not None:  # over the samples, which two banks of one camera share
        taps = taps @ bank.mix.astype(np.float64)
    return Side(taps, {}, families, head["files"]["kernels.npy"])


def _dictionary(path: Path) -> Side:
    from patchlab import learn

    (dictionary, _), head = store.load(path, "dictionary")
    units = {"orientation": "orientation_rad", "frequency": "frequency_cpp", "size": "size_px"}
    shapes = {units[n]: v for n, v in learn.shape_numbers(dictionary.atoms).items()}
    return Side(dictionary.atoms, shapes, {}, head["files"][".0.atoms.npy"])


def _fits(path: Path) -> Side:
    (fits, _), head = store.load(path, "fits")
    return Side(_rendered(fits), _parameters(fits), _families(fits), head["files"]["content.json"])


def _rendered(fits: KernelFits) -> F64:
    drawn = np.stack([render(f.family, f.parameters, fits.size) for f in fits.fits])
    if not fits.colours:
        return drawn
    return np.asarray(drawn[..., None] * np.array([f.direction for f in fits.fits])[:, None, None])


def _families(fits: KernelFits) -> dict[str, int]:
    return dict(sorted(Counter(f.family for f in fits.fits).items()))


def _parameters(fits: KernelFits) -> dict[str, F64]:
    """What good fits measured: direction, widths and, where there is one, frequency."""
    good = [f.parameters for f in fits.fits if f.verdict == "good"]
    names = {"theta_rad": "orientation_rad"}
    return {
        names.get(name, name): np.array([p[name] for p in good if name in p])
        for name in ("theta_rad", "sigma_u_px", "sigma_v_px", "frequency_cpp")
    }
