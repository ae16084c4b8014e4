"""What the tests of the command line share: a call of it, and frames worked by hand."""

from __future__ import annotations

from pathlib import Path
from typing import TYPE_CHECKING, Any, NamedTuple

import pytest
import yaml
from typer.testing import CliRunner

from fishplate_cli.app import app

if TYPE_CHECKING:
    from collections.abc import Callable

VECTORS = Path(__file__).resolve().parents[2] / "fixtures" / "vectors"


class Ended(NamedTuple):
    """How a command ended."""

    code: int
    out: str
    err: str
    raw: bytes


@pytest.fixture
def fishplate() -> Callable[..., Ended]:
    """Call the command line in this process; a fault of ours is raised."""

    def call(*arguments: object, given: str | bytes = "") -> Ended:
        done = CliRunner().invoke(app, [str(each) for each in arguments], input=given)
        if done.exception and not isinstance(done.exception, SystemExit):
            raise done.exception
        return Ended(done.exit_code, done.stdout, done.stderr, done.stdout_bytes)

    return call


@pytest.fixture(scope="session")
def vectors() -> dict[str, dict[str, Any]]:
    """The frames of fixtures/vectors, worked by hand from SUBSET-026 3.6.0, by number."""
    return {
        path.name[:2]: yaml.safe_load(path.read_text(encoding="utf-8"))
        for path in sorted(VECTORS.glob("*.yaml"))
    }


@pytest.fixture
def frame(vectors: dict[str, dict[str, Any]]) -> str:
    """Message 3 with packets 15 and 21, worked by hand: the hex of vector 01."""
    text: str = vectors["01"]["hex"]
    return text.replace(" ", "")
