"""The ways a bank can be computed: each counted, priced and bounded, the cheapest taken.

Kernels that share parity parts are one cluster and are planned together. A cluster is computed by
its taps or by its parts, whole products or separable ones; or, where it makes no edges, by tile
transforms or at half resolution. One plan may hold all of them.
"""

from __future__ import annotations

from collections.abc import Mapping, Sequence
from dataclasses import dataclass, replace
from itertools import combinations
from typing import Any

import numpy as np

from patchlab.bank import halved as half
from patchlab.bank.costs import (
    Costs,
    Work,
    of_halved,
    of_mixing,
    of_planes,
    of_products,
    of_tiles,
)
from patchlab.bank.halved import Halved
from patchlab.bank.products import (
    EVERY,
    Part,
    Product,
    Sum,
    by_plane,
    clusters,
    in_groups,
    in_plane,
    padded,
    parity_parts,
    share,
    uses_of,
)
from patchlab.bank.separable import separable_terms
from patchlab.bank.tile_fft import LARGEST, TileFFT, tile_fft
from patchlab.bank.tile_fft import bound as tile_bound
from patchlab.conventions import gamma
from patchlab.types import F64, Bank

CLEARLY = 1.5
"""How many times cheaper tile transforms must be to be taken unasked: their bound is larger, and
what they cost differs most between processors."""
CLASSES = 16
"""Different shapes up to which it is tried to bring them together."""
KINDS = ("auto", "direct", "parity", "separable", "halved", "fft")


@dataclass(frozen=True, eq=False)
class Parts:
    """Products, the kernels as sums of them, and which are computed together."""

    products: tuple[Product, ...]
    sums: Mapping[int, Sum]
    groups: tuple[tuple[int, ...], ...]


@dataclass(frozen=True, eq=False)
class Candidate:
    """A bank's computation.

    Parameters
    ----------
    parts : products of every kernel, for strengths and for the numpy engine too
    whole : the same without separable products, for fixed point
    tiles, halved : kernels whose responses compiled code makes by other means
    bounds : largest error of every kernel
    work : counted, of the compiled responses
    """

    parts: Parts
    whole: Parts
    tiles: TileFFT | None
    halved: Halved | None
    bounds: tuple[float, ...]
    work: Work

    @property
    def elsewhere(self) -> frozenset[int]:
        """Kernels whose responses are not made by products."""
        others = [p.kernels for p in (self.tiles, self.halved) if p is not None]
        return frozenset(k for kernels in others for k in kernels)


