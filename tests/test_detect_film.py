"""Edges of videos: every frame, the same whatever the workers, bad frames put aside."""

import csv
import io
import sys

import av
import numpy as np
import pytest
from click.testing import CliRunner
from PIL import Image

from patchlab import images
from patchlab.cli import commands
from patchlab.errors import InputError, Interrupted, UsageError
from patchlab.images import extras
from patchlab.images.scenes import render_scene
from patchlab.pipeline import detect as job
from patchlab.pipeline import edgel_table
from tests.test_detect_folder import CAMERA, bank, contents, run

__all__ = ["bank"]  # the fixture of the folder's tests

COUNT = 2 * images.film.PART_FRAMES + 3


@pytest.fixture(scope="module")
def frames():
    pictures = [
        render_scene(k, (72, 80), CAMERA, light=300, smallest=10.0, largest=40.0).frame.pixels
        for k in range(4)
    ]
    return [np.roll(pictures[k % 4], k, axis=1) for k in range(COUNT)]


def encode(path, frames):
    with av.open(str(path), "w") as film:
        stream = film.add_stream("ffv1", rate=25)
        stream.height, stream.width = frames[0].shape
        stream.pix_fmt = "gray"
        stream.options = {"level": "3", "slicecrc": "1", "g": "1"}
        for pixels in frames:
            film.mux(stream.encode(av.VideoFrame.from_ndarray(pixels, format="gray")))
        film.mux(stream.encode())


@pytest.fixture(scope="module")
def film(frames, tmp_path_factory):
    where = tmp_path_factory.mktemp("films")
    encode(where / "film.mkv", frames)
    return where


@pytest.fixture(scope="module")
def whole(bank, film, tmp_path_factory):
    out = tmp_path_factory.mktemp("whole") / "d"
    return out, run(bank, film, out)


def test_every_frame_has_the_edges_of_its_picture(bank, frames, whole, tmp_path):
    out, result = whole
    assert [f["path"] for f in result["images"]] == [f"film.mkv#{k}" for k in range(COUNT)]
    assert result["quarantined"] == []
    (tmp_path / "stills").mkdir()
    for k in (0, 1, 16, 17, COUNT - 1):
        Image.fromarray(frames[k]).save(tmp_path / "stills" / f"{k}.png")
        run(bank, tmp_path / "stills" / f"{k}.png", tmp_path / f"out{k}")
        still = (tmp_path / f"out{k}" / "edgels" / f"{k}_png.csv").read_bytes()
        assert still == (out / "edgels" / f"film_mkv_page{k}.csv").read_bytes()
        assert still.count(b"\n") > 20


def test_workers_change_nothing(bank, film, whole, tmp_path):
    assert run(bank, film, tmp_path / "d", jobs=2) == whole[1]
    assert contents(tmp_path / "d") == contents(whole[0])


def test_a_video_alone_and_a_folder_with_pictures(bank, film, frames, whole, tmp_path):
    alone = run(bank, film / "film.mkv", tmp_path / "alone")
    assert alone == whole[1]
    mixed = tmp_path / "mixed"
    mixed.mkdir()
    (mixed / "b.mkv").write_bytes((film / "film.mkv").read_bytes())
    Image.fromarray(frames[0]).save(mixed / "a.png")
    found = run(bank, mixed, tmp_path / "m")
    assert [f["path"] for f in found["images"]][:2] == ["a.png", "b.mkv#0"]
    assert found["images"][0]["edgels"] == found["images"][1]["edgels"]


def test_a_stopped_job_keeps_the_parts_that_are_done(bank, film, whole, tmp_path):
    out, told = tmp_path / "d", []

    def stop(stage, done, total, note=""):
        told.append((done, total))
        raise Interrupted("stopped")

    with pytest.raises(Interrupted):
        run(bank, film, out, progress=stop)
    assert told == [(1, 3)]
    kept = {r["picture"] for r in csv.DictReader(io.StringIO((out / "edgels.csv").read_text()))}
    assert kept == {f"film.mkv#{k}" for k in range(images.film.PART_FRAMES)}
    again = []
    run(bank, film, out, resume=True, progress=lambda s, d, t, n="": again.append(d))
    assert again == [2, 3]
    assert contents(out) == contents(whole[0])


