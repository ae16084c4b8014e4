"""The command line of fishplate: parsing, exit codes and rendering; the work is the library's."""

from __future__ import annotations

import sys

import fishplate


def main() -> None:
    """Run the command line; `--version` is answered before anything else is imported."""
    if sys.argv[1:2] == ["--version"]:
        sys.stdout.write(f"fishplate {fishplate.__version__}\n")
        return
    from fishplate_cli.app import run  # noqa: PLC0415  loads typer

    sys.exit(run(sys.argv[1:]))
