"""Stand-ins for what the earlier stages hand to the bank: atoms, dictionaries, surveys."""

from __future__ import annotations

import math

import numpy as np
import pytest

from patchlab.families import render
from patchlab.types import (
    Dictionary,
    InputContract,
    InputTable,
    KernelFit,
    KernelFits,
    NoiseModel,
    Survey,
    Whitening,
)


def edge_atoms(seed: int, count: int = 80, size: int = 12, across: float = 1.1, along: float = 2.6):
    """Steps and lines at random places, turns and sizes: what a learner finds on photographs."""
    draw = np.random.default_rng(seed)
    atoms = []
    for _ in range(count):
        p = {
            "theta_rad": draw.uniform(0, math.pi),
            "x_px": draw.uniform(-3.5, 3.5),
            "y_px": draw.uniform(-3.5, 3.5),
            "sigma_u_px": across * math.exp(0.1 * draw.standard_normal()),
            "sigma_v_px": along * math.exp(0.1 * draw.standard_normal()),
        }
        atom = render(str(draw.choice(["gd1", "gd2"])), p, size)
        atom -= atom.mean()
        atoms.append(atom / np.linalg.norm(atom))
    return np.array(atoms)


def pink_scale(atoms):
    """Atoms at the scale of a photograph's components: large ones carry more."""
    power = np.abs(np.fft.fft2(atoms, s=(32, 32))) ** 2
    f = np.hypot(*np.meshgrid(np.fft.fftfreq(32), np.fft.fftfreq(32)))
    centre = (power * f).sum(axis=(1, 2)) / power.sum(axis=(1, 2))
    return atoms / centre[:, None, None]


def dictionary(atoms, basis=None):
    basis = pink_scale(atoms[:80]) if basis is None else basis
    k = len(basis)
    whitening = Whitening(
        np.eye(2), np.eye(2), np.zeros(2), np.ones(2), rank=2, form="pca", removed=(), samples=1
    )
    return Dictionary(
        method="ica",
        filters=basis.copy(),
        atoms=basis,
        contribution=np.full(k, 1 / k),
        kurtosis=np.full(k, 9.0),
        identified=np.ones(k, bool),
        converged=True,
        iterations=10,
        tolerance=1e-6,
        curve=np.zeros(1),
        log_likelihood=None,
        whitening=whitening,
        pooled_atoms=atoms,
    )


def survey(blur=0.7, electrons=400.0, measurable=True, autocovariance=None):
    """A camera of 8 bits with 2 electrons of read noise and a stabilising table."""
    contract = InputContract("Mono8", 0, 255)
    light = np.arange(256.0) * electrons / 255
    values = (2 * np.sqrt(light + 3 / 8 + 4)).astype(np.float32)
    sd = 1.0 if measurable else None
    table = InputTable("stabilised" if measurable else "linear", contract, values, sd)
    return Survey(contract, NoiseModel(measurable, autocovariance=autocovariance), table, blur)


def good_fits(count, verdict="good"):
    one = KernelFit(0, "gd1", {}, {}, 0.9, 0.0, verdict, None, None)
    return KernelFits("atoms", 12, (one,) * count, 144.0)


class Stand:
    """The makers above, for tests that ask for the fixture."""

    edge_atoms = staticmethod(edge_atoms)
    dictionary = staticmethod(dictionary)
    survey = staticmethod(survey)
    good_fits = staticmethod(good_fits)


@pytest.fixture(scope="session")
def stand() -> type[Stand]:
    return Stand
