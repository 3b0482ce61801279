"""A bank loaded from Python: numbers, refusals, and what it may not import."""

from __future__ import annotations

import shutil
import subprocess
import sys
from pathlib import Path

import numpy as np
import pytest

import patchlab
from patchlab import edges
from patchlab.bank import read_bank, reference
from patchlab.errors import InputError, PatchlabError, UsageError
from tests.bank.banks import picture
from tests.export.folders import BANKS, scene, write


@pytest.fixture(scope="module")
def folder(tmp_path_factory):
    return write(tmp_path_factory.mktemp("run") / "bank", BANKS["step"])


def test_every_public_name_is_there_and_says_what_it_is():
    assert len(patchlab.__all__) <= 25
    for name in patchlab.__all__:
        assert getattr(patchlab, name).__doc__.strip(), name
    assert set(patchlab.__all__) <= set(dir(patchlab))
    assert patchlab.Bank is patchlab.types.Bank
    with pytest.raises(AttributeError, match="no attribute 'nothing'"):
        _ = patchlab.nothing


def test_no_public_name_hides_a_folder():
    home = {path.stem for path in Path(patchlab.__file__).parent.iterdir()}
    assert not home & set(patchlab.__all__)


@pytest.mark.parametrize("library", [False, True])
def test_it_gives_the_bank_its_responses_and_its_edges(folder, library):
    loaded = patchlab.load_bank(folder, library=library)
    how = "compiled" if library else "numpy"
    assert repr(loaded) == f"<bank step: 16 kernels of 11 x 11, Mono8, {how}>"
    pixels = scene(BANKS["step"])
    got = loaded.responses(pixels)
    error = np.abs(got - reference.responses(BANKS["step"], pixels)).max(axis=(1, 2))
    assert (error <= loaded.plan.error_bound).all()
    found = loaded.edges(pixels, rate=10)
    expected = edges.detect(BANKS["step"], pixels, lambda _: got, rate=10)
    assert found.edges[:, 60:].any()
    np.testing.assert_array_equal(found.edges, expected.edges)
    np.testing.assert_array_equal(found.strength, expected.strength)
    edgels = loaded.edgels(pixels, rate=10)
    assert 0 < len(edgels) <= found.edges.sum()
    assert edgels["strength"].min() > 0
    hidden = np.zeros(pixels.shape, bool)
    hidden[:, 60:] = True
    assert not loaded.edges(pixels, threshold=50.0, invalid=hidden).edges[:, 60:].any()


def test_a_runs_folder_serves_as_well(folder):
    assert patchlab.load_bank(str(folder.parent)).folder == folder


def test_what_does_not_fit_is_refused_in_one_sentence(folder, tmp_path):
    loaded = patchlab.load_bank(folder)
    wide = picture((60, 70)).astype(np.uint16) * 257
    for call in (loaded.responses, loaded.edges, loaded.edgels):
        with pytest.raises(InputError, match=r"takes Mono8 pixels \(uint8\), not uint16") as caught:
            call(wide)
        assert "\n" not in str(caught.value)
    with pytest.raises(InputError, match="plane"):
        loaded.responses([[[1, 2], [3, 4]]])
    with pytest.raises(UsageError, match="not both"):
        loaded.edges(picture((60, 70)), rate=1, threshold=4)
    bare = write(tmp_path / "bare", BANKS["arbitrary"], library=False)
    with pytest.raises(InputError, match="there is no lib/"):
        patchlab.load_bank(bare, library=True)
    with pytest.raises(UsageError, match="no kernels that find"):
        patchlab.load_bank(bare).edges(picture((60, 70)), threshold=4)
    with pytest.raises(PatchlabError, match="no bank here"):
        patchlab.load_bank(tmp_path)


