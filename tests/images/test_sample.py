import dataclasses

import numpy as np
import pytest

from patchlab.errors import InputError, UsageError
from patchlab.images import SampleSettings, list_photos, memory_needed, sample_folder, take_in
from patchlab.images.formats import png_bytes
from patchlab.images.sample import grid_steps, quota, sample, sample_frame
from patchlab.types import Frame, InputContract, InputTable

MONO8 = InputContract("Mono8", 0, 255)
PLAIN = InputTable("identity", MONO8, np.arange(256, dtype=np.float32), None)


def picture(seed, shape=(90, 110)):
    """Steps and grain, away from black and white."""
    rng = np.random.default_rng(seed)
    steps = np.kron(rng.integers(0, 160, (9, 11)), np.ones((10, 10), int))
    return (40 + steps + rng.integers(0, 20, (90, 110)))[: shape[0], : shape[1]].astype(np.uint8)


def frames(count=5):
    return [Frame(f"d/{k}.png", picture(k), MONO8) for k in range(count)]


def draw(some, table=PLAIN, **options):
    settings = SampleSettings(**{"patches": 2000, **options})
    return sample(some, table, settings, count_frames=len(some))


def same(a, b):
    return (
        all(
            getattr(a, f).tobytes() == getattr(b, f).tobytes()
            for f in ("patches", "frame", "origin", "dc", "contrast")
        )
        and a.frames == b.frames
        and a.rejected == b.rejected
    )


@pytest.mark.parametrize("size", [8, 12, 32])
def test_patches_are_the_pictures_own(size):
    some = frames()
    got = draw(some, size=size)
    assert len(got) == 2000 or size == 32
    for k in range(0, len(got), 97):
        r, c = got.origin[k]
        values = some[got.frame[k]].pixels[r : r + size, c : c + size].astype(float)
        assert np.isclose(got.dc[k], values.mean(), rtol=1e-6)
        assert np.isclose(got.contrast[k], values.std(), rtol=1e-6)
        rebuilt = got.patches[k].astype(float) * got.contrast[k] + got.dc[k]
        assert np.allclose(rebuilt, values.ravel(), atol=2e-4)


def test_dc_is_out_and_contrast_is_one():
    x = draw(frames()).patches.astype(np.float64)
    assert np.abs(x.mean(axis=1)).max() < 1e-7
    assert np.allclose(x.std(axis=1), 1, atol=1e-6)
    raw = draw(frames(), normalise=False)
    assert (raw.contrast == 1).all()
    assert raw.patches.std() > 5


def test_order_of_files_changes_nothing():
    some = frames()
    assert same(draw(some), draw(some[::-1]))
    assert not same(draw(some), draw(some, seed=1))


def test_a_frame_draws_the_same_beside_others_or_alone():
    settings = SampleSettings(patches=1500)
    alone = sample_frame(frames()[2], PLAIN, settings, 700)
    less = sample_frame(frames()[2], PLAIN, settings, 100)
    for field in ("patches", "origin", "dc", "sd", "contrast"):
        assert getattr(less, field).tobytes() == getattr(alone, field)[:100].tobytes()
    subset = {(p.tobytes(), f) for p, f in _named(draw(frames()[1:3], patches=800, per_frame=400))}
    whole = {(p.tobytes(), f) for p, f in _named(draw(frames(), patches=2000, per_frame=400))}
    shared = {f for _, f in subset}
    mine = {x for x in whole if x[1] in shared}
    # which patches are the flattest depends on the others, what was drawn does not
    assert len(mine & subset) > 0.8 * len(mine)


def test_every_frame_has_its_own_sequence():
    a, b = (
        sample_frame(Frame(name, picture(3), MONO8), PLAIN, SampleSettings(), 500)
        for name in ("a.png", "b.png")
    )
    both = set(map(tuple, a.origin.tolist())) & set(map(tuple, b.origin.tolist()))
    assert len(both) < 60  # 500 of 7821 places each: 32 in common are expected


def _named(got):
    return [(p, got.frames[f]) for p, f in zip(got.patches, got.frame, strict=True)]


def test_no_place_is_drawn_twice():
    got = draw(frames(1), patches=5000, flat_fraction=0)
    places = set(map(tuple, got.origin.tolist()))
    assert len(places) == len(got)
    assert got.origin.min() == 0
    assert tuple(got.origin.max(axis=0)) == (78, 98)


