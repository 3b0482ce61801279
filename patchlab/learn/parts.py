"""Parts of objects: components of aligned pictures of one kind of thing.

A stack of pictures is a matrix, and which of its sides are the samples is a choice:

- ``pixels``: every pixel is a sample, every picture a variable. Independent components are
  pictures whose pixels are independent: few pixels are far from zero, so each holds one part.
- ``pictures``: every picture is a sample, every pixel a variable. Independent components have
  independent coefficients; their pictures may spread over the whole object.

These are architectures I and II of Bartlett, Movellan & Sejnowski 2002, IEEE Trans. Neural
Netw. 13:1450. Principal components are the same either way, since a matrix and its transpose
have one singular value decomposition; independent components are not.
"""

from __future__ import annotations

from typing import Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.errors import InputError, UsageError
from patchlab.learn.ica import unmix
from patchlab.learn.likelihood import Rows
from patchlab.learn.order import dominant_sign
from patchlab.learn.trust import NOISE_KURTOSIS
from patchlab.learn.whiten import one_thread
from patchlab.types import F64, Parts, Whitening

Samples = Literal["pixels", "pictures"]


def learn_parts(
    pictures: NDArray[np.floating],
    *,
    samples: Samples = "pixels",
    method: Literal["ica", "pca"] = "ica",
    components: int | None = None,
    seed: int = 0,
    restarts: int = 3,
    tolerance: float = 1e-7,
    max_iterations: int = 1000,
    jobs: int = 1,
) -> Parts:
    """Components of aligned pictures, pixels or pictures being the samples.

    The mean picture and each picture's own mean are taken out, so that both sides of the
    matrix are centred and the choice of ``samples`` changes nothing else.

    Parameters
    ----------
    pictures : ndarray (n, h, w), aligned, in one light
    samples : "pixels" or "pictures"
    method : "ica" (independent components) or "pca" (principal ones)
    components : how many; None cuts at the largest gap in the spectrum (:func:`largest_gap`)
    seed, restarts, tolerance, max_iterations, jobs : of the learner

    Returns
    -------
    Parts : in order of falling contribution, each picture of unit energy, its largest
        absolute pixel positive

    Raises
    ------
    UsageError : a parameter out of its range.
    InputError : pictures that are alike, not finite, or fewer than four.

    Examples
    --------
    >>> r = np.random.default_rng(0)
    >>> stack = np.zeros((40, 8, 8))
    >>> stack[:, 1:3, 1:3] = r.normal(size=(40, 1, 1))
    >>> stack[:, 5:7, 5:7] = r.normal(size=(40, 1, 1))
    >>> found = learn_parts(stack, components=2)
    >>> bool(found.locality.min() > learn_parts(stack, components=2, method="pca").locality.min())
    True
    """
    if samples not in ("pixels", "pictures"):
        raise UsageError(f"unknown samples {samples!r}", remedy="choose pixels or pictures")
    if method not in ("ica", "pca"):
        raise UsageError(f"unknown method {method!r}", where="method", remedy="choose ica or pca")
    stack = _checked(pictures)
    centred, mean, light = _centred(stack)
    left, scale, right = _factors(centred, samples)
    k = largest_gap(scale**2) if components is None else components
    if not 2 <= k <= scale.size:
        raise UsageError(
            f"{k} components are not in 2 to {scale.size}, what these pictures carry",
            where="components",
        )
    white, span = left[:, :k] * len(left) ** 0.5, scale[:k, None] * right[:k] / len(left) ** 0.5
    turned, converged, iterations = np.eye(k), True, 0
    if method == "ica":
        rows = Rows(np.ascontiguousarray(white, np.float32))
        run = unmix(
            rows, _white(k), seed=seed, restarts=restarts, tolerance=tolerance,
            max_iterations=max_iterations, jobs=jobs,
        )  # fmt: skip
        turned = run.W / np.linalg.norm(run.W, axis=1, keepdims=True)
        converged, iterations = run.outcome == "converged", run.iterations
    images, codes, tails = _canonical(white, span, turned, samples)
    images = images.reshape(k, *stack.shape[1:])
    return Parts(
        method=method,
        samples=samples,
        images=images,
        codes=codes,
        mean=mean,
        light=light,
        contribution=np.sum(codes**2, axis=0) / float(np.sum(scale**2)),
        kurtosis=tails,
        locality=locality(images),
        spectrum=scale**2 / stack.size,
        converged=converged,
        iterations=iterations,
        warnings=_warnings(method, samples, tails, len(white), converged),
    )