def test_a_bad_frame_is_put_aside_and_the_others_go_on(bank, film, whole, tmp_path, monkeypatch):
    spoilt = {5, 20}

    def damaged(frame, number, total, options):
        picture = extras_frame(frame, number, total, options)
        return "the frame is damaged" if number in spoilt else picture

    extras_frame = extras._video_frame
    monkeypatch.setattr(extras, "_video_frame", damaged)
    result = run(bank, film, tmp_path / "d")
    assert [q["path"] for q in result["quarantined"]] == ["film.mkv#5", "film.mkv#20"]
    assert len(result["images"]) == COUNT - 2
    assert [f for f in whole[1]["images"] if f["path"] not in ("film.mkv#5", "film.mkv#20")] == (
        result["images"]
    )
    spoilt.update(range(COUNT // 2))
    with pytest.raises(InputError, match=rf"\d+ of {COUNT} pictures cannot serve"):
        run(bank, film, tmp_path / "e")


def test_damaged_bytes_spoil_their_own_frames_only(bank, frames, tmp_path):
    encode(tmp_path / "film.mkv", frames)
    with av.open(str(tmp_path / "film.mkv")) as film:
        packets = [(p.pos, p.size) for p in film.demux(video=0) if p.size]
    data = bytearray((tmp_path / "film.mkv").read_bytes())
    at, size = packets[7]
    data[at + 8 : at + size] = bytes(size - 8)
    spoilt = tmp_path / "spoilt"
    spoilt.mkdir()
    (spoilt / "film.mkv").write_bytes(data)
    result = run(bank, spoilt, tmp_path / "d")
    assert [q["path"] for q in result["quarantined"]] == ["film.mkv#7"]
    assert len(result["images"]) == COUNT - 1


def test_what_is_no_video_is_put_aside_with_its_name(bank, film, tmp_path):
    folder = tmp_path / "p"
    folder.mkdir()
    (folder / "a.mkv").write_bytes((film / "film.mkv").read_bytes())
    (folder / "b.mp4").write_bytes(b"nothing at all" * 30)
    result = run(bank, folder, tmp_path / "d")
    assert [q["path"] for q in result["quarantined"]] == ["b.mp4"]
    assert len(result["images"]) == COUNT


def test_one_frame_is_held_at_a_time(film, monkeypatch):
    """A part is read lazily: its second frame is not decoded before the first was taken."""
    made = []
    own = extras._video_frame
    monkeypatch.setattr(extras, "_video_frame", lambda *a: made.append(a[1]) or own(*a))
    parts = images.film_parts(film, "film.mkv")
    assert [(p.first, len(p.times)) for p in parts] == [(0, 16), (16, 16), (32, 3)]
    found = images.read_part(film, "film.mkv", parts[1], images.ReadOptions())
    assert next(found)[0] == "film.mkv#16"
    assert made == [16]
    assert [name for name, _ in found] == [f"film.mkv#{k}" for k in range(17, 32)]


@pytest.mark.parametrize("codec", ["mpeg4", "mjpeg"])
def test_parts_are_the_frames_that_one_pass_gives(tmp_path, frames, codec):
    """Also where frames are coded from their neighbours, so that a jump lands before its aim."""
    with av.open(str(tmp_path / "f.avi"), "w") as film:
        stream = film.add_stream(codec, rate=25)
        stream.height, stream.width = frames[0].shape
        stream.pix_fmt = "yuvj420p" if codec == "mjpeg" else "yuv420p"
        stream.codec_context.gop_size = 10
        for pixels in frames:
            colour = np.repeat(pixels[..., None], 3, axis=2)
            film.mux(stream.encode(av.VideoFrame.from_ndarray(colour, format="rgb24")))
        film.mux(stream.encode())
    with av.open(str(tmp_path / "f.avi")) as film:
        expected = [f.to_ndarray(format="rgb24") for f in film.decode(video=0)]
    got = {}
    for part in images.film_parts(tmp_path, "f.avi"):
        for number, picture in extras.film_frames(
            tmp_path / "f.avi", part.times, part.first, part.total, part.seeks, images.ReadOptions()
        ):
            got[number] = picture.samples
    assert sorted(got) == list(range(len(expected))) == list(range(COUNT))
    for k, picture in enumerate(expected):
        np.testing.assert_array_equal(got[k], picture)


def test_parquet_holds_what_csv_holds(bank, film, whole, tmp_path, monkeypatch):
    from pyarrow import parquet

    monkeypatch.setattr(edgel_table, "ROW_GROUP", 500)
    result = run(bank, film, tmp_path / "d", table="parquet")
    assert result["table"] == "edgels.parquet"
    assert not (tmp_path / "d" / "edgels.csv").exists()
    table = parquet.read_table(tmp_path / "d" / "edgels.parquet")
    rows = list(csv.DictReader(io.StringIO((whole[0] / "edgels.csv").read_text())))
    assert table.column_names == list(rows[0])
    assert table.num_rows == len(rows) > 1000
    assert parquet.ParquetFile(tmp_path / "d" / "edgels.parquet").num_row_groups > 2
    for name in table.column_names:
        got, text = table.column(name).to_pylist(), [r[name] for r in rows]
        if name in ("picture", "kind"):
            assert got == text
        else:
            np.testing.assert_array_equal(np.float32(got), np.float32(text))


def test_parquet_without_its_package_is_one_sentence_before_any_work(
    bank, film, tmp_path, monkeypatch
):
    monkeypatch.setitem(sys.modules, "pyarrow", None)
    with pytest.raises(UsageError, match=r"need the extra \[parquet\]"):
        run(bank, film, tmp_path / "d", table="parquet")
    assert not (tmp_path / "d").exists()
    words = ["detect", str(bank), str(film), "-o", str(tmp_path / "d"), "--table", "parquet"]
    done = CliRunner().invoke(commands.patchlab, words)
    assert isinstance(done.exception, UsageError)
    assert "patchlab-bank[parquet]" in done.exception.remedy


def test_a_table_of_no_edgels_is_a_table(tmp_path):
    from pyarrow import parquet

    edgel_table.write_table(tmp_path, "parquet", [])
    assert parquet.read_table(tmp_path / "edgels.parquet").num_rows == 0
    assert job.RESULT == "detect.json"
