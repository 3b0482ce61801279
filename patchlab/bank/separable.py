"""Products of low rank: a column of coefficients times a row.

A product whose coefficients are ``v h'`` takes ``len(v) + len(h)`` multiplies a pixel in
place of ``len(v) len(h)``: columns first, then along the row. An axis-aligned kernel is one
such product, an oriented Gabor with a round envelope is two, and so is each x/y-parity part of it
alone. Other oriented kernels have a rank near their size, and gain nothing.

The terms come from the singular value decomposition (Eckart & Young 1936), one after the other,
each from what the rounded ones before it left over: the rounding of a term is made good by the
next, and only the last one's is left. What stays is ``E = P - sum v_r h_r'``, for the float32
``v_r``, ``h_r``; a response errs by it at most ``sum |E| uses X``, which is added to the bound of
the rounding of the sums: the longest path through a term has ``len(v) + len(h)`` roundings, its
folds, and the joins.
"""

from __future__ import annotations

import math

import numpy as np

from patchlab.bank.products import Product, uses_of
from patchlab.types import F32, F64

MOST = 3
"""Terms that are tried for one product."""


def rank_one(part: F64) -> tuple[F32, F32]:
    """The float32 column and row whose product is nearest to a matrix, in the 2-norm.

    The row is fitted to the rounded column, so that the column's rounding does no harm of its own.
    """
    left, values, right = np.linalg.svd(part)
    turn = np.sign(left[np.abs(left[:, 0]).argmax(), 0])  # either sign would do: one is chosen
    column = (np.sqrt(values[0]) * turn * left[:, 0]).astype(np.float32)
    wide = column.astype(np.float64)
    weight = float(wide @ wide)
    row = part.T @ wide / weight if weight else 0 * right[0]
    return column, row.astype(np.float32)


def separable_terms(product: Product, allowed: float, most: int = MOST) -> tuple[Product, ...]:
    """A product as the fewest separable ones that leave no more than is allowed.

    Parameters
    ----------
    product : with its exact coefficients
    allowed : largest ``sum |E| uses``; see the top of this file
    most : terms at most

    Returns
    -------
    tuple of Product : empty where so few terms leave more, or where nothing is saved

    >>> taps = np.outer([1.0, 2.0, 1.0], [1.0, 0.0, -1.0])
    >>> (term,) = separable_terms(Product("all", taps, taps), allowed=1e-6)
    >>> term.multiplies
    6.0
    """
    uses = uses_of(product.basis, (product.exact.shape[0], product.exact.shape[1]))
    terms: list[Product] = []
    left = product.exact
    values = np.linalg.svd(left, compute_uv=False)
    if math.sqrt(float((values[most:] ** 2).sum())) > allowed:
        return ()  # no matrix of that rank is nearer (Eckart & Young), and sum |E| is more
    while len(terms) < most and (len(terms) + 1) * sum(left.shape) < left.size:
        column, row = rank_one(left)
        term = np.outer(column.astype(np.float64), row.astype(np.float64))
        rest = left - term
        if float((np.abs(rest) * uses).sum()) <= allowed:
            terms.append(Product(product.basis, left, term, (column, row)))
            return tuple(terms)
        # the part it stands for is what it computes: what is left is the next one's
        terms.append(Product(product.basis, term, term, (column, row)))
        left = rest
    return ()
