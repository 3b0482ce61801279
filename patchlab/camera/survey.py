"""Everything about a camera that its photographs tell, in two passes over the frames."""

from __future__ import annotations

from collections.abc import Callable, Iterable, Sequence
from dataclasses import replace

import numpy as np

from patchlab.camera.blur import BlurMeter
from patchlab.camera.marks import MarkMeter
from patchlab.camera.noise import NoiseMeter
from patchlab.camera.pixels import limited
from patchlab.camera.spectrum import Spectrum, SpectrumMeter
from patchlab.camera.static import measure_noise_dark, measure_noise_static
from patchlab.camera.table import default_kind, make_table, sd_of
from patchlab.progress import Progress, silent
from patchlab.types import Frame, InputContract, NoiseModel, Survey, TableKind


def survey(
    frames_factory: Callable[[], Iterable[Frame]],
    contract: InputContract,
    *,
    kind: TableKind | None = None,
    static: Iterable[Sequence[Frame]] | None = None,
    dark: Iterable[Frame] | None = None,
    progress: Progress = silent,
) -> Survey:
    """Measure noise, blur, spectrum and marks of a camera and make its input table.

    Parameters
    ----------
    frames_factory : gives the frames anew at each call (called twice); at most 64 are used,
        so a longer folder is best thinned evenly
    contract : what every frame must be
    kind : of the input table; None takes stabilised when the noise is measurable, else
        linear (identity for float32)
    static : static scenes, which tell the noise better than photographs do
    dark : dark frames, which tell the read noise best
    progress : told after every frame

    Returns
    -------
    Survey

    Raises
    ------
    InputError : no frame, mixed contracts, or ``kind="stabilised"`` without a noise law.
    """
    noise_meter, spectrum_meter = NoiseMeter(), SpectrumMeter()
    total = 0
    for frame in limited(frames_factory(), contract):
        noise_meter.add(frame)
        spectrum_meter.add(frame)
        total += 1
        progress("survey", total, 0, "noise and spectrum")
    noise = better_noise(noise_meter.result(), static, dark)
    spectrum = spectrum_meter.result()

    blur_meter, mark_meter = BlurMeter(noise), MarkMeter(noise)
    for done, frame in enumerate(limited(frames_factory(), contract), 1):
        blur_meter.add(frame)
        mark_meter.add(frame)
        progress("survey", total + done, 2 * total, "blur and marks")
    sigma, note = blur_meter.result()
    marks = mark_meter.result()
    found = Survey(
        contract,
        noise,
        make_table(kind or default_kind(noise, contract), contract, noise),
        sigma,
        note,
        marks=marks.marks,
        frames=total,
        distrusted=marks.distrusted,
        edge_widths_px=blur_meter.all_widths,
    )
    return found if spectrum is None else _with_spectrum(found, spectrum)


def better_noise(
    photos: NoiseModel,
    static: Iterable[Sequence[Frame]] | None,
    dark: Iterable[Frame] | None,
) -> NoiseModel:
    """The best law at hand: static scenes over photographs, read noise from dark frames."""
    noise = photos
    if static is not None:
        from_static = measure_noise_static(static)
        noise = from_static if from_static.measurable else photos
    if dark is None:
        return noise
    at_rest = measure_noise_dark(dark)
    if not at_rest.measurable or noise.gain is None:
        return noise
    assert at_rest.read_noise is not None
    assert noise.read_noise is not None
    change = at_rest.read_noise**2 - noise.read_noise**2
    return replace(
        noise,
        read_noise=at_rest.read_noise,
        read_noise_error=at_rest.read_noise_error,
        sd=np.sqrt(np.maximum(noise.sd**2 + change, 1e-12)),
    )


def _with_spectrum(found: Survey, spectrum: Spectrum) -> Survey:
    """Add the spectrum, and where noise overtakes it."""
    power = _noise_power(found.noise, found.contract, spectrum.mean_light)
    over = None
    if power is not None:
        below = np.flatnonzero(spectrum.power < 2 * power)  # the sum holds both
        over = float(spectrum.frequency[below[0]]) if below.size else None
    return replace(
        found,
        spectrum_exponent=spectrum.exponent,
        spectrum_spread=spectrum.spread,
        spectrum_frequency=spectrum.frequency,
        spectrum_power=spectrum.power,
        spectrum_anisotropy=spectrum.anisotropy,
        noise_power=power,
        noise_overtakes_cpp=over,
    )


def _noise_power(noise: NoiseModel, contract: InputContract, mean_light: float) -> float | None:
    """Power of white noise at the mean light, on the spectrum's scale."""
    if not noise.measurable or mean_light <= 0:
        return None
    codes = np.linspace(contract.black, contract.white, 513)
    light = contract.light(codes)
    sd = sd_of(noise, contract, codes) * np.gradient(light, codes)
    return float(np.interp(mean_light, light, sd) / mean_light) ** 2
