"""Colour components of photographs and of planted colours.

Photographs come with scikit-image (NASA public domain and CC0) and scikit-learn (CC BY 2.0). The
published results are of independent components of natural colour patches: most are achromatic,
the others opponent, blue against yellow and red against green (Hoyer and Hyvarinen 2000, Network
11:191-210; Tailor, Finkel and Buchsbaum 2000, Vision Res. 40:2671-2676).
"""

import numpy as np
import pytest
import skimage.data
from sklearn.datasets import load_sample_images

from patchlab import learn, shapes
from patchlab.conventions import pixel_format
from patchlab.errors import UsageError
from patchlab.families import render
from patchlab.images.sample import SampleSettings, sample
from patchlab.shapes.colour import AXES, colour_axis, fit_colour_kernels, separate
from patchlab.types import Frame, InputContract, InputTable

SIZE = 8


def patches_of(pictures, count=12_000, name="RGB8"):
    """Patches of the codes as they are, as the published experiments had them."""
    form = pixel_format(name)
    contract = InputContract(name, 0.0, 255.0)
    table = InputTable("identity", contract, np.arange(256, dtype=np.float32), None)
    frames = [Frame(f"{i}.png", p, contract) for i, p in enumerate(pictures)]
    settings = SampleSettings(size=SIZE, patches=count)
    found = sample(frames, table, settings, count_frames=len(frames))
    assert found.planes == form.planes
    return found


def learned(found, **options):
    known = learn.whiten(found, retain=0.999)
    return learn.learn_ica(found, known, restarts=1, tolerance=1e-4, **options)


@pytest.fixture(scope="module")
def photographs():
    names = ("astronaut", "coffee", "chelsea")
    own = [getattr(skimage.data, name)() for name in names]
    return [np.ascontiguousarray(p[..., :3]) for p in [*own, *load_sample_images().images]]


@pytest.fixture(scope="module")
def basis(photographs):
    return learned(patches_of(photographs))


# ---------------------------------------------------------------- photographs


def test_photographs_give_grey_components_and_opponent_ones(basis):
    filters = separate(basis.filters).directions
    atoms = separate(basis.atoms)
    grey = np.abs(atoms.directions @ np.array(AXES["grey"]))
    assert 0.25 < np.mean(grey > np.cos(np.deg2rad(10))) < 0.8
    # a filter of colour is blind to grey: its weights sum to nothing
    sums = np.abs(filters.sum(axis=1)) / np.sqrt(3)
    assert np.mean(sums < 0.1) > 0.4
    counts = dict.fromkeys(AXES, 0)
    for direction in filters[sums < 0.1]:
        counts[colour_axis(direction, "RGB")[0]] += 1
    assert counts["grey"] == 0
    assert min(counts["blue-yellow"], counts["red-green"]) >= 5
    # a component is nearly one profile in one colour
    assert np.median(atoms.share) > 0.9


def test_grey_components_lead_and_their_profiles_are_edges(basis):
    fits = fit_colour_kernels(basis.atoms[:40], "atoms", "RGB")
    assert shapes.share_by_axis(fits)["grey"] > 25
    assert fits.median_r2 > 0.7
    assert all(f.r2 <= f.colour_share + 1e-9 for f in fits.fits)


def test_a_grey_photograph_gives_only_grey_components(photographs):
    grey = [np.stack([p[..., 1]] * 3, axis=2) for p in photographs]
    known = learned(patches_of(grey, 6000), components=40)
    found = separate(known.atoms)
    off = np.sqrt(1 - np.minimum((found.directions @ np.array(AXES["grey"])) ** 2, 1))
    assert off.max() < 1e-5
    assert found.share.min() > 1 - 1e-9
    assert known.whitening.rank <= SIZE**2 - 1


@pytest.mark.parametrize("turn", ["swap", "opponent"])
def test_turned_colours_turn_the_directions(photographs, turn):
    """An orthonormal basis of colours is as good as any: what is learned turns with it."""
    axes = np.array(list(AXES.values()))
    turned = axes if turn == "opponent" else np.eye(3)[[2, 0, 1]]
    found = patches_of(photographs, 6000)
    rows = found.patches.reshape(len(found), -1, 3) @ turned.T.astype(np.float32)
    other = type(found)(
        **{**found.__dict__, "patches": rows.reshape(len(found), -1).astype(np.float32)}
    )
    known, again = learn.whiten(found, rank=30), learn.whiten(other, rank=30)
    np.testing.assert_allclose(known.spectrum[:100], again.spectrum[:100], rtol=1e-4)
    a = learn.learn_ica(found, known, restarts=1, tolerance=1e-6)
    b = learn.learn_ica(other, again, restarts=1, tolerance=1e-6)
    if turn == "swap":  # the start is drawn over samples, so only the optimum can be compared
        assert a.log_likelihood == pytest.approx(b.log_likelihood, abs=0.05)
    mapped = a.atoms @ turned.T
    partner, cosine = learn.match(mapped, b.atoms)
    good = np.abs(cosine) > 0.98
    assert good.mean() > 0.5
    first, second = separate(mapped[good]), separate(b.atoms[partner[good]])
    assert np.abs((first.directions * second.directions).sum(axis=1)).min() > 0.97


