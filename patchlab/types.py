"""The nouns: what the stages hand to one another.

Every result is a frozen dataclass that checks its own shapes once. Arrays are
C-contiguous and not written to after construction.
"""

from __future__ import annotations

from collections.abc import Mapping
from dataclasses import dataclass, field
from typing import Any, Literal

import numpy as np
from numpy.typing import NDArray

from patchlab.conventions import DEFAULT_BORDER, PixelFormat, pixel_format, srgb_decode
from patchlab.errors import InputError, UsageError

F32 = NDArray[np.float32]
F64 = NDArray[np.float64]


def _check(condition: bool, message: str) -> None:
    if not condition:
        raise ValueError(message)


# ---------------------------------------------------------------- pictures


@dataclass(frozen=True)
class InputContract:
    """Which pixels something takes.

    Parameters
    ----------
    pixels : PFNC name (Mono8 to Mono16; RGB8, BGR8 and BayerRG8 to 16 for colour) or float32
    black, white : codes of no light and of full scale
    transfer : "linear" or "srgb", how codes follow light
    plane : "" for a monochrome picture; of a Bayer sensor its pattern and the plane that is taken:
        "BayerRG green" (the green pixels of the red rows), "BayerRG luminance" (bilinear colours,
        Rec. 709 weights) or "BayerRG mosaic" (all pixels; patches begin on even rows and columns)
    """

    pixels: str
    black: float
    white: float
    transfer: Literal["linear", "srgb"] = "linear"
    plane: str = ""

    def __post_init__(self) -> None:
        _check(self.white > self.black, "white level must exceed black level")
        pixel_format(self.pixels)

    @property
    def format(self) -> PixelFormat:
        """The pixel format, with its depth and types."""
        return pixel_format(self.pixels)

    @property
    def lattice(self) -> int:
        """Rows and columns after which the pixels' meaning repeats: 2 for a mosaic, else 1."""
        return 2 if self.plane.endswith(" mosaic") else 1

    def light(self, codes: NDArray[Any]) -> F64:
        """Linear light in [0, 1] of pixel codes: black to 0, white to 1."""
        unit = (np.asarray(codes, dtype=np.float64) - self.black) / (self.white - self.black)
        unit = np.clip(unit, 0.0, 1.0)
        return srgb_decode(unit) if self.transfer == "srgb" else unit


@dataclass(frozen=True, eq=False)
class Frame:
    """One picture as its camera's codes.

    Parameters
    ----------
    path : relative path with forward slashes ("#k" appended for page k of several)
    pixels : ndarray (h, w) of the contract's dtype; (h, w, 3) for interleaved colour, and
        (2 h, 2 w) for a Bayer sensor whose pixels are its cells
    contract : InputContract
    invalid : bool ndarray (h, w), True where a pixel must not be used, or None
    sha256 : of the file's bytes
    notes : what the reader did (orientation applied, colour to luminance, ...)
    """

    path: str
    pixels: NDArray[Any]
    contract: InputContract
    invalid: NDArray[np.bool_] | None = None
    sha256: str = ""
    notes: tuple[str, ...] = ()

    def __post_init__(self) -> None:
        form = self.contract.format
        _check(self.pixels.ndim == (3 if form.interleaved else 2), "a frame is one picture")
        _check(self.pixels.shape == form.stored(self.shape), "a frame holds whole pixels")
        _check(
            self.pixels.dtype == np.dtype(self.contract.format.dtype),
            f"{self.contract.pixels} pixels must be {self.contract.format.dtype}",
        )
        if self.invalid is not None:
            _check(self.invalid.shape == self.shape, "mask and pixels differ in shape")

    @property
    def shape(self) -> tuple[int, int]:
        """Height and width, pixels."""
        return self.contract.format.size_of(self.pixels)


@dataclass(frozen=True)
class Quarantined:
    """A file that could not serve, and why. ``sha256`` is empty when it could not be read."""

    path: str
    reason: str
    sha256: str = ""


# ---------------------------------------------------------------- the camera

TableKind = Literal["identity", "linear", "log", "stabilised"]


