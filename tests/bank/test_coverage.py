"""What a bank covers: identities, an independent reckoning, chance, and the nulls."""

from __future__ import annotations

import numpy as np
import pytest

from patchlab.bank import coverage as cov
from patchlab.errors import InputError, UsageError
from patchlab.families import render


def step(theta, across=1.0, along=1.8, size=15):
    p = {"theta_rad": theta, "sigma_u_px": across, "sigma_v_px": along}
    return render("gd1", p, size)


def lattice_groups(count, widths, size, parity):
    return [cov.oriented_group(t, widths, size, parity) for t in np.pi * np.arange(count) / count]


def shifted(kernel, y, x, size=12):
    """The kernel cut to a patch with its centre at pixel (y, x)."""
    c = kernel.shape[0] // 2
    big = np.pad(kernel, size)
    return big[c + size - y : c + 2 * size - y, c + size - x : c + 2 * size - x]


def slow_coverage(group, atom):
    """The definition, one least squares a shift."""
    size = atom.shape[0]
    a = (atom - atom.mean()).ravel()
    total = sum((k * k).sum() for k in group)
    best = 0.0
    for y in range(size):
        for x in range(size):
            cut = [shifted(k, y, x, size) for k in group]
            if sum((k * k).sum() for k in cut) < 0.25 * total:
                continue
            basis = np.stack([(k - k.mean()).ravel() for k in cut], axis=1)
            fitted = basis @ np.linalg.lstsq(basis, a, rcond=None)[0]
            best = max(best, float(fitted @ fitted / (a @ a)))
    return best


@pytest.mark.parametrize("parity", ["pair", "odd"])
def test_agrees_with_the_definition(parity):
    draw = np.random.default_rng(1)
    atoms = draw.standard_normal((4, 12, 12))
    group = lattice_groups(8, (1.1, 1.9), 15, parity)[1]
    fast = cov.coverage_of([group], atoms)
    np.testing.assert_allclose(fast, [slow_coverage(group, a) for a in atoms], atol=2e-6)


def test_a_bank_covers_its_own_kernels_wherever_they_stand():
    groups = lattice_groups(8, (1.0, 1.8), 15, "pair")
    atoms = [shifted(g[m], y, x) for g in groups for m in (0, 1) for y, x in ((5, 6), (1, 4))]
    np.testing.assert_allclose(cov.coverage_of(groups, np.array(atoms)), 1.0, atol=1e-5)


def test_a_kernel_mostly_outside_does_not_count():
    kernel = np.zeros((11, 11))
    kernel[6, 6], kernel[1, 1] = np.sqrt(0.2), np.sqrt(0.8)  # the larger part far off its centre
    fifth, whole = shifted(kernel, 0, 0), shifted(kernel, 5, 5)
    one, other = cov.coverage_of([kernel[None]], np.array([fifth, whole]))
    assert other == pytest.approx(1, abs=1e-5)
    assert one < 0.9  # only a fifth of the kernel's energy would be on the patch
    assert one == pytest.approx(slow_coverage(kernel[None], fifth), abs=1e-5)


def test_scale_sign_and_mean_of_atoms_do_not_matter():
    atoms = np.random.default_rng(2).standard_normal((5, 12, 12))
    groups = lattice_groups(4, (1.0, 1.8), 15, "pair")
    same = np.array([-3.0, 1e-3, 7.0, -1.0, 40.0])[:, None, None] * atoms + 11.0
    np.testing.assert_allclose(
        cov.coverage_of(groups, atoms), cov.coverage_of(groups, same), atol=1e-5
    )


def test_one_more_group_never_covers_less():
    atoms = np.random.default_rng(3).standard_normal((20, 12, 12))
    groups = lattice_groups(8, (1.0, 1.8), 15, "pair")
    less, more = (cov.coverage_of(groups[:n], atoms) for n in (4, 8))
    assert (more >= less).all()
    assert (more > less).any()


def test_a_pair_covers_any_phase_and_an_odd_kernel_does_not():
    lines = np.stack([render("gd2", {"theta_rad": t, "sigma_u_px": 1.0, "sigma_v_px": 1.8}, 12)
                      for t in np.pi * np.arange(8) / 8])  # fmt: skip
    pair = cov.coverage_of(lattice_groups(8, (1.0, 1.8), 15, "pair"), lines)
    odd = cov.coverage_of(lattice_groups(8, (1.0, 1.8), 15, "odd"), lines)
    assert pair.mean() > odd.mean() + 0.2


