"""Links in a folder of photographs."""

import json

import numpy as np
import pytest
from PIL import Image

from patchlab.cli import main
from patchlab.images import list_photos


@pytest.fixture
def home(tmp_path):
    for place in ("photos/sub", "elsewhere"):
        (tmp_path / place).mkdir(parents=True)
    for k, name in enumerate(("photos/a.png", "photos/sub/b.png", "elsewhere/c.png")):
        Image.fromarray(np.full((40, 40), 60 + k, np.uint8)).save(tmp_path / name)
    return tmp_path


def test_links_that_lead_out_are_passed_over_and_counted(home):
    photos = home / "photos"
    (photos / "one.png").symlink_to(home / "elsewhere/c.png")
    (photos / "two").symlink_to(home / "elsewhere", target_is_directory=True)
    (photos / "gone.png").symlink_to(home / "elsewhere/nothing.png")
    (photos / "within.png").symlink_to("sub/b.png")
    listing = list_photos(photos)
    assert listing.files == ("a.png", "sub/b.png", "within.png")
    assert listing.outside == 3


def test_a_link_to_the_folder_itself_is_no_way_out(home):
    (home / "link").symlink_to(home / "photos", target_is_directory=True)
    listing = list_photos(home / "link")
    assert listing.files == ("a.png", "sub/b.png")
    assert listing.outside == 0


def test_a_person_is_told_of_them(home, capsys):
    (home / "photos/one.png").symlink_to(home / "elsewhere/c.png")
    with pytest.raises(SystemExit) as stop:
        main(["survey", str(home / "photos"), "--dry-run", "--json"])
    assert stop.value.code == 0
    assert json.loads(capsys.readouterr().out)["outside"] == 1