def locality(images: F64) -> F64:
    """How local pictures (k, h, w) are: 1 for a single pixel, 0 for energy spread evenly.

    One less the spread of a picture's energy (root mean square distance from its centre of
    energy) over the spread of an even picture of the same size. Energy in opposite corners
    makes it negative. Not a published index: defined here.

    Examples
    --------
    >>> dot = np.zeros((1, 9, 9))
    >>> dot[0, 3, 4] = 2.0
    >>> float(locality(dot)[0]), abs(round(float(locality(np.ones((1, 9, 9)))[0]), 9))
    (1.0, 0.0)
    """
    energy = np.asarray(images, dtype=np.float64) ** 2
    energy /= np.maximum(energy.sum(axis=(1, 2), keepdims=True), 1e-300)
    h, w = energy.shape[1:]
    spread = np.zeros(len(energy))
    for share, length in ((energy.sum(axis=2), h), (energy.sum(axis=1), w)):
        at = np.arange(length, dtype=np.float64)
        middle = share @ at
        spread += np.sum(share * (at - middle[:, None]) ** 2, axis=1)
    return np.asarray(1 - np.sqrt(spread / ((h**2 + w**2 - 2) / 12)))


def largest_gap(variance: F64) -> int:
    """Where falling variances drop by the largest factor, in their first half; at least 2.

    Examples
    --------
    >>> largest_gap(np.array([9.0, 8, 7, 2, 1.8, 1.7, 1.6, 1.5]))
    3
    """
    half = max(variance.size // 2, 2)
    drop = variance[1:half] / np.maximum(variance[2 : half + 1], 1e-300)
    return 2 + int(np.argmax(drop)) if drop.size else min(2, variance.size)


def _checked(pictures: NDArray[np.floating]) -> F64:
    stack = np.asarray(pictures, dtype=np.float64)
    if stack.ndim != 3:
        raise UsageError(f"aligned pictures are one stack (n, h, w), not {stack.shape}")
    if len(stack) < 4:
        raise InputError(f"{len(stack)} pictures are too few to learn parts from")
    if not np.isfinite(stack).all():
        raise InputError("a picture holds a value that is not a finite number")
    return stack


def _centred(stack: F64) -> tuple[F64, F64, F64]:
    """Pictures as rows, centred along both sides; the mean picture; each one's own light."""
    flat = stack.reshape(len(stack), -1)
    mean, own, all_of_it = flat.mean(axis=0), flat.mean(axis=1), flat.mean()
    centred = flat - mean - own[:, None] + all_of_it
    return centred, mean.reshape(stack.shape[1:]), own - all_of_it


def _canonical(white: F64, span: F64, W: F64, samples: str) -> tuple[F64, F64, F64]:
    """Component pictures as rows, codes (n, k) and kurtosis, in canonical order and scale.

    ``white`` holds the samples as rows, ``span`` what takes them back to the matrix.
    """
    with one_thread():
        sources, mixing = white @ W.T, np.linalg.inv(W).T @ span
    tails = (sources**4).mean(axis=0) / np.maximum((sources**2).mean(axis=0) ** 2, 1e-300)
    images, codes = (sources.T, mixing) if samples == "pixels" else (mixing, sources.T)
    norm = np.linalg.norm(images, axis=1, keepdims=True) * dominant_sign(images)[:, None]
    images, codes = images / norm, codes * norm
    order = np.argsort(-np.sum(codes**2, axis=1), kind="stable")
    return np.ascontiguousarray(images[order]), np.ascontiguousarray(codes[order].T), tails[order]


def _factors(centred: F64, samples: str) -> tuple[F64, F64, F64]:
    """Singular value decomposition with the samples as rows, down to rounding."""
    matrix = centred if samples == "pictures" else centred.T
    with one_thread():
        left, scale, right = np.linalg.svd(matrix, full_matrices=False)
    kept = int(np.sum(scale > 1e-9 * max(scale[0], 1e-300)))
    if kept < 2:
        raise InputError("the pictures do not differ: there are no parts to tell apart")
    return left[:, :kept], scale[:kept], right[:kept]


def _white(k: int) -> Whitening:
    eye = np.eye(k)
    return Whitening(eye, eye, np.zeros(k), np.ones(k), k, "pca", (), 0)


def _warnings(
    method: str, samples: str, tails: F64, count: int, converged: bool
) -> tuple[str, ...]:
    if method == "pca":
        return ()
    out = []
    if not converged:
        out.append("not converged; raise max_iterations")
    by_chance = 3 + 3 * (24 / count) ** 0.5  # the learner looks for what sticks out
    if float(np.median(tails)) < max(NOISE_KURTOSIS, by_chance):
        what = "pixels" if samples == "pixels" else "coefficients"
        out.append(
            f"the components' {what} look normal (median kurtosis {np.median(tails):.2f}): "
            "they are arbitrary; take the other side of the matrix as samples"
        )
    return tuple(out)
