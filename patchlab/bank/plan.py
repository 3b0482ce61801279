"""How a bank is computed: shared work, counted operations, a proven error bound.

A plan is a list of *products* and a list of *sums*. A product is a set of
coefficients dotted with a *basis* of picture values; a kernel's response is a
signed sum of products. Five bases are known, with c the kernel's radius:

====  ==================================================================
all   ``p(y + j - c, x + i - c)``: the taps themselves (the direct plan)
ee    rows y + j and y - j added, columns x + i and x - i added
eo    rows added, columns subtracted
oe    rows subtracted, columns added
oo    both subtracted
====  ==================================================================

with j and i from 0 or 1 to c; rows and columns of zeros at the rim are cut off.
Every kernel is the sum of its four x/y-parity parts, so the last four reach any
kernel. A point-symmetric or antisymmetric kernel has only two parts, and a kernel
and its mirror image have the same parts up to sign: equal parts are computed
once. That is exact algebra; sharing needs the symmetry to hold bit for bit in
the float32 taps.
"""

from __future__ import annotations

import hashlib
from collections.abc import Iterator, Mapping
from typing import Any

import numpy as np

from patchlab.bank.fixed import fixed_point
from patchlab.bank.products import (
    EVERY,
    Part,
    Product,
    Sum,
    clusters,
    parity_parts,
    share,
    unfold,
    uses_of,
)
from patchlab.bank.tile_fft import LARGEST, LENGTH, TileFFT, tile_fft
from patchlab.bank.tile_fft import bound as tile_bound
from patchlab.bank.tile_fft import cost as tile_cost
from patchlab.bank.tile_fft import work as tile_work
from patchlab.conventions import gamma
from patchlab.errors import UsageError
from patchlab.types import F32, F64, Bank, Plan

KINDS = ("auto", "direct", "parity", "fft")
CLEARLY = 1.5
"""How many times fewer operations tile transforms must promise to be taken."""
GROUP = 6
"""Products that are computed together: what the registers of a core hold."""


# ---------------------------------------------------------------- strength


def strength_members(bank: Bank, scale: int) -> tuple[tuple[int, int | None, int | None], ...]:
    """Which kernels make the strength of one scale.

    Parameters
    ----------
    bank : Bank
    scale : position among ``bank.scales``, 0 the finest

    Returns
    -------
    tuple of (orientation, even kernel or None, odd kernel or None), by orientation

    Raises
    ------
    UsageError : no such scale, or the scale lacks the kernels its strength is made of.
    """
    if not 0 <= scale < len(bank.scales):
        raise UsageError(
            f"scale {scale} is not in this bank, which has {len(bank.scales)}", where=bank.name
        )
    found = {}
    for parity in ("even", "odd"):
        members = bank.members(bank.scales[scale], parity)
        found[parity] = {
            place
            if bank.kernels[i].orientation is None
            else int(bank.kernels[i].orientation or 0): i
            for place, i in enumerate(members)
        }
    even, odd = found["even"], found["odd"]
    wanted = {"step": odd, "line": even, "energy": odd}[bank.strength]
    if not wanted or (bank.strength == "energy" and set(even) != set(odd)):
        needs = {"step": "odd kernels", "line": "even kernels", "energy": "even and odd pairs"}
        raise UsageError(
            f"scale {scale} has no {needs[bank.strength]} for the strength {bank.strength!r}",
            where=bank.name,
        )
    return tuple(
        (
            turn,
            even[turn] if bank.strength != "step" else None,
            odd[turn] if bank.strength != "line" else None,
        )
        for turn in sorted(wanted)
    )


# ---------------------------------------------------------------- planning


def _split(exact: F64) -> tuple[dict[int, dict[Part, F64]], dict[int, dict[Part, F64]]]:
    """Every kernel (h, h) or (h, h, planes) by its parity parts, and as it is, plane by plane."""
    parity: dict[int, dict[Part, F64]] = {}
    direct: dict[int, dict[Part, F64]] = {}
    for index, kernel in enumerate(exact):
        planes = [kernel] if kernel.ndim == 2 else list(np.moveaxis(kernel, -1, 0))
        own = [(m, part) for m, taps in enumerate(planes) for part in parity_parts(taps).items()]
        parity[index] = {(m, basis): part for m, (basis, part) in own}
        read = [m for m, taps in enumerate(planes) if taps.any()]
        if len(read) > 1:
            direct[index] = {(EVERY, "all"): np.stack(planes)}
        else:
            direct[index] = {(m, "all"): planes[m] for m in read or [0]}
    return parity, direct


