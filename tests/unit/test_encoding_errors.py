"""Wrong trees: each wrong value is named with its place, what was expected and what was got.

Layouts: SUBSET-026 issue 3.6.0, 7.4.2, 7.4.3, 8.6, 8.7; telegram sizes: SUBSET-036 4.3.1.2.
"""

from __future__ import annotations

import pytest

from fishplate.errors import EncodeError
from fishplate.frames import encode_bits
from unit.wrong_trees import REFUSED


@pytest.mark.parametrize("case", REFUSED)
def test_a_wrong_tree_names_its_place(case: str) -> None:
    tree, path, reason, expected, got = REFUSED[case]
    with pytest.raises(EncodeError) as caught:
        encode_bits(tree)
    error = caught.value
    assert error.path == path
    assert reason in error.reason
    assert expected in error.expected
    if got is not None:
        assert error.got == got
        assert type(error.got) is type(got)
    assert "\n" not in str(error)


@pytest.mark.parametrize(
    "case",
    ["missing", "superfluous altogether", "one too large", "a list too long", "data that is none"],
)
def test_force_excuses_lengths_only(case: str) -> None:
    with pytest.raises(EncodeError):
        encode_bits(REFUSED[case][0], force=True)
