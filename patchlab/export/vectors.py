"""Test vectors: small pictures with the exact answers a port has to give.

A case is one picture in the bank's own pixels, the float64 responses of the slow
oracle, and for each kernel how far a float32 target may be from them. The same
cases go into the bank's folder (for people who port it), into the C self-test
(the small ones) and through every target in :mod:`patchlab.export.verify`.
"""

from __future__ import annotations

import io
import json
import math
from collections.abc import Callable, Iterator, Mapping
from dataclasses import dataclass
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import UNIT_ROUNDOFF, PixelFormat, pixel_format, rng
from patchlab.errors import InputError, UsageError
from patchlab.export.vectors_text import readme
from patchlab.store import canonical_json, npy_bytes
from patchlab.types import F64, Bank, Bundle, Plan

Pixels = NDArray[Any]
Oracle = Callable[[Bank, Pixels], F64]
"""``oracle(bank, pixels)``: float64 responses (n, h, w) of the tabled, bordered picture."""

LIMIT_BYTES = 1_200_000
WIDEST_TILE = 60_000
"""More values than compiled code keeps in a ring of kernel-high rows before it starts
another column tile."""
PARITIES = {"step": ("odd",), "line": ("even",), "energy": ("odd", "even")}
"""The kernels that each strength is made of."""


# ---------------------------------------------------------------- strength, in float64


def edges_lacking(bank: Bank) -> str:
    """Why a bank has no edge strength ("" when it has).

    A step needs odd kernels at every scale, a line even ones, energy both with the same
    orientations.
    """
    if not bank.scales:
        return "its kernels belong to no scale"
    for scale in bank.scales:
        turns = [_turns(bank, scale, parity) for parity in PARITIES[bank.strength]]
        for parity, found in zip(PARITIES[bank.strength], turns, strict=True):
            if not found:
                return f"scale {scale} has no {parity} kernel, which {bank.strength} strength needs"
            if len(set(found)) < len(found):
                return f"scale {scale} has two {parity} kernels of one orientation"
        if turns[0] != turns[-1]:
            return f"scale {scale} has odd and even kernels of different orientations"
    return ""


def orientations(bank: Bank, scale: int) -> tuple[int, ...]:
    """Orientation numbers of one scale, in the order of :func:`magnitudes`.

    They are what ``orientation`` holds: the kernel's own, or its place where it has none.
    """
    return _turns(bank, scale, PARITIES[bank.strength][0])


def _turns(bank: Bank, scale: int, parity: str) -> tuple[int, ...]:
    own = [bank.kernels[i].orientation for i in bank.members(scale, parity)]
    return tuple(place if turn is None else turn for place, turn in enumerate(own))


def magnitudes(bank: Bank, responses: F64, scale: int) -> F64:
    """What the strength of one scale is the largest of.

    Parameters
    ----------
    responses : ndarray (n, h, w)

    Returns
    -------
    ndarray (orientations, h, w): |odd| for step, |even| for line, sqrt(odd^2 + even^2)
    for energy.
    """
    parts = [responses[list(bank.members(scale, p))] for p in PARITIES[bank.strength]]
    return np.abs(parts[0]) if len(parts) == 1 else np.hypot(parts[0], parts[1])


def strongest(bank: Bank, responses: F64) -> tuple[F64, NDArray[np.uint8]]:
    """Strength and winning orientation of every scale, the first among equals.

    Returns
    -------
    float64 and uint8 ndarray (scales, h, w)
    """
    sizes = [magnitudes(bank, responses, s) for s in bank.scales]
    numbers = [np.array(orientations(bank, s), dtype=np.uint8) for s in bank.scales]
    winners = [n[m.argmax(axis=0)] for n, m in zip(numbers, sizes, strict=True)]
    return np.stack([m.max(axis=0) for m in sizes]), np.stack(winners)


def strength_tolerance(bank: Bank, bounds: tuple[float, ...], scale: int) -> float:
    """How far a float32 strength may be from the exact one, from the responses' bounds.

    Taking the largest of several values moves no further than the worst of them. For
    energy both parts err, and the squares, sum and root add less than 4 u of the value.
    """
    worst = 0.0
    for members in zip(*(bank.members(scale, p) for p in PARITIES[bank.strength]), strict=True):
        error = math.hypot(*(bounds[i] for i in members))
        if len(members) > 1:
            reach = math.hypot(*(float(bank.reach[i]) for i in members))
            error += 4 * UNIT_ROUNDOFF * (reach * bank.table.span + error)
        worst = max(worst, error)
    return worst


