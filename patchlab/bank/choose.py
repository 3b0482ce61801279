"""Choosing the bank: two purposes, one mechanism.

A bank lies on a fixed mirrored orientation lattice whose structure follows from the budget
alone, with one pair of widths for each size. What is chosen is only those widths:

- ``edges``: step kernels whose sizes give the best predicted detection for the camera's noise
  and blur, starting from the size that the learned atoms show. A bank that covers more of the
  atoms is not a better edge detector, so coverage has no say here.
- ``features``: quadrature pairs whose widths cover most of the learned atoms, pooled over
  restarts, equally weighted, capped in size.

Single learned components differ between two runs on the same photographs; such a bank does
not, and still follows the camera.
"""

from __future__ import annotations

import dataclasses
from dataclasses import dataclass
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.bank import octaves, predict
from patchlab.bank.coverage import Parity, RefinedWidths, Widths, refine_widths, report_coverage
from patchlab.bank.lattice import (
    LINES,
    PAIRS,
    STEPS,
    check_name,
    lattice_bank,
    structure_for,
    without_mirror_bias,
)
from patchlab.conventions import BORDERS, DEFAULT_BORDER, shift_cosine
from patchlab.errors import UsageError
from patchlab.types import F64, Bank, Dictionary, KernelFits, Survey

CURVE_BUDGET = 32
"""The coverage curve goes up to so many kernels (and to the bank's own)."""
FEW_GOOD = 0.5
"""Below this share of well fitted atoms the photographs hardly show edges."""
CLEAR_MARGIN = 0.1
"""Coverage that learned atoms must have above a rotated basis to show structure."""
DEFAULT_RATIO = 1.8
"""Ratio of neighbouring sizes where noise and blur cannot choose it."""


@dataclass(frozen=True)
class BankSettings:
    """What is asked of a bank.

    Parameters
    ----------
    kernels : budget, 4 to 64; the largest lattice that it holds is taken
    purpose : "edges" or "features"
    lines : give each step kernel of an edge bank an even (line) partner; they count too
    false_edges : false edge elements allowed per megapixel of flat area, 0.1 to 1000
    border : one of the five names
    name : C identifier, prefix of every exported symbol
    widths : (across, along) of each size, pixels, to set them by hand
    size : kernel side, odd, 3 to 63, to set it by hand (octaves have their own)
    octaves : doubled widths added to an edge bank, each with as many directions as its coarsest
        size; their kernels come on top of the budget
    seed : of the rotated basis that coverage is compared with

    Raises
    ------
    UsageError : a value outside its range or choices.
    """

    kernels: int = 16
    purpose: Literal["edges", "features"] = "edges"
    lines: bool = False
    false_edges: float = 10.0
    border: str = DEFAULT_BORDER
    name: str = "bank"
    widths: Widths | None = None
    size: int | None = None
    seed: int = 0
    octaves: int = 0

    def __post_init__(self) -> None:
        if not 4 <= self.kernels <= 64:
            raise UsageError(f"a bank of {self.kernels} kernels", remedy="ask for 4 to 64")
        if self.purpose not in ("edges", "features"):
            raise UsageError(f"unknown purpose {self.purpose!r}", remedy="edges or features")
        if not 0.1 <= self.false_edges <= 1000:
            raise UsageError(
                f"{self.false_edges:g} false edges per megapixel", remedy="ask for 0.1 to 1000"
            )
        if self.border not in BORDERS:
            raise UsageError(f"unknown border {self.border!r}", remedy=", ".join(BORDERS))
        if self.size is not None and not (3 <= self.size <= 63 and self.size % 2):
            raise UsageError(
                f"kernels of side {self.size}", remedy="ask for an odd side of 3 to 63"
            )
        if self.lines and self.purpose == "features":
            raise UsageError("a bank of features has its line kernels already")
        if not 0 <= self.octaves <= octaves.MOST:
            raise UsageError(f"{self.octaves} octaves", remedy=f"ask for 0 to {octaves.MOST}")
        if self.octaves and self.purpose == "features":
            raise UsageError("octaves are for banks of edges", remedy="leave out one of the two")
        check_name(self.name)

    @property
    def structures(self) -> dict[int, tuple[int, ...]]:
        """Orientations of each size by number of kernels, for this kind of bank."""
        if self.purpose == "features":
            return PAIRS
        return LINES if self.lines else STEPS

    @property
    def parity(self) -> Parity:
        """Whether each orientation holds a pair or an odd kernel alone."""
        return "pair" if self.lines or self.purpose == "features" else "odd"


