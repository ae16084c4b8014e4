"""What all tests share: which of them run by default.

Tests marked `slow` (100,000 random strings, 20,000 mutated frames, ...) are left out of a plain
`pytest`. They run when CI=true is set, or when -m asks for them: `pytest -m slow`.
"""

from __future__ import annotations

import os
from typing import TYPE_CHECKING

if TYPE_CHECKING:
    import pytest


def pytest_configure(config: pytest.Config) -> None:
    """Leave slow tests out unless -m or CI=true decides."""
    if not config.option.markexpr and os.environ.get("CI") != "true":
        config.option.markexpr = "not slow"
