"""The standard as data: `registry(version)` gives all variables and layouts of a system version."""

from __future__ import annotations

from fishplate.standard.build import Registry, known_versions, registry

__all__ = ["Registry", "known_versions", "registry"]
