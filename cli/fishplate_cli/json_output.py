"""Trees as JSON text: one, or the list of several or of none."""

from __future__ import annotations

import json
from decimal import Decimal
from itertools import chain
from typing import TYPE_CHECKING, Any

from fishplate.captures import time_text
from fishplate_cli.console import write

if TYPE_CHECKING:
    from collections.abc import Iterable


def dump(tree: dict[str, Any], indent: int | None = None) -> str:
    """Write a tree as JSON, a time that is a number with its own digits."""
    time = tree.get("time")
    if not isinstance(time, Decimal):
        return json.dumps(tree, ensure_ascii=False, indent=indent)
    text = json.dumps({**tree, "time": None}, ensure_ascii=False, indent=indent)
    return text.replace('"time": null', f'"time": {time_text(time)}', 1)


def write_trees(trees: Iterable[dict[str, Any]]) -> None:
    """Write the one tree, or the list of several or of none; none is held longer than needed."""
    texts = (dump(each, indent=2) for each in trees)
    first = next(texts, None)
    if first is None:
        write("[]")
        return
    second = next(texts, None)
    if second is None:
        write(first)
        return
    write(f"[\n{first}")
    for text in chain((second,), texts):
        write(f",\n{text}")
    write("]")