@pytest.mark.parametrize(
    "dtype", ["bool", "int8", "int16", "uint16", "int32", "int64", "float16", "float32", "float64",
              "complex64", "object", "U3"],
)  # fmt: skip
def test_what_an_8_bit_contract_does_not_know_is_refused(folder, dtype):
    loaded = patchlab.load_bank(folder)
    pixels = (picture((60, 70)) // 2).astype(dtype)
    for call in (loaded.responses, loaded.edges, loaded.edgels):
        with pytest.raises(InputError, match=r"takes Mono8 pixels \(uint8\), not ") as caught:
            call(pixels)
        assert "\n" not in str(caught.value)


def test_shapes_and_masks_that_mean_nothing_are_refused(folder):
    loaded, pixels = patchlab.load_bank(folder), picture((60, 70))
    for call in (loaded.responses, loaded.edges, loaded.edgels):
        with pytest.raises(InputError, match="one plane"):
            call(np.stack([pixels] * 3, axis=2))
        with pytest.raises(InputError, match="masked"):
            call(np.ma.array(pixels, mask=pixels > 200))
        with pytest.raises(InputError, match="kernel"):
            call(pixels[:5])


def test_byte_order_and_real_dtypes_change_nothing(tmp_path):
    twelve, floats = (
        patchlab.load_bank(write(tmp_path / name, BANKS[name], library=False))
        for name in ("energy", "line")
    )
    codes = picture((40, 50), "Mono12")
    for other in (codes.astype(">u2"), codes[:, ::-1][:, ::-1], np.ma.array(codes)):
        np.testing.assert_array_equal(twelve.responses(other), twelve.responses(codes))
    light = np.round(picture((40, 50), "float32") * 100)
    for dtype in ("float16", "float64", ">f4", "int32", "uint8"):
        found = floats.edgels(light.astype(dtype), threshold=3.0)
        assert found.dtype == patchlab.types.EDGEL
        assert found.tobytes() == floats.edgels(light.astype("float32"), threshold=3.0).tobytes()
    for dtype in ("bool", "complex128", "object"):
        with pytest.raises(InputError, match="takes float32 pixels"):
            floats.edges(light.astype(dtype), threshold=3.0)


def test_codes_beyond_the_contract_s_depth_are_refused(tmp_path):
    loaded = patchlab.load_bank(write(tmp_path / "b", BANKS["energy"], library=False))
    pixels = picture((40, 50), "Mono12")
    pixels[3, 4] = 5000
    with pytest.raises(InputError, match="5000 is beyond Mono12"):
        loaded.responses(pixels)
    with pytest.raises(InputError, match="5000 is beyond Mono12"):
        loaded.edges(pixels, threshold=3.0)


def test_loading_runs_nothing_of_the_folder(folder, tmp_path):
    """A library that would end the process when loaded is not touched unless asked for."""
    bank, _, head = read_bank(folder)
    copy = shutil.copytree(folder, tmp_path / "b")
    (name,) = [n for n in head["files"] if n.startswith("lib/")]
    (copy / name).write_bytes(b"not what was written")
    assert patchlab.load_bank(copy).bank.name == bank.name
    with pytest.raises(PatchlabError, match="was changed"):
        patchlab.load_bank(copy, library=True)


CHILD = """
import sys
for name in ("numba", "sklearn", "dask", "skimage", "matplotlib", "onnx", "PIL", "click", "rich"):
    sys.modules[name] = None
import numpy as np
import patchlab
pixels = np.full((60, 70), 80, np.uint8)
pixels[20:, 25:] = 120
for library in (False, True):
    bank = patchlab.load_bank(sys.argv[1], library=library)
    assert bank.edges(pixels).edges.any()
    print(bank.responses(pixels).shape, len(bank.edgels(pixels)) > 0)
assert not any(m.startswith("patchlab.learn") for m in sys.modules)
"""


def test_a_bank_runs_where_the_learner_cannot_be_imported(folder):
    done = subprocess.run(
        [sys.executable, "-c", CHILD, folder], capture_output=True, text=True, timeout=120
    )
    assert done.returncode == 0, done.stderr
    assert done.stdout == "(16, 60, 70) True\n" * 2