# ---------------------------------------------------------------- cases


@dataclass(frozen=True, eq=False)
class Case:
    """One picture and its exact answers.

    Parameters
    ----------
    name, what : for files and for people
    pixels : (h, w) of the contract's dtype; of colours as a picture of them is stored
    expected : float64 (n, h, w), exact responses
    tolerance : float64 (n,), largest allowed |float32 response - expected|
    strength : float64 (scales, h, w), or None for a bank without strength
    orientation : uint8 (scales, h, w), number of the winner (near ties may differ in float32)
    strength_tolerance : float64 (scales,)
    counts : int16 (n, h, w), exact fixed-point counts, or None for a bank without
    """

    name: str
    what: str
    pixels: Pixels
    expected: F64
    tolerance: F64
    strength: F64 | None = None
    orientation: NDArray[np.uint8] | None = None
    strength_tolerance: F64 | None = None
    counts: NDArray[np.int16] | None = None


def make_cases(
    bank: Bank,
    plan: Plan,
    oracle: Oracle,
    *,
    crop: Pixels | None = None,
    small: bool = False,
    limit_bytes: int = LIMIT_BYTES,
) -> tuple[Case, ...]:
    """Build the test vectors of a bank.

    Parameters
    ----------
    bank, plan : the plan's ``error_bound`` is the tolerance
    oracle : callable, float64 responses
    crop : a piece of a real picture in the bank's pixels, at least as large as the kernels;
        its middle is used
    small : only the impulse and a little noise down to the kernels' size, for the C self-test
    limit_bytes : about how large all expected arrays may be; cases at the end of the list
        are left out beyond it (the first two never)

    Returns
    -------
    tuple of Case : impulse off the middle, impulses in the corners, uniform noise, the picture
        that drives the kernel with the largest bound to its extremes, checkerboard, step, ramp,
        flat full scale, wide noise, crop. Sizes: the kernel's exactly, one more, odd, wide.
    """
    pictures = list(_small(bank) if small else _pictures(bank, plan))
    form = bank.contract.format
    if crop is not None and not small and min(form.size_of(crop)) >= bank.size:
        piece = middle(form.split(crop), max(bank.size, 40))
        pictures.append(("crop", "a piece of a picture", form.joined(piece)))
    cases: list[Case] = []
    left = limit_bytes / 8 / (len(bank) + len(bank.scales))
    for name, what, pixels in pictures:
        left -= math.prod(form.size_of(pixels))
        if left >= 0 or len(cases) < 2:
            cases.append(_answered(bank, plan, oracle, name, what, pixels))
    return tuple(cases)


def make_probes(bank: Bank, plan: Plan, oracle: Oracle) -> tuple[Case, ...]:
    """Larger pictures for verification only: they cross the column tiles and row rings.

    Returns
    -------
    tuple of Case : noise one pixel higher than the kernels and wider than any column tile,
        tall noise, and the extreme picture repeated several times.
    """
    h = bank.size
    wide = WIDEST_TILE // h + 301
    pictures = (
        ("probe_wide", "noise across the seam of column tiles", _noise(bank, (h + 1, wide))),
        ("probe_tall", "noise, many rows", _noise(bank, (4 * h + 61, h + 1))),
        ("probe_worst", "extremes, repeated", _worst(bank, plan, (4 * h + 1, 4 * h + 2))),
        *_worst_fixed(bank, plan),
    )
    return tuple(_answered(bank, plan, oracle, *picture) for picture in pictures)


def _answered(bank: Bank, plan: Plan, oracle: Oracle, name: str, what: str, pixels: Pixels) -> Case:
    pixels = np.ascontiguousarray(pixels)
    expected = np.asarray(oracle(bank, pixels), dtype=np.float64)
    if expected.shape != (len(bank), *bank.contract.format.size_of(pixels)):
        raise ValueError(f"the oracle gave {expected.shape} for a picture of {pixels.shape}")
    tolerance = np.array(plan.error_bound, dtype=np.float64)
    fixed = plan.detail.get("fixed")
    counts = None if fixed is None else fixed.counts(pixels)[0]
    if edges_lacking(bank):
        return Case(name, what, pixels, expected, tolerance, counts=counts)
    bounds = [strength_tolerance(bank, plan.error_bound, s) for s in bank.scales]
    winners = strongest(bank, expected)
    return Case(name, what, pixels, expected, tolerance, *winners, np.array(bounds), counts)


# ---------------------------------------------------------------- pictures

Picture = tuple[str, str, Pixels]


