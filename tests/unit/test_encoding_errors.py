"""Wrong trees: each wrong value is named with its place, what was expected and what was got.

Layouts: SUBSET-026 issue 3.6.0, 7.4.2, 7.4.3, 8.6, 8.7; telegram sizes: SUBSET-036 4.3.1.2.
"""

from __future__ import annotations

import pytest

import fishplate
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


def test_a_telegram_that_names_another_version_than_its_tree() -> None:
    """Bits of 1.0 under an M_VERSION of 2.1 would be read in the wrong layouts."""
    header = {
        "Q_UPDOWN": 1,
        "M_VERSION": "2.1",
        "Q_MEDIA": 0,
        "N_PIG": 0,
        "N_TOTAL": 0,
        "M_DUP": 0,
        "M_MCOUNT": 255,
        "NID_C": 905,
        "NID_BG": 9050,
        "Q_LINK": 1,
    }
    packet = {"NID_PACKET": 39, "Q_DIR": 1, "Q_SCALE": 1, "D_TRACTION": 100, "M_TRACTION": 1}
    tree = {"version": "1.0", "header": header, "packets": [packet]}
    with pytest.raises(EncodeError, match=r"names version 2\.1, the tree is of version 1\.0"):
        fishplate.encode(tree)
    assert len(fishplate.encode(tree, force=True)) == 210
    del tree["version"]
    header["M_VERSION"] = "1.0"
    assert len(fishplate.encode(tree)) == 210
