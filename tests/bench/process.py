"""The command line as whole processes: ``python tests/bench/process.py``.

Four tables: start-up against an empty typer application with as many commands (taking turns),
one telegram of each system version, a capture of a thousand frames through ``fishplate decode
--as jsonl``, and the memory a capture of 50 MB takes beside one of 2 MB. Exit code 1 when a target
is missed. Needs a system with `os.wait4`.
"""

from __future__ import annotations

import argparse
import json
import os
import statistics
import subprocess
import sys
import tempfile
from pathlib import Path
from time import perf_counter
from typing import TYPE_CHECKING

import with_construct
import workload

if TYPE_CHECKING:
    from collections.abc import Sequence

COMMANDS = ("decode", "encode", "fields", "list", "about")
RUN = "import sys; from fishplate_cli import main; sys.exit(main())"
EMPTY = "\n".join(
    [
        "import typer",
        "app = typer.Typer()",
        *(f"@app.command('{name}')\ndef {name}(): pass" for name in COMMANDS),
        "app()",
    ]
)
DECODE = "import fishplate; fishplate.decode({!r}, medium='balise')"
LOADED = """
import sys
start = 'fishplate.engine.generated.'
print(*sorted(each.removeprefix(start) for each in sys.modules if each.startswith(start)))
"""
HEADER_BITS = 50
FRAMES = 1000
START_TARGET = 1.6
MEMORY_TARGET_MB = 50
SMALL_MB, LARGE_MB = 2, 50

FISHPLATE = [sys.executable, "-c", RUN]
CACHE = tempfile.TemporaryDirectory(prefix="fishplate-bench-")
CACHED = {
    **{name: value for name, value in os.environ.items() if name != "PYTHONDONTWRITEBYTECODE"},
    "PYTHONPYCACHEPREFIX": CACHE.name,
}
"""Users run compiled files: so do both sides here, whatever this machine is set to."""


def seconds(command: Sequence[str]) -> float:
    """Run a command, which has to succeed, and return how long it took."""
    start = perf_counter()
    subprocess.run(command, stdout=subprocess.DEVNULL, check=True, env=CACHED)
    return perf_counter() - start


def peak_mb(command: Sequence[str]) -> float:
    """Run a command, which has to succeed, and return the most memory it held."""
    child = subprocess.Popen(command, stdout=subprocess.DEVNULL, env=CACHED)
    _, status, usage = os.wait4(child.pid, 0)
    child.returncode = os.waitstatus_to_exitcode(status)
    if child.returncode:
        raise subprocess.CalledProcessError(child.returncode, command)
    unit = 1 if sys.platform == "darwin" else 1024  # bytes there, kilobytes here
    return usage.ru_maxrss * unit / 1e6


def start_up(frame: str, rounds: int) -> bool:
    """Print how long processes take from start to end; True when the target is reached."""
    empty = [sys.executable, "-c", EMPTY, "decode"]
    contestants = {
        "python, nothing": [sys.executable, "-c", ""],
        "import fishplate": [sys.executable, "-c", "import fishplate"],
        "fishplate.decode one frame": [
            sys.executable,
            "-c",
            f"import fishplate; fishplate.decode({frame!r})",
        ],
        "fishplate --version": [*FISHPLATE, "--version"],
        "fishplate --help": [*FISHPLATE, "--help"],
        "fishplate decode one frame": [*FISHPLATE, "decode", frame],
        "fishplate fields one frame": [*FISHPLATE, "fields", frame],
    }
    ratios: dict[str, list[float]] = {name: [] for name in contestants}
    times: dict[str, list[float]] = {name: [] for name in contestants}
    base: list[float] = []
    for _ in range(rounds):
        for name, command in contestants.items():
            before = seconds(empty)
            own = seconds(command)
            after = seconds(empty)
            base += [before, after]
            times[name].append(own)
            ratios[name].append(2 * own / (before + after))
    print(f"{'start-up':32}{'best ms':>9}{'ratio':>8}{'target':>8}")
    print(f"{'empty typer application':32}{min(base) * 1e3:>9.0f}{1:>8}")
    reached = True
    for name in contestants:
        ratio = statistics.median(ratios[name])
        verdict = ""
        if name == "fishplate decode one frame":
            reached = ratio <= START_TARGET
            verdict = f"{START_TARGET:>8}  {'reached' if reached else 'MISSED'}"
        print(f"{name:32}{min(times[name]) * 1e3:>9.0f}{ratio:>8.2f}{verdict}")
    return reached


