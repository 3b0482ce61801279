"""Time a bank's targets beside the libraries that are installed, interleaved in one run.

Times on a shared machine drift, so every round runs each target once, one after the
other, and only ratios of medians are worth quoting. What a target gives is compared
with the exact responses on a small picture first: a fast wrong answer is not timed.
"""

from __future__ import annotations

import time
from collections.abc import Callable, Iterator, Mapping, Sequence
from dataclasses import dataclass
from importlib import import_module, util
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import BORDERS, pad
from patchlab.errors import UsageError, VerificationError
from patchlab.export.onnx import conv_bound
from patchlab.export.onnx import emit as emit_onnx
from patchlab.progress import Progress, silent
from patchlab.types import F64, Bank

Run = Callable[[NDArray[Any], int], Any]
"""(pixels, threads) to planes, or whatever else is timed."""


@dataclass(frozen=True)
class Entrant:
    """What is timed.

    Parameters
    ----------
    name, note : for people
    run : callable on pixels and a number of threads
    bounds : largest error of each kernel's plane, or None where the result is not planes
    step : value of one unit of the result, one a kernel; None for 1
    threaded : does it take more than one thread?
    """

    name: str
    note: str
    run: Run
    bounds: Sequence[float] | None = None
    step: Sequence[float] | None = None
    threaded: bool = True


@dataclass(frozen=True)
class Timing:
    """Median and spread of one target, milliseconds; ``ratio`` is over the first target.

    ``cpu_ms`` is the median of the processor's time, over all threads: on a machine that does
    other things too it says more than the clock. ``error`` is the worst error over its bound on
    the small picture, None if it was not compared.
    """

    target: str
    threads: int
    median_ms: float
    low_ms: float
    high_ms: float
    cpu_ms: float
    ratio: float
    error: float | None
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


# ---------------------------------------------------------------- libraries


def canny() -> Callable[[NDArray[Any], NDArray[Any], float, float], NDArray[np.bool_]] | None:
    """OpenCV's Canny on 16-bit gradients (x, y) with two thresholds; None where not installed."""
    if util.find_spec("cv2") is None:
        return None
    import cv2

    def run(x: NDArray[Any], y: NDArray[Any], low: float, high: float) -> NDArray[np.bool_]:
        return np.asarray(cv2.Canny(x, y, low, high, L2gradient=True) > 0)

    return run


def libraries(bank: Bank, width: int, height: int) -> Iterator[Entrant]:
    """The libraries that are installed, each given the same work: table, border, every kernel."""
    for maker in (_opencv, _onnxruntime, _torch, _scipy):
        yield from maker(bank, width, height)


def _opencv(bank: Bank, width: int, height: int) -> Iterator[Entrant]:
    if util.find_spec("cv2") is None or bank.border == "wrap":  # filter2D has no wrap
        return
    import cv2

    flag = getattr(cv2, BORDERS[bank.border].opencv)

    def planes(pixels: NDArray[Any], threads: int) -> Any:
        cv2.setNumThreads(threads)
        values = bank.table.apply(pixels)
        return [cv2.filter2D(values, cv2.CV_32F, k, borderType=flag) for k in bank.taps]

    yield Entrant("OpenCV filter2D", f"float32 planes, {cv2.__version__}", planes, conv_bound(bank))
    if not bank.scales:
        return

    def edges(pixels: NDArray[Any], threads: int) -> Any:
        found = planes(pixels, threads)
        even, odd = (bank.members(bank.scales[0], parity) for parity in ("even", "odd"))
        if bank.strength == "energy":
            sizes = [cv2.magnitude(found[e], found[o]) for e, o in zip(even, odd, strict=True)]
        else:
            sizes = [np.abs(found[k]) for k in (odd if bank.strength == "step" else even)]
        best, who = sizes[0], np.zeros(pixels.shape, dtype=np.uint8)
        for turn, size in enumerate(sizes[1:], 1):
            who[size > best] = turn
            best = cv2.max(best, size)
        return best, who

    yield Entrant("OpenCV, strength by hand", f"first scale, {cv2.__version__}", edges)


def _onnxruntime(bank: Bank, width: int, height: int) -> Iterator[Entrant]:
    if util.find_spec("onnxruntime") is None:
        return
    import onnxruntime

    try:
        model = emit_onnx(bank).files[f"{bank.name}.onnx"]
    except (UsageError, KeyError):  # without onnx, or a border that it does not have
        return
    sessions: dict[int, Any] = {}
    room: dict[tuple[int, int], NDArray[np.float32]] = {}

    def planes(pixels: NDArray[Any], threads: int) -> Any:
        if threads not in sessions:
            options = onnxruntime.SessionOptions()
            options.intra_op_num_threads, options.inter_op_num_threads = threads, 1
            sessions[threads] = onnxruntime.InferenceSession(
                model, options, providers=["CPUExecutionProvider"]
            )
        h, w = pixels.shape
        out = room.setdefault((h, w), np.empty((1, len(bank), h, w), dtype=np.float32))
        binding = sessions[threads].io_binding()
        binding.bind_cpu_input("image", np.ascontiguousarray(pixels[None, None]))
        binding.bind_output("responses", "cpu", 0, np.float32, out.shape, out.ctypes.data)
        sessions[threads].run_with_iobinding(binding)
        return out[0]

    note = f"float32 planes, output preallocated, {onnxruntime.__version__}"
    yield Entrant("onnxruntime, exported graph", note, planes, conv_bound(bank))


