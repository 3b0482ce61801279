"""Stopping the command line: Ctrl-C and SIGTERM at any time, and what a run warns of."""

import shlex
import signal
import subprocess
import sys
import time

import pytest
from click.testing import CliRunner

from patchlab.cli.commands import patchlab
from patchlab.cli.making import _warn_of
from patchlab.cli.stopping import Stop
from patchlab.cli.terminal import Terminal
from patchlab.errors import Interrupted
from patchlab.images import make_sample_images

SLOW_IMPORT = """
import os, signal, sys, time
class Slow:
    def find_spec(self, name, path=None, target=None):
        if name == {module!r}:
            print("here", flush=True)
            time.sleep(60)
sys.meta_path.insert(0, Slow())
from patchlab.cli import main
sys.argv = ["patchlab", "run", "nowhere", "-o", {out!r}]
main()
"""


def child(code, **kwargs):
    """A Python process that has printed its first line."""
    process = subprocess.Popen(
        [sys.executable, "-c", code],
        stdout=subprocess.PIPE,
        stderr=subprocess.PIPE,
        text=True,
        **kwargs,
    )
    assert process.stdout.readline().strip() == "here"
    return process


@pytest.mark.parametrize(("number", "code"), [(signal.SIGINT, 130), (signal.SIGTERM, 143)])
@pytest.mark.parametrize("module", ["click", "patchlab.pipeline"])
def test_a_stop_while_modules_load_ends_in_one_sentence(tmp_path, module, number, code):
    process = child(SLOW_IMPORT.format(module=module, out=str(tmp_path / "my out")))
    process.send_signal(number)
    _, said = process.communicate(timeout=30)
    assert process.returncode == code
    assert len(said.split("\n")) <= 3
    assert said.strip().startswith("patchlab: stopped at once; finished stages are kept")
    assert len(said.strip().splitlines()) == 1


STUBBORN = """
import signal, sys, time
import patchlab.cli
def call(stop):
    if {notice}:
        stop.notice = lambda: print("asked", flush=True)
    signal.pthread_sigmask(signal.SIG_BLOCK, [signal.SIGINT])
    print("here", flush=True)
    while True:
        try:
            signal.pthread_sigmask(signal.SIG_UNBLOCK, [signal.SIGINT])
            time.sleep(60)
        except KeyboardInterrupt:
            if not {swallow}:
                raise
            signal.pthread_sigmask(signal.SIG_BLOCK, [signal.SIGINT])
            print("swallowed", flush=True)
patchlab.cli._call = call
sys.argv = ["patchlab"]
patchlab.cli.main()
"""


@pytest.mark.parametrize(
    ("notice", "swallow", "answers"),
    [(True, False, ["asked"]), (False, True, ["swallowed", "swallowed"])],
)
def test_ctrl_c_again_ends_it_whatever_it_does(notice, swallow, answers):
    process = child(STUBBORN.format(notice=notice, swallow=swallow))
    for answer in answers:
        process.send_signal(signal.SIGINT)
        assert process.stdout.readline().strip() == answer
    process.send_signal(signal.SIGINT)
    _, said = process.communicate(timeout=30)
    assert process.returncode == 130
    assert said == "patchlab: stopped at once; finished stages are kept\n"


LEAVING = """
import sys, time
import patchlab.cli
from patchlab.errors import Interrupted
from patchlab.workers import map_ordered
def call(stop):
    stop.notice = lambda: None
    busy = map_ordered(time.sleep, [0, 0, 90, 90], jobs=2)
    next(busy), next(busy)
    print("here", flush=True)
    while not stop.asked:
        time.sleep(0.01)
    busy.close()
    raise Interrupted("stopped during sleep")
patchlab.cli._call = call
sys.argv = ["patchlab"]
patchlab.cli.main()
"""