@dataclass(frozen=True, eq=False)
class InputTable:
    """Pixel code to working value: the first step of everything that is learned or run.

    For integer pixels ``values`` holds one working value for each code. For
    float32 pixels a formula stands in its place: ``identity``, or
    ``stabilised`` as ``scale * sqrt(max(slope * p + offset, 0))``.

    Parameters
    ----------
    kind : identity, linear, log or stabilised
    contract : InputContract
    values : float32 ndarray (2 ** bits,), or None for float32 pixels
    noise_sd : standard deviation of the camera's noise in working values (1 when stabilised);
        None when it was not measurable
    slope, offset, scale : the root formula for float32 pixels
    valid_codes : first and last code that is trusted (beyond: clipped)
    """

    kind: TableKind
    contract: InputContract
    values: F32 | None
    noise_sd: float | None
    slope: float = 1.0
    offset: float = 0.0
    scale: float = 1.0
    valid_codes: tuple[float, float] = (-np.inf, np.inf)

    def __post_init__(self) -> None:
        if self.contract.format.integer:
            _check(
                self.values is not None and self.values.shape == (1 << self.contract.format.bits,),
                "an integer table has one value for each code",
            )
        else:
            _check(self.values is None, "float32 pixels take a formula, not a table")
            _check(self.kind in ("identity", "stabilised"), f"no {self.kind} formula for float32")

    def apply(self, pixels: NDArray[Any]) -> F32:
        """Working values of pixel codes, float32, any shape.

        Raises
        ------
        InputError : the dtype is not the contract's, or a code is beyond its depth.
        """
        form = self.contract.format
        if pixels.dtype != np.dtype(form.dtype):
            raise InputError(
                f"this bank takes {form.name} pixels ({form.dtype}), not {pixels.dtype}",
                remedy="convert the picture, or learn a bank for this camera's format",
            )
        if self.values is not None:
            if form.bits < 8 * pixels.itemsize and pixels.size and int(pixels.max()) >> form.bits:
                raise InputError(
                    f"a pixel code {int(pixels.max())} is beyond {form.name}",
                    remedy=f"codes must stay below {1 << form.bits}",
                )
            return np.asarray(self.values[pixels])
        if self.kind == "identity":
            return np.asarray(pixels, dtype=np.float32)
        root = np.maximum(np.float32(self.slope) * pixels + np.float32(self.offset), np.float32(0))
        return np.asarray(np.float32(self.scale) * np.sqrt(root), dtype=np.float32)

    @property
    def span(self) -> float:
        """Largest absolute working value an input can give (1 for a float identity)."""
        if self.values is not None:
            return float(np.abs(self.values).max())
        top = max(abs(self.contract.black), abs(self.contract.white))
        return float(np.abs(self.apply(np.array([top], dtype=np.float32))[0]))


@dataclass(frozen=True, eq=False)
class NoiseModel:
    """Variance of the noise against level: ``var = gain * (code - black) + read_noise ** 2``.

    Parameters
    ----------
    measurable : False when the folder cannot tell; the numbers are None, ``reason`` says why
    gain : DN per electron; None for a bent law that only ``levels`` and ``sd`` describe
    gain_error : its standard error
    read_noise : DN, quantisation taken out; None beside a gain where the frames cannot tell it
        (``reason`` says why): then ``sd[0]`` is the law's value at the black level
    levels, sd : sampled curve, codes and DN
    autocovariance : (2m+1, 2m+1) of the noise, centre 1; None means white
    kept_fraction : share of the pixels that were flat enough to tell
    source : "photos", "static", "dark" or "simulated"
    points : (n, 2) measured codes and standard deviations that the law was fitted to
    """

    measurable: bool
    reason: str = ""
    gain: float | None = None
    gain_error: float | None = None
    read_noise: float | None = None
    read_noise_error: float | None = None
    levels: F64 = field(default_factory=lambda: np.empty(0))
    sd: F64 = field(default_factory=lambda: np.empty(0))
    autocovariance: F64 | None = None
    kept_fraction: float = 0.0
    source: str = "photos"
    points: F64 = field(default_factory=lambda: np.empty((0, 2)))