def test_white_noise_is_covered_by_chance_only():
    atoms = np.random.default_rng(4).standard_normal((100, 12, 12))
    chance = cov.coverage_of(lattice_groups(8, (0.91, 2.55), 23, "pair"), atoms).mean()
    assert 0.05 < chance < 0.12  # 0.08 on such atoms was measured for this bank


def test_flat_and_misshapen_atoms_are_refused():
    group = lattice_groups(4, (1.0, 1.8), 15, "odd")
    with pytest.raises(InputError, match="no atom has any structure"):
        cov.coverage_of(group, np.ones((3, 12, 12)))
    with pytest.raises(UsageError, match="size, size"):
        cov.coverage_of(group, np.ones((3, 144)))
    with pytest.raises(UsageError, match="at least one orientation"):
        cov.refine_widths(np.ones((3, 12, 12)), ())


def test_widths_of_planted_atoms_come_back(stand):
    atoms = stand.edge_atoms(5, 120, across=1.1, along=2.4)
    found = cov.refine_widths(atoms, (8,))
    assert found.widths[0] == pytest.approx((1.1, 2.4), rel=0.08)
    assert found.at_bound == ((),)
    assert found.coverage > 0.85


def test_widths_are_a_maximum(stand):
    """Optimality: no small step in either width covers more."""
    atoms = stand.edge_atoms(6, 60)
    found = cov.refine_widths(atoms, (8,))
    (across, along), size = found.widths[0], 2 * 12 - 1
    for a, b in ((1.03, 1), (0.97, 1), (1, 1.03), (1, 0.97)):
        groups = lattice_groups(8, (across * a, along * b), size, "pair")
        assert cov.coverage_of(groups, atoms).mean() < found.coverage + 1e-5


def test_wide_atoms_end_on_the_bound_and_say_so(stand):
    atoms = stand.edge_atoms(7, 40, across=2.6, along=5.0)
    found = cov.refine_widths(atoms, (6,))
    assert "sigma_u_px" in found.at_bound[0]
    assert found.widths[0][0] <= 2.0
    assert found.widths[0][1] <= 4.0


def test_two_sizes_are_told_finest_first(stand):
    small = stand.edge_atoms(8, 60, across=0.8, along=1.4)
    large = stand.edge_atoms(9, 60, across=1.7, along=3.0)
    found = cov.refine_widths(np.concatenate([small, large]), (8, 4))
    assert found.structure == (8, 4)
    assert found.widths[0][0] == pytest.approx(0.8, rel=0.15)
    assert found.widths[1][0] == pytest.approx(1.7, rel=0.15)


def test_turning_the_atoms_turns_nothing_else(stand):
    """The lattice of 8 holds every quarter turn, so turned photographs give the same widths."""
    atoms = stand.edge_atoms(10, 50)
    turned = np.ascontiguousarray(np.rot90(atoms, axes=(1, 2)))
    first, second = (cov.refine_widths(a, (8,)) for a in (atoms, turned))
    assert first.coverage == pytest.approx(second.coverage, abs=1e-4)


def test_rotated_basis_keeps_second_moments():
    basis = np.random.default_rng(11).standard_normal((30, 8, 8))
    turned = cov.rotated_basis(basis, 3, turns=2)
    assert turned.shape == (60, 8, 8)
    rows, first = basis.reshape(30, -1), turned[:30].reshape(30, -1)
    np.testing.assert_allclose(first.T @ first, rows.T @ rows, atol=1e-10)
    assert np.abs(turned[:30] - turned[30:]).max() > 0.1
    np.testing.assert_array_equal(turned, cov.rotated_basis(basis, 3, turns=2))
    assert np.abs(turned - cov.rotated_basis(basis, 4, turns=2)).max() > 0.1


def test_a_rotated_basis_is_covered_at_least_a_fifth_less(stand):
    atoms = stand.edge_atoms(12, 100)
    basis = stand.dictionary(atoms).atoms
    learned = cov.refine_widths(atoms, (8,))
    told = cov.report_coverage(
        atoms, basis, (8,), learned.widths, "pair", [(8, (4,)), (16, (8,)), (24, (8, 4))]
    )
    assert told.learned == pytest.approx(learned.coverage, abs=1e-6)
    assert told.rotated < told.learned - 0.2
    assert told.untrained < told.learned + 1e-6
    assert list(told.budget) == [8, 16, 24]
    assert (np.diff(told.curve) > -1e-6).all()  # a larger budget covers no less
    assert told.curve[1] == pytest.approx(told.learned, abs=0.03)