def _torch(bank: Bank, width: int, height: int) -> Iterator[Entrant]:
    if util.find_spec("torch") is None:
        return
    torch = import_module("torch")

    weights = torch.from_numpy(bank.taps[:, None].copy()).to(memory_format=torch.channels_last)

    def planes(pixels: NDArray[Any], threads: int) -> Any:
        torch.set_num_threads(threads)
        padded = pad(bank.table.apply(pixels), bank.radius, bank.border).astype(np.float32)
        with torch.no_grad():
            found = torch.nn.functional.conv2d(torch.from_numpy(padded[None, None]), weights)
        return found[0].numpy()

    yield Entrant("torch conv2d", f"float32 planes, {torch.__version__}", planes, conv_bound(bank))


def _scipy(bank: Bank, width: int, height: int) -> Iterator[Entrant]:
    import scipy
    from scipy import fft

    def planes(pixels: NDArray[Any], threads: int) -> Any:
        padded = pad(bank.table.apply(pixels), bank.radius, bank.border).astype(np.float32)
        shape = tuple(fft.next_fast_len(n, real=True) for n in padded.shape)
        h, w = pixels.shape
        spectrum = fft.rfft2(padded, shape, workers=threads)
        flipped = bank.taps[:, ::-1, ::-1]
        c = bank.size - 1
        return [
            fft.irfft2(spectrum * fft.rfft2(k, shape), shape, workers=threads)[c : c + h, c : c + w]
            for k in flipped
        ]

    yield Entrant("scipy.fft, spectrum shared", f"float32 planes, {scipy.__version__}", planes)


# ---------------------------------------------------------------- timing


def worst_share(entrant: Entrant, pixels: NDArray[Any], exact: F64) -> float | None:
    """Worst error over its bound on a small picture; None where there is no bound.

    Raises
    ------
    VerificationError : the result is outside its bound.
    """
    if entrant.bounds is None:
        return None
    found = np.asarray(entrant.run(pixels, 1), dtype=np.float64)
    if entrant.step is not None:
        found = found * np.asarray(entrant.step)[:, None, None]
    errors = np.abs(found - exact).max(axis=(1, 2))
    bounds = np.asarray(entrant.bounds)
    share = float(np.max(errors / np.where(bounds > 0, bounds, np.inf)))
    if not (errors <= bounds).all():
        raise VerificationError(
            f"{share:.3g} times its error bound: a wrong answer is not timed", where=entrant.name
        )
    return share


def measure(
    entrants: Sequence[Entrant],
    pixels: NDArray[Any],
    repeats: int,
    *,
    threads: Sequence[int] = (1,),
    small: tuple[NDArray[Any], F64] | None = None,
    progress: Progress = silent,
) -> tuple[Timing, ...]:
    """Run every entrant ``repeats`` times, interleaved, after one warm-up of each.

    Parameters
    ----------
    entrants : ratios are over the first one with the same number of threads
    pixels : ndarray (h, w)
    repeats : timed rounds
    threads : numbers of threads; those that cannot use more are run with one
    small : a small picture and its exact responses; without it nothing is compared

    Returns
    -------
    tuple of Timing, by number of threads, in the order of ``entrants``

    Raises
    ------
    VerificationError : a result is outside its bound.
    """
    shares = {e.name: worst_share(e, *small) if small else None for e in entrants}
    jobs = [(n, e) for n in threads for e in entrants if n == 1 or e.threaded]
    spent: list[list[float]] = [[] for _ in jobs]
    worked: list[list[float]] = [[] for _ in jobs]
    for turn in range(repeats + 1):
        for job, (n, entrant) in enumerate(jobs):
            start, cpu = time.perf_counter(), time.process_time()
            entrant.run(pixels, n)
            if turn:
                spent[job].append(1e3 * (time.perf_counter() - start))
                worked[job].append(1e3 * (time.process_time() - cpu))
        progress("bench", turn, repeats)
    medians = [float(np.median(times)) for times in spent]
    first: Mapping[int, float] = {
        n: m for (n, _), m in reversed(list(zip(jobs, medians, strict=True)))
    }
    return tuple(
        Timing(
            e.name,
            n,
            m,
            min(times),
            max(times),
            float(np.median(cpu)),
            m / first[n],
            shares[e.name],
            e.note,
        )
        for (n, e), m, times, cpu in zip(jobs, medians, spent, worked, strict=True)
    )