@dataclass(frozen=True)
class Mark:
    """A trace that the camera or its file format leaves in pictures."""

    name: str
    found: bool | None
    value: float
    threshold: float
    effect: str
    remedy: str


@dataclass(frozen=True, eq=False)
class SlantedEdge:
    """Modulation transfer across one edge.

    Parameters
    ----------
    angle_deg : of the edge from the nearest axis
    frequency_cpp, mtf : ndarray, cycles per pixel up to 1 and transfer, 1 at 0
    mtf50_cpp : first frequency where the transfer is one half
    sigma_px : of the Gaussian line spread with this MTF50 (pixel aperture included)
    distance_px, spread : the edge spread function, distance from the edge and light
    """

    angle_deg: float
    frequency_cpp: F64
    mtf: F64
    mtf50_cpp: float
    sigma_px: float
    distance_px: F64
    spread: F64


@dataclass(frozen=True, eq=False)
class Survey:
    """What the camera itself does to pictures.

    ``blur_sigma_px`` and ``spectrum_exponent`` are None where the folder cannot tell.
    ``spectrum_frequency`` (cycles per pixel) and ``spectrum_power`` are the radial mean in
    linear light over the frame's mean; ``noise_power`` is the noise's share on that scale
    and ``noise_overtakes_cpp`` the frequency above which it is the larger part, or None.
    ``distrusted`` lists (path, reason) of frames better left out of learning.
    ``grid`` is the row and column where the blocks of compression begin, where that mark was found.
    ``slanted_edge`` is the chart's transfer when one was given, and then where the blur is from.
    ``notes`` say what static, dark or chart frames changed, or why they could not serve.
    Of colour frames one plane was surveyed (green), and ``sample_noise`` (samples,) holds the
    standard deviation of the noise in the working values of each sample; empty where unknown.
    """

    contract: InputContract
    noise: NoiseModel
    table: InputTable
    blur_sigma_px: float | None = None
    blur_note: str = ""
    spectrum_exponent: float | None = None
    spectrum_spread: float | None = None
    marks: tuple[Mark, ...] = ()
    frames: int = 0
    spectrum_frequency: F64 = field(default_factory=lambda: np.empty(0))
    spectrum_power: F64 = field(default_factory=lambda: np.empty(0))
    spectrum_anisotropy: float | None = None
    noise_power: float | None = None
    noise_overtakes_cpp: float | None = None
    distrusted: tuple[tuple[str, str], ...] = ()
    edge_widths_px: F64 = field(default_factory=lambda: np.empty(0))
    slanted_edge: SlantedEdge | None = None
    notes: tuple[str, ...] = ()
    sample_noise: F64 = field(default_factory=lambda: np.empty(0))
    grid: tuple[int, int] | None = None


# ---------------------------------------------------------------- learning


@dataclass(frozen=True, eq=False)
class PatchSet:
    """Patches drawn from frames, DC removed exactly and contrast-normalised.

    The working values of patch i are ``patches[i] * contrast[i] + dc[i]``.

    Parameters
    ----------
    patches : float32 ndarray (n, size * size), row-major pixels; of colour pixels
        (n, size * size * samples), see :func:`patchlab.conventions.tile_shape`
    size : patch side, pixels
    frame : int32 ndarray (n,), index into ``frames``
    origin : int32 ndarray (n, 2), top-left (row, column)
    dc : float32 ndarray (n,), mean; of colour pixels (n, samples), the mean of each plane
    contrast : float32 ndarray (n,), what the patch was divided by
    frames : relative paths
    rejected : count by reason
    """

    patches: F32
    size: int
    frame: NDArray[np.int32]
    origin: NDArray[np.int32]
    dc: F32
    contrast: F32
    frames: tuple[str, ...]
    rejected: Mapping[str, int]

    def __post_init__(self) -> None:
        n = self.patches.shape[0]
        planes = 1 if self.dc.ndim == 1 else self.dc.shape[1]
        wide = planes * self.size**2
        _check(self.patches.shape == (n, wide), "patches must be (n, size * size * samples)")
        _check(self.origin.shape == (n, 2) and self.frame.shape == (n,), "one origin a patch")
        _check(len(self.dc) == n and self.contrast.shape == (n,), "one mean a patch")

    @property
    def planes(self) -> int:
        """Samples of a pixel: 1, or more for colour."""
        return int(self.patches.shape[1]) // self.size**2

    def __len__(self) -> int:
        return int(self.patches.shape[0])


