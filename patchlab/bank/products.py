"""The algebra of plans: kernels as signed sums of products, equal products shared."""

from __future__ import annotations

from collections.abc import Iterable, Mapping, Sequence
from dataclasses import dataclass, replace
from typing import Any

import numpy as np

from patchlab.types import F32, F64

PARITY_BASES = ("ee", "eo", "oe", "oo")

Sum = tuple[tuple[int, int], ...]
"""A kernel as ((product, +1 or -1), ...)."""
GROUP = 6
"""Products that are computed together: what the registers of a core hold."""


@dataclass(frozen=True, eq=False)
class Product:
    """Coefficients and the basis they are dotted with.

    Parameters
    ----------
    basis : all, ee, eo, oe or oo
    exact : what the product stands for
    rounded : what is computed: float32 coefficients, or the float64 product of the factors
    factors : float32 column and row, where the product is separable
    plane : the working plane that the basis is of, or :data:`EVERY` for coefficients
        (planes, h, w) of the basis "all" in every plane
    """

    basis: str
    exact: F64
    rounded: F32 | F64
    factors: tuple[F32, F32] | None = None
    plane: int = 0

    @property
    def multiplies(self) -> float:
        """Multiplies a pixel, a separable product's columns counted once."""
        return float(self.exact.size if self.factors is None else sum(self.exact.shape))


Part = tuple[int, str]
"""A working plane and a basis of it."""

EVERY = -1
"""In the place of a working plane: all of them."""


# ---------------------------------------------------------------- parity parts


def parity_parts(kernel: F64) -> dict[str, F64]:
    """Split a kernel into the coefficients of its four x/y-parity parts.

    Parameters
    ----------
    kernel : float64 ndarray (h, h), h odd

    Returns
    -------
    dict : ee (c+1, c+1), eo (c+1, c), oe (c, c+1), oo (c, c); only the entries that are
        not zero by symmetry, j and i rising from 0 (even) or 1 (odd)

    >>> parts = parity_parts(np.arange(9.0).reshape(3, 3))
    >>> float(parts["ee"][0, 0]), float(parts["eo"][0, 0]), float(parts["oe"][0, 0])
    (4.0, 1.0, 3.0)
    """
    c = kernel.shape[0] // 2
    flip_y, flip_x = kernel[::-1], kernel[:, ::-1]
    both = flip_y[:, ::-1]
    quarter = slice(c, None), slice(c + 1, None)
    even, odd = quarter
    return {
        "ee": ((kernel + flip_y) + (flip_x + both))[even, even] / 4,
        "eo": ((kernel + flip_y) - (flip_x + both))[even, odd] / 4,
        "oe": ((kernel - flip_y) + (flip_x - both))[odd, even] / 4,
        "oo": ((kernel - flip_y) - (flip_x - both))[odd, odd] / 4,
    }


def basis_size(basis: str, radius: int) -> tuple[int, int]:
    """Rows and columns of a product's coefficients."""
    if basis == "all":
        return 2 * radius + 1, 2 * radius + 1
    return radius + (basis[0] == "e"), radius + (basis[1] == "e")


def trimmed(basis: str, part: F64) -> F64:
    """A product's coefficients without the zeros beyond its own support."""
    rows, cols = np.nonzero(part)[-2:]
    if basis == "all":  # stays centred
        c = part.shape[-1] // 2
        a, b = (int(np.abs(at - c).max(initial=0)) for at in (rows, cols))
        return part[..., c - a : c + a + 1, c - b : c + b + 1]
    return part[: rows.max(initial=0) + 1, : cols.max(initial=0) + 1]