def test_saturated_and_invalid_patches_are_rejected_and_counted():
    pixels = picture(0)
    pixels[:, :30], pixels[:, 80:] = 255, 0
    mask = np.zeros(pixels.shape, dtype=bool)
    mask[60:] = True
    got = sample([Frame("a", pixels, MONO8, mask)], PLAIN, SampleSettings(patches=300),
                 count_frames=1)  # fmt: skip
    r, c = got.origin[:, 0], got.origin[:, 1]
    assert (c >= 30).all()
    assert (c + 12 <= 80).all()
    assert (r + 12 <= 60).all()
    assert got.rejected["saturated"] > 0
    assert got.rejected["invalid"] > 0
    narrow = dataclasses.replace(PLAIN, valid_codes=(50, 150))
    tight = sample(frames(1), narrow, SampleSettings(size=8, patches=50), count_frames=1)
    for k in range(len(tight)):
        values = tight.patches[k] * tight.contrast[k] + tight.dc[k]
        assert values.min() > 49.9
        assert values.max() < 150.1


def test_white_level_below_full_scale_saturates():
    table = dataclasses.replace(PLAIN, contract=InputContract("Mono8", 0, 180))
    got = sample([Frame("a", picture(0), table.contract)], table,
                 SampleSettings(size=8, patches=100), count_frames=1)  # fmt: skip
    top = (got.patches * got.contrast[:, None] + got.dc[:, None]).max()
    assert top < 179.5
    assert got.rejected["saturated"] > 0


def test_the_flattest_are_dropped_over_the_whole_folder():
    faint = 100 + np.random.default_rng(0).integers(0, 3, (90, 110))
    dull = Frame("dull", faint.astype(np.uint8), MONO8)
    got = sample([*frames(2), dull], PLAIN, SampleSettings(patches=900, flat_fraction=1 / 3),
                 count_frames=3)  # fmt: skip
    assert set(got.frame.tolist()) == {0, 1}
    assert got.frames == ("d/0.png", "d/1.png", "dull")
    every = draw(frames(), flat_fraction=0)
    assert every.rejected["flattest"] == 0
    kept = draw(frames(), flat_fraction=0.5, patches=1000)
    assert kept.contrast.min() > np.quantile(every.contrast, 0.4)


def test_equal_contrasts_are_settled_by_path_not_by_order():
    twin = [Frame(name, picture(3), MONO8) for name in ("a", "b", "c")]
    assert same(draw(twin, patches=500), draw(twin[::-1], patches=500))


def test_budgets():
    assert len(draw(frames(), patches=700)) == 700
    few = draw(frames(), patches=700, per_frame=20)
    assert len(few) == 5 * 29 - int(0.3 * 5 * 29)  # 20 / 0.7 candidates, rounded up
    assert quota(SampleSettings(patches=700), 5) == 200
    one = draw([*frames(1), Frame("tiny", picture(0)[:9, :9], MONO8)], size=12)
    assert one.rejected["frame smaller than a patch"] == 1
    assert set(one.frame.tolist()) == {0}


def test_patches_below_the_noise_are_not_taken():
    half = np.full((90, 110), 100, np.uint8)
    half[::2, ::2] = 101  # contrast 0.43
    half[:, 60::4] = 140  # contrast of 17
    noisy = dataclasses.replace(PLAIN, noise_sd=2.0)
    got = sample([Frame("a", half, MONO8)], noisy, SampleSettings(patches=50), count_frames=1)
    assert (got.contrast >= 4.0).all()
    assert (got.origin[:, 1] > 60 - got.size).all()
    assert got.rejected["below the noise"] > 10
    with pytest.raises(InputError, match="noise"):
        sample([Frame("a", half[:, :55], MONO8)], noisy, SampleSettings(), count_frames=1)


def test_sixteen_bit_copies_give_the_same_patches():
    wide = InputContract("Mono16", 0, 65535)
    table = InputTable("linear", wide, (np.arange(65536) / 257).astype(np.float32), None)
    deep = [Frame(f.path, f.pixels.astype(np.uint16) * 257, wide) for f in frames()]
    a, b = draw(frames()), draw(deep, table)
    assert np.array_equal(a.origin, b.origin)
    assert np.allclose(a.patches, b.patches, atol=1e-6)


def test_float_frames():
    real = InputContract("float32", 0, 1)
    table = InputTable("identity", real, None, None)
    some = [Frame(f.path, (f.pixels / 255).astype(np.float32), real) for f in frames()]
    a, b = draw(frames()), draw(some, table)
    assert np.array_equal(a.origin, b.origin)
    assert np.allclose(a.patches, b.patches, atol=1e-5)


