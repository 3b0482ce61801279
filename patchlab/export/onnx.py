"""The bank as ONNX graphs: the only door to the onnx package.

Two files, both for any height and width and any number of pictures:

``NAME.onnx``
    input ``image`` (N, 1, H, W) of the contract's pixels, or (N, H, W, 3) of interleaved colour;
    output ``responses`` (N, kernels, H, W) float32. Of a Bayer sensor the input is the mosaic
    and H, W count its cells.
``NAME_edges.onnx``
    the same input; outputs ``strength`` (N, scales, H, W) float32 and ``orientation``
    (N, scales, H, W) uint8, the number of the winning orientation; ties to the first.
    Written when every scale of the bank has the kernels that its strength needs.

Operator set 17 and IR version 8 are pinned, so runtimes of 2022 and later load them.
ONNX Conv is a correlation, as everywhere here. The border is a step of its own,
after the input table and before a Conv with explicit zero pads: the Pad operator
where it has the border's mode, Slice and Concat for ``mirror`` and ``wrap``, which
operator set 17 lacks. Nothing is ever replaced by something like it.

A picture must be at least as large as the kernels (``patchlab.minimum_size`` in the
file's metadata): ONNX has no way to refuse, so the caller has to look. Down to one
pixel more than the kernels' radius the answers are still the border rule's. Below
that ``mirror`` and ``wrap`` fail or give a picture of another size; for ``mirror101``
the runtime should refuse, which onnxruntime does today and did not in 1.18.
A pixel code beyond the contract's depth makes Gather fail.
"""

from __future__ import annotations

import json
from collections.abc import Callable, Mapping
from dataclasses import dataclass, field
from typing import Any

import numpy as np
from numpy.typing import NDArray

from patchlab import __version__
from patchlab.conventions import BORDERS, UNIT_ROUNDOFF, gamma
from patchlab.errors import UsageError
from patchlab.export.vectors import PARITIES, edges_lacking, orientations
from patchlab.store import LICENCE
from patchlab.types import F32, Bank, InputTable

OPSET = 17
IR_VERSION = 8
MISSING = (
    "the ONNX files were not written: the onnx package is not installed "
    "(python -m pip install onnx onnxruntime)"
)

Runner = Callable[[NDArray[Any]], tuple[NDArray[Any], ...]]
"""Takes one (h, w) plane of pixels, gives each output's (channels, h, w)."""


@dataclass(frozen=True)
class OnnxExport:
    """Files by name, and sentences about what was not written and why."""

    files: Mapping[str, bytes]
    notes: tuple[str, ...] = ()


def emit(bank: Bank, *, licence: str = LICENCE) -> OnnxExport:
    """Write the bank as ONNX: responses, and edges where the bank has them.

    Parameters
    ----------
    bank : Bank
    licence : the sentence that goes into each file's metadata

    Returns
    -------
    OnnxExport : ``NAME.onnx`` and ``NAME_edges.onnx``, checked by the onnx checker with
        full shape inference; the same bank gives the same bytes. Without the onnx package
        there are no files and a note says so.
    """
    try:
        import onnx  # noqa: F401 - only whether it is there
    except ImportError:
        return OnnxExport({}, (MISSING,))
    files = {f"{bank.name}.onnx": _responses_model(bank, licence)}
    lacking = edges_lacking(bank)
    if lacking:
        return OnnxExport(files, (f"no ONNX graph for edges: {lacking}",))
    return OnnxExport({**files, f"{bank.name}_edges.onnx": _edges_model(bank, licence)})


ROOT_ROUNDINGS = 5
"""Roundings that the root formula may differ by between runtimes: two for the argument, two
for a square root that is right to one unit in the last place only, one for the scale."""