def padded(product: Product, shape: tuple[int, int]) -> Product:
    """A product with zeros at its rim; taps stay centred."""
    down, right = (n - m for n, m in zip(shape, product.exact.shape[-2:], strict=True))
    if not (down or right):
        return product
    room = ((0, down), (0, right))
    if product.basis == "all":
        room = ((down // 2, down // 2), (right // 2, right // 2))
    exact: F64 = np.pad(product.exact, room)
    rounded: F32 = np.pad(product.rounded, room)
    return replace(product, exact=exact, rounded=rounded)


def uses_of(basis: str, shape: tuple[int, int]) -> F64:
    """How many pixels each basis value is made of: 1, 2 or 4."""
    if basis == "all":
        return np.ones(shape)
    rows, cols = np.full(shape[0], 2.0), np.full(shape[1], 2.0)
    rows[: int(basis[0] == "e")] = 1
    cols[: int(basis[1] == "e")] = 1
    return np.outer(rows, cols)


# ---------------------------------------------------------------- sharing


def by_plane(p: Product) -> list[tuple[int, F32 | F64, F64]]:
    """The working planes that a product reads, with its coefficients there."""
    if p.plane != EVERY:
        return [(p.plane, p.rounded, p.exact)]
    return [(m, p.rounded[m], p.exact[m]) for m in range(len(p.exact))]


def in_plane(parts: Mapping[str, F64], plane: int = 0) -> dict[Part, F64]:
    """The parts of a kernel on one working plane."""
    return {(plane, basis): part for basis, part in parts.items()}


def share(parts: Mapping[int, Mapping[Part, F64]]) -> tuple[list[Product], dict[int, Sum]]:
    """Equal parts become one product; a negated part shares it with a minus sign."""
    products: list[Product] = []
    known: dict[tuple[Part, tuple[int, ...], bytes], tuple[int, int]] = {}
    sums: dict[int, Sum] = {}
    for index, split in parts.items():
        terms = []
        for where, part in split.items():
            if not part.any():
                continue
            plane, basis = where
            exact = trimmed(basis, part)
            key = (where, exact.shape, (exact + 0.0).tobytes())  # + 0.0: minus zero is zero
            if key not in known:
                place = len(products)
                rounded = exact.astype(np.float32)
                products.append(Product(basis, exact, rounded, plane=plane))
                known[(where, exact.shape, (0.0 - exact).tobytes())] = (place, -1)
                known[key] = (place, 1)
            terms.append(known[key])
        sums[index] = tuple(terms)
    return products, sums


def clusters(sums: Mapping[int, Sum]) -> list[list[int]]:
    """Kernels that share products, directly or through others."""
    owner: dict[int, int] = {}
    root = {index: index for index in sums}

    def find(index: int) -> int:
        while root[index] != index:
            index = root[index]
        return index

    for index, terms in sums.items():
        for product, _ in terms:
            if product in owner:
                root[find(index)] = find(owner[product])
            owner[product] = index
    found: dict[int, list[int]] = {}
    for index in sums:
        found.setdefault(find(index), []).append(index)
    return list(found.values())


def unfold(values: F64, basis: str, c: int) -> F64:
    """A product's coefficients as the taps of a kernel of radius c."""
    rows, cols = values.shape
    if basis == "all":
        return np.pad(values, ((c - rows // 2,) * 2, (c - cols // 2,) * 2))
    top, left = int(basis[0] == "o"), int(basis[1] == "o")
    quarter = np.zeros((c + 1, c + 1))
    quarter[top : top + rows, left : left + cols] = values
    half = np.concatenate([(1 if basis[1] == "e" else -1) * quarter[:, :0:-1], quarter], axis=1)
    return np.concatenate([(1 if basis[0] == "e" else -1) * half[:0:-1], half])


def in_groups(keys: Mapping[int, tuple[Any, ...]]) -> list[list[int]]:
    """Products with one key, at most GROUP together, in the order of the keys."""
    groups: list[list[int]] = []
    for key in sorted(set(keys.values())):
        same = [p for p in sorted(keys) if keys[p] == key]
        count = -(-len(same) // GROUP)
        groups += [list(map(int, part)) for part in np.array_split(same, count)]
    return groups


def described(
    products: Sequence[Product], groups: Iterable[Sequence[int]], coloured: bool = False
) -> tuple[str, ...]:
    """Groups of products, a line each, for a person; ``coloured`` names their planes."""
    words = {
        "all": "taps as they are",
        "ee": "even in y, even in x",
        "eo": "even in y, odd in x",
        "oe": "odd in y, even in x",
        "oo": "odd in y, odd in x",
    }
    said = []
    for group in groups:
        first = products[group[0]]
        rows, cols = first.exact.shape[-2:]
        how = "coefficients" if first.factors is None else "coefficients as column times row"
        which = "every working plane" if first.plane == EVERY else f"plane {first.plane + 1}"
        plane = f", {which}" if coloured else ""
        said.append(f"{len(group)} x {rows} x {cols} {how}, {words[first.basis]}{plane}")
    return tuple(said)
