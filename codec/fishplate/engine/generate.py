"""Writes the generated modules from the registries: ``python -m fishplate.engine.generate``.

With ``--check`` nothing is written; the exit code is 1 when a module is not what the registry
would give.
"""

from __future__ import annotations

import re
import sys
from pathlib import Path
from typing import TYPE_CHECKING

from fishplate.engine.reading import ReaderSource
from fishplate.engine.source import fixed_fields
from fishplate.engine.writing import WriterSource
from fishplate.standard import registry
from fishplate.standard.editions import EDITIONS
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Field, Packet

if TYPE_CHECKING:
    from collections.abc import Iterator, Sequence

    from fishplate.standard import Registry

FOLDER = Path(__file__).parent / "generated"

HEAD = '''"""Readers and writers of SUBSET-026, layouts {layouts}.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

{imports}'''

ORIGINS = {
    "fishplate.bits": ("blob", "digits_text", "digits_value", "read_blob"),
    "fishplate.engine.runtime": ("Codec", "Misfit", "Tree"),
}
"""What a generated module may import, and from where."""


class Module:
    """The generated module of one registry; what its bases hold the same is taken from there."""

    def __init__(self, registry: Registry, bases: Sequence[Module]) -> None:
        self.registry = registry
        self.name = registry.layouts
        every = dict((*_packets(registry), *_messages(registry), *_headers(registry)))
        homes = {name: _home(name, text, bases) for name, text in every.items()}
        self.own = {name: text for name, text in every.items() if not homes[name]}
        self.homes = {name: home for name, home in homes.items() if home}

    def source(self) -> str:
        """Return the whole source of the module."""
        body = "".join(self.own.values()) + self._table()
        lines = [
            f"from fishplate.engine.generated import {home}"
            for home in sorted(set(self.homes.values()))
        ]
        for module, names in ORIGINS.items():
            used = [each for each in names if re.search(rf"\b{each}\b", body)]
            if used:
                lines.append(f"from {module} import {', '.join(used)}")
        head = HEAD.format(layouts=self.name, imports="\n".join(sorted(lines)) + "\n")
        return head + body

    def _called(self, name: str) -> str:
        return f"{self.homes[name]}.{name}" if name in self.homes else name

    def _table(self) -> str:
        registry = self.registry
        lines = ["", "", "CODEC = Codec(", f'    layouts="{self.name}",']
        for verb in ("read", "write"):
            for kind in ("packet", "message"):
                lines += self._by_number(verb, kind)
            media = ", ".join(
                f'"{medium}": {self._called(f"{verb}_{medium}")}' for medium in registry.headers
            )
            lines.append(f"    {verb}_header={{{media}}},")
        lines += [f"    unmeasured={_unmeasured(registry)},"]
        lines += [f"    forms={_forms(registry)},"]
        lines.append(f"    since={_since(registry)},")
        evidence = tuple((each.kind, each.note, each.subject) for each in registry.evidence)
        lines += [f"    evidence={evidence!r},", ")", ""]
        return "\n".join(lines)

    def _by_number(self, verb: str, kind: str) -> Iterator[str]:
        only = {key for key, form in self.registry.forms.items() if form.only}
        keys: set[tuple[str, int]] = set(self.registry.messages)
        if kind == "packet":
            keys = set(self.registry.packets) - only
        yield f"    {verb}_{kind}={{"
        for direction in (TO_TRAIN, TO_TRACK):
            yield f'        "{direction}": {{'
            for number in sorted(number for way, number in keys if way == direction):
                stem = f"{_word(direction)}_" if kind == "packet" else "message_"
                yield f"            {number}: {self._called(f'{verb}_{stem}{number}')},"
            yield "        },"
        yield "    },"


def _home(name: str, text: str, bases: Sequence[Module]) -> str:
    """Return the module that holds the same function already, if one does."""
    return next((base.name for base in bases if base.own.get(name) == text), "")


