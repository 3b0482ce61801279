"""Banks for pixels with colours: a lattice on each opponent plane, or the learned filters.

The kernels of a colour edge bank are those of a monochrome one, on three working planes: grey,
blue-yellow and red-green (:func:`patchlab.bank.planes.opponent_mix`). A plane's sizes are scales
of their own, grey first, so edges of colour are added where grey shows none.
"""

from __future__ import annotations

from dataclasses import replace

import numpy as np

from patchlab.bank.given import bank_as_learned
from patchlab.bank.lattice import exact_taps, unit_noise
from patchlab.bank.planes import coloured, opponent_mix
from patchlab.conventions import DEFAULT_BORDER
from patchlab.errors import UsageError
from patchlab.types import F32, F64, Bank, Dictionary, KernelFits, Survey


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
    mix: F32 | None = None
    if noise is not None and not np.allclose(noise, 1.0, atol=1e-6):
        mix = np.diag(1 / noise).astype(np.float32)
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
