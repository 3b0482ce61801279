"""Edges of a folder: the same whatever the workers, kept when stopped, gone on with."""

import csv
import json
from dataclasses import replace

import numpy as np
import pytest
from click.testing import CliRunner
from PIL import Image

from patchlab import bank as banks
from patchlab.bank import lattice
from patchlab.cli import commands, main
from patchlab.errors import InputError, Interrupted, UsageError
from patchlab.images.scenes import Camera, render_scene
from patchlab.pipeline import detect as job
from patchlab.progress import silent
from patchlab.report import edge_pictures
from patchlab.types import Bank, EdgeMap, InputTable, Thresholds

CAMERA = Camera(bits=8, gain=0.5, full_well=600, read_noise=2.0, blur_sigma_px=0.8)
RATES = np.array([1.0, 10.0, 1000.0])


def limits(*strength):
    return Thresholds(RATES, np.array(strength), np.ones(3), 0.7, 1.0, "white")


@pytest.fixture(scope="module")
def bank(tmp_path_factory):
    where = tmp_path_factory.mktemp("detect") / "bank"
    electrons = np.arange(256) / CAMERA.gain
    values = (2 * np.sqrt(electrons + 3 / 8 + CAMERA.read_noise**2)).astype(np.float32)
    table = InputTable("stabilised", CAMERA.contract, values, 1.0)
    parities = ("odd", "even")
    kernels, taps = lattice.lattice_bank((4,), ((1.2, 1.44),), parities, None, 1.0)
    made = Bank("proof", kernels, taps, table, provenance={"blur_sigma_px": 0.8})
    made = replace(made, thresholds=limits(5.6, 5.2, 4.2), line_thresholds=limits(5.7, 5.3, 4.3))
    banks.write_bank(where, made, banks.make_plan(made), {}, seed=0, settings={})
    return where


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    where = tmp_path_factory.mktemp("pictures")
    for k, name in enumerate(("a.png", "b, c.png", "deep/d.png", "e.png", "f.png", "g.png")):
        (where / name).parent.mkdir(exist_ok=True)
        made = render_scene(k, (72, 80), CAMERA, light=300, smallest=10.0, largest=40.0)
        Image.fromarray(made.frame.pixels).save(where / name)
    (where / "bad.png").write_bytes(b"\x89PNG\r\n\x1a\n, and then nothing")
    return where


def run(bank, folder, out, *, progress=silent, request=None, **options):
    asked = request or job.Request(rate=10)
    return job.detect(bank, folder, out, asked, max_bad=0.3, progress=progress, **options)


def contents(out):
    return {
        str(p.relative_to(out)): p.read_bytes()
        for p in sorted(out.rglob("*"))
        if p.is_file() and p.name != job.JOURNAL
    }


@pytest.fixture(scope="module")
def whole(bank, folder, tmp_path_factory):
    out = tmp_path_factory.mktemp("whole") / "d"
    return out, run(bank, folder, out)


def test_one_table_holds_every_edgel_and_a_bad_frame_is_told(whole):
    out, result = whole
    assert [i["path"] for i in result["images"]] == [
        "a.png", "b, c.png", "deep/d.png", "e.png", "f.png", "g.png"
    ]  # fmt: skip
    assert [q["path"] for q in result["quarantined"]] == ["bad.png"]
    with (out / result["table"]).open(newline="") as file:
        rows = list(csv.DictReader(file))
    counted = {i["path"]: i["edgels"] for i in result["images"]}
    assert sum(counted.values()) == len(rows) > 300
    for name, count in counted.items():
        own = [r for r in rows if r["picture"] == name]
        with (out / "edgels" / f"{name.replace('.', '_')}.csv").open(newline="") as file:
            alone = list(csv.DictReader(file))
        assert len(alone) == count
        assert [{k: v for k, v in r.items() if k != "picture"} for r in own] == alone
    assert json.loads((out / "detect.json").read_text()) == result
    assert not (out / "overlay").exists()  # nothing was to be drawn