def modules() -> list[Module]:
    """Return the modules of all editions, each behind those it is composed from."""
    done: dict[str, Module] = {}
    waiting = {each.layouts: registry(each.version, each.issue) for each in EDITIONS}
    while waiting:
        name = next(name for name, each in waiting.items() if set(each.bases) <= set(done))
        each = waiting.pop(name)
        done[name] = Module(each, [done[base] for base in each.bases])
    return list(done.values())


def _packets(registry: Registry) -> Iterator[tuple[str, str]]:
    for packet in registry.packets.values():
        name = f"{_word(packet.direction)}_{packet.number}"
        known = {"NID_PACKET": str(packet.number)}
        reading = known | ({"L_PACKET": "length"} if _measured(packet) else {})
        body = ReaderSource(registry.variables, packet.nodes, reading).lines
        if _measured(packet):
            body = ["    length = p", *body]
        yield _reader(name, body)
        yield _writer(name, WriterSource(registry.variables, packet.nodes, known).lines)


def _messages(registry: Registry) -> Iterator[tuple[str, str]]:
    for message in registry.messages.values():
        name = f"message_{message.number}"
        known = {"NID_MESSAGE": str(message.number)}
        yield _reader(name, ReaderSource(registry.variables, message.nodes, known).lines)
        yield _writer(name, WriterSource(registry.variables, message.nodes, known).lines)


def _headers(registry: Registry) -> Iterator[tuple[str, str]]:
    for header in registry.headers.values():
        yield _reader(header.medium, ReaderSource(registry.variables, header.nodes).lines)
        yield _writer(header.medium, WriterSource(registry.variables, header.nodes).lines)


def _reader(stem: str, body: list[str]) -> tuple[str, str]:
    head = f"\n\ndef read_{stem}(n: int, p: int) -> tuple[Tree, int]:\n"
    return f"read_{stem}", head + "\n".join(body) + "\n"


def _writer(stem: str, body: list[str]) -> tuple[str, str]:
    head = f"\n\ndef write_{stem}(t: Tree) -> tuple[int, int]:\n"
    return f"write_{stem}", head + "\n".join(body) + "\n"


def _word(direction: str) -> str:
    return direction.replace("-", "_")


def _measured(packet: Packet) -> bool:
    return any(isinstance(each, Field) and each.name == "L_PACKET" for each in packet.nodes)


def _unmeasured(registry: Registry) -> str:
    widths: dict[str, dict[int, int]] = {TO_TRAIN: {}, TO_TRACK: {}}
    for packet in registry.packets.values():
        if not _measured(packet):
            fields = fixed_fields(packet.nodes) or []
            bits = sum(registry.variables[each.variable].bits for each in fields)
            widths[packet.direction][packet.number] = bits
    return str(widths).replace("'", '"')


def _forms(registry: Registry) -> str:
    forms: dict[str, dict[int, str]] = {TO_TRAIN: {}, TO_TRACK: {}}
    for (direction, number), form in registry.forms.items():
        forms[direction][number] = form.version
    return str(forms).replace("'", '"')


def _since(registry: Registry) -> str:
    versions: dict[str, dict[int, str]] = {TO_TRAIN: {}, TO_TRACK: {}}
    for (direction, number), packet in registry.packets.items():
        if packet.since:
            versions[direction][number] = packet.since
    return str(versions).replace("'", '"')


def main(arguments: list[str]) -> int:
    """Write or check every generated module; return the exit code."""
    stale = 0
    for module in modules():
        path = FOLDER / f"{module.name}.py"
        source = module.source()
        if path.exists() and path.read_text(encoding="utf-8") == source:
            continue
        if "--check" in arguments:
            sys.stderr.write(f"{path.name} is not what the registry gives\n")
            stale = 1
        else:
            path.write_text(source, encoding="utf-8")
    return stale


if __name__ == "__main__":
    sys.exit(main(sys.argv[1:]))
