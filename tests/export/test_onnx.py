"""The ONNX graphs against scipy, OpenCV, onnxruntime and the onnx reference evaluator."""

from __future__ import annotations

import json
import os
import subprocess
import sys

import cv2
import numpy as np
import onnx
import onnxruntime
import pytest
from scipy import ndimage

from patchlab.conventions import BORDERS
from patchlab.export.onnx import ROOT_ROUNDINGS, conv_bound, emit, reference_runner
from patchlab.types import Bank, InputContract, InputTable, Kernel, Thresholds

FORMATS = ("Mono8", "Mono10", "Mono12", "Mono16", "float32")


def table(pixels, kind="stabilised"):
    bits = 0 if pixels == "float32" else int(pixels[4:])
    contract = InputContract(pixels, 0, 2**bits - 1 if bits else 1)
    if not bits:
        return InputTable(kind, contract, None, 1.0, slope=730.0, offset=0.3, scale=1.7)
    codes = np.arange(2**bits)
    values = codes if kind == "identity" else 1.7 * np.sqrt(codes * (730 / 2**bits) + 0.3)
    return InputTable(kind, contract, values.astype(np.float32), 1.0)


def make(pixels="float32", kind="identity", border="mirror101", taps=None, **more):
    """Without taps: three odd and three even kernels of 7 x 7 with no symmetry at all."""
    if taps is None:
        taps = np.random.default_rng(5).standard_normal((6, 7, 7))
    n = len(taps)
    kernels = tuple(
        Kernel(f"k{i}", "given", "odd" if i < n // 2 else "even", 0, i % max(n // 2, 1), {}, 1.0)
        for i in range(n)
    )
    taps = np.asarray(taps, dtype=np.float32)
    return Bank("demo", kernels, taps, table(pixels, kind), border, **more)


def picture(bank, shape, seed=0):
    form = bank.contract.format
    generator = np.random.default_rng(seed)
    if form.integer:
        return generator.integers(0, form.full_scale + 1, shape).astype(form.dtype)
    return generator.random(shape).astype(np.float32)


def exact(bank, pixels):
    working = bank.table.apply(pixels).astype(np.float64)
    mode = BORDERS[bank.border].scipy
    return np.stack(
        [ndimage.correlate(working, k.astype(np.float64), mode=mode) for k in bank.taps]
    )


def runtime(model):
    options = onnxruntime.SessionOptions()
    options.intra_op_num_threads = 1
    options.log_severity_level = 4
    session = onnxruntime.InferenceSession(model, options, providers=["CPUExecutionProvider"])
    return lambda pixels: tuple(o[0] for o in session.run(None, {"image": pixels[None, None]}))


RUNNERS = {"onnxruntime": runtime, "reference": reference_runner}


def opencv(bank, pixels):
    """Border first, then filter2D (its WRAP exists only in copyMakeBorder)."""
    r = bank.radius
    mode = getattr(cv2, BORDERS[bank.border].opencv)
    working = bank.table.apply(pixels).astype(np.float64)
    padded = cv2.copyMakeBorder(working, r, r, r, r, mode, value=0)
    planes = [cv2.filter2D(padded, cv2.CV_64F, k.astype(np.float64)) for k in bank.taps]
    return np.stack(planes)[:, r : r + pixels.shape[0], r : r + pixels.shape[1]]


@pytest.mark.parametrize("runner", RUNNERS)
@pytest.mark.parametrize("border", BORDERS)
def test_impulse_at_the_centre_gives_the_flipped_kernel_exactly(border, runner):
    bank = make(border=border)
    pixels = np.zeros((15, 17), dtype=np.float32)
    pixels[6, 9] = 1
    (got,) = RUNNERS[runner](emit(bank).files["demo.onnx"])(pixels)
    wanted = np.zeros((6, 15, 17), dtype=np.float32)
    wanted[:, 3:10, 6:13] = bank.taps[:, ::-1, ::-1]
    assert np.array_equal(got, wanted)


@pytest.mark.parametrize("runner", RUNNERS)
@pytest.mark.parametrize("border", BORDERS)
@pytest.mark.parametrize("shape", [(7, 7), (8, 30), (23, 9)])
def test_noise_and_corners_agree_with_scipy_and_opencv(border, shape, runner):
    bank = make(border=border)
    pixels = picture(bank, shape)
    pixels[0, 0] = pixels[-1, -1] = pixels[0, -1] = 1
    wanted = exact(bank, pixels)
    np.testing.assert_allclose(opencv(bank, pixels), wanted, rtol=0, atol=1e-13)
    (got,) = RUNNERS[runner](emit(bank).files["demo.onnx"])(pixels)
    assert got.dtype == np.float32
    error = np.abs(got - wanted).max(axis=(1, 2))
    assert (error <= conv_bound(bank)).all()


@pytest.mark.parametrize("runner", RUNNERS)
def test_published_worked_arrays(runner):
    """Operator page of ONNX Conv: a 5 x 5 ramp under 3 x 3 ones with pads 1; the impulse
    through 1 .. 9 comes out as 9 .. 1."""
    ones_and_count = np.stack([np.ones((3, 3)), np.arange(1, 10).reshape(3, 3)])
    run = RUNNERS[runner](emit(make(border="zero", taps=ones_and_count)).files["demo.onnx"])
    (ramp,) = run(np.arange(25, dtype=np.float32).reshape(5, 5))
    assert ramp[0, 0].tolist() == [12, 21, 27, 33, 24]
    inner = [[54, 63, 72], [99, 108, 117], [144, 153, 162]]
    assert ramp[0, 1:-1, 1:-1].tolist() == inner
    impulse = np.zeros((5, 5), dtype=np.float32)
    impulse[2, 2] = 1
    assert run(impulse)[0][1, 1:-1, 1:-1].tolist() == [[9, 8, 7], [6, 5, 4], [3, 2, 1]]


@pytest.mark.parametrize("kind", ["identity", "stabilised"])
@pytest.mark.parametrize("pixels", FORMATS)
def test_working_values_are_the_tables_own_bits(pixels, kind):
    bank = make(pixels, kind, taps=np.ones((1, 1, 1)))
    codes = picture(bank, (40, 61))
    model = emit(bank).files["demo.onnx"]
    wanted = bank.table.apply(codes)
    assert np.array_equal(reference_runner(model)(codes)[0][0], wanted)
    got = runtime(model)(codes)[0][0]
    if pixels == "float32" and kind == "stabilised":  # some releases round the root badly
        np.testing.assert_allclose(got, wanted, rtol=ROOT_ROUNDINGS * 2.0**-24)
    else:
        assert np.array_equal(got, wanted)


@pytest.mark.parametrize("pixels", FORMATS)
def test_every_pixel_format_keeps_its_bound(pixels):
    bank = make(pixels, "stabilised")
    codes = picture(bank, (19, 24))
    (got,) = runtime(emit(bank).files["demo.onnx"])(codes)
    ratio = np.abs(got - exact(bank, codes)).max(axis=(1, 2)) / conv_bound(bank)
    assert ratio.max() <= 1
    assert ratio.max() > 1e-4  # measured about 0.01: the bound is not empty


@pytest.mark.parametrize("runner", RUNNERS)
def test_a_code_beyond_the_depth_is_refused(runner):
    run = RUNNERS[runner](emit(make("Mono10")).files["demo.onnx"])
    codes = np.zeros((9, 9), dtype=np.uint16)
    codes[4, 4] = 1023
    assert run(codes)[0].any()
    codes[4, 4] = 1024
    with pytest.raises(Exception, match=r"out of (data )?bounds"):
        run(codes)


def test_several_pictures_at_once():
    bank = make("Mono8")
    codes = np.stack([picture(bank, (11, 13), seed) for seed in range(3)])[:, None]
    session = onnxruntime.InferenceSession(
        emit(bank).files["demo.onnx"], providers=["CPUExecutionProvider"]
    )
    got = session.run(["responses"], {"image": codes})[0]
    assert got.shape == (3, 6, 11, 13)
    for one, answers in zip(codes[:, 0], got, strict=True):
        assert (np.abs(answers - exact(bank, one)).max(axis=(1, 2)) <= conv_bound(bank)).all()


@pytest.mark.parametrize("border", BORDERS)
def test_pictures_smaller_than_the_kernels(border):
    """From one more than the radius the rule still holds; below, nothing of the right size
    comes back unless it is right (mirror101 depends on the runtime there)."""
    bank = make(border=border)
    run = runtime(emit(bank).files["demo.onnx"])
    refused, answered = [], []
    for side in range(bank.radius + 1 if border == "mirror101" else 1, bank.size):
        pixels = picture(bank, (side, 9))
        try:
            (got,) = run(pixels)
        except Exception:
            refused.append(side)
            continue
        if got.shape == (6, side, 9):
            answered.append(side)
            padded = np.pad(pixels.astype(np.float64), 3, mode=BORDERS[border].numpy)
            wanted = np.stack(
                [ndimage.correlate(padded, k.astype(np.float64))[3:-3, 3:-3] for k in bank.taps]
            )
            assert (np.abs(got - wanted).max(axis=(1, 2)) <= conv_bound(bank)).all()
    assert set(answered) >= {4, 5, 6}
    assert all(side < bank.radius for side in refused)


@pytest.mark.parametrize("strength", ["step", "line", "energy"])
@pytest.mark.parametrize("runner", RUNNERS)
def test_edges_graph(strength, runner):
    """Two scales, orientation numbers with gaps, kernels in no order."""
    taps = np.random.default_rng(3).standard_normal((12, 5, 5))
    spots = [(s, p, o) for s in (0, 1) for p in ("odd", "even") for o in (0, 2, 5)]
    order = np.random.default_rng(4).permutation(12)
    kernels = tuple(
        Kernel(f"k{i}", "gabor", spots[i][1], spots[i][0], spots[i][2], {}, 1.0) for i in order
    )
    bank = Bank("demo", kernels, taps.astype(np.float32), table("Mono8"), strength=strength)
    codes = picture(bank, (16, 21))
    answers = exact(bank, codes)
    values, numbers = RUNNERS[runner](emit(bank).files["demo_edges.onnx"])(codes)
    assert values.dtype == np.float32
    assert numbers.dtype == np.uint8
    for scale in (0, 1):
        sizes = {}
        for turn in (0, 2, 5):
            plane = {p: answers[order.tolist().index(spots.index((scale, p, turn)))]
                     for p in ("odd", "even")}  # fmt: skip
            wanted = {"step": np.abs(plane["odd"]), "line": np.abs(plane["even"])}
            sizes[turn] = wanted.get(strength, np.hypot(plane["odd"], plane["even"]))
        largest = np.max(list(sizes.values()), axis=0)
        np.testing.assert_allclose(values[scale], largest, rtol=0, atol=2 * max(conv_bound(bank)))
        winner = np.array([0, 2, 5])[np.argmax(list(sizes.values()), axis=0)]
        assert np.array_equal(numbers[scale], winner)  # noise has no near ties here


def test_first_orientation_wins_a_tie():
    run = runtime(emit(make("Mono8")).files["demo_edges.onnx"])
    _, numbers = run(np.zeros((9, 9), dtype=np.uint8))
    assert not numbers.any()


def test_banks_without_strength_get_no_edges_graph():
    taps = np.ones((2, 3, 3), dtype=np.float32)
    given = tuple(Kernel(f"k{i}", "given", "none", None, None, {}, 1.0) for i in range(2))
    plain = emit(Bank("demo", given, taps, table("Mono8")))
    assert list(plain.files) == ["demo.onnx"]
    assert "belong to no scale" in plain.notes[0]
    even = tuple(Kernel(f"k{i}", "gd2", "even", 0, i, {}, 1.0) for i in range(2))
    assert "no odd kernel" in emit(Bank("demo", even, taps, table("Mono8"))).notes[0]
    assert len(emit(Bank("demo", even, taps, table("Mono8"), strength="line")).files) == 2


@pytest.mark.parametrize("border", BORDERS)
def test_the_border_is_a_step_of_its_own_and_pads_are_explicit(border):
    for data in emit(make(border=border)).files.values():
        model = onnx.load_model_from_string(data)
        onnx.checker.check_model(model, full_check=True)
        assert model.ir_version == 8
        assert [(o.domain, o.version) for o in model.opset_import] == [("", 17)]
        (conv,) = [n for n in model.graph.node if n.op_type == "Conv"]
        attributes = {a.name: onnx.helper.get_attribute_value(a) for a in conv.attribute}
        assert attributes["pads"] == [0, 0, 0, 0]
        assert "auto_pad" not in attributes
        ops = [n.op_type for n in model.graph.node]
        if border in ("mirror", "wrap"):
            assert ops.count("Slice") == 4
            assert "Pad" not in ops
        else:
            assert ops.count("Pad") == 1
        sizes = [
            d.dim_param or d.dim_value for d in model.graph.input[0].type.tensor_type.shape.dim
        ]
        assert sizes == ["N", 1, "H", "W"]


def test_taps_are_stored_bit_for_bit():
    bank = make("Mono12", "stabilised")
    model = onnx.load_model_from_string(emit(bank).files["demo.onnx"])
    arrays = {t.name: onnx.numpy_helper.to_array(t) for t in model.graph.initializer}
    assert arrays["kernels"].tobytes() == bank.taps.tobytes()
    assert arrays["input_table"].tobytes() == bank.table.values.tobytes()


def test_metadata():
    limits = Thresholds(np.array([10.0, 100]), np.array([5.1, 4.6]), np.ones(2), 0.7, 20.0, "white")
    bank = make("Mono12", "stabilised", border="edge", thresholds=limits)
    files = emit(bank, licence="Free for any use.").files
    props = {
        name: {p.key: p.value for p in onnx.load_model_from_string(data).metadata_props}
        for name, data in files.items()
    }
    plain, edges = props["demo.onnx"], props["demo_edges.onnx"]
    assert plain["patchlab.border"] == "edge"
    assert plain["patchlab.operation"] == "correlation"
    assert plain["patchlab.licence"] == edges["patchlab.licence"] == "Free for any use."
    assert plain["patchlab.input_table"] == "stabilised"
    assert json.loads(plain["patchlab.contract"])["pixels"] == "Mono12"
    assert json.loads(plain["patchlab.kernels"]) == [k.name for k in bank.kernels]
    assert json.loads(plain["patchlab.error_bound"]) == list(conv_bound(bank))
    assert json.loads(plain["patchlab.minimum_size"]) == 7
    assert json.loads(plain["patchlab.thresholds"])["strength"] == [5.1, 4.6]
    assert (
        json.loads(plain["patchlab.thresholds"])["groups_per_megapixel"] == limits.groups.tolist()
    )
    assert json.loads(plain["patchlab.line_thresholds"]) is None
    assert edges["patchlab.strength"] == "step"
    assert json.loads(edges["patchlab.scales"])[0]["kernels"] == ["k0", "k1", "k2"]


def test_same_bank_same_bytes_in_another_process():
    """Other hash seed, other process: nothing in the file may depend on it."""
    code = (
        "import hashlib, numpy as np\n"
        "from patchlab.export.onnx import emit\n"
        "from patchlab.types import *\n"
        "t = np.arange(256, dtype=np.float32)\n"
        "k = tuple(Kernel(f'k{i}', 'gd1', 'odd', 0, i, {}, 1.0) for i in range(2))\n"
        "table = InputTable('identity', InputContract('Mono8', 0, 255), t, None)\n"
        "taps = np.arange(18, dtype=np.float32).reshape(2, 3, 3)\n"
        "for name, data in sorted(emit(Bank('demo', k, taps, table)).files.items()):\n"
        "    print(name, hashlib.sha256(data).hexdigest())\n"
    )
    printed = {
        subprocess.run(
            [sys.executable, "-c", code],
            env={**os.environ, "PYTHONHASHSEED": seed},
            capture_output=True,
            text=True,
            check=True,
        ).stdout
        for seed in ("1", "2")
    }
    assert len(printed) == 1
    assert printed.pop().count("\n") == 2


def test_without_the_onnx_package_it_says_so(monkeypatch):
    monkeypatch.setitem(sys.modules, "onnx", None)
    made = emit(make())
    assert not made.files
    assert "onnx package is not installed" in made.notes[0]