def conv_bound(bank: Bank) -> tuple[float, ...]:
    """For each kernel, the largest error of a float32 sum of products in any order.

    ``gamma(taps that are not zero) * sum|k| * span`` covers every order of summation, with
    fused multiply-add or without (Higham 2002, section 3.1), so it holds for any ONNX
    runtime that multiplies and adds in float32. Float pixels under the root formula add
    :data:`ROOT_ROUNDINGS`, because not every runtime rounds a square root correctly
    (onnxruntime 1.18 does not); mixing working planes of C samples adds C. A runtime that
    fuses the formula's product and sum keeps the bound where ``offset`` is not negative.
    """
    count = np.count_nonzero(bank.taps.reshape(len(bank), -1), axis=1)
    root = bank.table.values is None and bank.table.kind == "stabilised"
    more = ROOT_ROUNDINGS if root else 0 if bank.mix is None else bank.mix.shape[1]
    return tuple(
        gamma(max(int(n), 1) + more) * float(reach) * bank.table.span
        for n, reach in zip(count, bank.reach, strict=True)
    )


# ---------------------------------------------------------------- graphs


@dataclass
class _Graph:
    """Nodes and constants as they are added; every result is named after its node."""

    nodes: list[Any] = field(default_factory=list)
    constants: list[Any] = field(default_factory=list)

    def constant(self, name: str, values: Any, dtype: str) -> str:
        from onnx import numpy_helper

        array = np.ascontiguousarray(values, dtype=dtype)
        self.constants.append(numpy_helper.from_array(array, name))
        return name

    def add(self, op: str, name: str, *inputs: str, **attributes: Any) -> str:
        self.split(op, (name,), *inputs, **attributes)
        return name

    def split(self, op: str, names: tuple[str, ...], *inputs: str, **attributes: Any) -> None:
        from onnx import helper

        self.nodes.append(helper.make_node(op, inputs, names, name=names[0], **attributes))


def _working_values(graph: _Graph, table: InputTable) -> str:
    """Pixel codes to working values: the table as Gather, or the root formula.

    The formula takes the steps of ``InputTable.apply`` in the same order and precision, so
    a runtime that rounds every step correctly gives the same bits.
    """
    from onnx import TensorProto

    if table.values is not None:
        index = graph.add("Cast", "code", "image", to=TensorProto.INT32)
        values = graph.constant("input_table", table.values, "float32")
        return graph.add("Gather", "working", values, index, axis=0)
    if table.kind == "identity":
        return "image"
    for name in ("slope", "offset", "scale"):
        graph.constant(name, np.float32(getattr(table, name)), "float32")
    sloped = graph.add("Mul", "sloped", "image", "slope")
    shifted = graph.add("Add", "shifted", sloped, "offset")
    floor = graph.constant("floor", np.float32(0), "float32")
    root = graph.add("Sqrt", "root", graph.add("Max", "floored", shifted, floor))
    return graph.add("Mul", "working", root, "scale")


def _bordered(graph: _Graph, plane: str, border: str, radius: int) -> str:
    """Extend a plane by ``radius`` on all four sides, exactly as the border rule says."""
    if radius == 0:
        return plane
    mode = BORDERS[border].onnx
    if mode is not None:
        inputs = [graph.constant("margins", [0, 0, radius, radius] * 2, "int64")]
        if mode == "constant":
            inputs.append(graph.constant("outside", np.float32(0), "float32"))
        return graph.add("Pad", "bordered", plane, *inputs, mode=mode)
    for axis, side in ((2, "rows"), (3, "columns")):
        plane = _extended(graph, plane, border, radius, axis, side)
    return plane


_END = np.iinfo(np.int64).max


def _extended(graph: _Graph, plane: str, border: str, radius: int, axis: int, side: str) -> str:
    """One axis of ``mirror`` (first and last lines reversed) or ``wrap`` (last, then first)."""
    ranges = {
        # first and last line that Slice takes (the end is not taken itself), and its step
        "mirror": ((radius - 1, -_END, -1), (-1, -radius - 1, -1)),
        "wrap": ((-radius, _END, 1), (0, radius, 1)),
    }
    if border not in ranges:
        raise UsageError(f"the border {border!r} cannot be written as ONNX")
    strips = []
    for end, (start, stop, step) in zip(("before", "after"), ranges[border], strict=True):
        name = f"{side}_{end}"
        numbers = {"start": start, "stop": stop, "axis": axis, "step": step}
        inputs = [graph.constant(f"{name}_{k}", [v], "int64") for k, v in numbers.items()]
        strips.append(graph.add("Slice", name, plane, *inputs))
    return graph.add("Concat", f"{side}_bordered", strips[0], plane, strips[1], axis=axis)


