"""Time a bank's targets beside the libraries that are installed, interleaved in one run.

Times on a shared machine drift, so every round runs each target once, one after the
other, and only ratios of medians are worth quoting.
"""

from __future__ import annotations

import time
from collections.abc import Callable, Iterator, Mapping
from dataclasses import dataclass
from importlib import util
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import BORDERS
from patchlab.progress import Progress, silent
from patchlab.types import Bank

Run = Callable[[NDArray[Any]], Any]


@dataclass(frozen=True)
class Timing:
    """Median and spread of one target, milliseconds; ``ratio`` is over the first target."""

    target: str
    median_ms: float
    low_ms: float
    high_ms: float
    ratio: float
    note: str


def picture(bank: Bank, width: int, height: int) -> NDArray[Any]:
    """A picture with structure in the bank's pixels: a ramp, a wave and noise."""
    rng = np.random.default_rng(1)
    y, x = np.mgrid[0:height, 0:width]
    unit = 0.45 + 0.2 * x / width + 0.2 * np.sin(x / 7.0) * np.cos(y / 11.0)
    unit = np.clip(unit + rng.normal(0, 0.02, unit.shape), 0, 1)
    low, high = bank.contract.black, bank.contract.white
    scaled = low + (high - low) * unit
    if bank.contract.format.integer:
        scaled = np.rint(scaled)
    return np.asarray(scaled, dtype=bank.contract.format.dtype)


def libraries(bank: Bank) -> Iterator[tuple[str, Run, str]]:
    """The libraries that are installed, each given the same work: table, then every kernel."""
    if util.find_spec("cv2") is not None and bank.border != "wrap":  # filter2D has no wrap
        import cv2

        cv2.setNumThreads(1)
        flag = getattr(cv2, BORDERS[bank.border].opencv)

        def by_opencv(pixels: NDArray[Any]) -> Any:
            values = bank.table.apply(pixels)
            return [cv2.filter2D(values, cv2.CV_32F, k, borderType=flag) for k in bank.taps]

        yield "OpenCV filter2D", by_opencv, f"float32, {cv2.__version__}"


def canny() -> Callable[[NDArray[Any], NDArray[Any], float, float], NDArray[np.bool_]] | None:
    """OpenCV's Canny on 16-bit gradients (x, y) with two thresholds; None where not installed."""
    if util.find_spec("cv2") is None:
        return None
    import cv2

    def run(x: NDArray[Any], y: NDArray[Any], low: float, high: float) -> NDArray[np.bool_]:
        return np.asarray(cv2.Canny(x, y, low, high, L2gradient=True) > 0)

    return run


def onnx_graph(model: bytes) -> tuple[str, Run, str] | None:
    """The exported graph in onnxruntime on one thread; None where it is not installed."""
    try:
        import onnxruntime
    except ImportError:
        return None
    options = onnxruntime.SessionOptions()
    options.intra_op_num_threads = options.inter_op_num_threads = 1
    session = onnxruntime.InferenceSession(model, options, providers=["CPUExecutionProvider"])

    def run(pixels: NDArray[Any]) -> Any:
        return session.run(["responses"], {"image": pixels[None, None]})

    return "onnxruntime, exported graph", run, f"float32, {onnxruntime.__version__}"


def measure(
    targets: Mapping[str, tuple[Run, str]],
    pixels: NDArray[Any],
    repeats: int,
    progress: Progress = silent,
) -> tuple[Timing, ...]:
    """Run every target ``repeats`` times, interleaved, after one warm-up of each.

    Parameters
    ----------
    targets : name to (callable on pixels, note); ratios are over the first
    pixels : ndarray (h, w)
    repeats : timed rounds

    Returns
    -------
    tuple of Timing, in the order of ``targets``
    """
    spent: dict[str, list[float]] = {name: [] for name in targets}
    for turn in range(repeats + 1):
        for name, (run, _) in targets.items():
            start = time.perf_counter()
            run(pixels)
            if turn:
                spent[name].append(1e3 * (time.perf_counter() - start))
        progress("bench", turn, repeats)
    medians = {name: float(np.median(times)) for name, times in spent.items()}
    first = next(iter(medians.values()))
    return tuple(
        Timing(name, medians[name], min(times), max(times), medians[name] / first, targets[name][1])
        for name, times in spent.items()
    )
