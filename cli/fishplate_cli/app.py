"""The application: which commands there are, and what happens when one of them fails.

Exit codes: 2 wrong usage; else 3 when some input could not be read or written as asked (the rest
is done); else 0. 1 is kept for findings. 70 means that fishplate itself failed, 74 that output
could not be written, 130 an interrupt, 141 that whoever reads the output wants no more.
"""

from __future__ import annotations

import os
import sys
from contextlib import contextmanager
from importlib import import_module
from typing import TYPE_CHECKING, Annotated, Any

import typer
from typer.core import TyperGroup

import fishplate
from fishplate_cli.words import CAUTION, EXAMPLES, OVERVIEW, SHORT

if TYPE_CHECKING:
    from collections.abc import Iterator

COMMANDS = ("decode", "encode", "fields", "list", "about")
MODULES = {"list": "listing"}
"""Where a command is defined, when the module does not bear its name."""

OWN_FAILURE = 70
NOT_WRITTEN = 74
INTERRUPTED = 130
NO_READER = 141
DEBUG = "FISHPLATE_DEBUG"
SETTINGS = {"help_option_names": ["--help", "-h"]}


class Commands(TyperGroup):
    """Commands that are imported when they are called, or when help is asked for."""

    def list_commands(self, ctx: Any) -> list[str]:  # noqa: ARG002, D102
        return list(COMMANDS)

    def get_command(self, ctx: Any, cmd_name: str) -> Any:  # noqa: ARG002, D102
        if cmd_name not in COMMANDS:
            return None
        module = import_module(f"fishplate_cli.{MODULES.get(cmd_name, cmd_name)}")
        alone = typer.Typer(add_completion=False, rich_markup_mode=None)
        alone.command(
            cmd_name,
            help=f"{module.HELP}\n\n\b\nExamples:\n{EXAMPLES[cmd_name]}",
            short_help=SHORT[cmd_name],
            epilog=CAUTION,
            no_args_is_help=True,
            context_settings=SETTINGS,
        )(module.command)
        return typer.main.get_command(alone)

    def invoke(self, ctx: Any) -> Any:  # noqa: D102
        with _failures_in_one_line():
            return super().invoke(ctx)


app = typer.Typer(
    cls=Commands,
    add_completion=False,
    rich_markup_mode=None,
    pretty_exceptions_enable=False,
    no_args_is_help=True,
    epilog=CAUTION,
    context_settings=SETTINGS,
)


def _answer_version(value: bool) -> None:
    if value:
        sys.stdout.write(f"fishplate {fishplate.__version__}\n")
        raise typer.Exit


@app.callback(help=OVERVIEW)
def fishplate_command(
    *,
    version: Annotated[
        bool,
        typer.Option(
            "--version", is_eager=True, callback=_answer_version, help="Say which version."
        ),
    ] = False,
) -> None:
    """Do what comes before every command: nothing."""


def run(arguments: list[str]) -> int:
    """Run the command line with these arguments; return the exit code."""
    if sys.stdout is None:
        return NOT_WRITTEN
    _set_up(sys.stdout)
    try:
        code = _called(arguments)
        sys.stdout.flush()
    except BrokenPipeError:
        return _without_reader()
    except Exception as error:
        if os.environ.get(DEBUG):
            raise
        kind = type(error).__name__
        text = " ".join(str(error).split())[:200]
        sys.stderr.write(
            f"fishplate: this is a fault of fishplate, please report it: {kind}: {text} "
            f"({DEBUG}=1 shows where)\n"
        )
        return OWN_FAILURE
    return code


def _called(arguments: list[str]) -> int:
    try:
        app(args=arguments, prog_name="fishplate")
    except SystemExit as end:
        return end.code if isinstance(end.code, int) else 0
    return 0


def _set_up(stream: Any) -> None:
    """Write UTF-8 to files and pipes, and what the terminal cannot show as escapes."""
    if hasattr(stream, "reconfigure"):
        encoding = None if stream.isatty() else "utf-8"
        stream.reconfigure(encoding=encoding, errors="backslashreplace")


@contextmanager
def _failures_in_one_line() -> Iterator[None]:
    """Turn what the world outside does to a running command into one line and an exit code."""
    try:
        yield
    except BrokenPipeError:
        raise typer.Exit(_without_reader()) from None
    except KeyboardInterrupt:
        sys.stderr.write("fishplate: interrupted\n")
        raise typer.Exit(INTERRUPTED) from None
    except OSError as error:
        sys.stderr.write(f"fishplate: {error.strerror or error}\n")
        raise typer.Exit(NOT_WRITTEN) from None


def _without_reader() -> int:
    """Give standard output somewhere to go, so that nothing complains at the very end."""
    try:
        nowhere = os.open(os.devnull, os.O_WRONLY)
        os.dup2(nowhere, sys.stdout.fileno())
    except (OSError, ValueError):
        # No file behind standard output: then nothing can complain either.
        return NO_READER
    return NO_READER