class Planner:
    """Plans one bank.

    Parameters
    ----------
    bank : Bank
    kind : one of KINDS
    tolerance : error of a response, in working values, that is allowed beyond what rounding alone
        may do to a direct sum
    costs : prices that choose
    fused : kernels that make a strength
    """

    def __init__(
        self, bank: Bank, kind: str, tolerance: float, costs: Costs, fused: frozenset[int]
    ) -> None:
        self.bank, self.kind, self.tolerance, self.costs = bank, kind, tolerance, costs
        self.fused = fused
        self.exact = bank.taps.astype(np.float64)
        self.whole, self.split = _split(self.exact)
        self.direct = {
            k: gamma(bank.size**2) * float(np.abs(taps).sum()) * bank.table.span
            for k, taps in enumerate(self.exact)
        }
        self.mixing = 0 if bank.mix is None else bank.mix.shape[1]
        self.spans = [float(reach) * bank.table.span for reach in bank.plane_reach]

    def plan(self) -> Candidate:
        """The cheapest candidate of this kind."""
        mixed: dict[int, Mapping[Part, F64]] = {}
        for cluster in clusters(share(self.split)[1]):
            mixed |= self._cluster(cluster)
        mixed = {k: mixed[k] for k in self.split}
        whole = self._parts(*share(mixed))
        parts = self._lowered(whole)
        tiles, halved = self._elsewhere(parts)
        done = Candidate(parts, whole, tiles, halved, self._bounds(parts, tiles, halved), Work())
        return replace(done, work=self._work(done))

    # ------------------------------------------------------------ clusters

    def _cluster(self, cluster: list[int]) -> dict[int, Mapping[Part, F64]]:
        """Taps or parity parts for some kernels that share parts."""
        taps: dict[int, Mapping[Part, F64]] = {k: self.whole[k] for k in cluster}
        parts: dict[int, Mapping[Part, F64]] = {k: self.split[k] for k in cluster}
        if self.kind in ("direct", "parity"):
            return taps if self.kind == "direct" else parts
        times = [self._time(self._lowered(self._parts(*share(way)))) for way in (taps, parts)]
        return taps if times[0] <= times[1] else parts

    def _time(self, parts: Parts) -> float:
        """Price of some products, without the folded rows, which others may read too."""
        radius = self.bank.radius
        some = of_products(parts.products, parts.groups, parts.sums.values(), radius, among=True)
        return self.costs.beyond_fill(some)

    def _parts(self, products: list[Product], sums: dict[int, Sum]) -> Parts:
        """Products of one plane, basis, shape and use (scale and parity) go together."""
        use: dict[int, tuple[Any, ...]] = {}
        for index, terms in sums.items():
            kernel = self.bank.kernels[index]
            scale = -1 if kernel.scale is None else kernel.scale
            for number, _ in terms:
                p = products[number]
                about = (scale, kernel.parity, p.plane, p.basis, p.factors is not None)
                use.setdefault(number, about)
        products = list(products)
        for about in sorted(set(use.values())):
            mine = [number for number in sorted(use) if use[number] == about]
            for number, shape in self._shapes([products[n] for n in mine], mine).items():
                products[number] = padded(products[number], shape)
        keys = {n: (*about, products[n].exact.shape) for n, about in use.items()}
        return Parts(tuple(products), sums, tuple(tuple(g) for g in in_groups(keys)))

    def _shapes(self, products: list[Product], numbers: list[int]) -> dict[int, tuple[int, int]]:
        """Shapes with which products go together best: zeros at the rim may fill up a group."""
        classes: list[tuple[tuple[int, int], list[int]]] = []
        for p, number in zip(products, numbers, strict=True):
            shape = (p.exact.shape[-2], p.exact.shape[-1])
            same = next((c for c in classes if c[0] == shape), None)
            if same is None:
                classes.append((shape, [number]))
            else:
                same[1].append(number)
        first = products[0]
        plain = first.factors is None and first.plane != EVERY
        while plain and 1 < len(classes) <= CLASSES:
            pairs = [(self._saved(first.basis, a, b), a, b) for a, b in combinations(classes, 2)]
            saved, a, b = max(pairs, key=lambda pair: pair[0])
            if saved <= 0:
                break
            classes = [c for c in classes if c is not a and c is not b]
            classes.append((_around(a[0], b[0]), a[1] + b[1]))
        return {number: shape for shape, some in classes for number in some}

    def _saved(self, basis: str, a: Any, b: Any) -> float:
        """Price that is saved when two classes of products take one shape."""

        def price(shape: tuple[int, int], count: int) -> float:
            blank = Product(basis, np.empty(shape), np.empty(shape))
            groups = in_groups(dict.fromkeys(range(count), ()))
            work = of_products((blank,) * count, groups, [], self.bank.radius)
            return self.costs.beyond_fill(work)

        apart = price(a[0], len(a[1])) + price(b[0], len(b[1]))
        return apart - price(_around(a[0], b[0]), len(a[1]) + len(b[1]))

    def _lowered(self, parts: Parts) -> Parts:
        """The same with separable products where they are allowed and cheaper, or asked for."""
        if self.kind in ("direct", "parity") or self.bank.planes > 1:
            return parts
        products: list[Product] = []
        place: dict[int, list[int]] = {}
        # a strength compares kernels with each other: whole products treat turned ones alike,
        # to the last bit
        kept = set()
        if self.kind != "separable":
            kept = {n for k in self.fused & set(parts.sums) for n, _ in parts.sums[k]}
        for number, p in enumerate(parts.products):
            terms = (p,) if number in kept else self._terms(p)
            place[number] = list(range(len(products), len(products) + len(terms)))
            products += terms
        sums = {
            k: tuple((at, sign) for number, sign in terms for at in place[number])
            for k, terms in parts.sums.items()
        }
        return self._parts(products, sums)

    def _terms(self, product: Product) -> tuple[Product, ...]:
        uses = uses_of(product.basis, (product.exact.shape[0], product.exact.shape[1]))
        weight = float((np.abs(product.exact) * uses).sum())
        span = max(self.bank.table.span, 1e-300)
        # at most four parts make a kernel; half of what is allowed is left to the rounding
        share = self.tolerance / (2 if product.basis == "all" else 8)
        allowed = max(gamma(self.bank.size**2) * weight / 2, share / span)
        terms = separable_terms(product, allowed)
        if not terms or self.kind == "separable":
            return terms or (product,)
        one = [((0, 1),)]
        some = [tuple((i, 1) for i in range(len(terms)))]
        whole, lowered = (
            of_products(ways, [range(len(ways))], sums, self.bank.radius, among=True)
            for ways, sums in (((product,), one), (terms, some))
        )
        cheaper = self.costs.beyond_fill(lowered) < self.costs.beyond_fill(whole)
        return terms if cheaper else (product,)

    # ------------------------------------------------------------ other means

    def _elsewhere(self, parts: Parts) -> tuple[TileFFT | None, Halved | None]:
        """Kernels whose responses compiled code makes by tile transforms, or at half resolution.

        Kernels of an edge bank that make its strength stay with the products, which fused edges
        need anyway. Learned and given kernels, which are there for their responses, may go: their
        fused edges still take the products. With float pixels none goes unasked: a pixel that is
        not a number, or far beyond the contract, would spoil its whole block. Half resolution is
        not tried without a tolerance: it is never as exact as rounding.
        """
        if self.bank.planes > 1:
            return None, None
        kept = self.fused if self.bank.purpose == "edges" else frozenset()
        free = [k for k, terms in parts.sums.items() if k not in kept and terms]
        unasked = self.kind == "auto" and self.bank.contract.format.integer
        if not free or not (unasked or self.kind in ("fft", "halved")):
            return None, None
        if self.kind == "fft":
            return tile_fft(self.bank.taps, tuple(free)), None
        asked = self.kind == "halved" or self.tolerance > 0
        halved = self._halve(free) if asked else None
        if self.kind == "halved":
            return None, halved
        return self._cheapest(parts, free, halved)

    def _halve(self, free: list[int]) -> Halved | None:
        values = self.bank.table.values
        span = self.bank.table.span
        ends = np.array([-span, span]) if values is None else values.astype(np.float64)
        reach = half.extent(ends, self.bank.border)
        some = {k: {basis: part for (_, basis), part in self.split[k].items()} for k in free}
        allowed = {k: max(self.direct[k], self.tolerance) for k in free}
        found = half.halve(some, allowed, reach, self.bank.radius)
        if self.kind == "auto" or (found is not None and len(found.kernels) == len(free)):
            return found
        for k in free:
            weight = float(np.abs(self.exact[k]).sum())
            allowed[k] = max(allowed[k], half.FORCED * weight * span)
        return half.halve(some, allowed, reach, self.bank.radius, closest=True)

    def _cheapest(
        self, parts: Parts, free: list[int], halved: Halved | None
    ) -> tuple[TileFFT | None, Halved | None]:
        """For every cluster the cheapest of products, transforms and half resolution."""
        tiles = tile_fft(self.bank.taps, tuple(free)) if self.bank.size <= LARGEST else None
        prices = {
            "tiles": CLEARLY * self.costs.beyond_fill(of_tiles(tiles)) / len(free)
            if tiles
            else np.inf,
            "halved": self.costs.beyond_fill(of_halved(halved)) / len(halved.kernels)
            if halved
            else np.inf,
        }
        go: dict[str, list[int]] = {"tiles": [], "halved": []}
        for cluster in clusters({k: parts.sums[k] for k in free}):
            reached = halved is not None and set(cluster) <= set(halved.kernels)
            each = {
                "tiles": prices["tiles"] * len(cluster),
                "halved": prices["halved"] * len(cluster) if reached else np.inf,
            }
            best = min(each, key=lambda way: each[way])
            products, sums = self._only(parts, cluster)
            if each[best] < self._time(self._parts(products, sums)) + self._written(len(cluster)):
                go[best] += cluster
        return (
            tile_fft(self.bank.taps, tuple(sorted(go["tiles"]))),
            half.only(halved, go["halved"]) if halved else None,
        )

    def _written(self, kernels: int) -> float:
        return self.costs.beyond_fill(of_planes(kernels))

    def _only(self, parts: Parts, kernels: list[int]) -> tuple[list[Product], dict[int, Sum]]:
        used = sorted({number for k in kernels for number, _ in parts.sums[k]})
        place = {number: i for i, number in enumerate(used)}
        sums = {k: tuple((place[n], sign) for n, sign in parts.sums[k]) for k in kernels}
        return [parts.products[n] for n in used], sums

    # ------------------------------------------------------------ bounds and work

    def _bounds(
        self, parts: Parts, tiles: TileFFT | None, halved: Halved | None
    ) -> tuple[float, ...]:
        """Largest |float32 response - exact response| for every kernel; see ``make_plan``."""
        span = self.bank.table.span
        found = {
            k: _bound(parts.products, terms, self.spans, self.mixing)
            for k, terms in parts.sums.items()
        }
        for k in tiles.kernels if tiles else ():
            found[k] = max(found[k], tile_bound(self.exact[k], span))
        if halved is not None:
            for k, bound in zip(halved.kernels, halved.bound, strict=True):
                found[k] = max(found[k], bound)
        return tuple(found[k] for k in sorted(found))

    def _work(self, plan: Candidate) -> Work:
        rest = {k: t for k, t in plan.parts.sums.items() if k not in plan.elsewhere}
        used = {n for terms in rest.values() for n, _ in terms}
        groups = [[n for n in group if n in used] for group in plan.parts.groups]
        groups = [group for group in groups if group]
        work = of_products(plan.parts.products, groups, rest.values(), self.bank.radius)
        work += of_planes(len(rest))
        work += of_mixing(*self.bank.mix.shape) if self.bank.mix is not None else Work()
        work += of_tiles(plan.tiles) if plan.tiles else Work()
        return work + (of_halved(plan.halved) if plan.halved else Work())