def test_workers_change_nothing(bank, folder, whole, tmp_path):
    run(bank, folder, tmp_path / "d", jobs=2)
    assert contents(tmp_path / "d") == contents(whole[0])


def test_a_stopped_job_keeps_what_is_done_and_goes_on(bank, folder, whole, tmp_path):
    out, seen = tmp_path / "d", []

    def stop(stage, done, total, note=""):
        seen.append(note)
        if done == 3:
            raise Interrupted("stopped")

    with pytest.raises(Interrupted):
        run(bank, folder, out, progress=stop)
    assert len(seen) == 3
    kept = contents(out)
    assert kept["edgels.csv"].startswith(b"picture,x_px,y_px,theta_deg,")
    assert "detect.json" not in kept
    with (out / job.JOURNAL).open("a") as journal:
        journal.write('{"file": "e.png", "fra')  # cut off by a crash
    again = []
    run(bank, folder, out, resume=True, progress=lambda s, d, t, n="": again.append((d, n)))
    assert not {n for _, n in again} & set(seen)
    assert [d for d, _ in again] == [4, 5, 6, 7]
    assert contents(out) == contents(whole[0])


def test_a_picture_that_changed_is_looked_at_again(bank, folder, tmp_path):
    copy, out = tmp_path / "p", tmp_path / "d"
    copy.mkdir()
    for name in ("a.png", "e.png"):
        (copy / name).write_bytes((folder / name).read_bytes())
    run(bank, copy, out)
    (copy / "e.png").write_bytes((folder / "f.png").read_bytes())
    again = []
    result = run(bank, copy, out, resume=True, progress=lambda *a: again.append(a[3]))
    assert again == ["e.png"]
    assert result["images"][1]["edgels"] == run(bank, copy, tmp_path / "x")["images"][1]["edgels"]


def test_a_result_does_not_outlive_the_pictures_it_tells_of(bank, folder, tmp_path):
    copy, out = tmp_path / "p", tmp_path / "d"
    copy.mkdir()
    (copy / "a.png").write_bytes((folder / "a.png").read_bytes())
    run(bank, copy, out)
    assert (out / job.RESULT).is_file()
    (copy / "bad.png").write_bytes(b"nothing")
    with pytest.raises(InputError, match="1 of 2"):
        run(bank, copy, out, resume=True)
    assert not (out / job.RESULT).exists()
    assert (out / "edgels" / "a_png.csv").is_file()


def test_another_request_does_not_go_on(bank, folder, whole, tmp_path):
    out, _ = whole
    with pytest.raises(UsageError, match="other settings"):
        run(bank, folder, out, resume=True, request=job.Request(rate=1000))
    with pytest.raises(UsageError, match="something here already"):
        run(bank, folder, out)
    (tmp_path / "strange").mkdir()
    with pytest.raises(UsageError, match="nothing here to go on with"):
        run(bank, folder, tmp_path / "strange", resume=True)


def test_too_many_bad_pictures_are_a_failure(bank, tmp_path):
    (tmp_path / "p").mkdir()
    (tmp_path / "p" / "a.png").write_bytes(b"nothing")
    with pytest.raises(InputError, match="1 of 1 pictures cannot serve") as failed:
        run(bank, tmp_path / "p", tmp_path / "d")
    assert failed.value.where == str(tmp_path / "p")
    assert not (tmp_path / "d").exists()  # nothing was found, so nothing is left


def test_a_failure_keeps_what_was_found_and_what_is_not_its_own(bank, folder, tmp_path):
    pictures, out = tmp_path / "p", tmp_path / "d"
    pictures.mkdir()
    (pictures / "bad.png").write_bytes(b"nothing")
    out.mkdir()
    (out / "mine.txt").write_text("kept")
    with pytest.raises(InputError):
        run(bank, pictures, out, force=True)
    assert [p.name for p in out.iterdir()] == ["mine.txt"]
    (pictures / "a.png").write_bytes((folder / "a.png").read_bytes())
    with pytest.raises(InputError, match="1 of 2"):
        run(bank, pictures, out, force=True)
    assert {"edgels.csv", "edgels", job.JOURNAL, "mine.txt"} == {p.name for p in out.iterdir()}