# ---------------------------------------------------------------- planted


def test_a_planted_grating_comes_back_with_its_colour():
    """Sparse mixtures of three known coloured Gabors: each is found with its direction."""
    rng = np.random.default_rng(8)
    planted = []
    for theta, colour in ((0.3, (0.8, -0.6, 0)), (1.2, (0.5, 0.5, -0.707)), (2.2, (1, 1, 1))):
        about = {"theta_rad": theta, "sigma_u_px": 1.8, "sigma_v_px": 2.2,
                 "frequency_cpp": 0.16, "phase_rad": 0.7}  # fmt: skip
        profile = render("gabor", about, SIZE)
        profile -= profile.mean()
        kernel = profile[..., None] * (np.array(colour) / np.linalg.norm(colour))
        planted.append(kernel / np.linalg.norm(kernel))
    rows = rng.laplace(size=(8000, 3)) @ np.array(planted).reshape(3, -1)
    rows += 0.01 * rng.normal(size=rows.shape)
    rows -= np.tile(rows.reshape(8000, -1, 3).mean(axis=1), SIZE**2)
    base = patches_of([rng.integers(20, 200, (60, 60, 3)).astype(np.uint8)], 1000)
    n = len(rows)
    mixed = type(base)(
        rows.astype(np.float32), SIZE, np.zeros(n, np.int32), np.zeros((n, 2), np.int32),
        np.zeros((n, 3), np.float32), np.ones(n, np.float32), ("f",), {},
    )  # fmt: skip
    known = learn.learn_ica(mixed, learn.whiten(mixed, rank=3), restarts=1)
    partner, cosine = learn.match(np.array(planted), known.atoms)
    assert np.abs(cosine).min() > 0.99
    fits = fit_colour_kernels(known.atoms, "atoms", "RGB")
    for place, (theta, colour) in zip(
        partner, ((0.3, (0.8, -0.6, 0)), (1.2, (0.5, 0.5, -0.707)), (2.2, (1, 1, 1))), strict=True
    ):
        fit = fits.fits[place]
        unit = np.array(colour) / np.linalg.norm(colour)
        assert abs(float(np.dot(fit.direction, unit))) > 0.999
        assert fit.family == "gabor"
        assert fit.verdict == "good"
        assert abs((fit.parameters["theta_rad"] - theta + 0.3) % np.pi - 0.3) < 0.05


def test_separation_is_the_first_singular_pair():
    kernels = np.random.default_rng(1).normal(size=(6, 5, 5, 4))
    found = separate(kernels)
    for kernel, profile, direction, share in zip(
        kernels, found.profiles, found.directions, found.share, strict=True
    ):
        u, s, vt = np.linalg.svd(kernel.reshape(25, 4), full_matrices=False)
        assert share == pytest.approx(s[0] ** 2 / (s**2).sum())
        best = s[0] * np.outer(u[:, 0], vt[0])
        np.testing.assert_allclose(np.outer(profile.ravel(), direction), best, atol=1e-10)
        assert direction[np.abs(direction).argmax()] > 0


def test_axes_are_orthonormal_and_named():
    axes = np.array(list(AXES.values()))
    np.testing.assert_allclose(axes @ axes.T, np.eye(3), atol=1e-12)
    for name, axis in AXES.items():
        assert colour_axis(axis, "RGB")[0] == name
        assert colour_axis(np.array(axis)[[2, 1, 0]], "BGR")[0] == name


def test_fits_in_a_table_carry_their_colours():
    about = {"theta_rad": 0.4, "sigma_u_px": 1.2, "sigma_v_px": 2.0}
    kernel = np.multiply.outer(render("gd1", about, SIZE), [0.1, 0.2, -0.9])
    fits = fit_colour_kernels(kernel[None], "filters", "BGR")
    head, row = shapes.fits_csv(fits).decode().splitlines()
    told = dict(zip(head.split(","), row.split(","), strict=True))
    assert told["colour_axis"] == "red-green"
    unit = np.array([0.1, 0.2, -0.9]) / np.linalg.norm([0.1, 0.2, -0.9])
    found = [float(told[f"direction_{i}_{c}"]) for i, c in enumerate("BGR")]
    np.testing.assert_allclose(np.abs(found @ unit), 1, atol=1e-12)
    assert shapes.fits_json(fits)["fits"][0]["colour_share"] == pytest.approx(1)
    with pytest.raises(UsageError, match="samples a pixel"):
        fit_colour_kernels(kernel[None], "filters", "RGGB")