def _around(a: tuple[int, int], b: tuple[int, int]) -> tuple[int, int]:
    """The least shape that holds two others."""
    return max(a[0], b[0]), max(a[1], b[1])


def _split(exact: F64) -> tuple[dict[int, dict[Part, F64]], dict[int, dict[Part, F64]]]:
    """Every kernel (h, h) or (h, h, planes) as it is and by its parity parts, plane by plane."""
    whole: dict[int, dict[Part, F64]] = {}
    parity: dict[int, dict[Part, F64]] = {}
    for index, kernel in enumerate(exact):
        planes = [kernel] if kernel.ndim == 2 else list(np.moveaxis(kernel, -1, 0))
        read = [m for m, taps in enumerate(planes) if taps.any()]
        if len(read) > 1:
            whole[index] = {(EVERY, "all"): np.stack(planes)}
        else:
            whole[index] = {(m, "all"): planes[m] for m in read or [0]}
        parity[index] = {}
        for m, taps in enumerate(planes):
            parity[index] |= in_plane(parity_parts(taps), m)
    return whole, parity


def _bound(products: tuple[Product, ...], terms: Sum, spans: Sequence[float], mixing: int) -> float:
    """By how much a kernel's sum can err, from the spans of the working planes."""
    total = 0.0
    for number, _ in terms:
        p = products[number]
        uses = uses_of(p.basis, (p.exact.shape[-2], p.exact.shape[-1]))
        length = p.exact.size if p.factors is None else sum(p.exact.shape)
        folds = 0 if p.basis == "all" else 2
        roundings = length + folds + len(terms) - 1 + mixing
        for plane, rounded, exact in by_plane(p):
            share = gamma(roundings) * float((np.abs(rounded).astype(np.float64) * uses).sum())
            share += float((np.abs(rounded - exact) * uses).sum())
            total += share * spans[plane]
    return total
