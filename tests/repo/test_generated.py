"""Files written by programs are what the programs would write today."""

from __future__ import annotations

import subprocess
import sys

import pytest

from repo.files import ROOT


@pytest.mark.parametrize(
    "command",
    [
        ["-m", "fishplate.engine.generate", "--check"],
        ["docs/reference.py", "--check"],
        ["fixtures/demo/build.py", "--check"],
    ],
    ids=" ".join,
)
def test_generated_files_are_current(command: list[str]) -> None:
    done = subprocess.run(
        [sys.executable, *command], cwd=ROOT, capture_output=True, encoding="utf-8", check=False
    )
    assert done.returncode == 0, done.stdout + done.stderr
