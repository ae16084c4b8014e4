"""The command line of fishplate: parsing, exit codes and rendering; the work is the library's."""

from __future__ import annotations

import sys

INTERRUPTED = 130


def main() -> None:
    """Run the command line, guarded from the first statement on."""
    try:
        from fishplate_cli.process import run  # noqa: PLC0415  an interrupt may come here already

        code = run(sys.argv[1:])
    except KeyboardInterrupt:
        code = INTERRUPTED
        if sys.stderr is not None:
            try:
                sys.stderr.write("fishplate: interrupted\n")
            except OSError:
                # Nobody can be told; the exit code says it.
                code = INTERRUPTED
    sys.exit(code)