@dataclass(frozen=True)
class WidthChoice:
    """Widths with their reasons.

    Parameters
    ----------
    structure : orientations of each size, finest first
    widths : (across, along) of each size, pixels
    warnings : sentences for people
    about : where the widths come from, plain data for the manifest
    """

    structure: tuple[int, ...]
    widths: Widths
    warnings: tuple[str, ...]
    about: dict[str, Any]


# ---------------------------------------------------------------- the two purposes


def _bound_warning(scale: int, name: str, value: float) -> str:
    return (
        f"{name} of size {scale} ended on its bound at {value:g} px; "
        "the best width may lie beyond it"
    )


def _for_features(atoms: F64, structure: tuple[int, ...]) -> WidthChoice:
    """Widths that cover the pooled atoms best."""
    found = refine_widths(atoms, structure, "pair")
    warnings = [
        _bound_warning(i, name, found.widths[i][name == "sigma_v_px"])
        for i, names in enumerate(found.at_bound)
        for name in names
    ]
    about = {"widths_from": "coverage of the learned atoms"}
    return WidthChoice(found.structure, found.widths, tuple(warnings), about)


def _noise_sd(survey: Survey) -> float | None:
    """Noise of the working values, None where it cannot be told or is nil."""
    sd = survey.table.noise_sd
    return sd if sd is not None and sd > 0 else None


def _missing(survey: Survey) -> str:
    """What the sizes of an edge bank lack: "", "noise", "blur" or both."""
    lacking = [] if _noise_sd(survey) is not None else ["noise"]
    lacking += [] if survey.blur_sigma_px is not None else ["blur"]
    return " and ".join(lacking)


def _for_edges(
    shown: RefinedWidths,
    structure: tuple[int, ...],
    survey: Survey,
    settings: BankSettings,
    heights: F64 | None,
) -> WidthChoice:
    """Sizes by predicted detection; by the atoms alone where noise or blur are unknown."""
    start = shown.widths[0][0]
    missing, sd = _missing(survey), _noise_sd(survey)
    if missing or sd is None or survey.blur_sigma_px is None:
        across = predict.ladder(start, len(structure), DEFAULT_RATIO)
        about: dict[str, Any] = {"widths_from": "the learned atoms"}
        said = [
            f"the camera's {missing} could not be measured, so the sizes follow the learned "
            "atoms and not the predicted detection"
        ]
        stuck = [not predict.inside(w) for w in across]
    else:
        bright = predict.tone_contrasts(survey.table) if heights is None else heights
        given = predict.conditions(
            np.multiply.outer(predict.dimming(survey.table), bright).ravel(),
            sd,
            survey.blur_sigma_px,
            settings.false_edges,
            survey.noise.autocovariance,
        )
        best = predict.best_widths(structure, given, (start, 1.5 * given.blur_px))
        across, said, stuck = best.across, [], list(best.at_bound)
        about = {
            "widths_from": "predicted detection",
            "predicted_f": round(best.predicted, 4),
            "blur_px": given.blur_px,
            "contrasts_from": "uniform tones" if heights is None else "the patches",
            "exposures": predict.EXPOSURES,
        }
    about["atoms_sigma_u_px"] = start
    said += [
        _bound_warning(i, "sigma_u_px", w)
        for i, (w, bound) in enumerate(zip(across, stuck, strict=True))
        if bound
    ]
    widths = tuple((w, round(predict.ASPECT * w, 3)) for w in across)
    return WidthChoice(structure, widths, tuple(said), about)


