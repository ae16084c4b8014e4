"""The command line as a process: its streams, and an exit code whatever becomes of it.

Standard error may be closed or full: that changes no exit code. Imports nothing large, so that
`--version` is answered at once.
"""

from __future__ import annotations

import io
import os
import sys
from contextlib import contextmanager
from typing import TYPE_CHECKING, Any

import fishplate
from fishplate_cli import INTERRUPTED

if TYPE_CHECKING:
    from collections.abc import Iterator

OWN_FAILURE = 70
NOT_WRITTEN = 74
NO_READER = 141
DEBUG = "FISHPLATE_DEBUG"
LONGEST_REASON = 200


class Ended(Exception):
    """The command is over; `code` says how it ended."""

    def __init__(self, code: int) -> None:
        super().__init__()
        self.code = code


class _Careful(io.FileIO):
    """A file that what cannot be written is lost to: nothing is raised, and nothing is kept."""

    def write(self, data: Any) -> int:
        try:
            written = super().write(data)
        except OSError:
            return len(data)
        return len(data) if written is None else written


def run(arguments: list[str]) -> int:
    """Run the command line with these arguments; return the exit code."""
    _set_up_errors()
    if sys.stdout is None:
        sys.stderr.write("fishplate: standard output is closed\n")
        return NOT_WRITTEN
    _set_up(sys.stdout)
    try:
        with outside_failures():
            code = _answered(arguments)
            sys.stdout.flush()
    except Ended as end:
        return end.code
    except Exception as error:
        if os.environ.get(DEBUG):
            raise
        kind = type(error).__name__
        text = " ".join(str(error).split())[:LONGEST_REASON]
        sys.stderr.write(
            f"fishplate: this is a fault of fishplate, please report it: {kind}: {text} "
            f"({DEBUG}=1 shows where)\n"
        )
        return OWN_FAILURE
    return code


def _answered(arguments: list[str]) -> int:
    """Answer `--version` before anything else is imported, and everything else."""
    if arguments[:1] == ["--version"]:
        sys.stdout.write(f"fishplate {fishplate.__version__}\n")
        return 0
    from fishplate_cli.app import app  # noqa: PLC0415  loads typer

    try:
        app(args=arguments, prog_name="fishplate")
    except SystemExit as end:
        return end.code if isinstance(end.code, int) else 0
    return 0


@contextmanager
def outside_failures() -> Iterator[None]:
    """Turn what the world outside does to a running command into one line and `Ended`."""
    try:
        yield
    except BrokenPipeError:
        _end_output()
        raise Ended(NO_READER) from None
    except KeyboardInterrupt:
        sys.stderr.write("fishplate: interrupted\n")
        raise Ended(INTERRUPTED) from None
    except OSError as error:
        _end_output()
        sys.stderr.write(f"fishplate: {error.strerror or error}\n")
        raise Ended(NOT_WRITTEN) from None


def _set_up(stream: Any) -> None:
    """Write UTF-8 to files and pipes, and what the terminal cannot show as escapes."""
    if hasattr(stream, "reconfigure"):
        encoding = None if stream.isatty() else "utf-8"
        stream.reconfigure(encoding=encoding, errors="backslashreplace")


def _set_up_errors() -> None:
    """Let standard error take everything, be it closed, full or without a reader."""
    if sys.stderr is None:
        sys.stderr = open(os.devnull, "w", encoding="utf-8")  # noqa: PTH123, SIM115  to the end
        return
    try:
        number = sys.stderr.fileno()
    except (OSError, ValueError):
        # No file behind it: then nothing can be full.
        return
    sys.stderr = io.TextIOWrapper(
        io.BufferedWriter(_Careful(number, "w", closefd=False)),
        encoding=sys.stderr.encoding,
        errors="backslashreplace",
        line_buffering=True,
    )


def _end_output() -> None:
    """Give standard output somewhere to go, so that nothing complains at the very end."""
    try:
        nowhere = os.open(os.devnull, os.O_WRONLY)
        os.dup2(nowhere, sys.stdout.fileno())
    except (OSError, ValueError):
        # No file behind standard output: then nothing can complain either.
        return