def versions(rounds: int) -> None:
    """Print what decoding one telegram of each system version takes, and what it loads."""
    print(f"\n{'one telegram of version':32}{'best ms':>9}{'ratio':>8}  layouts loaded")
    codes = {f"{code >> 4}.{code & 15}": code for code in (33, 16, 17, 32, 34, 35, 48)}
    times: dict[str, list[float]] = {version: [] for version in codes}
    for _ in range(rounds):
        for version, code in codes.items():
            times[version].append(seconds([sys.executable, "-c", DECODE.format(telegram(code))]))
    first = min(times["2.1"])
    for version, code in codes.items():
        command = [sys.executable, "-c", DECODE.format(telegram(code)) + LOADED]
        done = subprocess.run(command, capture_output=True, check=True, env=CACHED, text=True)
        best = min(times[version])
        print(f"{version:32}{best * 1e3:>9.0f}{best / first:>8.2f}  {done.stdout.strip()}")


def telegram(code: int) -> str:
    """A telegram that holds its end flag only: a header of 50 bits, then ones to 210."""
    header = f"1{code:07b}000000000{255:08b}{905:010b}{9050:014b}1"
    assert len(header) == HEADER_BITS
    return f"0b{header}{'1' * (210 - HEADER_BITS)}"


def capture(path: Path, data: bytes, frames: int) -> Path:
    """Write a capture of the benchmark's message over and over."""
    with path.open("w", encoding="ascii") as file:
        for index in range(frames):
            line = {
                "time": round(index * 0.1, 1),
                "medium": "radio",
                "direction": "to-train",
                "data": data.hex(),
            }
            file.write(json.dumps(line) + "\n")
    return path


def throughput(path: Path, rounds: int) -> None:
    """Print how long a capture of a thousand frames takes."""
    command = [*FISHPLATE, "decode", str(path), "--as", "jsonl"]
    started = [*FISHPLATE, "decode", os.devnull, "--as", "jsonl"]
    done = subprocess.run(command, capture_output=True, check=True)
    lines = done.stdout.splitlines()
    assert len(lines) == FRAMES, f"{len(lines)} lines for {FRAMES} frames"
    assert json.loads(lines[-1])["packets"] == workload.TREE["packets"]
    whole = min(seconds(command) for _ in range(rounds))
    begin = min(subprocess_seconds(started) for _ in range(rounds))
    each = (whole - begin) / FRAMES * 1e6
    print(f"\n{FRAMES} frames, {path.stat().st_size / 1e6:.2f} MB, decode --as jsonl")
    print(f"whole process {whole * 1e3:.0f} ms, of it start-up {begin * 1e3:.0f} ms")
    print(f"{each:.0f} us a frame, {FRAMES / (whole - begin):.0f} frames a second")


def subprocess_seconds(command: Sequence[str]) -> float:
    """Run a command whatever its exit code (an empty file is no capture); return its time."""
    start = perf_counter()
    subprocess.run(command, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL, check=False)
    return perf_counter() - start


def memory(folder: Path, data: bytes) -> bool:
    """Print the peak memory of a small and a large capture; True when the target is reached."""
    line = len(capture(folder / "one.jsonl", data, 1).read_text(encoding="ascii"))
    peaks = []
    print(f"\n{'memory, decode --as jsonl':32}{'peak MB':>9}")
    for megabytes in (SMALL_MB, LARGE_MB):
        path = capture(folder / f"{megabytes}.jsonl", data, megabytes * 1_000_000 // line)
        peaks.append(peak_mb([*FISHPLATE, "decode", str(path), "--as", "jsonl"]))
        print(f"{f'capture of {path.stat().st_size / 1e6:.1f} MB':32}{peaks[-1]:>9.1f}")
    growth = peaks[1] - peaks[0]
    reached = growth <= MEMORY_TARGET_MB
    print(f"{'difference':32}{growth:>9.1f}{f'at most {MEMORY_TARGET_MB}':>14}", end="  ")
    print("reached" if reached else "MISSED")
    return reached


def main() -> int:
    """Print all four tables."""
    parser = argparse.ArgumentParser(description=__doc__.partition("\n")[0])
    parser.add_argument("--rounds", type=int, default=8)
    rounds = parser.parse_args().rounds
    data = with_construct.encode_as_used(with_construct.from_ours(workload.TREE))
    reached = start_up(data.hex(), rounds)
    versions(rounds)
    with tempfile.TemporaryDirectory() as name:
        folder = Path(name)
        throughput(capture(folder / "thousand.jsonl", data, FRAMES), rounds)
        reached &= memory(folder, data)
    return 0 if reached else 1


if __name__ == "__main__":
    sys.exit(main())