def _worth_splitting(
    split: Mapping[int, Mapping[Part, F64]], whole: Mapping[int, Mapping[Part, F64]]
) -> set[int]:
    """Kernels for which the parity split saves more than its additions cost."""
    products, sums = share(split)
    chosen: set[int] = set()
    for cluster in clusters(sums):
        used = {product for index in cluster for product, _ in sums[index]}
        coefficients = sum(products[p].exact.size for p in used)
        # a basis value takes one addition for every group of products that reads it
        parity = 2 * coefficients + coefficients // GROUP + sum(len(sums[i]) for i in cluster)
        direct, _ = share({index: whole[index] for index in cluster})
        if parity < sum(2 * p.exact.size for p in direct):
            chosen.update(cluster)
    return chosen


def _group(products: list[Product], sums: Mapping[int, Sum], bank: Bank) -> list[list[int]]:
    """Products of one plane, basis, shape and use (scale and parity), at most GROUP together."""
    use: dict[int, tuple[Any, ...]] = {}
    for index, terms in sums.items():
        kernel = bank.kernels[index]
        scale = -1 if kernel.scale is None else kernel.scale
        for product, _ in terms:
            p = products[product]
            use.setdefault(product, (scale, kernel.parity, p.plane, p.basis, p.exact.shape))
    groups: list[list[int]] = []
    for key in sorted(set(use.values())):
        same = [p for p in sorted(use) if use[p] == key]
        count = -(-len(same) // GROUP)
        groups += [list(map(int, part)) for part in np.array_split(same, count)]
    return groups


def _by_plane(p: Product) -> list[tuple[int, F32, F64]]:
    """The working planes that a product reads, with its coefficients there."""
    if p.plane != EVERY:
        return [(p.plane, p.rounded, p.exact)]
    return [(m, p.rounded[m], p.exact[m]) for m in range(len(p.exact))]


def _bounds(
    products: list[Product], sums: Mapping[int, Sum], spans: tuple[float, ...], mixing: int
) -> tuple[float, ...]:
    """Largest |float32 response - exact response| for every kernel; see :func:`make_plan`."""
    bounds = []
    for index in sorted(sums):
        totals = [0.0] * len(spans)
        for number, _ in sums[index]:
            p = products[number]
            uses = uses_of(p.basis, (p.exact.shape[-2], p.exact.shape[-1]))
            folds = 0 if p.basis == "all" else 2
            roundings = p.exact.size + folds + len(sums[index]) - 1 + mixing
            for plane, rounded, exact in _by_plane(p):
                size = float((np.abs(rounded).astype(np.float64) * uses).sum())
                totals[plane] += gamma(roundings) * size
                totals[plane] += float((np.abs(rounded - exact) * uses).sum())
        bounds.append(sum(total * span for total, span in zip(totals, spans, strict=True)))
    return tuple(bounds)


def _additions(products: list[Product], groups: list[list[int]], sums: Mapping[int, Sum]) -> int:
    """Additions for each pixel: folding rows and columns, summing products, joining them."""
    used = [products[p] for group in groups for p in group]
    fold_rows = {(p.plane, p.basis[0], p.exact.shape[0] - (p.basis[0] == "e")) for p in used}
    total = sum(count for _, kind, count in fold_rows if kind != "a")
    for group in groups:
        first = products[group[0]]
        rows, cols = first.exact.shape[-2:]
        if first.basis != "all":
            total += rows * (cols - (first.basis[1] == "e"))
        total += len(group) * (first.exact.size - 1)
    return int(total) + sum(max(len(terms) - 1, 0) for terms in sums.values())


def _interface_number(bank: Bank) -> int:
    """A number that changes with anything a program built against the bank relies on."""
    h = hashlib.sha256(b"patchlab C interface 2\0")
    table = bank.table
    names = "\0".join(k.name for k in bank.kernels)
    about = f"{bank.name}\0{table.contract.pixels}\0{bank.border}\0{bank.strength}\0{names}"
    about += f"\0{table.kind}\0{table.slope!r}\0{table.offset!r}\0{table.scale!r}"
    h.update(about.encode())
    h.update(np.ascontiguousarray(bank.taps, "<f4").tobytes())
    if bank.mix is not None:
        h.update(np.ascontiguousarray(bank.mix, "<f4").tobytes())
    if table.values is not None:
        h.update(np.ascontiguousarray(table.values, "<f4").tobytes())
    return int(h.hexdigest()[:7], 16)


def _which(plane: int) -> str:
    return ", in every working plane" if plane == EVERY else f", working plane {plane + 1}"


def _lines(
    products: list[Product], groups: list[list[int]], coloured: bool = False
) -> tuple[str, ...]:
    words = {
        "all": "taps as they are",
        "ee": "even in y, even in x",
        "eo": "even in y, odd in x",
        "oe": "odd in y, even in x",
        "oo": "odd in y, odd in x",
    }
    return tuple(
        f"{len(group)} x {products[group[0]].exact.shape[-2]} x "
        f"{products[group[0]].exact.shape[-1]} coefficients, {words[products[group[0]].basis]}"
        + _which(products[group[0]].plane)
        * coloured
        for group in groups
    )


def _name(products: list[Product], sums: Mapping[int, Sum], tiles: TileFFT | None) -> str:
    used = {products[p].basis for k in sums if tiles is None or k not in tiles.kernels
            for p, _ in sums[k]}  # fmt: skip
    rows = "parity" if used - {"all"} else "direct"
    if tiles is None:
        return rows
    return f"{rows} and tile FFT" if used else "tile FFT"


def _mixing(bank: Bank) -> tuple[int, int]:
    """Multiplies and additions a pixel that make the working planes."""
    if bank.mix is None:
        return 0, 0
    planes, samples = bank.mix.shape
    return planes * samples, planes * (samples - 1)


def _counted(
    bank: Bank,
    products: list[Product],
    groups: list[list[int]],
    sums: Mapping[int, Sum],
    tiles: TileFFT | None,
) -> tuple[tuple[str, ...], float, float]:
    """What is computed, in words, and its multiplies and additions a pixel."""
    if tiles is None:
        mixing = _mixing(bank)
        work = float(sum(p.exact.size for p in products) + mixing[0])
        summed = float(_additions(products, groups, sums) + mixing[1])
        return _lines(products, groups, bank.planes > 1), work, summed
    rest = {k: terms for k, terms in sums.items() if k not in tiles.kernels}
    used = {p for terms in rest.values() for p, _ in terms}
    kept = [[p for p in group if p in used] for group in groups]
    kept = [group for group in kept if group]
    times, plus = tile_work(tiles.size, len(tiles.kernels))
    line = (
        f"{len(tiles.kernels)} kernels of {tiles.size} x {tiles.size} by tile FFT, blocks of "
        f"{LENGTH} rows for {tiles.rows}"
    )
    multiplies = sum(products[p].exact.size for p in used) + times
    adds = (_additions(products, kept, rest) if kept else 0) + plus
    return (*_lines(products, kept), line), float(multiplies), float(adds)


def _by_tiles(
    bank: Bank, products: list[Product], sums: Mapping[int, Sum], kind: str
) -> tuple[int, ...]:
    """Kernels whose responses compiled code makes by tile transforms.

    Kernels that make a strength stay with the products, which fused edges need. Of the others a
    cluster goes when that saves operations. With float pixels none goes unasked: a pixel that is
    not a number, or far beyond the contract, would spoil its whole block.
    """
    if bank.planes > 1:
        return ()
    fused = {k for s in range(len(bank.scales)) for _, *pair in strength_members(bank, s)
             for k in pair if k is not None}  # fmt: skip
    free = {k: terms for k, terms in sums.items() if k not in fused and terms}
    each = tile_cost(bank.size, len(free)) / max(len(free), 1) if bank.size <= LARGEST else np.inf
    unasked = kind == "auto" and bank.contract.format.integer
    chosen: list[int] = []
    for cluster in clusters(free):
        work = sum(products[p].exact.size for p in {p for k in cluster for p, _ in sums[k]})
        if kind == "fft" or (unasked and CLEARLY * each * len(cluster) < work):
            chosen += cluster
    return tuple(sorted(chosen))


def make_plan(bank: Bank, kind: str = "auto") -> Plan:
    """Plan a bank's computation.

    Parameters
    ----------
    bank : Bank
    kind : "direct" (every tap), "parity" (every kernel by its parts), "fft" (every kernel that
        makes no strength by tile transforms, see :mod:`patchlab.bank.tile_fft`) or "auto", which
        takes for each set of kernels that share parts whichever needs fewer operations

    Returns
    -------
    Plan : its ``detail`` holds ``bases`` and ``planes`` (one a product; the working plane),
        ``coefficients`` (float32 arrays, one a product), ``sums`` (one a kernel),
        ``product_groups``, ``strength`` (one entry a scale, as :func:`strength_members`), ``fft``
        (kernels by tile transforms, or None), ``fixed`` (the bank in 16-bit fixed point, or
        None), ``abi`` (the interface's number), ``asked`` (the kind)

    Raises
    ------
    UsageError : an unknown kind, tile transforms of colours, or a scale that lacks the kernels its
        strength is made of.

    Notes
    -----
    The bound of a kernel is the sum over its products of
    ``gamma_n sum|coefficient| uses X + sum|rounding of the coefficient| uses X``, where n counts
    the roundings on the longest path (products and sums, two folds, the joins), ``uses`` is how
    many pixels a basis value is made of, and X the largest absolute working value of the input
    contract. It holds for every order of summation, with fused multiply-adds or without (Higham
    2002, section 3.1), barring underflow. For float32 pixels X is the contract's largest level:
    the bound scales with the working values if larger ones are given. Of a colour bank X is that
    of the product's working plane, whose mixing from C samples counts C roundings more. A kernel by
    tile transforms has the larger of this bound and :func:`patchlab.bank.tile_fft.bound`; the
    products stand by for engines that take them instead, and for fixed point.
    """
    if kind not in KINDS:
        raise UsageError(f"unknown plan {kind!r}", remedy=f"choose one of {', '.join(KINDS)}")
    if kind == "fft" and bank.planes > 1:
        raise UsageError("tile transforms take one plane", remedy="choose auto, direct or parity")
    exact = bank.taps.astype(np.float64)
    split, whole = _split(exact)
    chosen = set(split) if kind == "parity" else set()
    if kind == "auto":
        chosen = _worth_splitting(split, whole)
    mixed = {i: split[i] if i in chosen else whole[i] for i in split}
    products, sums = share(mixed)
    groups = _group(products, sums, bank)
    tiles = tile_fft(bank.taps, _by_tiles(bank, products, sums, kind))
    mixing = 0 if bank.mix is None else bank.mix.shape[1]
    spans = tuple(float(reach) * bank.table.span for reach in bank.plane_reach)
    bounds = _bounds(products, sums, spans, mixing)
    if tiles is not None:
        bounds = tuple(
            max(b, tile_bound(exact[k], bank.table.span)) if k in tiles.kernels else b
            for k, b in enumerate(bounds)
        )
    order = tuple(sums[i] for i in sorted(sums))
    lines, multiplies, adds = _counted(bank, products, groups, sums, tiles)
    return Plan(
        kind=_name(products, sums, tiles),
        groups=lines,
        multiplies=multiplies,
        adds=adds,
        error_bound=bounds,
        detail={
            "bases": tuple(p.basis for p in products),
            "planes": tuple(p.plane for p in products),
            "coefficients": tuple(p.rounded for p in products),
            "sums": order,
            "fft": tiles,
            "product_groups": tuple(tuple(g) for g in groups),
            "fixed": None
            if bank.planes > 1
            else fixed_point(
                bank,
                [p.basis for p in products],
                [p.rounded for p in products],
                order,
                tuple(tuple(g) for g in groups),
            ),
            "strength": tuple(strength_members(bank, s) for s in range(len(bank.scales))),
            "abi": _interface_number(bank),
            "asked": kind,
        },
    )


def rebuilt_taps(plan: Plan, size: int) -> Iterator[F64]:
    """The kernels a plan of one plane really computes, unfolded again; float64 (size, size) each.

    They differ from the bank's taps by the rounding of the parts and nothing else.
    """
    c = size // 2
    for terms in plan.detail["sums"]:
        kernel = np.zeros((size, size))
        for product, sign in terms:
            basis = plan.detail["bases"][product]
            values = plan.detail["coefficients"][product].astype(np.float64)
            kernel += sign * unfold(values, basis, c)
        yield kernel


def describe(plan: Plan) -> str:
    """The plan as a few lines for a person."""
    kernels = len(plan.detail["sums"])
    tiles = plan.detail["fft"]
    rows = [s for k, s in enumerate(plan.detail["sums"]) if not tiles or k not in tiles.kernels]
    shared = sum(len(terms) for terms in rows) - len({p for terms in rows for p, _ in terms})
    head = (
        f"{plan.kind} plan: {kernels} kernels, {plan.multiplies:.0f} multiplies and "
        f"{plan.adds:.0f} additions a pixel"
    )
    if shared:
        head += f"; {shared} parts are shared between kernels"
    worst = f"largest error bound {max(plan.error_bound):.3g} (working values)"
    fixed = plan.detail["fixed"]
    if fixed is not None:
        worst += f"; in 16-bit fixed point {max(fixed.bound):.3g}, nothing can overflow"
    return "\n".join([head, *(f"  {line}" for line in plan.groups), worst])
