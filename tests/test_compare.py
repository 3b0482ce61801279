"""Two results side by side: verdicts, crowds, pictures."""

import json

import numpy as np
import pytest
from click.testing import CliRunner

from patchlab import learn, shapes, store
from patchlab.cli.commands import patchlab
from patchlab.errors import UsageError
from patchlab.families import render
from patchlab.pipeline.compare import compare
from patchlab.report import comparison_pictures
from patchlab.types import PatchSet


def patches_of(width, seed=0):
    """Patches mixed from steps of one width at random places and directions: a camera's blur."""
    r = np.random.default_rng(seed)
    steps = []
    for _ in range(30):
        about = {"theta_rad": r.uniform(0, np.pi), "sigma_u_px": width, "sigma_v_px": 1.5 * width}
        place = {"x_px": r.uniform(-2, 2), "y_px": r.uniform(-2, 2)}
        steps.append(render("gd1", {**about, **place, "amplitude": 1.0}, 10).ravel())
    basis = np.array(steps)
    basis /= np.linalg.norm(basis, axis=1, keepdims=True)
    rows = r.laplace(size=(4000, 30)) @ basis
    rows -= rows.mean(axis=1, keepdims=True)
    n = len(rows)
    zero = np.zeros(n, np.float32)
    return PatchSet(
        np.ascontiguousarray(rows, np.float32),
        10,
        np.zeros(n, np.int32),
        np.zeros((n, 2), np.int32),
        zero,
        zero + 1,
        ("invented.png",),
        {},
    )


def results(folder, width, seed=0):
    """A dictionary and its fits, as a run leaves them."""
    patches = patches_of(width, seed)
    known = learn.learn_ica(patches, learn.whiten(patches, rank=12), restarts=1)
    store.save(folder / "dictionary", "dictionary", (known, known))
    fits = tuple(shapes.fit_kernels(known.atoms, of) for of in ("atoms", "filters"))
    store.save(folder / "fits", "fits", fits)
    return known


@pytest.fixture(scope="module")
def cameras(tmp_path_factory):
    """A sharp one, and a blurred one."""
    root = tmp_path_factory.mktemp("cameras")
    return {w: (root / str(w), results(root / str(w), w)) for w in (1.0, 1.7)}


@pytest.mark.parametrize("kind", ["dictionary", "fits"])
def test_one_result_is_bit_equal_to_itself(cameras, kind):
    folder, known = cameras[1.0]
    found = compare(folder / kind, folder / kind)
    assert (found.kind, found.verdict) == (kind, "bit-equal")
    assert found.cosine.min() == pytest.approx(1)
    assert all(d == 0 < chance for d, chance in found.distances.values())
    assert len(found.left) == len(known)


def test_order_and_sign_do_not_matter(cameras, tmp_path):
    from dataclasses import replace

    folder, known = cameras[1.0]
    turned = replace(known, atoms=np.ascontiguousarray(-known.atoms[::-1]))
    store.save(tmp_path / "other", "dictionary", (turned, turned))
    found = compare(folder, tmp_path / "other")
    assert found.verdict == "equivalent"
    assert found.left.tolist() == [11 - i for i in found.right]


def test_blur_is_seen_in_the_crowd(cameras):
    (sharp, _), (blurred, _) = cameras[1.0], cameras[1.7]
    found = compare(sharp, blurred)
    assert found.verdict == "different"
    distance, chance = found.distances["frequency_cpp"]
    assert distance > chance
    told = found.plain()["shapes"]["frequency_cpp"]
    assert told["first_median"] > 1.2 * told["second_median"]
    widths = compare(sharp / "fits", blurred / "fits").plain()["shapes"]["sigma_u_px"]
    assert widths["second_median"] > widths["first_median"]


def test_fewer_components_are_matched_into_more(cameras, tmp_path):
    folder, known = cameras[1.0]
    patches = patches_of(1.0)
    few = learn.learn_ica(patches, known.whitening, components=7, restarts=1)
    store.save(tmp_path / "few", "dictionary", (few, few))
    there, back = compare(tmp_path / "few", folder), compare(folder, tmp_path / "few")
    assert len(there.left) == len(back.left) == 7
    np.testing.assert_allclose(there.cosine, back.cosine)
    np.testing.assert_array_equal(there.left, back.right)
    assert np.all(np.diff(there.cosine) >= 0)


def test_two_kinds_are_refused(cameras):
    folder, _ = cameras[1.0]
    with pytest.raises(UsageError, match="cannot compare"):
        compare(folder / "fits", folder / "dictionary")


@pytest.mark.parametrize("kind", ["dictionary", "fits"])
def test_the_command_draws_the_differences(cameras, kind, tmp_path):
    (sharp, _), (blurred, _) = cameras[1.0], cameras[1.7]
    words = ["compare", str(sharp / kind), str(blurred / kind), "-o", str(tmp_path / "out")]
    done = CliRunner().invoke(patchlab, [*words, "--json"])
    assert done.exit_code == 0, done.output
    assert json.loads(done.stdout)["verdict"] == "different"
    found = compare(sharp / kind, blurred / kind)
    for name, data in comparison_pictures(found).items():
        assert (tmp_path / "out" / name).read_bytes() == data
        assert data.startswith(b"\x89PNG")
    assert isinstance(CliRunner().invoke(patchlab, words).exception, UsageError)
