"""Banks that tests of the bank and of its exports share."""

from __future__ import annotations

import math

import numpy as np

from patchlab.conventions import orientation_lattice, pixel_format
from patchlab.families import render, without_dc
from patchlab.types import Bank, InputContract, InputTable, Kernel


def contract(pixels: str) -> InputContract:
    form = pixel_format(pixels)
    return InputContract(pixels, 0.0, float(form.full_scale))


def table(pixels: str = "Mono8", kind: str = "identity") -> InputTable:
    about = contract(pixels)
    if pixels == "float32":
        if kind == "stabilised":
            return InputTable(kind, about, None, 1.0, slope=0.75, offset=-0.0625, scale=37.3)
        return InputTable("identity", about, None, None)
    codes = np.arange(1 << about.format.bits, dtype=np.float64)
    stabilised = 2 * np.sqrt(np.maximum(codes - 3, 0) / 0.71 + 5.3)
    values = stabilised if kind == "stabilised" else codes
    return InputTable(kind, about, values.astype(np.float32), 1.0 if kind == "stabilised" else None)


def _symmetric(taps, parity):
    sign = 1 if parity == "even" else -1
    return (taps + sign * taps[::-1, ::-1]) / 2


def _mirrored(family, theta, su, sv, size):
    """One kernel of a lattice; the mirror image of its partner bit for bit."""
    fold = min(theta, math.pi - theta)
    parameters = {"theta_rad": fold, "sigma_u_px": su, "sigma_v_px": sv}
    taps = render(family, parameters, size)
    if family == "gd2":
        taps = without_dc(taps, np.abs(render("gd1", parameters, size)) + 1e-3)
    taps = _symmetric(taps, "odd" if family == "gd1" else "even").astype(np.float32)
    if theta > fold + 1e-9:
        return taps[:, ::-1]
    across = taps[:, ::-1]
    if fold < 1e-9:
        taps = (taps - across) / 2 if family == "gd1" else (taps + across) / 2
    elif abs(fold - math.pi / 2) < 1e-9:
        taps = (taps + across) / 2
    return taps


def lattice_bank(
    name="lattice",
    *,
    families=("gd1",),
    count=8,
    widths=((1.2, 2.4), (2.0, 3.0)),
    size=11,
    pixels="Mono8",
    kind="identity",
    border="mirror101",
    strength="step",
) -> Bank:
    """Mirrored Gaussian derivatives: exact partners, unit norm."""
    kernels, taps = [], []
    for scale, (su, sv) in enumerate(widths):
        for family in families:
            parity = "odd" if family == "gd1" else "even"
            for turn, theta in enumerate(orientation_lattice(count)):
                plane = _mirrored(family, theta, su, sv, size)
                # a power of two: scaling stays exact, so partners stay exact
                taps.append(plane * np.float32(2.0 ** -round(math.log2(np.linalg.norm(plane)))))
                about = {"theta_rad": float(theta), "sigma_u_px": su, "sigma_v_px": sv}
                kernels.append(
                    Kernel(f"{parity}_{scale}_{turn}", family, parity, scale, turn, about, 1.0)
                )
    return Bank(
        name, tuple(kernels), np.stack(taps).astype(np.float32), table(pixels, kind),
        border=border, strength=strength,
    )  # fmt: skip


def given_bank(taps, name="given", *, pixels="Mono8", kind="identity", border="mirror101") -> Bank:
    """Any kernels, without scale or orientation."""
    taps = np.asarray(taps, dtype=np.float32)
    kernels = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(len(taps)))
    return Bank(name, kernels, taps, table(pixels, kind), border=border, purpose="taps")


def random_bank(n=5, size=7, seed=0, **about) -> Bank:
    taps = np.random.default_rng(seed).standard_normal((n, size, size))
    return given_bank(taps / size, "arbitrary", **about)


def picture(shape, pixels="Mono8", seed=1):
    """Random codes over the whole range of a format."""
    random = np.random.default_rng(seed)
    form = pixel_format(pixels)
    if form.integer:
        return random.integers(0, 1 << form.bits, shape).astype(form.dtype)
    return random.random(shape, dtype=np.float32)
