"""The command as a process: start-up, pipes, interrupts, faults of our own."""

from __future__ import annotations

import os
import signal
import subprocess
import sys
from pathlib import Path

import pytest

CALL = "import fishplate_cli; fishplate_cli.main()"
WRITING = (["--version"], ["--help"], ["list", "--help"], ["list", "-"])
CAPTURE = Path(__file__).resolve().parents[2] / "fixtures" / "demo" / "run.jsonl"


def command(*arguments: object) -> list[str]:
    return [sys.executable, "-c", CALL, *map(str, arguments)]


def ended(*arguments: object) -> subprocess.CompletedProcess[str]:
    return subprocess.run(command(*arguments), capture_output=True, encoding="utf-8", check=False)


def in_shell(
    arguments: list[str], stream: str, given: str = ""
) -> subprocess.CompletedProcess[str]:
    """Call the command with a stream redirected by the shell."""
    line = f'exec "$@" {stream}'
    return subprocess.run(
        ["sh", "-c", line, "sh", *command(*arguments)],
        input=given,
        capture_output=True,
        encoding="utf-8",
        check=False,
    )


def test_version_and_help_and_usage() -> None:
    assert ended("--version").stdout.startswith("fishplate 0.")
    assert ended("--help").returncode == 0
    assert ended().returncode == 2
    assert ended("--frobnicate").returncode == 2
    assert ended("frobnicate").returncode == 2


@pytest.mark.parametrize("name", ["decode", "encode", "fields", "list", "about"])
def test_help_has_examples_and_the_caution(name: str) -> None:
    text = " ".join(ended(name, "--help").stdout.split())
    assert f"Examples: fishplate {name} " in text
    assert "engineering aid" in text
    assert "EN 50128" in text


def test_a_reader_that_has_seen_enough_is_no_failure() -> None:
    with subprocess.Popen(
        command("fields", CAPTURE), stdout=subprocess.PIPE, stderr=subprocess.PIPE
    ) as process:
        assert process.stdout is not None
        assert process.stderr is not None
        process.stdout.readline()
        process.stdout.close()
        assert process.stderr.read() == b""
    assert process.returncode == 141


def test_an_interrupt_ends_in_one_line() -> None:
    with subprocess.Popen(
        command("decode", "-"),
        stdin=subprocess.PIPE,
        stdout=subprocess.PIPE,
        stderr=subprocess.PIPE,
    ) as process:
        assert process.stdin is not None
        assert process.stdout is not None
        assert process.stderr is not None
        process.stdin.write(CAPTURE.read_bytes())
        process.stdin.flush()
        process.stdout.read(1)
        process.send_signal(signal.SIGINT)
        process.stdout.read()
        assert process.stderr.read() == b"fishplate: interrupted\n"
    assert process.returncode == 130


@pytest.mark.skipif(os.name != "posix", reason="streams are closed as POSIX shells do it")
@pytest.mark.parametrize(
    ("arguments", "code"),
    [
        (["--version"], 0),
        (["decode", "nofile"], 2),
        (["list", "--frobnicate"], 2),
        (["list", "-"], 3),
        (["decode", "-"], 3),
    ],
)
@pytest.mark.parametrize("stream", ["2>&-", "2>/dev/full"])
def test_no_exit_code_depends_on_standard_error(
    arguments: list[str], code: int, stream: str
) -> None:
    if "full" in stream and not Path("/dev/full").exists():
        pytest.skip("needs a device that is always full")
    done = in_shell(arguments, stream, given="zz\n" * 5000)
    assert done.returncode == code


@pytest.mark.skipif(os.name != "posix", reason="streams are closed as POSIX shells do it")
@pytest.mark.parametrize("arguments", WRITING)
@pytest.mark.parametrize(
    ("stream", "said"),
    [
        (">&-", "fishplate: standard output is closed\n"),
        (">/dev/full", "fishplate: No space left on device\n"),
    ],
)
def test_output_that_is_refused_is_said_in_one_line(
    arguments: list[str], stream: str, said: str
) -> None:
    if "full" in stream and not Path("/dev/full").exists():
        pytest.skip("needs a device that is always full")
    done = in_shell(arguments, stream, given="9B0280011996C008E0C0\n")
    assert (done.returncode, done.stderr) == (74, said)


@pytest.mark.parametrize("arguments", WRITING)
def test_output_without_a_reader_is_no_failure(arguments: list[str]) -> None:
    reader, writer = os.pipe()
    os.close(reader)
    with os.fdopen(writer, "wb") as pipe:
        done = subprocess.run(
            command(*arguments),
            input=b"9B0280011996C008E0C0\n",
            stdout=pipe,
            stderr=subprocess.PIPE,
            check=False,
        )
    assert (done.returncode, done.stderr) == (141, b"")


@pytest.mark.parametrize(
    "module", ["fishplate_cli.process", "fishplate_cli.app", "typer", "fishplate_cli.decode"]
)
def test_an_interrupt_during_start_up_ends_in_one_line(module: str) -> None:
    script = f"""
import sys

class Interrupt:
    def find_spec(self, name, path=None, target=None):
        if name == {module!r}:
            raise KeyboardInterrupt

sys.meta_path.insert(0, Interrupt())
sys.argv = ["fishplate", "decode", "00"]
{CALL}
"""
    done = subprocess.run(
        [sys.executable, "-c", script], capture_output=True, encoding="utf-8", check=False
    )
    assert (done.returncode, done.stderr) == (130, "fishplate: interrupted\n")


@pytest.mark.skipif(not Path("/dev/full").exists(), reason="needs a device that is always full")
def test_output_that_cannot_be_written_is_said() -> None:
    with Path("/dev/full").open("wb") as full:
        done = subprocess.run(
            command("decode", CAPTURE), stdout=full, stderr=subprocess.PIPE, check=False
        )
    assert done.returncode == 74
    assert done.stderr == b"fishplate: No space left on device\n"


@pytest.mark.skipif(not hasattr(os, "geteuid"), reason="permissions as POSIX has them")
def test_a_file_that_may_not_be_read_is_named(tmp_path: Path) -> None:
    if os.geteuid() == 0:
        pytest.skip("root may read everything")
    path = tmp_path / "closed.txt"
    path.touch(mode=0)
    done = ended("decode", path)
    assert done.returncode == 3
    assert done.stderr == f"{path}: Permission denied\n"


def test_a_fault_of_our_own_asks_to_be_reported() -> None:
    script = (
        "import sys; sys.argv = ['fishplate', 'decode', '00']\n"
        "import fishplate_cli.decode as module\n"
        "def fail(*a, **k): raise LookupError('two\\nlines')\n"
        "module.check_frames = fail\n"
        f"{CALL}"
    )
    done = subprocess.run(
        [sys.executable, "-c", script], capture_output=True, encoding="utf-8", check=False
    )
    assert done.returncode == 70
    assert "please report it: LookupError: two lines" in done.stderr
    assert len(done.stderr.splitlines()) == 1
    shown = subprocess.run(
        [sys.executable, "-c", script],
        capture_output=True,
        encoding="utf-8",
        check=False,
        env={**os.environ, "FISHPLATE_DEBUG": "1"},
    )
    assert "Traceback" in shown.stderr


def test_text_that_no_encoding_holds_is_escaped(tmp_path: Path) -> None:
    path = tmp_path / "odd.jsonl"
    path.write_text('{"data": "00", "note": "\\ud800", "medium": "radio"}\n', encoding="ascii")
    done = ended("decode", "--as", "jsonl", path)
    assert done.returncode == 3
    assert r'"note": "\ud800"' in done.stdout
