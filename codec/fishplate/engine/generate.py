"""Writes the generated modules from the registries: ``python -m fishplate.engine.generate``.

With ``--check`` nothing is written; the exit code is 1 when a module is not what the registry
would give.
"""

from __future__ import annotations

import sys
from pathlib import Path
from typing import TYPE_CHECKING

from fishplate.engine.reading import ReaderSource
from fishplate.engine.runtime import MODULES
from fishplate.engine.source import fixed_fields
from fishplate.engine.writing import WriterSource
from fishplate.standard import registry
from fishplate.standard.vocabulary import TO_TRACK, TO_TRAIN, Field, Packet

if TYPE_CHECKING:
    from collections.abc import Iterator

    from fishplate.standard import Registry

FOLDER = Path(__file__).parent / "generated"

HEAD = '''"""Readers and writers of SUBSET-026 issue {issue}.

Written by ``python -m fishplate.engine.generate`` from the registry; never edit it.
"""

from __future__ import annotations

from fishplate.bits import blob, digits_text, digits_value, read_blob
from fishplate.engine.runtime import Codec, Misfit, Tree
'''


def module_source(registry: Registry) -> str:
    """Return the whole source of the generated module of one registry."""
    functions = [*_packets(registry), *_messages(registry), *_headers(registry)]
    return HEAD.format(issue=registry.issue) + "".join(functions) + _table(registry)


def _packets(registry: Registry) -> Iterator[str]:
    for packet in registry.packets.values():
        name = f"{_word(packet.direction)}_{packet.number}"
        known = {"NID_PACKET": str(packet.number)}
        reading = known | ({"L_PACKET": "length"} if _measured(packet) else {})
        body = ReaderSource(registry.variables, packet.nodes, reading).lines
        if _measured(packet):
            body = ["    length = p", *body]
        yield _reader(name, body)
        yield _writer(name, WriterSource(registry.variables, packet.nodes, known).lines)


def _messages(registry: Registry) -> Iterator[str]:
    for message in registry.messages.values():
        name = f"message_{message.number}"
        known = {"NID_MESSAGE": str(message.number)}
        yield _reader(name, ReaderSource(registry.variables, message.nodes, known).lines)
        yield _writer(name, WriterSource(registry.variables, message.nodes, known).lines)


def _headers(registry: Registry) -> Iterator[str]:
    for header in registry.headers.values():
        yield _reader(header.medium, ReaderSource(registry.variables, header.nodes).lines)
        yield _writer(header.medium, WriterSource(registry.variables, header.nodes).lines)


def _reader(name: str, body: list[str]) -> str:
    head = f"\n\ndef read_{name}(n: int, p: int) -> tuple[Tree, int]:\n"
    return head + "\n".join(body) + "\n"


def _writer(name: str, body: list[str]) -> str:
    head = f"\n\ndef write_{name}(t: Tree) -> tuple[int, int]:\n"
    return head + "\n".join(body) + "\n"


def _word(direction: str) -> str:
    return direction.replace("-", "_")


def _measured(packet: Packet) -> bool:
    return any(isinstance(each, Field) and each.name == "L_PACKET" for each in packet.nodes)


def _table(registry: Registry) -> str:
    lines = ["", "", "CODEC = Codec("]
    lines += [f'    version="{registry.version}",', f'    issue="{registry.issue}",']
    packets = [(each.direction, each.number) for each in registry.packets.values()]
    messages = [(each.direction, each.number) for each in registry.messages.values()]
    for verb in ("read", "write"):
        for kind, keys in (("packet", packets), ("message", messages)):
            lines.append(f"    {verb}_{kind}={{")
            for direction in (TO_TRAIN, TO_TRACK):
                lines.append(f'        "{direction}": {{')
                for number in sorted(number for way, number in keys if way == direction):
                    stem = f"{_word(direction)}_" if kind == "packet" else "message_"
                    lines.append(f"            {number}: {verb}_{stem}{number},")
                lines.append("        },")
            lines.append("    },")
        media = ", ".join(f'"{medium}": {verb}_{medium}' for medium in registry.headers)
        lines.append(f"    {verb}_header={{{media}}},")
    lines += [f"    unmeasured={_unmeasured(registry)},"]
    lines += [f"    versions={_versions(registry)},", ")", ""]
    return "\n".join(lines)


def _unmeasured(registry: Registry) -> str:
    widths: dict[str, dict[int, int]] = {TO_TRAIN: {}, TO_TRACK: {}}
    for packet in registry.packets.values():
        if not _measured(packet):
            fields = fixed_fields(packet.nodes) or []
            bits = sum(registry.variables[each.variable].bits for each in fields)
            widths[packet.direction][packet.number] = bits
    return str(widths).replace("'", '"')


def _versions(registry: Registry) -> str:
    codes = registry.variables["M_VERSION"].codes
    named = {each.first: each.label for each in codes if each.kind == "value"}
    return str(named).replace("'", '"')


def main(arguments: list[str]) -> int:
    """Write or check every generated module; return the exit code."""
    stale = 0
    for version, module in MODULES.items():
        path = FOLDER / f"{module}.py"
        source = module_source(registry(version))
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