@dataclass(frozen=True, eq=False)
class Whitening:
    """``z = K x`` has unit covariance and ``D z`` rebuilds x: K D = I, K C K' = I.

    Parameters
    ----------
    K : ndarray (rank, d), whitening
    D : ndarray (d, rank), dewhitening
    mean : ndarray (d,)
    spectrum : ndarray (d,), all eigenvalues of the covariance, falling
    form : "pca" (K is (rank, d), K D = I) or "zca" (K is (d, d) and symmetric, K D projects
        on the kept directions)
    removed : what was cut and why, one line each
    samples : patches the moments were summed over
    planes : samples of a pixel; the mean of each plane of a patch was projected out
    """

    K: F64
    D: F64
    mean: F64
    spectrum: F64
    rank: int
    form: Literal["pca", "zca"]
    removed: tuple[str, ...]
    samples: int
    planes: int = 1


@dataclass(frozen=True, eq=False)
class ComponentChoice:
    """How the number of components was chosen from the data.

    Parameters
    ----------
    counts : int64 ndarray (m,), numbers that were tried, rising
    gain : ndarray (m,), held-out likelihood above that of normal values, nats per pixel
    error : ndarray (m,), standard error of each gap to the best
    found_again : ndarray (m,), median |cos| of components learned anew on halves
    chosen : the number
    reason : a sentence
    """

    counts: NDArray[np.int64]
    gain: F64
    error: F64
    found_again: F64
    chosen: int
    reason: str


@dataclass(frozen=True, eq=False)
class Dictionary:
    """Learned components in canonical order, sign and scale.

    Filters are dotted with a patch; atoms are summed to rebuild it. Coefficients
    have unit variance. Components are sorted by falling contribution, and the
    sign makes each atom's largest absolute pixel positive.

    Parameters
    ----------
    method : "ica", "sparse" or "pca"
    filters, atoms : ndarray (k, size, size), of colour patches (k, size, size, samples)
    contribution : ndarray (k,), share of the patches' variance that each component carries
    kurtosis : ndarray (k,), of the coefficients (3 for a Gaussian)
    identified : bool ndarray (k,), False where the data cannot tell a component from its neighbours
    converged, iterations, tolerance, curve : how the learner ended; ``curve`` falls with iterations
    log_likelihood : held-out nats per patch, or None
    whitening : Whitening it was learned through
    pooled_atoms : ndarray (m, *one atom's), unit norm, atoms of every restart (this one's first)
    warnings : sentences for people
    over_restarts, over_resamples : ndarray (k,), mean |cos| with the partner that a component
        has in the other restarts, and in itself learned anew on halves of the patches; empty
        or NaN where that was not measured
    choice : how the number of components was chosen, where it was left to the data
    held_out_curve : ndarray (m, 2), step of the last stage and log-likelihood of held-out
        patches there, nats per patch; empty where that was not watched
    stopped_at : the step that learning went back to, since beyond it held-out patches became
        less likely; None where it was not stopped
    """

    method: Literal["ica", "sparse", "pca"]
    filters: F64
    atoms: F64
    contribution: F64
    kurtosis: F64
    identified: NDArray[np.bool_]
    converged: bool
    iterations: int
    tolerance: float
    curve: F64
    log_likelihood: float | None
    whitening: Whitening
    pooled_atoms: F64
    warnings: tuple[str, ...] = ()
    over_restarts: F64 = field(default_factory=lambda: np.empty(0))
    over_resamples: F64 = field(default_factory=lambda: np.empty(0))
    choice: ComponentChoice | None = None
    held_out_curve: F64 = field(default_factory=lambda: np.empty((0, 2)))
    stopped_at: int | None = None

    def __post_init__(self) -> None:
        k = self.atoms.shape[0]
        _check(self.atoms.ndim in (3, 4) and self.filters.shape == self.atoms.shape, "tiles")
        for name in ("contribution", "kurtosis", "identified"):
            _check(getattr(self, name).shape == (k,), f"{name} needs one entry a component")

    def __len__(self) -> int:
        return int(self.atoms.shape[0])

    @property
    def size(self) -> int:
        """Patch side, pixels."""
        return int(self.atoms.shape[1])

    @property
    def planes(self) -> int:
        """Samples of a pixel: 1, or more for colour."""
        return int(self.atoms.shape[3]) if self.atoms.ndim == 4 else 1


