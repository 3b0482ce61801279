"""The house keeps its floors: imports go down only, no stage imports another."""

import ast
import subprocess
import sys
from pathlib import Path

import pytest

import patchlab

ROOT = Path(patchlab.__file__).parent
STAGES = {"images", "camera", "learn", "shapes", "bank", "edges", "export"}
FLOOR = dict.fromkeys(("errors", "conventions", "types", "families", "_jit", "settings"), 0)
FLOOR |= dict.fromkeys(("store", "workers", "progress"), 1)
FLOOR |= dict.fromkeys(STAGES, 2)
FLOOR |= {"pipeline": 3, "report": 4, "cli": 5}
DOORS = {
    "numba": {"_jit.py"},
    "onnx": {"export/onnx.py"},
    "onnxruntime": {"export/verify.py", "export/bench.py"},
    "cv2": {"export/bench.py"},
    "PIL": {"images/decode.py", "images/scenes.py", "report/mosaic.py"},
    "imageio": {"images/decode.py"},
    "tifffile": {"images/decode.py"},
    "rawpy": {"images/extras.py"},
    "av": {"images/extras.py"},
    "pyarrow": {"pipeline/edgel_table.py"},
    "click": {"cli/"},
    "rich": {"cli/"},
    "matplotlib": {"report/"},
    "jinja2": {"report/"},
    "sklearn": {"learn/"},
}
MODULES = sorted(ROOT.rglob("*.py"))


def imports(path: Path) -> set[str]:
    """Every module a file imports, as dotted names."""
    found = set()
    for node in ast.walk(ast.parse(path.read_text(encoding="utf-8"))):
        if isinstance(node, ast.Import):
            found |= {alias.name for alias in node.names}
        elif isinstance(node, ast.ImportFrom):
            assert node.level == 0, f"{path}: imports are absolute"
            if node.module == "patchlab":
                found |= {f"patchlab.{alias.name}" for alias in node.names}
            else:
                found.add(node.module or "")
    return found


def room(path: Path) -> str:
    """The floor plan's name of the room that a file stands in."""
    return path.relative_to(ROOT).parts[0].removesuffix(".py")


@pytest.mark.parametrize("path", MODULES, ids=lambda p: str(p.relative_to(ROOT)))
def test_imports_go_down_only(path):
    here = room(path)
    if here in ("__init__", "__main__"):
        return
    assert here in FLOOR, f"{here} has no floor: add it to the plan"
    for name in imports(path):
        if not name.startswith("patchlab."):
            continue
        there = name.split(".")[1]
        if there in (here, "__version__"):
            continue
        assert FLOOR[there] < FLOOR[here] or (FLOOR[there] == FLOOR[here] < 2), (
            f"{path.relative_to(ROOT)} imports {name}"
        )


@pytest.mark.parametrize("path", MODULES, ids=lambda p: str(p.relative_to(ROOT)))
def test_third_parties_come_in_by_their_door(path):
    relative = path.relative_to(ROOT).as_posix()
    for name in imports(path):
        doors = DOORS.get(name.split(".")[0])
        assert doors is None or any(relative.startswith(d) for d in doors), f"{relative}: {name}"


def test_the_layer_check_sees_an_import_between_stages(tmp_path):
    bad = tmp_path / "bad.py"
    bad.write_text("def f():\n    from patchlab.learn import ica\n")
    assert "patchlab.learn" in imports(bad)


def test_import_is_quick_because_it_pulls_in_little():
    code = (
        "import sys; import patchlab; "
        "print(*sorted({m.split('.')[0] for m in sys.modules} "
        "& {'numba', 'sklearn', 'skimage', 'matplotlib', 'rich', 'click', 'onnx', 'scipy'}))"
    )
    done = subprocess.run([sys.executable, "-c", code], capture_output=True, text=True, check=True)
    assert done.stdout.split() == []


def test_help_pulls_in_no_heavy_library():
    code = (
        "import sys\nfrom patchlab.cli import main\n"
        "try:\n    main(['--help'])\nexcept SystemExit as end:\n    assert end.code == 0\n"
        "heavy = {m.split('.')[0] for m in sys.modules} "
        "& {'numba', 'sklearn', 'skimage', 'matplotlib', 'onnx', 'scipy', 'jinja2'}\n"
        "assert not heavy, heavy\n"
    )
    done = subprocess.run([sys.executable, "-c", code], capture_output=True, text=True)
    assert done.returncode == 0, done.stderr
    assert "run" in done.stdout


def test_every_public_function_says_what_it_does():
    silent = []
    for path in MODULES:
        tree = ast.parse(path.read_text(encoding="utf-8"))
        for node in ast.walk(tree):
            if isinstance(node, ast.FunctionDef | ast.ClassDef) and not node.name.startswith("_"):
                top = node in tree.body
                if top and not ast.get_docstring(node):
                    silent.append(f"{path.relative_to(ROOT)}:{node.name}")
    assert silent == []