def test_nothing_is_written_among_the_photographs(bank, folder, tmp_path):
    before = contents(folder)
    alone = folder / "a.png"
    for pictures, out in (
        (folder, folder),
        (folder, folder / "new"),
        (folder, folder / "deep" / ".." / "new"),
        (alone, folder),
    ):
        with pytest.raises(UsageError, match="nothing is written under the photographs"):
            run(bank, pictures, out, force=True)
    copy = tmp_path / "d" / "overlay"  # a place that the output itself would fill and clear
    copy.mkdir(parents=True)
    (copy / "a.png").write_bytes(alone.read_bytes())
    for pictures in (copy, copy / "a.png"):
        with pytest.raises(UsageError, match="nothing is written under the photographs"):
            run(bank, pictures, tmp_path / "d", force=True)
    assert contents(folder) == before
    link = tmp_path / "link"
    link.symlink_to(folder)
    with pytest.raises(UsageError, match="nothing is written under the photographs"):
        run(bank, folder, link / "new")
    run(bank, copy / "a.png", copy / "d")  # beside one picture a folder of its own may stand


def test_an_output_that_is_a_file_is_refused(bank, folder, tmp_path):
    (tmp_path / "file").write_text("kept")
    for out in (tmp_path / "file", tmp_path / "file" / "d"):
        for options in ({}, {"force": True}, {"resume": True}):
            with pytest.raises(UsageError, match="the output is a file"):
                run(bank, folder, out, **options)
    assert (tmp_path / "file").read_text() == "kept"


def test_no_two_pictures_share_a_file(bank, folder, tmp_path):
    pictures, out = tmp_path / "p", tmp_path / "d"
    pictures.mkdir()
    for name, source in (("a#b.png", "a.png"), ("a_pageb.png", "e.png")):
        (pictures / name).write_bytes((folder / source).read_bytes())
    pages = [Image.open(folder / name) for name in ("f.png", "g.png")]
    pages[0].save(pictures / "t.tif", save_all=True, append_images=pages[1:])
    pages[0].save(pictures / "t.tif_page0.tif")
    result = run(bank, pictures, out)
    assert [i["path"] for i in result["images"]] == [
        "a#b.png", "a_pageb.png", "t.tif#0", "t.tif#1", "t.tif_page0.tif"
    ]  # fmt: skip
    files = ("a#b_png", "a_pageb_png", "t_tif_page0", "t_tif_page1", "t.tif_page0_tif")
    assert {p.name for p in (out / "edgels").iterdir()} == {f"{name}.csv" for name in files}
    for name, image in zip(files, result["images"], strict=True):
        rows = (out / "edgels" / f"{name}.csv").read_text().splitlines()[1:]
        assert len(rows) == image["edgels"] > 0


def test_force_leaves_nothing_of_the_job_before(bank, folder, tmp_path):
    out, alone = tmp_path / "d", folder / "a.png"
    draw = edge_pictures
    run(bank, folder, out, draw=draw)
    (out / "mine.txt").write_text("kept")
    assert (out / "overlay" / "e_png.png").is_file()
    run(bank, alone, out, force=True)
    (out / "mine.txt").unlink()
    run(bank, alone, tmp_path / "fresh")
    assert contents(out) == contents(tmp_path / "fresh")
    assert {p.name for p in out.iterdir()} == {p.name for p in (tmp_path / "fresh").iterdir()}