@dataclass(frozen=True, eq=False)
class Parts:
    """Components of aligned pictures of one kind of object.

    Picture i is ``mean + light[i] + sum over j of codes[i, j] * images[j]``, on the directions
    that were kept.

    Parameters
    ----------
    method : "ica" or "pca"
    samples : which side of the matrix was sampled, "pixels" or "pictures"
    images : ndarray (k, h, w), unit energy
    codes : ndarray (n, k)
    mean : ndarray (h, w), the mean picture
    light : ndarray (n,), each picture's own mean less that of all
    contribution : ndarray (k,), energy of each component over the variance of the pictures
    kurtosis : ndarray (k,), over the samples (3 for a normal law)
    locality : ndarray (k,), 1 for a single pixel, 0 for energy spread evenly
    spectrum : ndarray (m,), variance of the pictures along principal components, falling
    converged, iterations : how the learner ended
    warnings : sentences for people
    """

    method: Literal["ica", "pca"]
    samples: Literal["pixels", "pictures"]
    images: F64
    codes: F64
    mean: F64
    light: F64
    contribution: F64
    kurtosis: F64
    locality: F64
    spectrum: F64
    converged: bool
    iterations: int
    warnings: tuple[str, ...] = ()

    def __post_init__(self) -> None:
        k = self.images.shape[0]
        _check(self.images.ndim == 3 and self.codes.shape[1] == k, "(k, h, w) and (n, k)")

    def __len__(self) -> int:
        return int(self.images.shape[0])


FamilyName = Literal["gabor", "gd1", "gd2", "centre_surround"]


@dataclass(frozen=True)
class KernelFit:
    """A parametric kernel fitted to one atom or filter.

    ``parameters`` and ``errors`` (one standard error) share their keys, which carry
    their units: amplitude, x_px, y_px (from the patch's middle), theta_rad,
    sigma_u_px (along the wave vector, across the edge), sigma_v_px (along the edge),
    frequency_cpp, phase_rad. A family leaves out what it does not have.

    ``octaves`` and ``orientation_rad`` are half-amplitude bandwidths measured on the
    spectrum; ``octaves`` is None where the low-pass side is open.

    Of a colour component ``parameters`` describe its spatial profile, ``direction`` is the unit
    vector over a pixel's samples that goes with it, ``colour_share`` the share of the component's
    energy that this product of a direction and a profile holds, and ``r2`` is that of the whole
    component.
    """

    index: int
    family: FamilyName
    parameters: Mapping[str, float]
    errors: Mapping[str, float]
    r2: float
    bic: float
    verdict: Literal["good", "poor", "failed"]
    octaves: float | None
    orientation_rad: float | None
    direction: tuple[float, ...] | None = None
    colour_share: float | None = None


@dataclass(frozen=True)
class KernelFits:
    """Fits of all components, in the dictionary's order; ``of`` says atoms or filters.

    ``colours`` has a letter for each sample of a pixel, "" for one plane.
    """

    of: Literal["atoms", "filters"]
    size: int
    fits: tuple[KernelFit, ...]
    effective_samples: float
    colours: str = ""

    def __len__(self) -> int:
        return len(self.fits)

    @property
    def median_r2(self) -> float:
        """Median R2 over the components."""
        return float(np.median([f.r2 for f in self.fits])) if self.fits else float("nan")

    def count(self, verdict: str) -> int:
        """How many fits have this verdict."""
        return sum(f.verdict == verdict for f in self.fits)