def test_ctrl_c_again_does_not_wait_for_workers_once_all_is_said():
    process = child(LEAVING)
    process.send_signal(signal.SIGINT)
    assert process.stderr.readline() == "patchlab: stopped during sleep\n"
    time.sleep(0.5)  # most often it waits for its workers by then; either way it ends
    process.send_signal(signal.SIGINT)
    process.communicate(timeout=60)  # the workers sleep for longer
    assert process.returncode == 130


def test_sigterm_ends_a_run_in_good_order_and_tells_the_command_as_typed(tmp_path):
    photos, out = tmp_path / "my photos", tmp_path / "an out"
    make_sample_images(photos, 6)
    words = ["run", str(photos), "-o", str(out), "--patches", "3000", "--restarts", "1",
             "--jobs", "1", "--name", "k2"]  # fmt: skip
    process = subprocess.Popen(
        [sys.executable, "-m", "patchlab", *words], stderr=subprocess.PIPE, text=True
    )
    deadline = time.monotonic() + 120
    while not (out / "survey").is_dir() and time.monotonic() < deadline:
        time.sleep(0.02)
    process.terminate()
    _, said = process.communicate(timeout=120)
    assert process.returncode == 143
    assert "Traceback" not in said
    last = said.strip().splitlines()[-1]
    assert "finished stages are kept; go on with: " in last
    assert shlex.split(last.split("go on with: ")[1]) == ["patchlab", *words, "--resume"]
    assert (out / "survey" / "manifest.json").is_file()


def test_the_resume_words_stand_before_a_double_dash_and_once():
    typed = ["run", "--force", "-o", "it's", "--resume", "--", "-photos"]
    words = shlex.split(Stop(typed).resume_words())
    assert words == ["patchlab", "run", "-o", "it's", "--resume", "--", "-photos"]


def test_a_stop_asked_for_before_the_work_keeps_it_from_beginning():
    stop = Stop()
    terminal = Terminal(stop=stop)
    with terminal.working():
        assert stop.notice is not None
        terminal("survey", 1, 2)
        stop.asked = signal.SIGINT
        with pytest.raises(Interrupted, match="stopped during survey; finished stages are kept"):
            terminal("survey", 2, 2)
    assert stop.notice is None
    with pytest.raises(Interrupted, match="before the work began"), terminal.working():
        raise AssertionError("it began")


def test_warnings_and_unusable_files_are_told_even_under_quiet(tmp_path):
    photos, out = tmp_path / "photos", tmp_path / "out"
    make_sample_images(photos, 4)
    for k in range(12):
        (photos / f"bad{k:02}.png").write_bytes(b"not a picture %d" % k)
    done = CliRunner().invoke(
        patchlab, ["survey", str(photos), "-o", str(out), "-q", "--max-bad", "0.9", "--jobs", "1"]
    )
    assert done.exit_code == 0, done.output
    lines = done.stderr.splitlines()
    assert [line.split(": ")[2] for line in lines[:10]] == [f"bad{k:02}.png" for k in range(10)]
    assert all(
        line.startswith("patchlab: warning: ") and line.split(": ")[3] for line in lines[:10]
    )
    assert lines[10:] == ["patchlab: warning: and 2 more files that could not serve"]


def test_each_warning_of_a_result_is_told(tmp_path, monkeypatch, capsys):
    from patchlab import store

    monkeypatch.setattr(store, "read_manifest", lambda *a: {"photos": {"quarantined": []}})
    _warn_of({"warnings": ["not converged", "too small"]}, tmp_path, Terminal(quiet=True))
    assert capsys.readouterr().err.splitlines() == [
        "patchlab: warning: not converged",
        "patchlab: warning: too small",
    ]


def test_the_help_prints_whole_numbers_whole():
    text = " ".join(CliRunner().invoke(patchlab, ["run", "--help"]).output.split())
    assert "(0 to 2147483647)" in text
    assert "(500 to 10000000)" in text
    assert "(0.1 to 1000)" in text
    assert "e+" not in text
