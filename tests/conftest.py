"""House rules of the tests: drawn examples are the same in every run, without a time limit."""

import os

from hypothesis import settings

settings.register_profile("house", deadline=None, derandomize="PATCHLAB_FUZZ" not in os.environ)
settings.load_profile("house")