def test_force_clears_only_what_a_detection_wrote(bank, folder, tmp_path):
    own = tmp_path / "d" / "edges" / "notes.txt"
    own.parent.mkdir(parents=True)
    own.write_text("kept")
    photo = own.parent / "photo.png"
    photo.write_bytes((folder / "a.png").read_bytes())
    kept = photo.read_bytes()
    run(bank, folder / "a.png", tmp_path / "d", force=True, draw=edge_pictures)
    half = own.parent / ".a_png.png.x1y2z3_k"  # the draft of a killed worker
    half.write_bytes(b"half")
    (own.parent / "t_tif_page0.png").write_bytes(b"of a page")
    run(bank, folder / "e.png", tmp_path / "d", force=True)
    assert {p.name for p in own.parent.iterdir()} == {"notes.txt", "photo.png"}
    assert own.read_text() == "kept"
    assert photo.read_bytes() == kept


def test_every_folder_that_a_drawing_fills_is_known():
    made = render_scene(0, (40, 40), CAMERA, light=300, smallest=10.0, largest=20.0)
    flat = np.zeros((40, 40), np.float32)
    none = np.zeros((40, 40), np.uint8)
    drawn = edge_pictures(made.frame, EdgeMap(flat, none, none, flat > 0, 5.0), 4)
    assert {"edgels", *drawn} == set(job.PLACES)


@pytest.mark.parametrize(
    ("words", "said"),
    [
        (("--threshold", "inf"), "must be positive and finite, not inf"),
        (("--threshold", "nan"), "must be positive and finite, not nan"),
        (("--false-edges", "inf"), "must be a finite number, not inf"),
        (("--false-edges", "nan"), "must be a finite number, not nan"),
        (("--max-bad", "nan"), "must be between 0 and 1, not nan"),
        (("--max-bad", "-0.1"), "must be between 0 and 1, not -0.1"),
        (("--max-bad", "1.5"), "must be between 0 and 1, not 1.5"),
    ],
)
def test_numbers_that_mean_nothing_are_refused(bank, folder, tmp_path, capsys, words, said):
    out = tmp_path / "d"
    with pytest.raises(SystemExit) as ended:
        main(["detect", str(bank), str(folder), "-o", str(out), *words])
    assert ended.value.code == 2
    told = capsys.readouterr().err.strip()
    assert said in told
    assert "\n" not in told
    assert not out.exists()


def test_a_bank_without_thresholds_claims_nothing_about_noise(bank, folder, tmp_path):
    plain, _, _ = banks.read_bank(bank)
    plain = replace(plain, thresholds=None, line_thresholds=None)
    banks.write_bank(tmp_path / "b", plain, banks.make_plan(plain), {}, seed=0, settings={})
    with pytest.raises(UsageError, match="this bank has no thresholds; give a strength"):
        run(tmp_path / "b", folder, tmp_path / "d")
    request = job.Request(threshold=5.2)
    assert run(tmp_path / "b", folder / "a.png", tmp_path / "d", request=request)["images"]


def test_kinds_and_pictures_from_the_command_line(bank, folder, tmp_path):
    picture = folder / "a.png"

    def call(out, *words):
        done = CliRunner().invoke(
            commands.patchlab,
            ["detect", str(bank), str(picture), "-o", str(tmp_path / out), "--json", *words],
        )
        assert done.exception is None, done.output
        return json.loads(done.stdout)

    both = call("both", "--edges", "both", "--false-edges", "10")
    assert both["thresholds"] == {"step": pytest.approx(5.2), "line": pytest.approx(5.3)}
    assert (tmp_path / "both" / "overlay" / "a_png.png").is_file()
    lines = call("line", "--edges", "line", "--no-pictures")
    assert set(lines["thresholds"]) == {"line"}
    assert {p.name for p in (tmp_path / "line").iterdir()} == {
        "detect.json", "edgels", "edgels.csv", job.JOURNAL
    }  # fmt: skip
    kinds = (tmp_path / "line" / "edgels.csv").read_text()
    assert "step" not in kinds
