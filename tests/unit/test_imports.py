"""Only the layouts that are used are loaded: start-up does not grow with the number of versions.

Each case runs in a process of its own and prints which issues it has loaded, as declarations
("standard") and as generated readers ("generated").
"""

from __future__ import annotations

import json
import pkgutil
import subprocess
import sys

import pytest

import fishplate.standard
from fishplate.engine import generated
from fishplate.standard.editions import EDITIONS
from unit.wire import END, TEMPORARY, balise, field, general, packet, position, radio

LAYOUTS = {each.layouts for each in EDITIONS}

PROGRAM = """
import json, sys
import fishplate
for text, given in json.loads(sys.argv[1]):
    message = fishplate.decode("0b" + text, **given)
    assert not message.problems
    assert fishplate.encode(message).bin == text
    assert message.tree()["packets"]
found = {}
for name in sys.modules:
    for place, prefix in (
        ("standard", "fishplate.standard."), ("generated", "fishplate.engine.generated.")
    ):
        issue = name.removeprefix(prefix)
        if issue != name and "." not in issue:
            found.setdefault(place, []).append(issue)
print(json.dumps(found))
"""

GENERAL = general(TEMPORARY)
# Message 132 of X = 1 (SUBSET-026 issue 3.6.0, 6.5.1.6.3), which the layouts of 2.1 do not fit.
REQUEST = radio(132, field(5, 32) + field(9, 24) + "1" + position())
# Packet 45 as issue 4.0.0 lays it out (7.4.2.11.1).
NETWORK = packet(45, field(0, 2))


def loaded(*frames: tuple[str, dict[str, str]]) -> tuple[set[str], set[str]]:
    """Decode and encode frames; return the issues declared and generated that this loads."""
    done = subprocess.run(
        [sys.executable, "-c", PROGRAM, json.dumps(frames)],
        capture_output=True,
        encoding="utf-8",
        check=True,
    )
    found = json.loads(done.stdout)
    return set(found.get("standard", ())) & LAYOUTS, set(found.get("generated", ()))


def test_the_places_looked_at_hold_all_issues() -> None:
    names = {each.name for each in pkgutil.iter_modules(generated.__path__)}
    assert names == LAYOUTS
    packages = {each.name for each in pkgutil.iter_modules(fishplate.standard.__path__)}
    assert packages >= LAYOUTS


@pytest.mark.parametrize(
    ("text", "given", "layouts"),
    [
        (GENERAL, {}, set()),
        (GENERAL, {"medium": "radio", "direction": "to-train"}, set()),
        (balise(TEMPORARY, END), {}, set()),
        (balise(TEMPORARY, END, version=16), {}, {"x1_chapter6"}),
        (balise(TEMPORARY, END, version=17), {}, {"x1_chapter6"}),
        (balise(TEMPORARY, END, version=32), {}, {"v3_3_0"}),
        (balise(TEMPORARY, END, version=48), {}, {"v4_0_0"}),
        # What is composed from another imports that one too.
        (balise(TEMPORARY, END, version=16), {"issue": "2.3.0"}, {"v2_3_0", "x1_chapter6"}),
        (balise(TEMPORARY, END, version=34), {}, {"x2_inferred", "v4_0_0"}),
        (GENERAL, {"version": "2.0"}, {"v3_3_0"}),
    ],
)
def test_decoding_loads_what_it_reads_with(
    text: str, given: dict[str, str], layouts: set[str]
) -> None:
    declared, read = loaded((text, given))
    assert read == {"v3_6_0"} | layouts
    assert declared == set(), "readers and writers need no declarations"


def test_a_packet_in_another_form_loads_nothing_else() -> None:
    declared, read = loaded((balise(NETWORK, END, version=34), {}))
    assert read == {"v3_6_0", "x2_inferred", "v4_0_0"}
    assert declared <= read, "it is written field by field, by its declaration"


def test_inferring_a_version_may_load_all_that_could_fit() -> None:
    _, read = loaded((REQUEST, {}))
    assert read >= {"v3_6_0", "x1_chapter6"}


def test_importing_loads_nothing() -> None:
    assert loaded()[0] == set()
    assert loaded()[1] == set()
