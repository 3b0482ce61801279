"""Learned components that describe a mark, and frames left out of learning."""

from dataclasses import replace

import imageio.v3 as iio
import numpy as np
import pytest
from scipy import ndimage

from patchlab import images
from patchlab.camera import flag_components, looks, survey
from patchlab.cli import main
from patchlab.images import SampleSettings, sample_folder
from patchlab.images.sample import grid_steps
from patchlab.types import Mark

SIZE = 8
CODES = np.arange(SIZE) - (SIZE - 1) / 2


def mark(name, found=True):
    return Mark(name, found, 1.0, 0.5, "", "")


def planted(seed=0, count=20_000):
    """Patches of three components: a slope across, a grid line down, a checkerboard.

    The grid line is met where the patch straddles a block boundary, the checkerboard's sign is
    set by the patch's place: both are the lattice's, the slope is the scene's.
    """
    rng = np.random.default_rng(seed)
    origin = rng.integers(0, 400, (count, 2)).astype(np.int32)
    slope = np.outer(np.ones(SIZE), CODES) / np.linalg.norm(np.outer(np.ones(SIZE), CODES))
    step = np.where(np.arange(SIZE) < 4, 1.0, -1.0)[:, None] * np.ones((1, SIZE)) / SIZE
    check = (-1.0) ** np.add.outer(np.arange(SIZE), np.arange(SIZE)) / SIZE
    code = rng.laplace(size=(count, 3)) + 0.1 * rng.standard_normal((count, 3))
    code[:, 1] *= np.where(origin[:, 0] % 8 == 4, 2.0, 0.2)
    code[:, 2] *= np.where(origin.sum(axis=1) % 2 == 0, 1.5, 0.5)
    atoms = np.stack([slope, step, check])
    return atoms, (code @ atoms.reshape(3, -1)).astype(np.float32), origin


@pytest.mark.parametrize(
    ("name", "flags"),
    [
        ("block_grid", ((1, "block_grid"),)),
        # the grid's line is met on even rows only, so it follows the finer lattice as well
        ("interpolation_lattice", ((1, "interpolation_lattice"), (2, "interpolation_lattice"))),
    ],
)
def test_components_locked_to_a_lattice_are_flagged_by_name(name, flags):
    atoms, patches, origin = planted()
    assert flag_components(atoms, atoms, patches, origin, [mark(name)]) == flags
    assert flag_components(atoms, atoms, patches, origin, [mark(name, False)]) == ()
    assert flag_components(atoms, atoms, patches, origin, [mark("sharpening")]) == ()
    # the same patches at places drawn anew are locked to nothing
    elsewhere = np.random.default_rng(1).permutation(origin)
    assert flag_components(atoms, atoms, patches, elsewhere, [mark(name)]) == ()


@pytest.mark.parametrize("turn", [False, True])
def test_lone_lines_are_the_row_noise_s(turn):
    line = np.zeros((SIZE, SIZE))
    line[3] = 1
    edge = ndimage.gaussian_filter(np.sign(np.add.outer(0.3 * CODES, CODES)), 0.7)
    bar = np.exp(-np.add.outer(CODES**2 / 2, CODES**2 / 8))
    atoms = np.stack([a.T if turn else a for a in (line, edge, bar)])
    patches, origin = np.zeros((1, SIZE**2), np.float32), np.zeros((1, 2), np.int32)
    name = "column_noise" if turn else "row_noise"
    assert flag_components(atoms, atoms, patches, origin, [mark(name)]) == ((0, name),)


def test_slow_shading_is_no_row_noise():
    slow = np.outer(CODES, np.ones(SIZE))
    bowl = np.outer(CODES**2 - (CODES**2).mean(), np.ones(SIZE))
    lines = np.outer([1, -2, 1, 2, -1, -2, 1, 0], np.ones(SIZE))
    patches, origin = np.zeros((1, SIZE**2), np.float32), np.zeros((1, 2), np.int32)
    atoms = np.stack([slow, bowl, lines])
    assert flag_components(atoms, atoms, patches, origin, [mark("row_noise")]) == (
        (2, "row_noise"),
    )


def test_a_lattice_of_rows_alone_is_seen():
    atoms, patches, origin = planted()
    where = np.where(origin[:, 0] % 2 == 0, 1.1, 0.9)[:, None].astype(np.float32)
    code = patches @ atoms[0].ravel()
    mixed = patches + (where - 1) * np.outer(code, atoms[0].ravel()).astype(np.float32)
    marks = [mark("interpolation_lattice"), mark("block_grid")]
    before, after = (
        dict(flag_components(atoms, atoms, p, origin, marks)) for p in (patches, mixed)
    )
    lattice = "interpolation_lattice"
    assert before == {1: "block_grid", 2: lattice}
    assert after == {0: lattice, 1: "block_grid", 2: lattice}


