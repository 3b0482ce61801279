"""Photographs behind an address are read as those of a folder."""

import functools
import http.server
import threading

import fsspec
import numpy as np
import pytest
from PIL import Image

from patchlab.errors import InputError, UsageError
from patchlab.images import SampleSettings, iterate, list_photos, sample_folder, take_in
from patchlab.images.address import Address
from patchlab.types import InputTable

SETTINGS = SampleSettings(size=8, patches=300)


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    """Three pictures, one below another folder, a hidden one, one of another kind."""
    root = tmp_path_factory.mktemp("photos")
    r = np.random.default_rng(0)
    (root / "more").mkdir()
    for name in ("a.png", "b b.png", "more/c.png"):
        Image.fromarray(r.integers(1, 250, (40, 50), dtype=np.uint8)).save(root / name)
    (root / ".hidden.png").write_bytes(b"")
    (root / "notes.txt").write_text("no picture")
    return root


class Quiet(http.server.SimpleHTTPRequestHandler):
    def log_message(self, *words):
        """Nothing."""


@pytest.fixture(scope="module")
def server(folder):
    handler = functools.partial(Quiet, directory=str(folder))
    with http.server.ThreadingHTTPServer(("127.0.0.1", 0), handler) as running:
        thread = threading.Thread(target=running.serve_forever)
        thread.start()
        yield f"http://127.0.0.1:{running.server_port}"
        running.shutdown()
        thread.join()


@pytest.fixture(scope="module")
def memory(folder):
    system = fsspec.filesystem("memory")
    for path in folder.rglob("*"):
        if path.is_file():
            system.pipe_file(f"/patchlab-test/{path.relative_to(folder)}", path.read_bytes())
    yield "memory://patchlab-test"
    system.rm("/patchlab-test", recursive=True)


@pytest.fixture(params=["memory", "file", "http"])
def address(request, folder, memory):
    if request.param == "http":
        return request.getfixturevalue("server")
    return memory if request.param == "memory" else f"file://{folder}"


def taken(where, jobs=1):
    intake = take_in(list_photos(where), jobs=jobs)
    contract = intake.contract
    values = np.arange(256, dtype=np.float32)
    table = InputTable("identity", contract, values, None)
    return intake, sample_folder(intake, table, SETTINGS, jobs=jobs)


def test_the_same_patches_from_an_address(folder, address):
    here, drawn = taken(folder)
    there, same = taken(address)
    assert there.listing.files == here.listing.files == ("a.png", "b b.png", "more/c.png")
    assert there.inputs == here.inputs
    assert same.patches.tobytes() == drawn.patches.tobytes()
    assert same.frames == drawn.frames


def test_what_is_passed_over_is_counted(folder, memory):
    listing = list_photos(memory)
    assert (listing.hidden, listing.other) == (1, 1)
    assert (listing.hidden, listing.other) == (
        list_photos(folder).hidden,
        list_photos(folder).other,
    )


def test_addresses_travel_to_other_processes(folder, server):
    _, drawn = taken(folder)
    assert taken(server, jobs=2)[1].patches.tobytes() == drawn.patches.tobytes()


def test_one_picture_alone(memory, folder):
    listing = list_photos(memory + "/a.png")
    assert listing.files == ("a.png",)
    frame = next(iterate(take_in(listing)))
    assert np.array_equal(frame.pixels, np.asarray(Image.open(folder / "a.png")))


def test_a_raw_buffer_finds_its_sidecar(memory):
    system = fsspec.filesystem("memory")
    pixels = np.arange(12, dtype=np.uint8)
    system.pipe_file("/patchlab-raw/x.raw", pixels.tobytes())
    system.pipe_file("/patchlab-raw/raw.toml", b'format = "Mono8"\nwidth = 4\nheight = 3\n')
    frame = next(iterate(take_in(list_photos("memory://patchlab-raw"))))
    assert np.array_equal(frame.pixels, pixels.reshape(3, 4))


def test_a_file_that_vanishes_is_quarantined(memory, folder):
    system = fsspec.filesystem("memory")
    for name in ("a.png", "b b.png", "more/c.png"):
        system.pipe_file(f"/patchlab-gone/{name}", (folder / name).read_bytes())
    intake = take_in(list_photos("memory://patchlab-gone"))
    system.rm_file("/patchlab-gone/a.png")
    missed = []
    assert len(list(iterate(intake, missed=missed.append))) == 2
    assert [m.reason for m in missed] == ["the file has vanished"]


def test_what_cannot_be_reached_is_said(memory, server, monkeypatch):
    with pytest.raises(InputError, match="no such folder"):
        list_photos("memory://patchlab-nowhere")
    with pytest.raises(UsageError, match="gopherhole"):
        list_photos("gopherhole://x")
    with pytest.raises(OSError, match=r"."):
        Address(server + "/absent.png").read_bytes()
    monkeypatch.setitem(__import__("sys").modules, "fsspec.core", None)
    with pytest.raises(UsageError, match=r"patchlab-bank\[cluster\]"):
        list_photos(memory)
