"""Use an installed fishplate from outside the repository: ``python smoke.py CAPTURE``.

Run by .ci/run in an environment that holds the wheel and nothing of ours besides. Ends with a
sentence and code 1 at the first thing that does not hold.
"""

from __future__ import annotations

import json
import subprocess
import sys
import sysconfig
from pathlib import Path

import fishplate
import fishplate_cli

COMMAND = Path(sysconfig.get_path("scripts")) / "fishplate"
KEPT = ("data", "bits", "time", "direction", "medium")


def main() -> None:
    """Run all checks."""
    capture = Path(sys.argv[1])
    check_package()
    version = run(0, "--version")
    expect("0." in version, f"--version printed {version!r}")
    text = run(0, "decode", str(capture))
    expect("NID_PACKET" in text or "packet" in text.lower(), "decode names no packet")
    check_round_trip(capture)
    run(2, "decode", "--no-such-option")
    Path("cut.txt").write_text("0307\n", encoding="ascii")
    run(3, "decode", "--medium", "radio", "--direction", "to-train", "cut.txt")
    print("smoke test: all well")


def check_package() -> None:
    """The wheel holds typed packages, and they come from the environment."""
    for package in (fishplate, fishplate_cli):
        folder = Path(package.__file__).parent
        expect(folder.is_relative_to(sys.prefix), f"{package.__name__} comes from {folder}")
        expect((folder / "py.typed").is_file(), f"{package.__name__} has no py.typed")


def check_round_trip(capture: Path) -> None:
    """Decoding and encoding the demo gives every bit, time and direction back."""
    trees = run(0, "decode", "--as", "jsonl", str(capture))
    again = run(0, "encode", "--as", "capture", "-", given=trees)
    before, after = kept(capture.read_text(encoding="utf-8")), kept(again)
    expect(len(before) == len(after), f"{len(before)} frames became {len(after)}")
    for number, (old, new) in enumerate(zip(before, after, strict=True)):
        changed = [key for key in old if new.get(key) != old[key]]
        expect(not changed, f"frame {number}: {old} became {new}")


def kept(lines: str) -> list[dict[str, object]]:
    """What a round trip keeps of each frame; hex digits in upper case, the true length always."""
    frames = []
    for line in filter(str.strip, lines.splitlines()):
        frame = {key: value for key, value in json.loads(line).items() if key in KEPT}
        frame["data"] = frame["data"].upper()
        frame.setdefault("bits", 4 * len(frame["data"]))
        frames.append(frame)
    return frames


def run(code: int, *arguments: str, given: str = "") -> str:
    """The output of the command, which has to end with this code and without a traceback."""
    done = subprocess.run(
        [COMMAND, *arguments], input=given, capture_output=True, encoding="utf-8", check=False
    )
    said = f"fishplate {' '.join(arguments)}: code {done.returncode}\n{done.stderr[-2000:]}"
    expect(done.returncode == code, f"{said}\nexpected code {code}")
    expect("Traceback" not in done.stderr, said)
    return done.stdout


def expect(holds: object, sentence: str) -> None:
    """End with the sentence unless it holds."""
    if not holds:
        sys.exit(f"smoke test: {sentence}")


if __name__ == "__main__":
    main()