def _by_hand(structure: tuple[int, ...], widths: Widths) -> WidthChoice:
    """Widths that a person has set."""
    if len(widths) != len(structure):
        raise UsageError(
            f"{len(widths)} pairs of widths for {len(structure)} sizes",
            remedy="give (across, along) for each size",
        )
    if not all(0.3 <= w <= 5 for pair in widths for w in pair):
        raise UsageError("widths set by hand must lie in 0.3 to 5 pixels")
    order = sorted(range(len(widths)), key=lambda i: widths[i])
    return WidthChoice(
        tuple(structure[i] for i in order),
        tuple(widths[i] for i in order),
        (),
        {"widths_from": "settings"},
    )


def _heights(survey: Survey, patch_contrast: NDArray[Any] | None) -> F64 | None:
    """Step heights that patches show, in working values; None where they do not tell."""
    if patch_contrast is None or np.ptp(patch_contrast) == 0:
        return None  # patches that were not normalised carry one and the same divisor
    noise = _noise_sd(survey) or 0.0
    spread = np.asarray(patch_contrast, dtype=np.float64)
    return np.asarray(2 * np.sqrt(np.maximum(spread**2 - noise**2, 0)))


def choose_widths(
    atoms: F64,
    survey: Survey,
    settings: BankSettings,
    *,
    patch_contrast: NDArray[Any] | None = None,
) -> WidthChoice:
    """Choose the structure and the widths of a bank, without making it.

    Parameters
    ----------
    atoms : ndarray (n, size, size), pooled over restarts
    survey, settings, patch_contrast : as for :func:`choose_bank`

    Returns
    -------
    WidthChoice

    Raises
    ------
    UsageError : a budget too small for the kind of bank, widths by hand that do not fit.
    """
    _, structure = structure_for(settings.kernels, settings.structures)
    if settings.widths is not None:
        return _by_hand(structure, settings.widths)
    if settings.purpose == "features":
        return _for_features(atoms, structure)
    shown = refine_widths(atoms, structure[:1], "pair")
    return _for_edges(shown, structure, survey, settings, _heights(survey, patch_contrast))


# ---------------------------------------------------------------- the bank


def _doubts(fits: KernelFits, margin: float) -> list[str]:
    """Reasons to distrust what was learned."""
    said = []
    if len(fits) and fits.count("good") < FEW_GOOD * len(fits):
        said.append(
            f"only {fits.count('good')} of {len(fits)} {fits.of} fit an edge or line kernel well: "
            "these photographs hardly show edges, or too few patches were learned from"
        )
    if margin < CLEAR_MARGIN:
        said.append(
            f"the best bank covers the learned atoms only {margin:.2f} better than a random "
            "rotation of them: no edge structure was learned"
        )
    return said


def _budget_points(
    table: dict[int, tuple[int, ...]], kernels: int
) -> list[tuple[int, tuple[int, ...]]]:
    return [(k, s) for k, s in table.items() if k <= max(CURVE_BUDGET, kernels)]


