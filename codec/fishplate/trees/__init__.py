"""Trees as people write them: JSON, JSON Lines and YAML text to plain dicts and lists.

Only what a tree can hold is read: mappings, lists, texts, whole numbers, true, false and null. In
YAML everything else that is not quoted stays the text it is (``0049123``, ``yes``, ``1.5``). A
key that stands twice is an error, since one of its values would be lost.
"""

from __future__ import annotations

import json
from functools import cache
from typing import TYPE_CHECKING, Any, NamedTuple

from fishplate.errors import EncodeError

if TYPE_CHECKING:
    from collections.abc import Iterable, Iterator

    from fishplate.errors import Path

CONTEXT = ("time", "note", "bits", "frame", "given", "assumed", "source", "changes")
"""Keys that may stand beside those of a tree: what is known about the frame, not its content."""

TREE_KEYS = frozenset({"medium", "header", "packets", "content"})
"""Keys of which every tree has one."""

KINDS: tuple[tuple[type | tuple[type, ...], str], ...] = (
    (type(None), "nothing"),
    (bool, "true or false"),
    (list, "a list"),
    (int, "a number"),
    (str, "text"),
    (object, "something else"),
)
"""What stands where a tree should, in the words people know it by."""


class NumberText(str):
    """A number with a fraction or an exponent, kept as it was written."""

    __slots__ = ()


class Authored(NamedTuple):
    """One tree as it was written, or the reason why it cannot be read.

    `document` counts trees from 1; `line` is where it begins, 0 where that is not known.
    """

    document: int
    line: int
    tree: Any
    problem: EncodeError | None = None


def split_context(tree: dict[str, Any]) -> tuple[dict[str, Any], dict[str, Any]]:
    """Return what a tree says of its content, and what stands beside it."""
    beside = {key: tree[key] for key in CONTEXT if key in tree}
    return {key: value for key, value in tree.items() if key not in beside}, beside


def is_left_out(tree: dict[str, Any]) -> bool:
    """Tell whether a tree only says why translating left nothing of a frame."""
    return "changes" in tree and not tree.keys() & TREE_KEYS


def parse_json(text: str) -> Any:
    """Read JSON, numbers with a fraction as the text they are; raises `EncodeError`."""
    try:
        return _decoder().decode(text)
    except json.JSONDecodeError as error:
        place = f"line {error.lineno}, character {error.colno}"
        raise EncodeError(f"not JSON: {error.msg} ({place})") from None
    except ValueError:
        raise EncodeError("not JSON as trees use it: a number of far too many digits") from None
    except RecursionError:
        raise EncodeError("not JSON as trees use it: nested too deep") from None


def read_json(text: str) -> Iterator[Authored]:
    """Yield the tree of a JSON text, or each tree of a list."""
    try:
        found = parse_json(text)
    except EncodeError as error:
        yield Authored(1, 0, None, error)
        return
    trees = found if isinstance(found, list) else [found]
    for number, tree in enumerate(trees, 1):
        yield _checked(Authored(number, 0, tree))


def read_json_lines(lines: Iterable[tuple[int, str, EncodeError | None]]) -> Iterator[Authored]:
    """Yield one tree a line of ``(line number, text, problem)``; blank lines are passed over."""
    document = 0
    for line, text, problem in lines:
        if problem is None and not text.strip():
            continue
        document += 1
        if problem is not None:
            yield Authored(document, line, None, problem)
            continue
        try:
            yield _checked(Authored(document, line, parse_json(text)))
        except EncodeError as error:
            yield Authored(document, line, None, error)


def read_yaml(text: str) -> Iterator[Authored]:
    """Yield the trees of one or several YAML documents, each a tree or a list of trees."""
    from fishplate.trees.yaml_text import yaml_documents  # noqa: PLC0415  loads PyYAML

    number = 0
    try:
        for line, found in yaml_documents(text):
            for tree in found if isinstance(found, list) else [found]:
                number += 1
                yield _checked(Authored(number, line, tree))
    except EncodeError as error:
        yield Authored(number + 1, 0, None, error)


def _checked(authored: Authored) -> Authored:
    if isinstance(authored.tree, dict):
        # What a translation says of itself stands beside the tree and is not read.
        found = _truth_in({**authored.tree, "changes": None}, ())
        if found is None:
            return authored
        reason = "true and false are no codes: write the code, or a label in quotes"
        return authored._replace(problem=EncodeError(reason, path=found))
    kind = next(word for types, word in KINDS if isinstance(authored.tree, types))
    problem = EncodeError(f"expected a tree (a mapping), got {kind}", got=authored.tree)
    return authored._replace(problem=problem)


def _truth_in(value: object, path: Path) -> Path | None:
    """Return where true or false stands in a tree, which Python would take for 1 or 0."""
    if isinstance(value, bool):
        return path
    steps: Iterable[tuple[str | int, object]] = ()
    if isinstance(value, dict):
        steps = value.items()
    elif isinstance(value, list):
        steps = enumerate(value)
    found = (_truth_in(each, (*path, step)) for step, each in steps)
    return next((each for each in found if each is not None), None)


@cache
def _decoder() -> json.JSONDecoder:
    """Build the reader of JSON once: `json.loads` would build one a line."""
    return json.JSONDecoder(
        object_pairs_hook=_unique, parse_float=NumberText, parse_constant=_constant
    )


def _unique(pairs: list[tuple[str, Any]]) -> dict[str, Any]:
    found = dict(pairs)
    if len(found) != len(pairs):
        raise EncodeError(f"not JSON as trees use it: key {repeated_key(pairs)!r} stands twice")
    return found


def repeated_key(pairs: list[tuple[str, Any]]) -> str:
    """Return the first key that stands twice among the pairs of a JSON object."""
    names = [key for key, _ in pairs]
    return next(key for key in names if names.count(key) > 1)


def _constant(name: str) -> None:
    raise EncodeError(f"not JSON: {name} is not a JSON number")
