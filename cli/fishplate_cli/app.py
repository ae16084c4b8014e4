"""The application: which commands there are, and what happens when one of them fails.

Exit codes: 2 wrong usage; else 3 when some input could not be read or written as asked (the rest
is done); else 0. 1 is kept for findings. 70 means that fishplate itself failed, 74 that output
could not be written, 130 an interrupt, 141 that whoever reads the output wants no more.
"""

from __future__ import annotations

import sys
from contextlib import contextmanager
from importlib import import_module
from typing import TYPE_CHECKING, Annotated, Any

import typer
from typer.core import TyperGroup

import fishplate
from fishplate_cli.process import Ended, outside_failures
from fishplate_cli.words import CAUTION, EXAMPLES, OVERVIEW, SHORT

if TYPE_CHECKING:
    from collections.abc import Iterator

COMMANDS = ("decode", "encode", "fields", "list", "translate", "about")
MODULES = {"list": "listing"}
"""Where a command is defined, when the module does not bear its name."""

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

    def make_context(self, *arguments: Any, **more: Any) -> Any:  # noqa: D102
        with _ending():
            return super().make_context(*arguments, **more)

    def invoke(self, ctx: Any) -> Any:  # noqa: D102
        with _ending():
            return super().invoke(ctx)


@contextmanager
def _ending() -> Iterator[None]:
    """End the command as typer does, whatever happens to it from outside."""
    try:
        with outside_failures():
            yield
    except Ended as end:
        raise typer.Exit(end.code) from None


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
