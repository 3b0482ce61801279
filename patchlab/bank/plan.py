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
the float32 taps. A product whose coefficients are a column times a row is computed so
where that is cheaper; some kernels' responses are made by other means altogether.
:mod:`patchlab.bank.candidates` finds the ways, :mod:`patchlab.bank.costs` counts and prices them.
"""

from __future__ import annotations

import hashlib
import math
from collections.abc import Iterator, Mapping

import numpy as np

from patchlab.bank.candidates import KINDS, Candidate, Parts, Planner
from patchlab.bank.costs import STANDING, Costs, Work, of_planes, of_products
from patchlab.bank.fixed import fixed_point
from patchlab.bank.flat import flat_bound
from patchlab.bank.products import Product, Sum, described, parity_parts, unfold
from patchlab.bank.tile_fft import LENGTH
from patchlab.errors import UsageError
from patchlab.types import F64, Bank, Plan

COLOUR_KINDS = ("auto", "direct", "parity")

FIXED_SHARE = 0.55
"""Time of 16-bit products over that of the same float32 ones: from 0.5 to 0.6 was measured with
AVX-512, for banks from 9 x 9 to 19 x 19."""

__all__ = ["KINDS", "describe", "make_plan", "parity_parts", "rebuilt_taps", "strength_members"]


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


def make_plan(
    bank: Bank, kind: str = "auto", *, tolerance: float = 0.0, costs: Costs = STANDING
) -> Plan:
    """Plan a bank's computation.

    Parameters
    ----------
    bank : Bank
    kind : "direct" (every tap), "parity" (every kernel by its parts), "separable" (a column times a
        row wherever the rank allows, see :mod:`patchlab.bank.separable`), "halved" and "fft" (every
        kernel, but an edge bank's, at half resolution, where that is within a hundredth of the
        largest response, or by tile transforms, see :mod:`patchlab.bank.halved` and
        :mod:`patchlab.bank.tile_fft`), or "auto", which takes for each set of kernels that share
        parts whichever is cheapest
    tolerance : error of a response, in working values, that is allowed beyond what rounding may do
        to a direct sum; with 0, separable products and half resolution must be as exact as that
    costs : prices that "auto" goes by, see :mod:`patchlab.bank.costs`

    Returns
    -------
    Plan : its ``detail`` holds ``bases``, ``planes`` (the working plane), ``coefficients``
        (float32 arrays) and ``factors`` (float32 column and row of a separable one, or None), one
        a product; ``sums`` (one a kernel),
        ``product_groups``, ``strength`` (one entry a scale, as :func:`strength_members`), ``flat``
        (one a scale, see :mod:`patchlab.bank.flat`), ``fft``
        and ``halved`` (kernels by tile transforms and at half resolution, or None), ``fixed`` (the
        bank in 16-bit fixed point, or None), ``abi`` (the interface's number), ``asked`` (the
        kind), ``tolerance``, ``costs``, ``work`` (counted), ``expected_ns`` and ``fixed_ns`` (of a
        pixel, by those prices, in float32 and in fixed point)

    Raises
    ------
    UsageError : an unknown kind, a kind of plan that colours do not have, a tolerance below zero,
        or a scale that lacks the kernels its strength is made of.

    Notes
    -----
    The bound of a kernel is the sum over its products of
    ``gamma_n sum|coefficient| uses X + sum|rounding of the coefficient| uses X``, where n counts
    the roundings on the longest path (products and sums, two folds, the joins), ``uses`` is how
    many pixels a basis value is made of, and X the largest absolute working value of the input
    contract. It holds for every order of summation, with fused multiply-adds or without (Higham
    2002, section 3.1), barring underflow. For float32 pixels X is the contract's largest level:
    the bound scales with the working values if larger ones are given. A kernel by other means
    has the larger of this bound and theirs; the products stand by for engines that take them
    instead, and for fixed point. Of a colour bank X is that of the product's working plane, whose
    mixing from C samples counts C roundings more; there are no plans but by taps and by parts.
    """
    if kind not in KINDS:
        raise UsageError(f"unknown plan {kind!r}", remedy=f"choose one of {', '.join(KINDS)}")
    if bank.planes > 1 and kind not in COLOUR_KINDS:
        raise UsageError(
            f"a bank of colours has no {kind} plan: that takes one plane",
            remedy=f"choose one of {', '.join(COLOUR_KINDS)}",
        )
    if not 0 <= tolerance < math.inf:
        raise UsageError(f"a tolerance is a number of working values from 0 up, not {tolerance}")
    strength = tuple(strength_members(bank, s) for s in range(len(bank.scales)))
    fused = frozenset(k for scale in strength for _, *pair in scale for k in pair if k is not None)
    found = Planner(bank, kind, tolerance, costs, fused).plan()
    whole = found.whole
    return Plan(
        kind=_name(found),
        groups=_lines(found, bank.planes > 1),
        multiplies=found.work.multiplies,
        adds=found.work.adds,
        error_bound=found.bounds,
        loads=found.work.loads,
        detail={
            "bases": tuple(p.basis for p in found.parts.products),
            "planes": tuple(p.plane for p in found.parts.products),
            "coefficients": tuple(p.rounded.astype(np.float32) for p in found.parts.products),
            "factors": tuple(p.factors for p in found.parts.products),
            "sums": _in_order(found.parts.sums),
            "fft": found.tiles,
            "halved": found.halved,
            "product_groups": found.parts.groups,
            "fixed": None
            if bank.planes > 1
            else fixed_point(
                bank,
                [p.basis for p in whole.products],
                [p.rounded for p in whole.products],
                _in_order(whole.sums),
                whole.groups,
            ),
            "strength": strength,
            "flat": ()
            if bank.planes > 1
            else tuple(flat_bound(bank, members, found.bounds) for members in strength),
            "abi": _interface_number(bank),
            "asked": kind,
            "tolerance": float(tolerance),
            "costs": costs,
            "work": found.work,
            "expected_ns": costs.time(found.work),
            "fixed_ns": costs.fill + FIXED_SHARE * costs.beyond_fill(_in_whole(bank, whole)),
        },
    )


def _in_whole(bank: Bank, whole: Parts) -> Work:
    """Work of a bank's fixed point: its products, all of them whole."""
    work = of_products(whole.products, whole.groups, whole.sums.values(), bank.radius)
    return work + of_planes(len(bank))