def test_nothing_to_draw_from():
    flat = [Frame("a", np.full((50, 50), 90, np.uint8), MONO8)]
    with pytest.raises(InputError, match="flat"):
        draw(flat)
    with pytest.raises(InputError, match="smaller than a patch of 12 x 12"):
        draw([Frame("a", picture(0)[:11], MONO8)])
    with pytest.raises(InputError, match="saturated"):
        draw([Frame("a", np.full((50, 50), 255, np.uint8), MONO8)])
    with pytest.raises(InputError, match="no frame"):
        draw([])
    with pytest.raises(InputError, match="Mono8"):
        draw([Frame("a", picture(0).astype(np.uint16), InputContract("Mono16", 0, 65535))])


@pytest.mark.parametrize(
    "bad", [{"size": 7}, {"size": 33}, {"patches": 0}, {"per_frame": 0}, {"seed": -1},
            {"flat_fraction": 0.95}, {"flat_fraction": -0.1}]
)  # fmt: skip
def test_settings_are_checked(bad):
    with pytest.raises(UsageError):
        SampleSettings(**bad)


def test_memory_estimate_is_above_what_is_held():
    settings = SampleSettings(patches=2000)
    got = draw(frames())
    held = got.patches.nbytes + got.origin.nbytes + got.frame.nbytes + 2 * got.dc.nbytes
    needed = memory_needed(settings, pixels=9900, frames=5)
    assert 2 * held < needed < 8 * held
    assert memory_needed(settings, pixels=9900, frames=5, jobs=2) > needed


@pytest.fixture
def folder(tmp_path):
    for k in range(4):
        (tmp_path / f"写真 {k}.png").write_bytes(png_bytes(picture(k)))
    np.save(tmp_path / "stack.npy", np.stack([picture(8), picture(9)]))
    return tmp_path


def test_worker_count_changes_nothing(folder):
    intake = take_in(list_photos(folder))
    settings = SampleSettings(patches=1200, seed=5)
    told = []
    one = sample_folder(intake, PLAIN, settings)
    two = sample_folder(intake, PLAIN, settings, jobs=2,
                        progress=lambda stage, done, total, note="": told.append(done))  # fmt: skip
    assert same(one, two)
    assert told == [1, 2, 3, 4, 5]
    assert one.frames[0] == "stack.npy#0"
    assert len(one) == 1200


def test_a_lost_file_leaves_the_others_as_they_were(folder):
    intake = take_in(list_photos(folder))
    settings = SampleSettings(patches=1200, flat_fraction=0)
    before = sample_folder(intake, PLAIN, settings)
    (folder / "写真 2.png").unlink()
    missed = []
    after = sample_folder(intake, PLAIN, settings, missed=missed.append)
    assert [q.path for q in missed] == ["写真 2.png"]
    kept = np.array([before.frames[f] in after.frames for f in before.frame])
    assert np.array_equal(before.patches[kept], after.patches)


def test_invalid_pixels_everywhere_are_not_blamed_on_the_exposure():
    hidden = np.ones((90, 110), bool)
    with pytest.raises(InputError, match="transparent or NaN pixels") as caught:
        draw([Frame("a.png", picture(0), MONO8, hidden)])
    assert "exposure" not in str(caught.value)
    white = np.full((90, 110), 255, np.uint8)
    with pytest.raises(InputError, match="check the exposure") as caught:
        draw([Frame("a.png", white, MONO8)])
    assert "transparent" not in str(caught.value)


def test_steps_on_the_grid_are_told_from_steps_beside_it():
    rng = np.random.default_rng(0)
    size, grid = 12, (3, 6)
    plane = 0.1 * rng.standard_normal((64, 64))
    blocks = np.kron(rng.standard_normal((9, 9)), np.ones((8, 8)))
    plane += blocks[8 - grid[0] :, 8 - grid[1] :][:64, :64]
    origin = rng.integers(0, 64 - size, (200, 2)).astype(np.int32)
    codes = np.stack([plane[y : y + size, x : x + size].ravel() for y, x in origin])
    assert np.median(grid_steps(codes, origin, grid)) > 5
    assert np.median(grid_steps(codes, origin, (7, 2))) < 1
    # scale and offset change nothing
    same = grid_steps(3 * codes + 50, origin, grid)
    assert np.allclose(same, grid_steps(codes, origin, grid), rtol=1e-4)


def test_a_single_boundary_is_measured_exactly():
    codes = np.zeros((1, 64), np.float32)
    codes[0, 32:] = 8  # a step of 8 between rows 3 and 4; ramps of 1 along the columns
    codes += np.tile(np.arange(8, dtype=np.float32), 8)
    # patch at (4, 0): row 4 of it is row 8 of the frame, where a block begins
    steps = grid_steps(codes, np.array([[4, 0]], np.int32), (0, 0))
    assert steps[0] == pytest.approx(8 / (7 / 13))  # inside: 7 columns of 1, 6 rows of 0