def _codes(bank: Bank, light: NDArray[Any]) -> Pixels:
    """Unit values to pixels: 0 to the lowest code, 1 to the highest the contract allows.

    Integer pixels use every code of their depth, float32 ones the range black to white. One
    plane (h, w) of light serves every sample of colour pixels, moved by a column from sample to
    sample so that no two see the same.
    """
    form = bank.contract.format
    if form.planes > 1:
        if light.ndim == 2:
            light = np.stack([np.roll(light, c, axis=1) for c in range(form.planes)], axis=2)
        light = form.joined(light)
    return _levels(bank, light)


def _levels(bank: Bank, light: NDArray[Any]) -> Pixels:
    """Unit values to codes of one sample, any shape."""
    form, contract = bank.contract.format, bank.contract
    if form.integer:
        return np.asarray(np.rint(light * form.full_scale).astype(form.dtype))
    span = contract.white - contract.black
    return np.asarray((contract.black + light * span).astype(form.dtype))


def _pictures(bank: Bank, plan: Plan) -> Iterator[Picture]:
    h = bank.size
    yield from _impulses(bank)
    yield "noise", "uniform noise, odd sizes", _noise(bank, (h + 2, 2 * h + 1))
    worst = "drives the kernel with the largest error bound to its extremes"
    yield "worst", worst, _worst(bank, plan, (h + 1, 2 * h + 3))
    y, x = np.mgrid[: h + 1, : h + 1]
    yield "checkerboard", "one pixel larger than the kernels", _codes(bank, (x + y) % 2)
    y, x = np.mgrid[:h, : h + 2]
    yield "step", "dark to bright along +x", _codes(bank, x >= (h + 2) // 2)
    y, x = np.mgrid[: h + 4, : h + 2]
    slope = (5 * x + 3 * y) / (5 * (h + 1) + 3 * (h + 3))
    yield "ramp", "rises along +x and +y", _codes(bank, slope)
    yield "flat", "full scale, as large as the kernels", _codes(bank, np.ones((h, h)))
    yield "wide", "noise, as high as the kernels", _noise(bank, (h, 6 * h + 7))


def _impulses(bank: Bank) -> Iterator[Picture]:
    """One off the middle, out of the border's reach, and one in each corner."""
    h, r = bank.size, bank.radius
    light = np.zeros((h + 3, h + 6))
    light[r + 1, r + 2] = 1
    yield "impulse", f"row {r + 1}, column {r + 2}: gives the flipped kernels", _codes(bank, light)
    light = np.zeros((h, h + 1))
    light[0, 0], light[0, -1], light[-1, 0], light[-1, -1] = 1, 0.25, 0.5, 0.75
    yield "corners", "four impulses of four heights", _codes(bank, light)


def _small(bank: Bank) -> Iterator[Picture]:
    yield next(_impulses(bank))
    yield "noise", "uniform noise", _noise(bank, (bank.size + 1, bank.size + 2))
    yield "smallest", "noise, as large as the kernels", _noise(bank, (bank.size, bank.size))


def _noise(bank: Bank, shape: tuple[int, int]) -> Pixels:
    planes = bank.contract.format.planes
    wide = shape if planes == 1 else (*shape, planes)
    return _codes(bank, rng(0, "vectors", f"noise {shape}").random(wide))


def _worst(bank: Bank, plan: Plan, shape: tuple[int, int]) -> Pixels:
    """Extremes of the working values, for the kernel with the largest bound.

    Left half: the largest values under its positive taps and the least under its negative
    ones, so that sums grow as far as they can. Right half: values of the largest size
    everywhere, so that all products are large and cancel. Values stray inwards by up to
    1/32 of their range, for products that do not fit 24 bits.
    """
    kernel = bank.taps[int(np.argmax(plan.error_bound))]
    if bank.mix is not None:
        kernel = kernel @ bank.mix
    light = np.linspace(0, 1, 4097)
    values = bank.table.apply(_levels(bank, light)).astype(np.float64)
    slack = (values.max() - values.min()) / 32
    high = light[values >= values.max() - slack]
    low = light[values <= values.min() + slack]
    y, x = np.indices(shape)
    bright = kernel[y % bank.size, x % bank.size] > 0  # (h, w), or (h, w, samples)
    bright[:, shape[1] // 2 :] = abs(values.max()) >= abs(values.min())
    draw = rng(0, "vectors", f"worst {shape}")
    wide = bright.shape
    return _codes(bank, np.where(bright, draw.choice(high, wide), draw.choice(low, wide)))


def _worst_fixed(bank: Bank, plan: Plan) -> Iterator[Picture]:
    """The picture on which the rounded taps of fixed point do most harm, and its negative."""
    fixed = plan.detail.get("fixed")
    if fixed is not None and bank.table.values is not None:
        k = int(np.argmax(fixed.bound))
        for most in (True, False):
            worst = fixed.worst(k, bank.table.values, most).astype(bank.contract.format.dtype)
            yield f"probe_fixed_{int(most)}", "worst for fixed point", np.tile(worst, (2, 2))


def middle(pixels: Pixels, side: int) -> Pixels:
    """The middle of a picture, at most ``side`` pixels high and wide."""
    rows, cols = (max(0, (n - side) // 2) for n in pixels.shape[:2])
    return pixels[rows : rows + side, cols : cols + side]


# ---------------------------------------------------------------- files

_ARRAYS = {"pixels": "image", "expected": "responses", "strength": "strength",
           "orientation": "orientation", "counts": "counts"}  # fmt: skip
"""Field of a case to the word in its file's name."""


def vector_files(
    bank: Bank, cases: tuple[Case, ...], edgels: Mapping[str, Any] | None = None
) -> Bundle:
    """Cases as files under ``vectors/``: ``.npy`` arrays, ``cases.json``, ``README.md``.

    ``edgels`` is a further entry for ``cases.json``. The same cases give the same bytes.
    """
    files: dict[str, bytes] = {}
    listed = []
    for case in cases:
        entry: dict[str, Any] = {"name": case.name, "what": case.what}
        for field, word in _ARRAYS.items():
            array = getattr(case, field)
            if array is not None:
                entry[word] = f"{case.name}.{word}.npy"
                files[f"vectors/{entry[word]}"] = npy_bytes(array)
        listed.append(entry)
    head: dict[str, Any] = {
        "operation": "correlation",
        "border": bank.border,
        "pixels": bank.contract.pixels,
        "kernels": [k.name for k in bank.kernels],
        "tolerance": cases[0].tolerance.tolist(),
        "cases": listed,
    }
    if cases[0].strength_tolerance is not None:
        head["strength"] = bank.strength
        head["strength_tolerance"] = cases[0].strength_tolerance.tolist()
    if edgels:
        head["edgels"] = dict(edgels)
    files["vectors/cases.json"] = canonical_json(head)
    files["vectors/README.md"] = readme(bank).encode()
    return files


def load_cases(read: Callable[[str], bytes]) -> tuple[Case, ...]:
    """Read the cases that :func:`vector_files` made.

    Parameters
    ----------
    read : callable, relative path to bytes; should check the hash

    Raises
    ------
    InputError : a damaged list or array, or arrays that do not belong together.
    """
    try:
        head = json.loads(read("vectors/cases.json"))
        strength_tolerance = head.get("strength_tolerance")
        cases = tuple(
            Case(
                name=str(entry["name"]),
                what=str(entry["what"]),
                tolerance=np.array(head["tolerance"], dtype=np.float64),
                strength_tolerance=strength_tolerance and np.array(strength_tolerance),
                **{
                    field: array_in(read(f"vectors/{entry[word]}"))
                    for field, word in _ARRAYS.items()
                    if word in entry
                },
            )
            for entry in head["cases"]
        )
        for case in cases:
            _fitting(case, len(head["kernels"]), pixel_format(str(head["pixels"])))
    except (KeyError, TypeError, ValueError, AttributeError, UsageError) as error:
        raise InputError(f"damaged test vectors: {error}", where="vectors/cases.json") from None
    return cases


def _fitting(case: Case, kernels: int, form: PixelFormat) -> None:
    h, w = form.size_of(case.pixels)
    fits = case.expected.shape == (kernels, h, w) and case.tolerance.shape == (kernels,)
    fits = fits and (case.counts is None or case.counts.shape == (kernels, h, w))
    for array in (case.strength, case.orientation):
        scales = 0 if case.strength_tolerance is None else len(case.strength_tolerance)
        fits = fits and (array is None or array.shape == (scales, h, w))
    if not fits or (case.strength is None) != (case.strength_tolerance is None):
        raise ValueError(f"the arrays of case {case.name} do not belong together")


def array_in(data: bytes) -> NDArray[Any]:
    """The plain array in a ``.npy`` file; ValueError for anything else."""
    try:
        return np.asarray(np.lib.format.read_array(io.BytesIO(data), allow_pickle=False))
    except Exception as error:  # a damaged header ends in errors of many kinds
        raise ValueError(f"not a plain array ({error})") from None
