"""Everything a person can set for a run, each once: name, default, range, meaning.

The command line's options, the TOML file's keys and the manifest's settings are
all made from this one list.
"""

from __future__ import annotations

import dataclasses
import json
import tomllib
from collections.abc import Mapping
from dataclasses import dataclass, field
from typing import Any

from patchlab.conventions import BORDERS, COLOUR_FORMATS, DEFAULT_BORDER, PIXEL_FORMATS
from patchlab.errors import UsageError


def _setting(
    default: Any,
    group: str,
    help: str,
    *,
    low: float | None = None,
    high: float | None = None,
    choices: tuple[str, ...] = (),
    words: tuple[str, ...] = (),
) -> Any:
    about = {"group": group, "help": help, "low": low, "high": high, "choices": choices}
    about["words"] = words  # what may stand in place of a number
    return field(default=default, metadata=about)


@dataclass(frozen=True)
class Settings:
    """The settings of a run; wrong values are refused before any picture is opened.

    Raises
    ------
    UsageError : a value outside its range or choices.
    """

    # reading
    white: float | None = _setting(None, "photos", "Code of full scale, when the file cannot say.")
    black: float | None = _setting(None, "photos", "Code of no light.")
    transfer: str = _setting(
        "auto", "photos", "How codes follow light.", choices=("auto", "linear", "srgb")
    )
    pixels: str | None = _setting(
        None,
        "photos",
        "Pixel format by its PFNC name.",
        choices=(*PIXEL_FORMATS, *COLOUR_FORMATS),
    )
    raw_format: str | None = _setting(
        None, "photos", "PFNC name of the pixels in .raw files, where no sidecar tells it."
    )
    raw_width: int | None = _setting(None, "photos", "Width of .raw files, pixels.", low=1)
    raw_height: int | None = _setting(None, "photos", "Height of .raw files, pixels.", low=1)
    bayer: str = _setting(
        "green",
        "photos",
        "What is taken of a Bayer sensor: its green lattice, luminance, or the mosaic.",
        choices=("green", "luminance", "mosaic"),
    )
    planes: str = _setting(
        "luminance",
        "photos",
        "What is learned on: luminance, or the colours of the pixels together.",
        choices=("luminance", "colour"),
    )
    mixed_depths: bool = _setting(False, "photos", "Allow frames of several depths in one folder.")
    max_bad: float = _setting(
        0.1, "photos", "Share of files that may be unusable.", low=0.0, high=1.0
    )
    pixel_limit: int = _setting(
        200_000_000, "photos", "Largest picture that is decoded, pixels.", low=1
    )
    # the camera
    table: str = _setting(
        "auto",
        "survey",
        "Input table; auto stabilises the noise when it can be measured, else linear.",
        choices=("auto", "identity", "linear", "log", "stabilised"),
    )
    mixed_cameras: bool = _setting(
        False, "survey", "Allow frames of several cameras, told by their sizes and noise."
    )
    # further frames of the camera
    static: str | None = _setting(
        None, "measure", "Folder with one folder for each static scene, two frames or more in each."
    )
    dark: str | None = _setting(
        None, "measure", "Folder of frames taken in darkness at the photographs' exposure."
    )
    slanted_edge: str | None = _setting(
        None, "measure", "Picture of one edge that leans 2 to 10 degrees, for the sharpness."
    )
    # sampling
    patch_size: int = _setting(12, "patches", "Patch side, pixels.", low=8, high=32)
    patches: int = _setting(60_000, "patches", "Patches in all.", low=500, high=10_000_000)
    per_frame: int | None = _setting(None, "patches", "At most so many patches a frame.", low=1)
    flat_fraction: float = _setting(
        0.3, "patches", "Share of the flattest patches dropped.", low=0.0, high=0.95
    )
    normalise: bool = _setting(True, "patches", "Divide each patch by its contrast.")
    all_frames: bool = _setting(
        False,
        "patches",
        "Draw from every frame, also from near duplicates, blurred and clipped ones.",
    )
    grid_patches: bool = _setting(
        False,
        "patches",
        "Draw patches also where the steps of block compression are stronger than the scene.",
    )
    # learning
    method: str = _setting(
        "ica", "learn", "Learner: independent components or sparse code.", choices=("ica", "sparse")
    )
    components: int | str | None = _setting(
        None,
        "learn",
        "Components, or auto to choose from the data; by default all that whitening keeps.",
        low=2,
        words=("auto",),
    )
    retain: float = _setting(
        0.98, "learn", "Share of the variance that whitening keeps.", low=0.5, high=1.0
    )
    penalty: float | None = _setting(
        None,
        "learn",
        "Penalty of the sparse code, in whitened units; by default from the noise, else 1.2.",
        low=0.01,
        high=100.0,
    )
    orthogonal: bool = _setting(True, "learn", "Keep components uncorrelated while learning.")
    restarts: int = _setting(
        3, "learn", "Independent starts whose atoms are pooled.", low=1, high=50
    )
    resamples: int = _setting(
        2, "learn", "Halves of the patches that tell how sure components are.", low=0, high=32
    )
    max_iterations: int = _setting(400, "learn", "Iterations of one start.", low=1)
    # the bank
    kernels: int = _setting(16, "bank", "Kernels in the bank.", low=4, high=64)
    purpose: str = _setting("edges", "bank", "What the bank is for.", choices=("edges", "features"))
    lines: bool = _setting(False, "bank", "Add even (line) partners to an edge bank.")
    octaves: int = _setting(
        0,
        "bank",
        "Octaves to add to an edge bank for soft and large edges, on top of its kernels; each "
        "takes about four times the work of the one before.",
        low=0,
        high=3,
    )
    keep_marked: bool = _setting(
        False, "bank", "Let components that describe a mark of the camera into the bank."
    )
    as_learned: bool = _setting(False, "bank", "Export the learned filters themselves.")
    false_edges: float = _setting(
        10.0, "bank", "False edge elements per megapixel of flat area.", low=0.1, high=1000.0
    )
    border: str = _setting(
        DEFAULT_BORDER, "bank", "What lies beyond the picture's rim.", choices=tuple(BORDERS)
    )
    library: bool = _setting(True, "bank", "Build the shared library of this machine.")
    plan: str = _setting(
        "auto",
        "bank",
        "How responses are computed; auto takes the cheapest.",
        choices=("auto", "direct", "parity", "separable", "halved", "fft"),
    )
    tolerance: float = _setting(
        0.0,
        "bank",
        "Error of a response, in working values, that a plan may spend on speed.",
        low=0.0,
        high=1e6,
    )
    costs: str | None = _setting(
        None, "bank", "Prices that choose the plan, a file of patchlab bench --calibrate."
    )
    target: str = _setting(
        "host",
        "bank",
        "Machines to compile for, with commas: host, aarch64-linux, "
        "x86_64-linux, x86_64-windows, wasm32.",
    )
    name: str | None = _setting(None, "bank", "C prefix of the bank; by default the folder's name.")
    # all
    seed: int = _setting(0, "common", "Seed of every draw.", low=0, high=2**31 - 1)
    jobs: int = _setting(0, "common", "Worker processes; 0 takes every core.", low=0, high=1024)
    cluster: str | None = _setting(
        None,
        "cluster",
        "Share reading, sampling, moments and passes of learning with a dask cluster: local, or "
        "its scheduler's address.",
    )
    max_memory: float = _setting(4.0, "common", "Memory to stay below, GiB.", low=0.25)
    strict: bool = _setting(False, "common", "Exit 4 when the result is below what was asked for.")

    def __post_init__(self) -> None:
        for f in dataclasses.fields(self):
            _validate(f, getattr(self, f.name))
        if self.name is not None and not (self.name.isascii() and self.name.isidentifier()):
            raise UsageError(f"--name {self.name!r} is not a C identifier")
        if self.planes == "colour" and self.bayer != "green":
            raise UsageError(
                "--planes colour keeps all of a Bayer sensor's pixels",
                remedy="leave out --bayer",
            )
        if self.octaves and (self.as_learned or self.purpose != "edges"):
            other = "--as-learned" if self.as_learned else f"--purpose {self.purpose}"
            raise UsageError(f"--octaves is for banks of edges, and {other} makes none")
        if self.white is not None and self.white <= (self.black or 0):
            raise UsageError("--white must exceed --black")

    def plain(self, *groups: str) -> dict[str, Any]:
        """As plain data for a manifest; only some groups when they are named."""
        return {
            f.name: getattr(self, f.name)
            for f in dataclasses.fields(self)
            if not groups or f.metadata["group"] in groups
        }


