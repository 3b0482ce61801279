"""The power spectrum of a folder: its radial mean and its power-law exponent.

Natural pictures have power near f^-2 (Field 1987, Journal of the Optical Society of
America A 4:2379-2394); single pictures scatter widely, so a folder is judged.
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass

import numpy as np

from patchlab.camera.pixels import limited
from patchlab.errors import InputError
from patchlab.types import F64, Frame

LOWEST_CYCLES = 4.0
HIGHEST_CPP = 0.35
SIDE = 1024
BINS = 64
LEAST = 12
"""Height and width below which 4 cycles a picture lie beyond the highest frequency fitted."""


@dataclass(frozen=True, eq=False)
class Spectrum:
    """Radial power spectrum of a folder in linear light.

    Parameters
    ----------
    exponent : a of power ~ f^-a, mean over frames
    spread : standard deviation over frames (0 for one frame)
    frequency : ndarray, cycles per pixel, bin centres up to 0.5
    power : ndarray, geometric mean over frames; a frame's mean light squared is 1
    anisotropy : log2 of the power along x over the power along y, mean over frames
    mean_light : mean light of the frames, 0 to 1
    """

    exponent: float
    spread: float
    frequency: F64
    power: F64
    anisotropy: float
    mean_light: float


def _plane(frame: Frame) -> tuple[F64, float]:
    """Contrast of a frame's middle (light over mean, minus 1) under a Hann window; the mean."""
    h, w = frame.pixels.shape
    height, width = min(h, SIDE), min(w, SIDE)
    y, x = (h - height) // 2, (w - width) // 2
    codes = np.nan_to_num(frame.pixels[y : y + height, x : x + width].astype(np.float64))
    light = frame.contract.light(codes)
    mean = float(light.mean())
    window = np.outer(np.hanning(height), np.hanning(width))
    flat = light / mean - 1 if mean > 0 else light * 0
    flat = flat - (flat * window).sum() / window.sum()
    return flat * window / np.sqrt((window**2).mean()), mean


def _radial(plane: F64) -> tuple[F64, F64, float, float]:
    """Frequency and power of every coefficient's ring; exponent; anisotropy."""
    h, w = plane.shape
    power = np.abs(np.fft.rfft2(plane)) ** 2 / plane.size
    fy, fx = np.fft.fftfreq(h)[:, None], np.fft.rfftfreq(w)[None, :]
    radius = np.hypot(fy, fx)
    lowest = LOWEST_CYCLES / min(h, w)
    # whole-cycle rings for the fit, as the resolution allows
    ring = np.rint(radius * min(h, w)).astype(np.int64)
    count = np.bincount(ring.ravel())
    mean = np.bincount(ring.ravel(), power.ravel()) / np.maximum(count, 1)
    at = np.arange(count.size) / min(h, w)
    use = (at >= lowest) & (at <= HIGHEST_CPP) & (count > 0) & (mean > 0)
    if use.sum() < 4:
        return at, mean, np.nan, 0.0
    # a straight line in log-log; rings are spaced evenly, so weigh by 1 / f
    slope = np.polyfit(np.log(at[use]), np.log(mean[use]), 1, w=np.sqrt(1 / at[use]))[0]
    band = (radius >= lowest) & (radius <= HIGHEST_CPP)
    along_x = power[band & (np.abs(fy) < fx)].sum()
    along_y = power[band & (np.abs(fy) > fx)].sum()
    lean = float(np.log2(along_x / along_y)) if along_x > 0 and along_y > 0 else 0.0
    return at, mean, float(-slope), lean


class SpectrumMeter:
    """Collects spectra, frame by frame."""

    def __init__(self) -> None:
        self.frequency = (np.arange(BINS) + 0.5) / (2 * BINS)
        self._exponents: list[float] = []
        self._lean: list[float] = []
        self._log_power: list[F64] = []
        self._light: list[float] = []

    def add(self, frame: Frame) -> None:
        """Look at one frame; a flat or tiny one is passed over."""
        if min(frame.pixels.shape) < LEAST:
            return
        plane, light = _plane(frame)
        at, mean, exponent, lean = _radial(plane)
        if not np.isfinite(exponent):
            return
        self._exponents.append(exponent)
        self._lean.append(lean)
        self._light.append(light)
        shown = (at > 0) & (mean > 0)
        self._log_power.append(np.interp(self.frequency, at[shown], np.log(mean[shown])))

    def result(self) -> Spectrum | None:
        """The folder's spectrum, or None when every frame was flat."""
        if not self._exponents:
            return None
        spread = float(np.std(self._exponents, ddof=1)) if len(self._exponents) > 1 else 0.0
        return Spectrum(
            float(np.mean(self._exponents)),
            spread,
            self.frequency,
            np.exp(np.mean(self._log_power, axis=0)),
            float(np.mean(self._lean)),
            float(np.mean(self._light)),
        )


def measure_spectrum(frames: Iterable[Frame]) -> Spectrum:
    """Power-law exponent and radial power spectrum of a folder.

    Parameters
    ----------
    frames : at most 64 are used, of each the middle 1024 x 1024 pixels

    Returns
    -------
    Spectrum : Hann window, radial mean, line from 4 cycles a picture to 0.35 cycles per
        pixel (0.7 of the Nyquist frequency), linear light.

    Raises
    ------
    InputError : no frame, or only flat ones.
    """
    meter = SpectrumMeter()
    for frame in limited(frames):
        meter.add(frame)
    found = meter.result()
    if found is None:
        raise InputError(
            "every frame is flat, so there is no spectrum", remedy="give photographs of scenes"
        )
    return found
