import os

import imageio.v3 as iio
import numpy as np
import pytest

from patchlab.errors import InputError
from patchlab.images import ReadOptions, iterate, list_photos, read_file, take_in
from patchlab.images.formats import png_bytes
from patchlab.store import sha256
from patchlab.types import InputContract


def grey(seed=0, shape=(30, 40), top=255):
    dtype = np.uint8 if top < 256 else np.uint16
    return np.random.default_rng(seed).integers(0, top + 1, shape).astype(dtype)


def fill(folder, names, top=255):
    for k, name in enumerate(names):
        path = folder / name
        path.parent.mkdir(parents=True, exist_ok=True)
        path.write_bytes(png_bytes(grey(k, top=top)))
    return folder


def snapshot(folder):
    return {p: (p.stat().st_mtime_ns, p.stat().st_size) for p in folder.rglob("*")}


ODD = ["b c.png", "a/été.png", "写真/画像 1.PNG", "a.png", "a/#1.png"]


def test_listing_is_sorted_recursive_and_counts_the_rest(tmp_path):
    fill(tmp_path, [*ODD, ".hidden.png", ".cache/x.png", ".cache/y.png"])
    (tmp_path / "NOTE.md").write_text("x")
    (tmp_path / "a/log.txt").write_text("x")
    listing = list_photos(tmp_path)
    assert listing.files == tuple(sorted(ODD))
    assert (listing.hidden, listing.other, listing.unreadable) == (2, 2, ())


def test_one_file_alone(tmp_path):
    fill(tmp_path, ["a.png", "b.png"])
    listing = list_photos(tmp_path / "b.png")
    assert (listing.root, listing.files) == (tmp_path, ("b.png",))
    assert len(take_in(listing).frames) == 1


def test_links_in_a_circle_and_pipes(tmp_path):
    fill(tmp_path, ["sub/a.png"])
    (tmp_path / "sub/up").symlink_to(tmp_path, target_is_directory=True)
    (tmp_path / "again").symlink_to(tmp_path / "sub", target_is_directory=True)
    os.mkfifo(tmp_path / "pipe.png")
    (tmp_path / "broken.png").symlink_to(tmp_path / "nowhere.png")
    listing = list_photos(tmp_path)
    assert listing.files == ("again/a.png", "broken.png")
    assert listing.other == 1
    (lost,) = take_in(listing, max_bad=0.5).quarantined
    assert (lost.path, lost.sha256) == ("broken.png", "")
    assert "vanished" in lost.reason


def test_nothing_there(tmp_path):
    with pytest.raises(InputError, match="no such folder"):
        list_photos(tmp_path / "none")
    with pytest.raises(InputError, match="no picture"):
        take_in(list_photos(tmp_path))
    (tmp_path / "a.png").write_bytes(b"")
    with pytest.raises(InputError, match=r"none of the pictures(.|\n)*a\.png: the file is empty"):
        take_in(list_photos(tmp_path), max_bad=1.0)


def test_a_folder_that_cannot_be_listed_is_told(tmp_path, monkeypatch):
    fill(tmp_path, ["a.png", "locked/b.png"])
    real = os.listdir

    def listdir(path):
        if str(path).endswith("locked"):
            raise PermissionError(13, "Permission denied")
        return real(path)

    monkeypatch.setattr(os, "listdir", listdir)
    listing = list_photos(tmp_path)
    assert [(q.path, "Permission denied" in q.reason) for q in listing.unreadable] == [
        ("locked/", True)
    ]
    assert len(take_in(listing, max_bad=0.5).quarantined) == 1


def test_a_name_that_is_not_text(tmp_path):
    fill(tmp_path, ["a.png"])
    try:
        with open(os.fsencode(tmp_path) + b"/b\xff.png", "wb") as out:
            out.write(png_bytes(grey(5)))
    except OSError:  # a file system that takes only text: nothing to be told apart
        assert list_photos(tmp_path).files == ("a.png",)
        return
    listing = list_photos(tmp_path)
    assert listing.files == ("a.png",)
    assert [q.path.encode() for q in listing.unreadable] == [rb"b\udcff.png"]


def test_intake_records_and_reading_again(tmp_path):
    fill(tmp_path, ODD)
    before = snapshot(tmp_path)
    intake = take_in(list_photos(tmp_path))
    assert [r.path for r in intake.frames] == sorted(ODD)
    assert intake.contract == InputContract("Mono8", 0, 255)
    frames = list(iterate(intake))
    assert [f.path for f in frames] == sorted(ODD)
    for frame, record in zip(frames, intake.frames, strict=True):
        assert np.array_equal(frame.pixels, grey(ODD.index(frame.path)))
        assert record.sha256 == sha256((tmp_path / record.file).read_bytes()) == frame.sha256
        assert record.pixels_sha256 == sha256(frame.pixels.tobytes())
        assert record.shape == frame.pixels.shape
    assert intake.inputs == {r.file: r.sha256 for r in intake.frames}
    assert intake.largest == 1200
    assert snapshot(tmp_path) == before


def test_bad_files_go_to_the_list_and_change_nothing_else(tmp_path):
    good = [f"{k:02d}.png" for k in range(10)]
    fill(tmp_path, good)
    alone = take_in(list_photos(tmp_path))
    data = png_bytes(grey(3))
    (tmp_path / "cut.png").write_bytes(data[:500])
    (tmp_path / "empty.jpg").write_bytes(b"")
    (tmp_path / ".DS_Store").write_bytes(b"x")
    with pytest.raises(InputError) as caught:
        take_in(list_photos(tmp_path))
    assert caught.value.exit_code == 3
    assert "2 of 12" in str(caught.value)
    assert "cut.png: the file is truncated" in str(caught.value)
    assert "empty.jpg: the file is empty" in str(caught.value)
    intake = take_in(list_photos(tmp_path), max_bad=0.2)
    assert intake.frames == alone.frames
    assert [(q.path, q.sha256) for q in intake.quarantined] == [
        ("cut.png", sha256(data[:500])),
        ("empty.jpg", sha256(b"")),
    ]


