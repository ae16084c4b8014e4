"""The standard as data: `registry(version)` gives all variables and layouts of a system version."""

from __future__ import annotations

from fishplate.standard.build import Registry, registry
from fishplate.standard.editions import known_versions

__all__ = ["Registry", "known_versions", "registry"]
