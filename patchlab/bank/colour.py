"""Banks for pixels with colours: a lattice on each opponent plane, or the learned filters.

The kernels of a colour edge bank are those of a monochrome one, on three working planes: grey,
blue-yellow and red-green (:func:`patchlab.bank.planes.opponent_mix`). A plane's sizes are scales
of their own, grey first, so edges of colour are added where grey shows none.
"""

from __future__ import annotations

from dataclasses import replace

import numpy as np

from patchlab.bank.given import bank_as_learned
from patchlab.bank.lattice import exact_taps, impulse_response, step_response, unit_noise
from patchlab.bank.planes import AXES, coloured, opponent_mix, weights
from patchlab.conventions import DEFAULT_BORDER, rgb_weights
from patchlab.errors import UsageError
from patchlab.families import render, without_dc
from patchlab.types import F32, F64, Bank, Dictionary, Kernel, KernelFits, Survey


def relative_noise(survey: Survey) -> F64 | None:
    """Noise of each sample over that of the surveyed one; None where it is not known."""
    sd = survey.table.noise_sd
    if not sd or not survey.sample_noise.size:
        return None
    return np.asarray(survey.sample_noise / sd)


def one_plane(survey: Survey) -> Survey:
    """The survey as that of the plane that was surveyed; a monochrome one as it is."""
    form = survey.contract.format
    if form.planes == 1:
        return survey
    contract = replace(survey.contract, pixels=f"Mono{form.bits}")
    return replace(survey, contract=contract, table=replace(survey.table, contract=contract))


def colour_bank(lattice: Bank, survey: Survey) -> Bank:
    """The kernels of a lattice bank on each of the three opponent planes.

    Parameters
    ----------
    lattice : Bank of one plane, chosen on the spatial profiles of colour components
    survey : of the colour frames: their contract, table and the noise of their samples

    Returns
    -------
    Bank : kernels named after their plane; its scales are the lattice's, once for each plane. The
        noise of every plane is ``table.noise_sd``, so unit noise gains stay.

    Raises
    ------
    UsageError : samples other than R, G and B.
    """
    noise = relative_noise(survey)
    names, mix = opponent_mix(survey.contract.format.colours, noise)
    count = len(lattice.scales)
    kernels, taps = [], []
    for m, name in enumerate(names):
        taps.append(coloured(lattice.taps, m, len(names)))
        for k in lattice.kernels:
            scale = None if k.scale is None else k.scale + m * count
            kernels.append(replace(k, name=f"{name}_{k.name}", scale=scale))
    warnings = list(lattice.warnings)
    if survey.table.noise_sd and noise is None:
        warnings.append(
            "the noise of some samples is not known; it is taken to be that of the green ones"
        )
    return replace(
        lattice,
        kernels=tuple(kernels),
        taps=np.concatenate(taps),
        table=survey.table,
        mix=mix,
        provenance={**lattice.provenance, "working_planes": list(names)},
        warnings=tuple(warnings),
    )