def _in_order(sums: Mapping[int, Sum]) -> tuple[Sum, ...]:
    return tuple(sums[k] for k in sorted(sums))


def _rows(found: Candidate) -> tuple[list[Product], list[list[int]]]:
    """Products that compiled responses are made of, and their groups."""
    terms = [t for k, t in found.parts.sums.items() if k not in found.elsewhere]
    used = {number for some in terms for number, _ in some}
    groups = [[p for p in group if p in used] for group in found.parts.groups]
    return [found.parts.products[p] for p in sorted(used)], [g for g in groups if g]


def _name(found: Candidate) -> str:
    used = _rows(found)[0]
    words = []
    if any(p.factors is None for p in used):
        whole = {p.basis for p in used if p.factors is None}
        words.append("parity" if whole - {"all"} else "direct")
    if any(p.factors is not None for p in used):
        words.append("separable")
    words += ["tile FFT"] * (found.tiles is not None)
    words += ["half resolution"] * (found.halved is not None)
    return " and ".join(words) or "direct"


def _lines(found: Candidate, coloured: bool) -> tuple[str, ...]:
    said = list(described(found.parts.products, _rows(found)[1], coloured))
    if found.tiles is not None:
        tiles = found.tiles
        said.append(
            f"{len(tiles.kernels)} kernels of {tiles.size} x {tiles.size} by tile FFT, blocks of "
            f"{LENGTH} rows for {tiles.rows}"
        )
    if found.halved is not None:
        half = found.halved
        said.append(
            f"{len(half.kernels)} kernels at half resolution: smoothed by "
            f"{4 * half.flatness - 1} taps, {2 * half.radius + 1} x {2 * half.radius + 1} taps, "
            f"interpolated by {2 * half.flatness}"
        )
        said += [f"  {line}" for line in described(half.products, half.groups)]
    return tuple(said)


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
            factors = plan.detail["factors"][product]
            if factors is not None:
                values = np.outer(*(f.astype(np.float64) for f in factors))
            kernel += sign * unfold(values, basis, c)
        yield kernel


def describe(plan: Plan) -> str:
    """The plan as a few lines for a person."""
    kernels = len(plan.detail["sums"])
    others = [plan.detail[way].kernels for way in ("fft", "halved") if plan.detail[way]]
    elsewhere = {k for some in others for k in some}
    rows = [s for k, s in enumerate(plan.detail["sums"]) if k not in elsewhere]
    shared = sum(len(terms) for terms in rows) - len({p for terms in rows for p, _ in terms})
    head = (
        f"{plan.kind} plan: {kernels} kernels, {plan.multiplies:.0f} multiplies, "
        f"{plan.adds:.0f} additions and {plan.loads:.0f} loads a pixel"
    )
    if shared:
        head += f"; {shared} parts are shared between kernels"
    worst = f"largest error bound {max(plan.error_bound):.3g} (working values)"
    fixed = plan.detail["fixed"]
    if fixed is not None:
        worst += f"; in 16-bit fixed point {max(fixed.bound):.3g}, nothing can overflow"
    float_ns, fixed_ns = plan.detail["expected_ns"], plan.detail["fixed_ns"]
    speed = f"about {float_ns:.1f} ns a pixel by the plan's prices"
    if fixed is not None:
        speed += f", {fixed_ns:.1f} in fixed point: "
        speed += "fixed point is faster" if fixed_ns < float_ns else "float32 is faster"
    return "\n".join([head, *(f"  {line}" for line in plan.groups), worst, speed])
