"""The input table: pixel code to working value, the first step of everything after.

``stabilised`` makes noise have standard deviation 1 at every grey level. It starts
from the generalised Anscombe transform (Foi et al. 2008, IEEE Transactions on Image
Processing 17:1737-1754), or from the integral of 1 / sd where the law is a curve,
and is then optimised against the exact probabilities of the codes, because the
closed forms fail near black and where steps are coarse.
"""

from __future__ import annotations

from dataclasses import replace

import numpy as np
from scipy import stats
from scipy.special import ndtr

from patchlab.errors import InputError, UsageError
from patchlab.types import F32, F64, InputContract, InputTable, NoiseModel, TableKind

RANGE = 255.0
"""Working value of white in the linear and the log table."""

ROUNDS = 20
LEVELS = 64
TOP = 0.98
SATURATION = 3.0
EXACT_ELECTRONS = 1000.0
_QUANTUM = 1 / 12


# ---------------------------------------------------------------- the noise at a level


def read_of(noise: NoiseModel, contract: InputContract) -> float | None:
    """Read noise of a straight law in codes, also where it is not told; None for a curve."""
    if noise.gain is None or noise.read_noise is not None:
        return noise.read_noise
    quantum = _QUANTUM if contract.format.integer else 0.0
    variance = noise.sd[0] ** 2 - noise.gain * (noise.levels[0] - contract.black) - quantum
    return float(np.sqrt(max(variance, 0.0)))


def sd_of(noise: NoiseModel, contract: InputContract, codes: F64) -> F64:
    """Standard deviation of the noise in codes at mean code values (quantisation included)."""
    codes = np.asarray(codes, dtype=np.float64)
    read = read_of(noise, contract)
    if noise.gain is not None and read is not None:
        quantum = _QUANTUM if contract.format.integer else 0.0
        light = np.maximum(codes - contract.black, 0)
        return np.sqrt(noise.gain * light + read**2 + quantum)
    return np.interp(codes, noise.levels, noise.sd)


def _window(contract: InputContract, mean: float, sd: float) -> F64:
    """Every code that noise can reach from a level."""
    top = min(contract.white, contract.format.full_scale)
    low = max(0, int(np.floor(mean - 9 * sd - 2)))
    high = min(int(top), int(np.ceil(mean + 9 * sd + 2)))
    return np.arange(min(low, int(top)), high + 1, dtype=np.float64)


def code_probabilities(noise: NoiseModel, contract: InputContract, level: float) -> tuple[F64, F64]:
    """Codes that a pixel of mean ``level`` gives, and their probabilities.

    Poisson electrons and Gaussian read noise where the law is linear (a Gaussian above
    1000 electrons, where its skew no longer counts), a Gaussian where it is a curve;
    then rounding, and clipping at code 0 and full scale.
    """
    sd = float(sd_of(noise, contract, np.array([level]))[0])
    codes = _window(contract, level, sd)
    edges = codes[:-1] + 0.5
    gain, read = noise.gain, read_of(noise, contract)
    electrons = (level - contract.black) / gain if gain else np.inf
    if gain is None or read is None or electrons > EXACT_ELECTRONS:
        below = ndtr((edges - level) / np.sqrt(max(sd**2 - _QUANTUM, 1e-6)))
    else:
        spread = 9 * np.sqrt(max(electrons, 1.0)) + 9
        count = np.arange(max(0, int(electrons - spread)), int(electrons + spread) + 1)
        weight = stats.poisson.pmf(count, max(electrons, 0.0))
        mean = contract.black + gain * count
        below = weight @ ndtr((edges[None, :] - mean[:, None]) / max(read, 1e-3))
        below /= weight.sum()
    return codes, np.diff(np.concatenate([[0.0], below, [1.0]]))