def option_name(name: str) -> str:
    """A setting's spelling on the command line."""
    return "--" + name.replace("_", "-")


def _plain(value: float) -> str:
    """A limit as a person would type it: 10000000, not 1e+07."""
    return str(int(value)) if value == int(value) else f"{value:g}"


def _validate(f: dataclasses.Field[Any], value: Any) -> None:
    about, name = f.metadata, option_name(f.name)
    if value is None and f.default is None:
        return
    if about["words"] and value in about["words"]:
        return
    expected = str(f.type).replace(" | None", "").replace("int | str", "int")
    kinds: dict[str, tuple[type, ...]] = {"int": (int,), "float": (int, float), "str": (str,)}
    fits = kinds.get(expected, (bool,))
    if not isinstance(value, fits) or (isinstance(value, bool) and expected != "bool"):
        raise UsageError(f"{name} takes a value of type {expected}, not {value!r}")
    if about["choices"] and value not in about["choices"]:
        raise UsageError(f"{name} {value!r} is not one of {', '.join(about['choices'])}")
    low, high = about["low"], about["high"]
    if (low is not None and value < low) or (high is not None and value > high):
        span = f"at least {_plain(low)}" if high is None else f"{_plain(low)} to {_plain(high)}"
        raise UsageError(f"{name} {value} is out of range", remedy=f"it takes {span}")
    if isinstance(value, float) and value != value:
        raise UsageError(f"{name} is not a number")


def from_toml(text: str, where: str = "") -> dict[str, Any]:
    """Read settings from TOML: one key a setting, spelled as in :class:`Settings`.

    Raises
    ------
    UsageError : not TOML, or an unknown key (named, with the nearest known one).
    """
    import difflib

    try:
        found: Mapping[str, Any] = tomllib.loads(text)
    except tomllib.TOMLDecodeError as error:
        raise UsageError(f"not valid TOML: {error}", where=where) from None
    known = [f.name for f in dataclasses.fields(Settings)]
    for key in found:
        if key not in known:
            near = difflib.get_close_matches(key, known, n=1)
            raise UsageError(
                f"unknown key {key!r}",
                where=where,
                remedy=f"did you mean {near[0]!r}?" if near else "",
            )
    return dict(found)


def to_toml(settings: Settings) -> str:
    """Write settings as TOML that :func:`from_toml` reads; unset ones as comments."""
    lines, group = [], ""
    for f in dataclasses.fields(settings):
        if f.metadata["group"] != group:
            group = f.metadata["group"]
            lines += ["", f"# {group}"]
        value = getattr(settings, f.name)
        text = {True: "true", False: "false"}.get(value) if isinstance(value, bool) else None
        if text is None:
            text = json.dumps(value, ensure_ascii=False) if isinstance(value, str) else repr(value)
        lines.append(f"# {f.name} =" if value is None else f"{f.name} = {text}")
    return "\n".join(lines).strip() + "\n"
