"""Trees as YAML to edit by hand, in the form that `encode` reads."""

from __future__ import annotations

from decimal import Decimal
from typing import Any

import yaml

from fishplate.captures import time_text

COLUMNS = 100


class Dumper(yaml.SafeDumper):
    """Writes numbers with a fraction as they are, and everything without anchors."""

    def ignore_aliases(self, data: Any) -> bool:  # noqa: ARG002, D102
        return True


def _decimal(dumper: Dumper, number: Decimal) -> yaml.ScalarNode:
    return dumper.represent_scalar("tag:yaml.org,2002:float", time_text(number))


Dumper.add_representer(Decimal, _decimal)


def dump(tree: dict[str, Any]) -> str:
    """Return a tree as one YAML document, elements of sets on one line where they fit."""
    text: str = yaml.dump(
        tree,
        Dumper=Dumper,
        sort_keys=False,
        allow_unicode=True,
        default_flow_style=None,
        width=COLUMNS,
    )
    return text.rstrip("\n")