def test_a_flagged_atom_in_words():
    wave = np.cos(2 * np.pi * np.arange(16) / 8)
    assert looks(np.outer(np.ones(16), wave)) == "axis-aligned, columns, wavelength 8.0 px"
    check = (-1.0) ** np.add.outer(np.arange(16), np.arange(16))
    assert looks(check) == "at 45 degrees, wavelength 1.4 px, near Nyquist"
    assert looks(np.ones((16, 16))) == "broad"


@pytest.fixture(scope="module")
def odd_folder(bench, tmp_path_factory):
    """Ten photographs: the fourth blurred, the sixth overexposed, the eighth a repeat."""
    lights = bench.photos(10)
    lights[3] = ndimage.gaussian_filter(lights[3], 3.0)
    lights[5] = 8 * lights[5]
    lights[7] = lights[0]
    folder = tmp_path_factory.mktemp("odd")
    for frame in bench.folder(lights, bench.contract(8, black=8), 0.5, 1.0, blur=0.7):
        iio.imwrite(folder / frame.path, frame.pixels)
    return folder


def test_distrusted_frames_have_their_reasons(odd_folder):
    intake = images.take_in(images.list_photos(odd_folder), images.ReadOptions(black=8))
    found = survey(lambda: images.iterate(intake), intake.contract)
    assert dict(found.distrusted) == {
        "03.png": "blurred", "05.png": "clipped", "07.png": "near duplicate",
    }  # fmt: skip


def test_a_folder_that_is_all_clipped_is_used_as_it_is(bench):
    contract = bench.contract(8, black=8)
    frames = bench.folder([4 * x for x in bench.photos(4)], contract, 0.5, 1.0)
    assert survey(lambda: frames, contract).distrusted == ()


def test_frames_left_out_leave_the_others_patches_as_they_were(odd_folder):
    intake = images.take_in(images.list_photos(odd_folder), images.ReadOptions(black=8))
    found = survey(lambda: images.iterate(intake), intake.contract)
    settings = SampleSettings(patches=10**6, per_frame=50, flat_fraction=0.0)
    some = sample_folder(intake.without(["03.png", "07.png"]), found.table, settings)
    every = sample_folder(intake, found.table, settings)
    assert set(every.frames) - set(some.frames) == {"03.png", "07.png"}
    kept = np.isin(np.array(every.frames)[every.frame], some.frames)
    assert np.array_equal(every.patches[kept], some.patches)


@pytest.mark.parametrize("every", [False, True])
def test_learning_leaves_them_out_and_says_so(odd_folder, tmp_path, capsys, every):
    words = ["learn", str(odd_folder), "-o", str(tmp_path / "run"), "--black", "8", "--jobs", "1"]
    words += ["--patches", "800", "--patch-size", "8", "--restarts", "1", "--max-iterations", "3"]
    with pytest.raises(SystemExit) as stop:
        main([*words, *(["--all-frames"] if every else [])])
    assert stop.value.code == 0
    said = capsys.readouterr().err
    told = "frames left out of learning: 1 blurred, 1 clipped, 1 near duplicate"
    assert (told in said) is not every


def test_a_long_folder_is_thinned_evenly(odd_folder):
    intake = images.take_in(images.list_photos(odd_folder))
    assert [r.path for r in intake.thinned(3).frames] == ["00.png", "03.png", "06.png"]
    assert intake.thinned(10) is intake
    assert [f.path for f in images.iterate(intake.thinned(2))] == ["00.png", "05.png"]


def test_the_grid_s_patches_are_counted_and_left_out(bench, tmp_path):
    contract = bench.contract(8, transfer="srgb")
    for frame in bench.folder(bench.photos(8), contract, 0.1, 1.0, blur=0.7, post=bench.jpeg(20)):
        iio.imwrite(tmp_path / frame.path, frame.pixels)
    intake = images.take_in(images.list_photos(tmp_path))
    found = survey(lambda: images.iterate(intake), intake.contract)
    assert found.grid == (0, 0)
    settings = SampleSettings(size=8, patches=1000)
    whole = sample_folder(intake, found.table, settings)
    less = sample_folder(intake, found.table, replace(settings, grid=found.grid))
    assert whole.rejected["on the block grid"] == 0
    assert less.rejected["on the block grid"] > 200
    # the rule goes by codes; the table bends them a little
    shown = [(grid_steps(p.patches, p.origin, found.grid) > 2).mean() for p in (whole, less)]
    assert shown[0] > 0.1
    assert shown[1] < shown[0] / 3