def test_exact_copies_are_used_once(tmp_path):
    fill(tmp_path, ["a.png", "b.png"])
    (tmp_path / "copy.png").write_bytes((tmp_path / "a.png").read_bytes())
    intake = take_in(list_photos(tmp_path))
    assert intake.copies == (("copy.png", "a.png"),)
    assert [r.path for r in intake.frames] == ["a.png", "b.png"]
    assert len(take_in(list_photos(tmp_path), keep_copies=True).frames) == 3


def test_mixed_depths_are_an_error_unless_allowed(tmp_path):
    fill(tmp_path, ["a.png"])
    fill(tmp_path, ["b.png"], top=65535)
    with pytest.raises(InputError, match=r"differ in depth(.|\n)*Mono8(.|\n)*Mono16"):
        take_in(list_photos(tmp_path))
    intake = take_in(list_photos(tmp_path), mixed_depths=True)
    assert intake.contract == InputContract("Mono16", 0, 65535)
    first, second = iterate(intake)
    assert np.array_equal(first.pixels, grey(0).astype(np.uint16) * 257)
    assert np.array_equal(second.pixels, grey(0, top=65535))
    assert any("scaled from Mono8" in n for n in first.notes)


def test_depths_are_scaled_to_floats_too(tmp_path):
    fill(tmp_path, ["a.png"])
    np.save(tmp_path / "b.npy", np.full((9, 9), 0.5, np.float32))
    first, _ = iterate(take_in(list_photos(tmp_path), mixed_depths=True))
    assert np.allclose(first.pixels, grey(0) / 255, atol=1e-7)


def test_mixed_transfers_ask_for_a_word(tmp_path):
    fill(tmp_path, ["a.png"])
    np.save(tmp_path / "b.npy", np.dstack([grey(1)] * 3))
    with pytest.raises(InputError, match="--transfer"):
        take_in(list_photos(tmp_path), mixed_depths=True)
    intake = take_in(list_photos(tmp_path), ReadOptions(transfer="srgb"))
    assert intake.contract.transfer == "srgb"
    assert np.array_equal(list(iterate(intake))[1].pixels, grey(1))


def test_a_file_that_vanishes_or_changes_is_passed_over(tmp_path):
    fill(tmp_path, ["a.png", "b.png", "c.png", "d.png"])
    intake = take_in(list_photos(tmp_path))
    (tmp_path / "b.png").unlink()
    (tmp_path / "c.png").write_bytes(png_bytes(grey(77)))
    missed = []
    assert [f.path for f in iterate(intake, missed=missed.append)] == ["a.png", "d.png"]
    assert [(q.path, q.reason) for q in missed] == [
        ("b.png", "the file has vanished"),
        ("c.png", "the file changed while it was in use"),
    ]
    assert len(list(iterate(intake))) == 2


def test_pages_keep_their_names_in_the_folder(tmp_path):
    np.save(tmp_path / "s.npy", grey(0, (3, 20, 25)))
    intake = take_in(list_photos(tmp_path))
    assert [(r.path, r.file, r.page) for r in intake.frames] == [
        (f"s.npy#{k}", "s.npy", k) for k in range(3)
    ]
    assert [f.path for f in iterate(intake)] == ["s.npy#0", "s.npy#1", "s.npy#2"]


def test_several_workers_read_the_same(tmp_path):
    fill(tmp_path, ["写真 a.png", "b.png", "c.png"])
    (tmp_path / "bad.png").write_bytes(b"bad")
    listing = list_photos(tmp_path)
    told = []
    one = take_in(listing, max_bad=0.5)
    two = take_in(
        listing, max_bad=0.5, jobs=2, progress=lambda stage, done, total, note="": told.append(done)
    )
    assert one == two
    assert told == [1, 2, 3, 4]


def test_an_unreadable_file_is_told(tmp_path, monkeypatch):
    fill(tmp_path, ["a.png"])

    def refuse(self):
        raise PermissionError(13, "Permission denied")

    monkeypatch.setattr(type(tmp_path), "read_bytes", refuse)
    with pytest.raises(InputError, match=r"a\.png: cannot be read \(Permission denied\)"):
        read_file(tmp_path, "a.png", ReadOptions())


def test_too_many_bad_files_are_told_with_the_remedy_first(tmp_path):
    fill(tmp_path, ["good.png"])
    for k in range(13):
        (tmp_path / f"{k:02d}.png").write_bytes(b"")
    with pytest.raises(InputError) as caught:
        take_in(list_photos(tmp_path))
    first, *lines = str(caught.value).split("\n")
    assert "13 of 14 files cannot be used" in first
    assert "remove them, or raise --max-bad" in first
    assert [line[2:8] for line in lines[:-1]] == [f"{k:02d}.png" for k in range(10)]
    assert lines[-1].strip() == "and 3 more"


def test_mixed_transfers_are_told_as_colour_and_grey(tmp_path):
    fill(tmp_path, ["grey.png"])
    iio.imwrite(tmp_path / "colour.png", np.stack([grey(k) for k in range(3)], axis=2))
    with pytest.raises(InputError) as caught:
        take_in(list_photos(tmp_path))
    told = str(caught.value)
    assert "taken as sRGB-coded (colour or JPEG) and some as linear (grey)" in told
    assert "srgb: colour.png" in told
    assert "linear: grey.png" in told
    assert "--transfer srgb or --transfer linear" in told