def choose_bank(
    dictionary: Dictionary,
    fits: KernelFits,
    survey: Survey,
    settings: BankSettings | None = None,
    *,
    patch_contrast: NDArray[Any] | None = None,
) -> Bank:
    """Choose a convolution bank for a camera.

    Parameters
    ----------
    dictionary : what was learned; ``pooled_atoms`` show the widths
    fits : of its atoms, to tell whether they look like edges at all
    survey : noise, blur and input table of the camera
    settings : BankSettings, defaults when None
    patch_contrast : ndarray (n,), standard deviations of patches in working values, from which
        the spread of edge contrasts is taken (a step through a patch's middle is twice its
        standard deviation high); None, or the same value for all, means the prior of
        :func:`patchlab.bank.predict.tone_contrasts`

    Returns
    -------
    Bank : taps of unit noise gain (in the camera's noise where it is known, else of unit norm),
        DC exactly zero, mirrored orientations exact mirror images; with its Coverage. There
        ``curve`` holds the best a bank of each budget reaches on the learned atoms, and
        ``rotated`` the best one of this structure on a rotated basis: these two compare. The
        bank's own ``learned`` is lower where its sizes were not chosen for coverage.

    Raises
    ------
    UsageError : a budget too small for the kind of bank, widths by hand that do not fit.
    """
    asked = settings or BankSettings()
    kernels, _ = structure_for(asked.kernels, asked.structures)
    choice = choose_widths(dictionary.pooled_atoms, survey, asked, patch_contrast=patch_contrast)
    coverage = report_coverage(
        dictionary.pooled_atoms,
        dictionary.atoms,
        choice.structure,
        choice.widths,
        "pair",  # coverage is over phases, whichever of them the bank computes
        _budget_points(asked.structures, kernels),
        asked.seed,
    )
    sd = _noise_sd(survey)
    parities: tuple[Literal["odd", "even"], ...] = ("odd", "even")
    parities = parities if asked.parity == "pair" else parities[:1]
    covariance = survey.noise.autocovariance
    made, taps = lattice_bank(choice.structure, choice.widths, parities, covariance, sd, asked.size)
    best = float(coverage.curve[list(coverage.budget).index(kernels)])
    warnings = [*_budget_warnings(asked, kernels), *choice.warnings]
    warnings += _cut_warnings(taps.shape[1] // 2, choice.widths)
    added = 0
    if asked.octaves:
        widest, directions = choice.widths[-1], choice.structure[-1]
        more = octaves.with_octaves(
            made, taps, asked.octaves, directions, widest, parities, covariance, sd
        )
        made, taps = more.kernels, more.taps
        added = len(more.widths)
        warnings += more.warnings
    warnings += _noise_warnings(sd, covariance)
    warnings += _doubts(fits, best - coverage.rotated)
    return Bank(
        name=asked.name,
        kernels=made,
        taps=taps,
        table=survey.table,
        border=asked.border,
        strength="energy" if asked.purpose == "features" else "step",
        purpose=asked.purpose,
        coverage=coverage,
        noise_autocovariance=covariance,
        provenance={"settings": dataclasses.asdict(asked), "choice": choice.about},
        warnings=tuple(warnings),
        octaves=added,
    )


def _budget_warnings(asked: BankSettings, kernels: int) -> list[str]:
    if kernels == asked.kernels:
        return []
    sizes = " + ".join(str(n) for n in asked.structures[kernels])
    return [
        f"{asked.kernels} kernels were asked for; the lattice below that has {kernels} "
        f"({sizes} orientations)"
    ]


def _cut_warnings(radius: int, widths: Widths) -> list[str]:
    widest = max(max(pair) for pair in widths)
    if radius >= 3 * widest - 0.5:
        return []
    return [
        f"kernels reach {radius} px from their centre, {radius / widest:.1f} standard deviations "
        "of the widest: their rims are cut"
    ]


def _noise_warnings(sd: float | None, covariance: F64 | None) -> list[str]:
    if sd is None:
        return ["the camera's noise is not known, so kernels have unit norm and responses no unit"]
    even_handed = without_mirror_bias(covariance)
    if covariance is not None and even_handed is not None:
        skew = float(np.abs(covariance - even_handed).max())
        if skew > 0.05:
            return [
                f"the noise is correlated along one diagonal (by {skew:.2f}); mirrored kernels "
                "share one scale, so their noise differs a little from 1"
            ]
    return []


def compare_banks(a: Bank, b: Bank) -> F64:
    """How well each kernel of one bank finds a counterpart in another.

    Parameters
    ----------
    a, b : Bank

    Returns
    -------
    ndarray (len(a),): for each kernel of ``a`` the largest |cos| with a kernel of ``b`` over
    all whole-pixel shifts, in [0, 1]
    """
    first, second = a.taps.astype(np.float64), b.taps.astype(np.float64)
    return np.array([max(shift_cosine(k, other) for other in second) for k in first])