def noise_of_table(table: InputTable, noise: NoiseModel, levels: F64) -> F64:
    """Standard deviation of the working values at mean code values, by exact probabilities.

    Parameters
    ----------
    table : of integer pixels, or the float32 formula (then to first order)
    noise : the law; must be measurable
    levels : ndarray of mean codes

    Returns
    -------
    ndarray like ``levels``
    """
    levels = np.asarray(levels, dtype=np.float64)
    if table.values is None:
        step = 1e-3 * (table.contract.white - table.contract.black)
        high, low = (
            table.apply((levels + s).astype(np.float32)).astype(np.float64) for s in (step, -step)
        )
        return np.asarray((high - low) / (2 * step) * sd_of(noise, table.contract, levels))
    values = table.values.astype(np.float64)
    chances = [code_probabilities(noise, table.contract, float(m)) for m in levels.ravel()]
    return _spread(values, chances).reshape(levels.shape)


def _spread(values: F64, chances: list[tuple[F64, F64]]) -> F64:
    """Standard deviation of a table's values under each distribution of codes."""
    found = np.empty(len(chances))
    for i, (codes, p) in enumerate(chances):
        v = values[codes.astype(np.int64)]
        mean = p @ v
        found[i] = np.sqrt(p @ (v - mean) ** 2)
    return found


# ---------------------------------------------------------------- tables


def _log(light: F64) -> F64:
    """``255 log(1 + 255 light) / log 256``: log with a floor of 1 / 255 of white, 0 to 255."""
    return np.asarray(RANGE * np.log1p(RANGE * light) / np.log1p(RANGE))


def _start(noise: NoiseModel, contract: InputContract, codes: F64) -> F64:
    """Slope of the generalised Anscombe transform, or 1 / sd of a curve, at every code."""
    read = read_of(noise, contract)
    if noise.gain is None or read is None:
        return 1 / np.maximum(sd_of(noise, contract, codes), 0.3)
    a, b = noise.gain, read**2 + _QUANTUM
    light = np.maximum(codes - contract.black, 0.0)
    return np.asarray(1 / np.sqrt(a * light + 0.375 * a**2 + b))


def _levels(slope: F64, black: float, top: float) -> F64:
    """Levels evenly spread in working values, closer towards black where the steps are coarse."""
    reached = np.concatenate([[0.0], np.cumsum(slope)])
    codes = black + np.arange(reached.size)
    inside = codes <= top
    goal = TOP * reached[inside][-1] * np.linspace(0, 1, LEVELS) ** 1.5
    return np.asarray(np.interp(goal, reached[inside], codes[inside]), np.float64)


def _stabilise(noise: NoiseModel, contract: InputContract) -> F64:
    """Working values of every code: 0 at the black level, noise of standard deviation 1."""
    codes = np.arange(1 << contract.format.bits, dtype=np.float64)
    middle = codes[:-1] + 0.5
    slope = _start(noise, contract, middle)
    top = min(contract.white, contract.format.full_scale)
    levels = _levels(slope[codes[:-1] >= contract.black], contract.black, top)
    chances = [code_probabilities(noise, contract, float(m)) for m in levels]
    dark = middle < contract.black
    for _ in range(ROUNDS):
        values = np.concatenate([[0.0], np.cumsum(slope)])
        sd = np.maximum(_spread(values, chances), 1e-3)
        slope = slope / np.interp(middle, levels, sd**0.8)
        at_black = slope[min(int(contract.black), slope.size - 1)]
        slope[dark] = np.minimum(slope[dark], at_black)
    values = np.concatenate([[0.0], np.cumsum(slope)])
    return np.asarray(values - np.interp(contract.black, codes, values), np.float64)


def _float_formula(noise: NoiseModel, contract: InputContract) -> tuple[float, float, float]:
    """Slope, offset and scale of the Anscombe root for float pixels."""
    read = read_of(noise, contract)
    if noise.gain is not None and read is not None:
        a, b = noise.gain, read**2
    else:
        light = noise.levels - contract.black
        weight = 1 / np.maximum(noise.sd, 1e-12) ** 2
        a, b = np.polyfit(light, noise.sd**2, 1, w=weight) if light.size > 1 else (0.0, 0.0)
        a = max(float(a), 1e-9 * float(noise.sd.max()))
        b = max(float(b), float(noise.sd.min()) ** 2 / 4)
    return a, 0.375 * a * a + b - a * contract.black, 2 / a