def _with_planes(taps: F32) -> F32:
    """Kernels (n, h, h, planes), with a last axis of length 1 for one plane."""
    return taps[..., None] if taps.ndim == 3 else taps


def _planes(graph: _Graph, bank: Bank, tabled: str) -> str:
    """Working planes (N, planes, H, W) of the tabled samples; one plane is as it is."""
    form = bank.contract.format
    if form.planes == 1:
        return tabled
    if form.interleaved:
        samples = graph.add("Transpose", "samples", tabled, perm=[0, 3, 1, 2])
    else:  # a cell's samples in the order of its rows
        samples = graph.add("SpaceToDepth", "samples", tabled, blocksize=form.cell)
    if bank.mix is None:
        return samples
    mix = graph.constant("mix", bank.mix[:, :, None, None], "float32")
    return graph.add("Conv", "planes", samples, mix, kernel_shape=[1, 1], pads=[0] * 4)


def _correlated(graph: _Graph, bank: Bank, taps: F32, name: str) -> str:
    planes = _planes(graph, bank, _working_values(graph, bank.table))
    plane = _bordered(graph, planes, bank.border, bank.radius)
    kernels = graph.constant("kernels", np.moveaxis(_with_planes(taps), -1, 1), "float32")
    return graph.add(
        "Conv", name, plane, kernels, kernel_shape=[bank.size] * 2, pads=[0] * 4, strides=[1, 1]
    )


def _responses_model(bank: Bank, licence: str) -> bytes:
    graph = _Graph()
    _correlated(graph, bank, bank.taps, "responses")
    about = {"kernels": [k.name for k in bank.kernels], "error_bound": conv_bound(bank)}
    outputs = {"responses": ("float32", len(bank))}
    doc = "Correlation of the tabled picture with each kernel."
    return _finish(graph, bank, bank.name, outputs, doc, {**about, "licence": licence})


def _edges_model(bank: Bank, licence: str) -> bytes:
    """Strength per scale and the number of the winning orientation."""
    parts = [bank.members(s, p) for p in PARITIES[bank.strength] for s in bank.scales]
    counts = [len(bank.members(s, PARITIES[bank.strength][0])) for s in bank.scales]
    graph = _Graph()
    size = _correlated(graph, bank, bank.taps[[i for part in parts for i in part]], "filtered")
    if bank.strength == "energy":
        squared = graph.add("Mul", "squared", size, size)
        halves = graph.constant("halves", [sum(counts)] * 2, "int64")
        graph.split("Split", ("odd_power", "even_power"), squared, halves, axis=1)
        size = graph.add("Sqrt", "size", graph.add("Add", "power", "odd_power", "even_power"))
    else:
        size = graph.add("Abs", "size", size)
    names = tuple(f"scale_{s}" for s in bank.scales)
    graph.split("Split", names, size, graph.constant("counts", counts, "int64"), axis=1)
    best = [graph.add("ReduceMax", f"{n}_strength", n, axes=[1], keepdims=1) for n in names]
    winners = [
        _winner(graph, n, orientations(bank, s)) for n, s in zip(names, bank.scales, strict=True)
    ]
    graph.add("Concat", "strength", *best, axis=1)
    graph.add("Concat", "orientation", *winners, axis=1)
    about = {"scales": _scales(bank), "strength": bank.strength, "licence": licence}
    outputs = {"strength": ("float32", len(names)), "orientation": ("uint8", len(names))}
    doc = f"Edge strength ({bank.strength}) and winning orientation of each scale."
    return _finish(graph, bank, f"{bank.name}_edges", outputs, doc, about)


def _winner(graph: _Graph, sizes: str, numbers: tuple[int, ...]) -> str:
    """The orientation number of the largest channel, the first among equals."""
    from onnx import TensorProto

    place = graph.add("ArgMax", f"{sizes}_place", sizes, axis=1, keepdims=1)
    if numbers != tuple(range(len(numbers))):
        table = graph.constant(f"{sizes}_numbers", numbers, "int64")
        place = graph.add("Gather", f"{sizes}_number", table, place, axis=0)
    return graph.add("Cast", f"{sizes}_orientation", place, to=TensorProto.UINT8)