# ---------------------------------------------------------------- the bank


@dataclass(frozen=True)
class Kernel:
    """One kernel of a bank; its taps stand at the same index of ``Bank.taps``.

    Parameters
    ----------
    name : a C identifier, unique in the bank
    family : gd1, gd2, gabor, learned or given
    parity : "odd" (step), "even" (line) or "none"
    scale : index of its size in the bank, 0 the finest; None outside any scale
    orientation : index on the scale's lattice; None when it has none
    parameters : as KernelFit's, without amplitude
    gain : response to its unit test signal (a unit step for odd, a unit impulse for others)
    """

    name: str
    family: str
    parity: Literal["odd", "even", "none"]
    scale: int | None
    orientation: int | None
    parameters: Mapping[str, float]
    gain: float
    r2: float | None = None


@dataclass(frozen=True, eq=False)
class Thresholds:
    """Strength thresholds against promised false edge elements per megapixel.

    Calibrated on the whole chain on pure noise. ``strength[i]`` belongs to ``rate[i]``;
    ``groups[i]`` is how many connected groups per megapixel those elements come in.
    """

    rate: F64
    strength: F64
    rice: F64
    hysteresis: float
    megapixels: float
    noise: str
    groups: F64 = field(default_factory=lambda: np.empty(0))


@dataclass(frozen=True, eq=False)
class Coverage:
    """Share of the learned atoms, equally weighted, that a bank reproduces.

    ``rotated`` is the best bank of the same structure on a rotated basis,
    ``untrained`` a default bank on the learned atoms; ``budget`` and ``curve``
    are kernels against coverage.
    """

    learned: float
    rotated: float
    untrained: float
    budget: NDArray[np.int64] = field(default_factory=lambda: np.empty(0, np.int64))
    curve: F64 = field(default_factory=lambda: np.empty(0))


@dataclass(frozen=True, eq=False)
class Bank:
    """A convolution bank: what goes into production.

    Parameters
    ----------
    name : C identifier, prefix of every exported symbol
    kernels : tuple of Kernel
    taps : float32 ndarray (n, h, h), h odd, anchored at the centre; used by every target. Of
        colour pixels (n, h, h, planes), over the working planes: a response is the sum over them
    table : InputTable, the first step; holds the input contract
    border : one of the five names
    strength : "step", "line" or "energy", what NAME_edges computes
    purpose : "edges", "features", "learned" or "taps"
    thresholds, coverage : None when not known
    line_thresholds : for lines, where the bank has even kernels beside its odd ones
    octaves : how many of its last scales are octaves, for soft and large edges
    noise_autocovariance : of the working values, centre 1; None means white
    provenance : plain data for the manifest (settings, seed, inputs, parents)
    mix : float32 ndarray (planes, samples), the working planes as weighted sums of a pixel's
        tabled samples; None: the working planes are the samples
    """

    name: str
    kernels: tuple[Kernel, ...]
    taps: F32
    table: InputTable
    border: str = DEFAULT_BORDER
    strength: Literal["step", "line", "energy"] = "step"
    purpose: str = "edges"
    thresholds: Thresholds | None = None
    coverage: Coverage | None = None
    noise_autocovariance: F64 | None = None
    provenance: Mapping[str, Any] = field(default_factory=dict)
    warnings: tuple[str, ...] = ()
    line_thresholds: Thresholds | None = None
    mix: F32 | None = None
    octaves: int = 0

    def __post_init__(self) -> None:
        n, h, w = self.taps.shape[:3]
        samples = self.contract.format.planes
        _check(self.taps.ndim == 3 + (samples > 1), "colour kernels have a tap for each plane")
        if self.mix is not None:
            _check(self.mix.dtype == np.float32 and samples > 1, "a mix is float32, of colours")
            _check(bool(np.isfinite(self.mix).all()), "a mix is finite")
            _check(self.mix.shape == (self.planes, samples), "a mix is (planes, samples)")
        else:
            _check(self.planes == samples, "one tap for each sample")
        _check(n == len(self.kernels) and n > 0, "one kernel for each plane of taps")
        _check(h == w and h % 2 == 1, "kernels are square and odd")
        _check(self.taps.dtype == np.float32, "taps are float32")
        _check(len({k.name for k in self.kernels}) == n, "kernel names must differ")
        if not bool(np.isfinite(self.taps).all()):
            raise UsageError("a kernel has a tap that is not a finite number")

    def __len__(self) -> int:
        return len(self.kernels)

    @property
    def contract(self) -> InputContract:
        """The pixels this bank takes."""
        return self.table.contract

    @property
    def size(self) -> int:
        """Kernel side, pixels."""
        return int(self.taps.shape[1])

    @property
    def planes(self) -> int:
        """Working planes: 1, or more for colour."""
        return int(self.taps.shape[3]) if self.taps.ndim == 4 else 1

    @property
    def plane_reach(self) -> F64:
        """Largest value of every working plane where all tabled samples stay within 1."""
        if self.mix is None:
            return np.ones(self.planes)
        return np.asarray(np.abs(self.mix.astype(np.float64)).sum(axis=1))

    @property
    def reach(self) -> F64:
        """Largest response of every kernel where all tabled samples stay within 1, (n,)."""
        sums = np.abs(self.taps.astype(np.float64)).sum(axis=(1, 2))
        return np.asarray(sums if self.planes == 1 else sums @ self.plane_reach)

    @property
    def radius(self) -> int:
        """Pixels a kernel reaches from its centre."""
        return self.size // 2

    @property
    def scales(self) -> tuple[int, ...]:
        """Indices of the scales, finest first (empty for a bank without scales)."""
        return tuple(sorted({k.scale for k in self.kernels if k.scale is not None}))

    def members(self, scale: int, parity: str) -> tuple[int, ...]:
        """Kernel indices of one scale and parity, in order of orientation."""
        found = [
            (k.orientation or 0, i)
            for i, k in enumerate(self.kernels)
            if k.scale == scale and k.parity == parity
        ]
        return tuple(i for _, i in sorted(found))