def mosaic_bank(lattice: Bank, survey: Survey) -> Bank:
    """The kernels of a lattice bank on the cells of a Bayer sensor: grey and two opponent sets.

    A sample does not lie in its cell's middle, so a kernel is drawn anew for every sample, where
    that one lies. An edge without colour then looks the same to all four, and the opponent
    kernels, whose weights add up to nothing, answer to it by what the sampling aliases alone: 2 %
    of the grey answer for kernels of 0.9 cells and a blur of 0.8 samples, 6 % for 0.7 cells.

    Parameters
    ----------
    lattice : Bank of one plane of cells
    survey : of the mosaics: their contract, table and the noise of their samples

    Returns
    -------
    Bank : as :func:`colour_bank`, with a tap for each sample; widths and places are in cells
    """
    noise = relative_noise(survey)
    sd = np.ones(survey.contract.format.planes) if noise is None else noise
    colours = survey.contract.format.colours
    rows = weights(np.array(list(AXES.values())) @ rgb_weights(colours), sd)
    gain = (survey.noise.autocovariance, survey.table.noise_sd or None)
    count, kernels, taps = len(lattice.scales), [], []
    for m, (name, row) in enumerate(zip(("grey", *AXES), rows, strict=True)):
        for k in lattice.kernels:
            planes = unit_noise(_on_samples(k, lattice.size, row) * sd, *gain)
            exact = np.stack([exact_taps(p) for p in np.moveaxis(planes, -1, 0)], axis=-1)
            step = step_response(exact.sum(axis=-1), k.parameters["theta_rad"])
            scale = None if k.scale is None else k.scale + m * count
            own = step if k.parity == "odd" else impulse_response(exact)
            kernels.append(replace(k, name=f"{name}_{k.name}", scale=scale, gain=own))
            taps.append(exact)
    return replace(
        lattice,
        kernels=tuple(kernels),
        taps=np.ascontiguousarray(np.stack(taps)),
        table=survey.table,
        mix=_equal_noise(noise),
        provenance={**lattice.provenance, "sets": ["grey", *AXES]},
    )


def _on_samples(kernel: Kernel, size: int, row: F64) -> F64:
    """A kernel over the samples of cells, (size, size, 4): each drawn where its sample lies."""
    planes = []
    for sample, weight in enumerate(row):
        y, x = ((place - 0.5) / 2 for place in divmod(sample, 2))
        at = {**kernel.parameters, "x_px": -x, "y_px": -y}
        planes.append(weight * without_dc(render(kernel.family, at, size)))
    return np.stack(planes, axis=-1)


def _equal_noise(noise: F64 | None) -> F32 | None:
    """The mix that brings all samples to one noise; None where they have it already."""
    if noise is None or np.allclose(noise, 1.0, atol=1e-6):
        return None
    return np.diag(1 / noise).astype(np.float32)


def colour_bank_as_learned(
    dictionary: Dictionary,
    survey: Survey,
    name: str = "bank",
    border: str = DEFAULT_BORDER,
    fits: KernelFits | None = None,
) -> Bank:
    """A bank of learned colour filters themselves: a tap for each sample.

    Of a Bayer sensor the samples are those of a cell, so a response belongs to a whole cell and
    every filter meets the mosaic in the phase that it was learned in.

    Parameters
    ----------
    dictionary, survey, name, border, fits : as :func:`patchlab.bank.given.bank_as_learned`

    Returns
    -------
    Bank of purpose "learned", with unit noise gain where the noise of the samples is known

    Raises
    ------
    UsageError : as there.
    """
    if dictionary.planes == 1:
        raise UsageError("these filters have no colours")
    filters = np.asarray(dictionary.filters, dtype=np.float64)
    filters = filters - filters.mean(axis=(1, 2), keepdims=True)
    flat = replace(dictionary, filters=filters[..., 0], atoms=dictionary.atoms[..., 0])
    plain = bank_as_learned(flat, one_plane(survey), name, border, fits)
    if filters.shape[1] % 2 == 0:
        filters = np.pad(filters, ((0, 0), (0, 1), (0, 1), (0, 0)))
    noise, covariance = relative_noise(survey), survey.noise.autocovariance
    mix = _equal_noise(noise)
    if mix is not None and noise is not None:
        filters = filters * noise  # in the mixed planes the same filter
    sd = survey.table.noise_sd if survey.table.noise_sd else None
    taps = np.stack(
        [
            np.stack([exact_taps(p) for p in np.moveaxis(unit_noise(f, covariance, sd), -1, 0)], -1)
            for f in filters
        ]
    )
    gains = [float(t.ravel()[int(np.abs(t).argmax())]) for t in taps]
    kernels = (replace(k, gain=g) for k, g in zip(plain.kernels, gains, strict=True))
    return replace(
        plain,
        kernels=tuple(kernels),
        taps=np.ascontiguousarray(taps),
        table=survey.table,
        mix=mix,
    )