def _scales(bank: Bank) -> list[dict[str, Any]]:
    """For people and programs: what each scale's orientation numbers stand for."""
    found = []
    for scale in bank.scales:
        members = [bank.kernels[i] for i in bank.members(scale, PARITIES[bank.strength][0])]
        found.append(
            {
                "scale": scale,
                "kernels": [k.name for k in members],
                "orientation": orientations(bank, scale),
                "theta_rad": [k.parameters.get("theta_rad") for k in members],
            }
        )
    return found


def _finish(
    graph: _Graph,
    bank: Bank,
    name: str,
    outputs: Mapping[str, tuple[str, int]],
    doc: str,
    about: Mapping[str, Any],
) -> bytes:
    import onnx
    from onnx import helper

    def plane(label: str, dtype: str, channels: int) -> Any:
        kind = helper.np_dtype_to_tensor_dtype(np.dtype(dtype))
        return helper.make_tensor_value_info(label, kind, ["N", channels, "H", "W"])

    form = bank.contract.format
    image = plane("image", form.dtype, 1)
    if form.planes > 1:
        shape = ["N", "H", "W", form.planes] if form.interleaved else ["N", 1, "rows", "columns"]
        kind = helper.np_dtype_to_tensor_dtype(np.dtype(form.dtype))
        image = helper.make_tensor_value_info("image", kind, shape)
    inside = helper.make_graph(
        graph.nodes,
        name,
        [image],
        [plane(label, *what) for label, what in outputs.items()],
        graph.constants,
        doc_string=doc,
    )
    model = helper.make_model(
        inside,
        opset_imports=[helper.make_opsetid("", OPSET)],
        ir_version=IR_VERSION,
        producer_name="patchlab",
        producer_version=__version__,
        doc_string=f"{doc} {about['licence']}",
    )
    helper.set_model_props(model, _metadata(bank, about))
    onnx.checker.check_model(model, full_check=True)
    return bytes(model.SerializeToString(deterministic=True))


def _metadata(bank: Bank, about: Mapping[str, Any]) -> dict[str, str]:
    """Sorted text entries; everything but plain words is JSON."""
    contract, limits = bank.contract, bank.thresholds
    entries: dict[str, Any] = {
        "bank": bank.name,
        "border": bank.border,
        "contract": {
            "pixels": contract.pixels,
            "black": contract.black,
            "white": contract.white,
            "transfer": contract.transfer,
            "plane": contract.plane,
        },
        "input_table": bank.table.kind,
        "minimum_size": bank.size,
        "noise_sd": bank.table.noise_sd,
        "operation": "correlation",
        "patchlab": __version__,
        "thresholds": limits and {
            "false_edges_per_megapixel": limits.rate.tolist(),
            "strength": limits.strength.tolist(),
            "groups_per_megapixel": limits.groups.tolist(),
            "hysteresis": limits.hysteresis,
        },
        "line_thresholds": bank.line_thresholds and bank.line_thresholds.strength.tolist(),
        "unit_roundoff": UNIT_ROUNDOFF,
        **about,
    }  # fmt: skip
    return {
        f"patchlab.{key}": value if isinstance(value, str) else json.dumps(value, sort_keys=True)
        for key, value in sorted(entries.items())
    }


# ---------------------------------------------------------------- reading back


def fed(pixels: NDArray[Any]) -> NDArray[Any]:
    """One picture as the graph's input: (1, 1, H, W), or (1, H, W, samples) where interleaved."""
    return pixels[None, None] if pixels.ndim == 2 else pixels[None]


def reference_runner(model: bytes) -> Runner:
    """Run a graph by the onnx package's own reference evaluator (plain numpy, slow).

    Raises
    ------
    UsageError : the onnx package is not installed.
    """
    try:
        import onnx
        from onnx.reference import ReferenceEvaluator
    except ImportError:
        raise UsageError("the onnx package is not installed") from None
    session = ReferenceEvaluator(onnx.load_model_from_string(model))

    def run(pixels: NDArray[Any]) -> tuple[NDArray[Any], ...]:
        return tuple(np.asarray(out)[0] for out in session.run(None, {"image": fed(pixels)}))

    return run