def _trusted(contract: InputContract, noise: NoiseModel | None) -> tuple[float, float]:
    """First and last code more than three standard deviations from saturation."""
    integer = contract.format.integer
    top = min(contract.white, contract.format.full_scale) if integer else contract.white
    bottom = float(integer and contract.black > 0) if integer else -np.inf
    if noise is None or not noise.measurable:
        return bottom, top - 1 if integer else top
    codes = np.linspace(contract.black, top, 4097)
    safe = codes + SATURATION * sd_of(noise, contract, codes) <= top
    last = float(codes[safe].max()) if safe.any() else top
    return bottom, float(np.floor(last)) if integer else last


def default_kind(noise: NoiseModel | None, contract: InputContract) -> TableKind:
    """Stabilised when the noise is known, else linear (identity for float32)."""
    if noise is not None and noise.measurable:
        return "stabilised"
    return "linear" if contract.format.integer else "identity"


def make_table(kind: TableKind, contract: InputContract, noise: NoiseModel | None) -> InputTable:
    """The input table of a camera.

    Parameters
    ----------
    kind :
        ``identity``: the code itself. ``linear``: 255 times the linear light (black 0,
        white 255, whatever the depth; sRGB decoded). ``log``: ``255 log(1 + 255 light) /
        log 256``. ``stabilised``: noise of standard deviation 1 at every level, 0 at the
        black level, rising.
    contract : which pixels; float32 takes identity and stabilised (as a root) only
    noise : the measured law; needed for stabilised

    Returns
    -------
    InputTable : ``noise_sd`` is the median over levels of the noise in working values;
        ``valid_codes`` ends three standard deviations below saturation.

    Raises
    ------
    InputError : stabilised without a measurable noise law.
    UsageError : a kind that float32 pixels do not have, or an unknown one.
    """
    known = noise is not None and noise.measurable
    if kind not in ("identity", "linear", "log", "stabilised"):
        raise UsageError(f"unknown table {kind!r}", remedy="identity, linear, log or stabilised")
    if kind == "stabilised" and not known:
        why = noise.reason if noise is not None else "the noise was not measured"
        raise InputError(
            f"a stabilised table needs the camera's noise: {why}",
            remedy="use --table linear, or give static frames",
        )
    valid = _trusted(contract, noise)
    if not contract.format.integer:
        return _float_table(kind, contract, noise, valid)
    codes = np.arange(1 << contract.format.bits, dtype=np.float64)
    if kind == "identity":
        values = codes
    elif kind == "stabilised":
        assert noise is not None
        values = _stabilise(noise, contract)
    else:
        light = contract.light(codes)
        values = RANGE * light if kind == "linear" else _log(light)
    return _finish(InputTable(kind, contract, _f32(values), None, valid_codes=valid), noise)


def _f32(values: F64) -> F32:
    return np.ascontiguousarray(values, dtype=np.float32)


def _float_table(
    kind: TableKind,
    contract: InputContract,
    noise: NoiseModel | None,
    valid: tuple[float, float],
) -> InputTable:
    if kind not in ("identity", "stabilised"):
        raise UsageError(
            f"float32 pixels have no {kind} table", remedy="choose identity or stabilised"
        )
    if kind == "identity":
        return _finish(InputTable(kind, contract, None, None, valid_codes=valid), noise)
    assert noise is not None
    slope, offset, scale = _float_formula(noise, contract)
    table = InputTable(kind, contract, None, None, slope, offset, scale, valid)
    return _finish(table, noise)


def _finish(table: InputTable, noise: NoiseModel | None) -> InputTable:
    """Fill in the noise of the working values."""
    if noise is None or not noise.measurable:
        return table
    if table.kind == "stabilised":
        return replace(table, noise_sd=1.0)
    contract = table.contract
    levels = contract.black + (contract.white - contract.black) * np.linspace(0.05, 0.85, 33)
    return replace(table, noise_sd=float(np.median(noise_of_table(table, noise, levels))))
