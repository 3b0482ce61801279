"""The banks that speed is quoted for and that the cost model is fitted on; all are made up."""

from __future__ import annotations

import math
from collections.abc import Iterator
from typing import Literal

import numpy as np

from patchlab.bank.lattice import lattice_bank
from patchlab.families import render
from patchlab.types import F32, F64, Bank, InputContract, InputTable, Kernel


def fixed_cases() -> Iterator[tuple[Bank, str]]:
    """The fixed banks, all for 8-bit pixels as they are, and what each stands for."""
    yield (
        mirrored("a", "gabor", 8, 11),
        "16 Gabors 11 x 11, 8 orientations, even and odd, mirrored",
    )
    yield arbitrary("b", 32, 15), "32 kernels 15 x 15, arbitrary"
    yield mirrored("c", "gd", 12, 9), "24 Gaussian derivatives 9 x 9, 12 orientations, mirrored"
    kernels, taps = lattice_bank((8, 8), ((1.2, 1.8), (2.0, 3.0)), ("odd",))
    yield (
        Bank("edges", kernels, taps, _table(), strength="step"),
        "edge bank: 8 orientations, 2 sizes",
    )
    for size in (7, 9, 11, 15, 21, 31):
        yield arbitrary(f"size_{size}", 16, size), f"16 kernels {size} x {size}, arbitrary"
    for count in (4, 8):
        yield arbitrary(f"count_{count}", count, 15), f"{count} kernels 15 x 15, arbitrary"
    yield round_gabors("round", 21), "8 Gabors 21 x 21 with round envelopes"
    yield smooth("smooth", 31), "8 wide step kernels 31 x 31"


def _table() -> InputTable:
    contract = InputContract("Mono8", 0.0, 255.0)
    return InputTable("identity", contract, np.arange(256, dtype=np.float32), None)


def arbitrary(name: str, count: int, size: int) -> Bank:
    """Kernels of noise: no symmetry, full rank."""
    taps = np.random.default_rng(size).standard_normal((count, size, size)) / size
    kernels = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(count))
    return Bank(name, kernels, taps.astype(np.float32), _table(), purpose="taps")


def mirrored(name: str, family: str, count: int, size: int) -> Bank:
    """Even and odd kernels of one size, mirror images tap for tap."""
    kernels, taps = [], []
    parities: tuple[Literal["even", "odd"], ...] = ("even", "odd")
    for parity in parities:
        planes: list[F32] = []
        for j in range(count):
            if 2 * j > count:
                planes.append(planes[count - j][:, ::-1])
            else:
                planes.append(_drawn(family, parity, j, count, size).astype(np.float32))
            about = {"theta_rad": math.pi * j / count}
            kernels.append(Kernel(f"{parity}_{j}", family, parity, 0, j, about, 1.0))
        taps += planes
    return Bank(name, tuple(kernels), np.stack(taps), _table(), strength="energy")


def _drawn(family: str, parity: str, j: int, count: int, size: int) -> F64:
    """Orientation j of the first quarter turn, with its exact symmetries."""
    p = {"theta_rad": math.pi * j / count, "sigma_u_px": size / 6, "sigma_v_px": size / 5}
    if family == "gabor":
        p |= {"frequency_cpp": 0.15, "phase_rad": 0.0 if parity == "even" else math.pi / 2}
        plane = render("gabor", p, size)
    else:
        plane = render("gd2" if parity == "even" else "gd1", p, size)
    sign = 1 if parity == "even" else -1
    plane = (plane + sign * plane[::-1, ::-1]) / 2
    if j == 0:
        plane = (plane + plane[::-1]) / 2
    if 2 * j == count:
        plane = (plane + plane[:, ::-1]) / 2
    return plane


def round_gabors(name: str, size: int) -> Bank:
    """Four orientations, even and odd, round envelopes: every one is two separable products."""
    taps = []
    for j in range(4):
        for phase in (0.0, math.pi / 2):
            p = {"theta_rad": math.pi * (j + 0.3) / 4, "frequency_cpp": 0.12, "phase_rad": phase}
            p |= {"sigma_u_px": size / 6, "sigma_v_px": size / 6}
            taps.append(render("gabor", p, size))
    return _given(name, np.stack(taps))


def smooth(name: str, size: int) -> Bank:
    """Eight wide step kernels of low frequency."""
    about = {"sigma_u_px": size / 10, "sigma_v_px": size / 9}
    turns = [math.pi * (j + 0.3) / 8 for j in range(8)]
    return _given(name, np.stack([render("gd1", about | {"theta_rad": t}, size) for t in turns]))


def _given(name: str, taps: F64) -> Bank:
    unit = taps / np.linalg.norm(taps, axis=(1, 2), keepdims=True)
    kernels = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(len(taps)))
    return Bank(name, kernels, unit.astype(np.float32), _table(), purpose="taps")


def calibration_banks() -> Iterator[tuple[Bank, tuple[str, ...]]]:
    """Banks that strain each price of the cost model, and the plans that they are timed by."""
    yield arbitrary("one_3", 1, 3), ("direct",)
    yield arbitrary("many_7", 16, 7), ("direct", "fft")
    yield arbitrary("many_11", 12, 11), ("direct", "fft")
    yield arbitrary("few_21", 4, 21), ("direct", "fft")
    yield mirrored("gabors_11", "gabor", 8, 11), ("parity", "separable")
    yield mirrored("steps_9", "gd", 12, 9), ("parity",)
    yield round_gabors("round_11", 11), ("parity", "separable")
    yield round_gabors("round_21", 21), ("separable", "fft")
    yield smooth("smooth_31", 31), ("halved", "parity")