@dataclass(frozen=True)
class Plan:
    """How a bank's responses are computed, with counted work and a proven error bound.

    Parameters
    ----------
    kind : its means in a few words, "parity" or "direct and tile FFT" for example
    groups : for people, one line a group of kernels that share work
    multiplies, adds, loads : per pixel, whole bank
    error_bound : for each kernel, the largest |float32 response - exact response of the taps|
        over every input the contract allows
    detail : plain data the generator needs
    """

    kind: str
    groups: tuple[str, ...]
    multiplies: float
    adds: float
    error_bound: tuple[float, ...]
    detail: Mapping[str, Any] = field(default_factory=dict)
    loads: float = 0.0


Bundle = Mapping[str, bytes]
"""Files of an export, relative path to bytes: written by one writer, all or none."""


# ---------------------------------------------------------------- edges


@dataclass(frozen=True, eq=False)
class EdgeMap:
    """Edges of one picture.

    Parameters
    ----------
    strength : float32 (h, w), in noise units when the bank's noise is known
    orientation : uint8 (h, w), index of the winning direction
    scale : uint8 (h, w), index of the scale that found the element (meaningful on ``edges``)
    edges : bool (h, w), thinned elements at or above the threshold (with hysteresis)
    threshold : the strength threshold used
    """

    strength: F32
    orientation: NDArray[np.uint8]
    scale: NDArray[np.uint8]
    edges: NDArray[np.bool_]
    threshold: float


EDGEL = np.dtype(
    [
        ("x", "f4"), ("y", "f4"),  # sub-pixel position, pixels
        ("theta", "f4"),  # normal direction towards the brighter side, radians, [-pi, pi)
        ("strength", "f4"),  # noise units
        ("sd", "f4"),  # standard error of the position along the normal, pixels
        ("scale", "u1"),
        ("kind", "u1"),  # 0 step, 1 bright line, 2 dark line
        ("width", "f4"),  # of a line, pixels, blur taken out; 0 for a step
    ]
)  # fmt: skip
"""One edge element. Arrays of edgels are plain structured numpy arrays."""
