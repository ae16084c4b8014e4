"""How hypothesis runs here: the same examples every time, no clock, no files left behind."""

from __future__ import annotations

from hypothesis import HealthCheck, settings

settings.register_profile(
    "fishplate",
    database=None,
    deadline=None,
    derandomize=True,
    max_examples=100,
    # A tree is drawn from one source of random numbers, value by value.
    suppress_health_check=[HealthCheck.too_slow, HealthCheck.data_too_large],
)
settings.load_profile("fishplate")
