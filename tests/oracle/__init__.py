"""Checks against sources outside the project; each module names its own."""

from __future__ import annotations
