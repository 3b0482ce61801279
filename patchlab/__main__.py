"""``python -m patchlab`` is the command line."""

from patchlab.cli import main

if __name__ == "__main__":
    main()
