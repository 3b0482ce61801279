"""A bank meets pixels of its own kind or says so."""

from types import SimpleNamespace

import numpy as np
import pytest

from patchlab.errors import InputError, UsageError
from patchlab.pipeline.detect import _same_kind, raw_layout
from patchlab.types import Frame, InputContract


def of_plane(plane):
    return InputContract("Mono12", 64.0, 4095.0, "linear", plane)


@pytest.mark.parametrize(
    ("wanted", "given", "fits"),
    [
        ("", "", True),
        ("BayerRG green", "BayerRG green", True),
        ("BayerRG green", "BayerGB green", True),
        ("BayerRG luminance", "BayerBG luminance", True),
        ("BayerRG mosaic", "BayerRG mosaic", True),
        ("BayerRG mosaic", "BayerGR mosaic", False),
        ("BayerRG mosaic", "BayerRG green", False),
        ("BayerRG green", "", False),
        ("", "BayerRG green", False),
    ],
)
def test_a_plane_of_a_sensor_is_no_plain_picture(wanted, given, fits):
    bank = SimpleNamespace(contract=of_plane(wanted))
    frame = Frame("a.raw", np.zeros((4, 4), np.uint16), of_plane(given))
    if fits:
        assert _same_kind(bank, frame) is None
        return
    with pytest.raises(InputError) as refused:
        _same_kind(bank, frame)
    words = [p or "a picture without a colour pattern" for p in (wanted, given)]
    assert refused.value.what == f"the bank takes {words[0]}, this is {words[1]}"
    assert refused.value.where == "a.raw"


def test_the_layout_of_raw_buffers_is_given_whole():
    assert raw_layout(None, None, None) is None
    assert raw_layout("BayerRG12p", 8, 4).width == 8
    with pytest.raises(UsageError, match="go together"):
        raw_layout("Mono12p", 8, None)
    with pytest.raises(UsageError, match="unknown raw format"):
        raw_layout("Mono13", 8, 4)
