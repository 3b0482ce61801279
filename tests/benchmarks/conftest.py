"""The scripts here are run by people, not collected."""

collect_ignore_glob = ["*.py"]
