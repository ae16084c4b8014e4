"""From the INPUT arguments of `encode` to trees: files, standard input, what was typed."""

from __future__ import annotations

from enum import StrEnum
from pathlib import Path
from typing import IO, TYPE_CHECKING, cast

from fishplate.captures.lines import Replayed, read_lines
from fishplate.errors import EncodeError
from fishplate.trees import (
    TREE_KEYS,
    Authored,
    parse_json,
    read_json,
    read_json_lines,
    read_yaml,
)
from fishplate_cli.inputs import STDIN, is_file, stdin

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator

LONGEST_LINE = 1 << 20
"""Bytes of the longest line with a tree on it: trees are many times longer than their frames."""

FURTHEST = 64 * 1024
"""Bytes of further lines that are looked at where the first one does not tell the form."""

JSON_STARTS = ("{", "[")
SUFFIXES = {".json": "json", ".jsonl": "jsonl", ".ndjson": "jsonl", ".yaml": "yaml", ".yml": "yaml"}
HINT = "; where each line is a tree, say --from jsonl"


class TreeForm(StrEnum):
    """The forms trees come in."""

    JSON = "json"
    JSONL = "jsonl"
    YAML = "yaml"


def is_typed(text: str) -> bool:
    """Tell whether an argument is a tree typed as JSON."""
    return text.lstrip().startswith(JSON_STARTS)


def read_trees(text: str, form: TreeForm | None) -> Iterator[Authored]:
    """Yield the trees of one argument."""
    if text == STDIN:
        yield from _from_stream(stdin(), form)
    elif is_file(text):
        suffix = Path(text).suffix.lower()
        known = TreeForm(SUFFIXES[suffix]) if suffix in SUFFIXES else None
        with Path(text).open("rb") as stream:
            yield from _from_stream(stream, form or known)
    else:
        yield from read_json(text)


def _from_stream(stream: IO[bytes], form: TreeForm | None) -> Iterator[Authored]:
    hint = ""
    if form is None:
        form, stream, doubt = _told(stream)
        hint = HINT if doubt else ""
    if form is TreeForm.JSONL:
        yield from read_json_lines(_numbered(stream))
        return
    try:
        text = stream.read().decode("utf-8-sig")
    except UnicodeDecodeError as error:
        problem = EncodeError(f"byte {error.start + 1} of the file is not UTF-8")
        yield Authored(1, 0, None, problem)
        return
    for each in read_yaml(text) if form is TreeForm.YAML else read_json(text):
        if each.problem and hint:
            yield each._replace(problem=EncodeError(f"{each.problem.reason}{hint}"))
        else:
            yield each


def _told(stream: IO[bytes]) -> tuple[TreeForm, IO[bytes], bool]:
    """Tell the form by the first lines; return it, the stream unread, and whether it is in doubt.

    Lines that are trees tell JSON Lines where nothing else can hold them: one behind a first line
    that is broken JSON, two in what would be one document of YAML.
    """
    seen = bytearray()
    line = _next(stream, seen)
    while line and not line.strip() and len(seen) < FURTHEST:
        line = _next(stream, seen)
    first = _text(line).lstrip()
    form = TreeForm.JSON if is_typed(first) else TreeForm.YAML
    trees = int(_is_tree(_text(line)))
    if first.startswith("{") and _is_mapping(first):
        form = TreeForm.JSONL
    elif not first.startswith("["):
        enough = 1 if form is TreeForm.JSON else 2
        documents = first.startswith("---")
        while line and trees < enough and not documents and len(seen) < FURTHEST:
            line = _next(stream, seen)
            trees += _is_tree(_text(line))
            documents = line.startswith(b"---")
        form = TreeForm.JSONL if trees >= enough and not documents else form
    doubt = form is TreeForm.YAML and trees > 0
    return form, cast("IO[bytes]", Replayed(bytes(seen), stream)), doubt


def _next(stream: IO[bytes], seen: bytearray) -> bytes:
    line = stream.readline(LONGEST_LINE)
    seen += line
    return line


def _text(line: bytes) -> str:
    return line.decode(errors="replace").removeprefix("\ufeff").rstrip()


def _is_mapping(text: str) -> bool:
    try:
        return isinstance(parse_json(text), dict)
    except EncodeError:
        return False


def _is_tree(line: str) -> bool:
    """Tell whether a line is a tree by itself; one within a larger JSON text stands further in."""
    if not line.startswith("{"):
        return False
    try:
        found = parse_json(line)
    except EncodeError:
        return False
    return isinstance(found, dict) and not TREE_KEYS.isdisjoint(found)


def _numbered(stream: IO[bytes]) -> Iterable[tuple[int, str, EncodeError | None]]:
    for line in read_lines(stream, LONGEST_LINE):
        problem = EncodeError(line.problem.reason) if line.problem else None
        yield line.number, line.text, problem
