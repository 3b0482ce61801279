"""The compiled models: the families' own formulas, and derivatives that are theirs."""

import numpy as np
import pytest

from patchlab import families
from patchlab.shapes.fit import canonical
from patchlab.shapes.solve import evaluate, from_solver, to_solver

FAMILIES = sorted(families.PARAMETERS)


def draw(family, count, seed=0):
    """Random parameters (count, n) of a family, well inside their ranges."""
    rng = np.random.default_rng(seed)
    ranges = {
        "amplitude": (-2, 2),
        "x_px": (-3, 3),
        "y_px": (-3, 3),
        "theta_rad": (-4, 7),
        "sigma_u_px": (0.6, 4),
        "sigma_v_px": (0.6, 4),
        "frequency_cpp": (0.02, 0.48),
        "phase_rad": (-7, 7),
        "sigma_px": (0.6, 2),
        "surround_px": (2.4, 5),
        "ratio": (0.2, 1.5),
    }
    return np.stack([rng.uniform(*ranges[n], count) for n in families.PARAMETERS[family]], 1)


@pytest.mark.parametrize("size", [7, 12])
@pytest.mark.parametrize("family", FAMILIES)
def test_models_are_the_formulas_of_the_families(family, size):
    p = draw(family, 20)
    values, _ = evaluate(family, p, size)
    for row, value in zip(p, values, strict=True):
        truth = families.render(
            family, dict(zip(families.PARAMETERS[family], row, strict=True)), size
        )
        np.testing.assert_allclose(value, truth, rtol=0, atol=1e-12)


@pytest.mark.parametrize("family", FAMILIES)
def test_derivatives_agree_with_finite_differences(family):
    p = draw(family, 12, seed=1)
    _, slopes = evaluate(family, p, 11)
    for a in range(p.shape[1]):
        h = 1e-5
        up, down = p.copy(), p.copy()
        up[:, a] += h
        down[:, a] -= h
        differences = (evaluate(family, up, 11)[0] - evaluate(family, down, 11)[0]) / (2 * h)
        scale = np.abs(slopes[:, a]).max()
        np.testing.assert_allclose(slopes[:, a], differences, rtol=0, atol=1e-7 * scale + 1e-9)


@pytest.mark.parametrize("family", FAMILIES)
def test_solver_parameters_go_there_and_back(family):
    p = draw(family, 5, seed=2)
    np.testing.assert_allclose(from_solver(family, to_solver(family, p)), p, rtol=1e-15)


@pytest.mark.parametrize("family", FAMILIES)
def test_folding_names_the_same_kernel(family):
    p = draw(family, 40, seed=3)
    folded = np.stack([canonical(family, row) for row in p])
    np.testing.assert_allclose(
        evaluate(family, folded, 9)[0], evaluate(family, p, 9)[0], rtol=0, atol=1e-12
    )
    if family != "centre_surround":
        assert ((folded[:, 3] >= 0) & (folded[:, 3] < np.pi)).all()
    if family == "gabor":
        assert (folded[:, 0] > 0).all()
        assert ((folded[:, 7] > -np.pi) & (folded[:, 7] <= np.pi)).all()
