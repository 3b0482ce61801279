"""Everything about a camera that its photographs tell, in two passes over the frames."""

from __future__ import annotations

from collections.abc import Callable, Iterable, Sequence
from dataclasses import replace

import numpy as np

from patchlab.camera.blur import BlurMeter
from patchlab.camera.chart import slanted_edge
from patchlab.camera.marks import MarkMeter
from patchlab.camera.mixed import joined, one_camera
from patchlab.camera.noise import NoiseMeter
from patchlab.camera.pixels import limited
from patchlab.camera.spectrum import Spectrum, SpectrumMeter
from patchlab.camera.static import measure_noise_dark, measure_noise_static
from patchlab.camera.table import default_kind, make_table, read_of, sd_of
from patchlab.progress import Progress, silent
from patchlab.types import Frame, InputContract, NoiseModel, SlantedEdge, Survey, TableKind


def survey(
    frames_factory: Callable[[], Iterable[Frame]],
    contract: InputContract,
    *,
    kind: TableKind | None = None,
    static: Iterable[Sequence[Frame]] | None = None,
    dark: Iterable[Frame] | None = None,
    edge: Frame | None = None,
    mixed: bool = False,
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
    mixed : allow frames of several cameras, told by their sizes and noise
    edge : a crop with one slanted edge, which tells the blur best
    progress : told after every frame

    Returns
    -------
    Survey

    Raises
    ------
    InputError : no frame, mixed contracts, several cameras, static or dark frames that do not
        belong together, no slanted edge, or ``kind="stabilised"`` without a noise law.
    """
    chart = None if edge is None else slanted_edge(edge)
    meters: list[tuple[tuple[int, ...], str, NoiseMeter]] = []
    spectrum_meter = SpectrumMeter()
    total, largest = 0, 0
    for frame in limited(frames_factory(), contract):
        meters.append((tuple(sorted(frame.pixels.shape)), frame.path, NoiseMeter()))
        meters[-1][2].add(frame)
        spectrum_meter.add(frame)
        if contract.format.integer:
            largest = max(largest, int(frame.pixels.max(initial=0)))
        total += 1
        progress("survey", total, 0, "noise and spectrum")
    from_photos = joined(meters).result()
    if not mixed:
        one_camera(meters, from_photos)
    noise, notes = better_noise(from_photos, contract, static, dark)
    spectrum = spectrum_meter.result()

    blur_meter, mark_meter = BlurMeter(noise), MarkMeter(noise)
    for done, frame in enumerate(limited(frames_factory(), contract), 1):
        blur_meter.add(frame)
        mark_meter.add(frame)
        progress("survey", total + done, 2 * total, "blur and marks")
    sigma, note = _blur(blur_meter, chart)
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
        grid=marks.grid,
        edge_widths_px=blur_meter.all_widths,
        slanted_edge=chart,
        notes=(*notes, *_depth_note(contract, largest)),
    )
    return found if spectrum is None else _with_spectrum(found, spectrum)


def _depth_note(contract: InputContract, largest: int) -> tuple[str, ...]:
    """A request for the white level where 16-bit codes stay below 10 or 12 bits.

    It changes nothing: dark photographs of a true 16-bit camera look the same.
    """
    if contract.pixels != "Mono16" or contract.white < 65535 or not largest:
        return ()
    bits = next((b for b in (10, 12) if largest < 1 << b), None)
    if bits is None:
        return ()
    return (
        f"the largest code of all frames is {largest} while the white level is taken to be "
        f"{contract.white:g}: if the camera has {bits} bits, give --white {(1 << bits) - 1}",
    )


def _blur(meter: BlurMeter, chart: SlantedEdge | None) -> tuple[float | None, str]:
    """Blur from the chart where there is one, else from the photographs."""
    sigma, note = meter.result()
    if chart is None:
        return sigma, note
    told = f"from the photographs {sigma:.2f} px" if sigma is not None else note
    if not np.isfinite(chart.sigma_px):
        return sigma, f"{note}; the slanted edge's transfer stays above one half"
    return chart.sigma_px, (
        f"of the Gaussian line spread with the slanted edge's MTF50 of {chart.mtf50_cpp:.3f} "
        f"cycles per pixel; {told}"
    )


def better_noise(
    photos: NoiseModel,
    contract: InputContract,
    static: Iterable[Sequence[Frame]] | None,
    dark: Iterable[Frame] | None,
) -> tuple[NoiseModel, tuple[str, ...]]:
    """The best law at hand, and what the further frames changed.

    Static scenes go before photographs; the read noise of a straight law comes from dark
    frames. Frames that cannot tell change nothing, and a note says why.

    Raises
    ------
    InputError : frames that do not belong together.
    """
    noise, notes = photos, []
    if static is not None:
        from_static = measure_noise_static(static)
        if from_static.measurable:
            noise = from_static
            notes.append("the noise law comes from the static scenes")
        else:
            notes.append(f"static scenes: {from_static.reason}")
    if dark is not None:
        noise, note = _with_dark(noise, measure_noise_dark(dark), contract)
        notes.append(note)
    return noise, tuple(notes)


def _with_dark(
    noise: NoiseModel, at_rest: NoiseModel, contract: InputContract
) -> tuple[NoiseModel, str]:
    """Put the dark frames' read noise into a straight law."""
    if at_rest.read_noise is None:
        return noise, f"read noise from dark frames: {at_rest.reason}"
    told = f"read noise {at_rest.read_noise:.3g} DN at a mean dark level of {at_rest.levels[0]:.4g}"
    before = read_of(noise, contract)
    if noise.gain is None or before is None:
        return noise, f"the dark frames' {told} is not used: there is no straight law to put it in"
    change = at_rest.read_noise**2 - before**2
    better = replace(
        noise,
        reason="",
        read_noise=at_rest.read_noise,
        read_noise_error=at_rest.read_noise_error,
        sd=np.sqrt(np.maximum(noise.sd**2 + change, 1e-12)),
    )
    return better, f"the read noise comes from the dark frames: {told}"


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
