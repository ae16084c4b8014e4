"""National values between X = 1 and X = 2, worked by hand.

Source: SUBSET-026 issue 3.6.0, 6.6.3.2.3, exceptions [1a], [1b], [2] and [16], in
``fixtures/standard/x1_chapter6`` (translations.csv). Default national values: A.3.2.
"""

from __future__ import annotations

import pytest

from fishplate.errors import EncodeError
from fishplate.translation import translate
from unit.translated import Tree, general, kinds, only, packets_of

COMMON = {
    "NID_PACKET": 3,
    "Q_DIR": 2,
    "Q_SCALE": 1,
    "D_VALIDNV": 100,
    "countries": [{"NID_C": 905}, {"NID_C": 906}],
    "V_NVSHUNT": 6,
    "V_NVSTFF": 8,
    "V_NVONSIGHT": 7,
    "V_NVUNFIT": 20,
    "V_NVREL": 4,
    "D_NVROLL": 2,
    "Q_NVEMRRLS": 0,
    "V_NVALLOWOVTRP": 0,
    "V_NVSUPOVTRP": 6,
    "D_NVOVTRP": 200,
    "T_NVOVTRP": 60,
    "D_NVPOTRP": 200,
    "M_NVCONTACT": 2,
    "T_NVCONTACT": 255,
    "M_NVDERUN": 1,
    "D_NVSTFF": 32767,
    "Q_NVDRIVER_ADHES": 0,
}
NATIONAL = COMMON | {"Q_NVSRBKTRG": 1}
NEW_DEFAULTS = {"V_NVLIMSUPERV": 20, "Q_NVLOCACC": 12}
"""A.3.2: 100 km/h in steps of 5 km/h, 12 m."""
BRAKING_DEFAULTS = {
    "Q_NVGUIPERM": 0,
    "Q_NVSBFBPERM": 0,
    "Q_NVINHSMICPERM": 0,
    "A_NVMAXREDADH1": 20,
    "A_NVMAXREDADH2": 14,
    "A_NVMAXREDADH3": 14,
    "M_NVAVADH": 0,
    "M_NVEBCL": 9,
    "Q_NVKINT": 0,
}
"""A.3.2: no permissions, 1.0, 0.7 and 0.7 m/s2 in steps of 0.05, 0, 99.9999999 %."""
FACTORS = {
    "Q_NVGUIPERM": 1,
    "Q_NVSBFBPERM": 0,
    "Q_NVINHSMICPERM": 1,
    "A_NVMAXREDADH1": 21,
    "A_NVMAXREDADH2": 15,
    "A_NVMAXREDADH3": 63,
    "M_NVAVADH": 10,
    "M_NVEBCL": 7,
    "Q_NVKINT": 1,
    "kv_sets": [{"Q_NVKVINTSET": 0, "speed_steps": [{"V_NVKVINT": 0, "M_NVKVINT": 35}]}],
    "length_steps": [{"L_NVKRINT": 0, "M_NVKRINT": 18}],
    "M_NVKTINT": 22,
}
BRAKING = {"NID_PACKET": 203, "Q_DIR": 2, **FACTORS}
JOINED = COMMON | {"Q_NVSBTSMPERM": 1} | NEW_DEFAULTS


def test_national_values_take_defaults() -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3 [1a]; the values of A.3.2.
    result = translate(general("1.0", NATIONAL), "2.1")
    assert result.tree is not None
    assert result.tree["packets"] == [JOINED | BRAKING_DEFAULTS]
    assert {(each.kind, each.clause) for each in result.changes} == {("defaulted", "A.3.2")}
    # [2]: the braking values keep what is stored; that nothing is, the clause does not speak of.
    stated = [each.message.split()[0] for each in result.changes if each.stated]
    assert stated == list(NEW_DEFAULTS)
    assert result.changes[-1].message.endswith("A.3.2 has factors, and no steps to say them in")
    assert len(result.changes) == len(NEW_DEFAULTS) + len(BRAKING_DEFAULTS)
    assert not result.lossy


def test_national_values_keep_what_is_stored() -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3 [1b] and [2]; codes and meanings, any subset.
    stored = {"V_NVLIMSUPERV": "120 km/h", "M_NVEBCL": "99 %", **FACTORS, "Q_NVKINT": 1}
    del stored["M_NVEBCL"]
    result = translate(general("1.0", NATIONAL), "2.1", stored=stored | {"M_NVEBCL": "99 %"})
    assert result.tree is not None
    wanted = JOINED | FACTORS | {"V_NVLIMSUPERV": 24, "M_NVEBCL": 2}
    assert result.tree["packets"] == [wanted]
    defaulted = [each.message for each in result.changes if each.kind == "defaulted"]
    assert len(defaulted) == 1
    assert "Q_NVLOCACC 12 (12 m)" in defaulted[0]
    assert {each.kind for each in result.changes} == {"kept", "defaulted"}


def test_braking_values_are_joined() -> None:
    # SUBSET-026 3.6.0, 6.6.3.2.3 [16]: same areas, same start distance; not what is stored.
    for packets in ([NATIONAL, BRAKING], [BRAKING, NATIONAL]):
        result = translate(general("1.1", *packets), "2.1", stored={"M_NVEBCL": 3})
        assert result.tree is not None
        assert result.tree["packets"] == [JOINED | FACTORS]
        place = packets.index(BRAKING)
        joined = [each for each in result.changes if each.kind == "joined"]
        assert [each.path for each in joined] == [("packets", place)]
        assert not result.lossy


def ways(*packets: Tree) -> list[tuple[int, int]]:
    """Direction and confidence level of each packet 3 that becomes of these."""
    found = packets_of(general("1.1", *packets), "2.1")
    return [(each["Q_DIR"], each["M_NVEBCL"]) for each in found]


def national(way: int) -> Tree:
    return NATIONAL | {"Q_DIR": way}


def braking(way: int, level: int) -> Tree:
    return BRAKING | {"Q_DIR": way, "M_NVEBCL": level}


# SUBSET-026 3.6.0, 6.6.3.2.3 [16], by the directions that Q_DIR names (7.5.1.103): 0 reverse,
# 1 nominal, 2 both. That those have to agree is common practice, no source.


def test_national_values_take_those_of_their_direction() -> None:
    found = ways(national(0), national(1), braking(1, 1), braking(0, 2))
    assert found == [(0, 2), (1, 1)]
    # One of both directions is for whichever has none of its own.
    assert ways(national(0), national(1), braking(2, 3), braking(1, 1)) == [(0, 3), (1, 1)]


def test_braking_values_for_both_directions_serve_several() -> None:
    packets = (national(0), national(1), braking(2, 3))
    assert ways(*packets) == [(0, 3), (1, 3)]
    joined = [each for each in kinds(general("1.1", *packets), "2.1") if each[0] == "joined"]
    # Lossy: that they were for both is not told any more.
    assert joined == [("joined", ("packets", 2), True)]


def test_braking_values_of_the_opposite_direction_are_not_taken() -> None:
    packets = (national(1), braking(0, 3))
    # Default of A.3.2.
    assert ways(*packets) == [(1, 9)]
    changes = translate(general("1.1", *packets), "2.1").changes
    (refused,) = [each for each in changes if each.kind == "rejected"]
    assert (refused.path, refused.stated, refused.lossy) == (("packets", 1), False, True)
    assert "for its direction" in refused.message


def test_braking_values_for_one_direction_are_taken_for_both() -> None:
    packets = (national(2), braking(1, 3))
    assert ways(*packets) == [(2, 3)]
    changes = translate(general("1.1", *packets), "2.1").changes
    (joined,) = [each for each in changes if each.kind == "joined"]
    assert joined.lossy
    assert joined.message.endswith("for both directions, although it is for one of them only")


def test_braking_values_alone_are_left_out() -> None:
    # SUBSET-026 3.6.0, 6.5.1.7.5: packet 203 is sent together with packet 3 only.
    tree = general("1.1", BRAKING)
    assert packets_of(tree, "2.1") == []
    (change,) = translate(tree, "2.1").changes
    assert (change.kind, change.path, change.lossy) == ("rejected", ("packets", 0), True)
    assert change.clause == "6.5.1.7.5"


def test_national_values_without_area_are_left_out() -> None:
    # X = 1 may name no area (N_ITER 0, 6.5.1.5.4), X = 2 names at least one (7.4.2.1.1).
    result = translate(general("1.0", NATIONAL | {"countries": []}), "2.1")
    assert result.tree is not None
    assert result.tree["packets"] == []
    assert [(each.kind, each.stated) for each in result.changes] == [("rejected", False)]


def test_national_values_back() -> None:
    # The reverse of 6.6.3.2.3 [16]: a packet 203 for 1.1, nothing for 1.0 (6.5.1.7.3).
    tree = general("2.1", JOINED | FACTORS)
    assert packets_of(tree, "1.1") == [NATIONAL, BRAKING]
    assert not translate(tree, "1.1").lossy
    assert packets_of(tree, "1.0") == [NATIONAL]
    lost = {each.path[2] for each in translate(tree, "1.0").changes if each.lossy}
    # Q_NVSBFBPERM is at its default.
    assert lost == FACTORS.keys() - {"Q_NVSBFBPERM"}
    usual = general("2.1", JOINED | BRAKING_DEFAULTS)
    assert packets_of(usual, "1.0") == [NATIONAL]
    assert not translate(usual, "1.0").lossy


def test_validity_from_now_on_has_no_code_in_1_0() -> None:
    # D_VALIDNV 32767 is "now" with X = 2 (7.5.1.36) and a distance with X = 1 (6.5.1.5.26).
    there = general("1.0", NATIONAL | {"D_VALIDNV": 32767})
    assert only(there, "2.1")["D_VALIDNV"] == 32767
    (change,) = [each for each in translate(there, "2.1").changes if each.kind == "differs"]
    assert change.path == ("packets", 0, "D_VALIDNV")
    # Steps of 1 m with Q_SCALE 1, of 10 m with 2 (7.5.1.129).
    assert "D_VALIDNV 32767 (32767 m) stays" in change.message
    wide = general("1.0", NATIONAL | {"D_VALIDNV": 32767, "Q_SCALE": 2})
    (change,) = [each for each in translate(wide, "2.1").changes if each.kind == "differs"]
    assert "D_VALIDNV 32767 (327670 m) stays" in change.message
    back = general("2.1", JOINED | BRAKING_DEFAULTS | {"D_VALIDNV": 32767})
    assert only(back, "1.0")["D_VALIDNV"] == 0
    assert ("mapped", ("packets", 0, "D_VALIDNV"), True) in kinds(back, "1.0")


@pytest.mark.parametrize(
    ("stored", "place"),
    [
        ({"V_NVLIMSUPERV": "fast"}, ("stored", "V_NVLIMSUPERV")),
        ({"V_LIM": 3}, ("stored", "V_LIM")),
        ({"kv_sets": []}, ("stored", "kv_sets")),
        ({"telephone_numbers": "0049"}, ("stored", "telephone_numbers")),
        ({"NID_OPERATIONAL": 9092}, ("stored", "NID_OPERATIONAL")),
    ],
)
def test_stored_values_are_checked(stored: Tree, place: tuple[str, ...]) -> None:
    with pytest.raises(EncodeError) as caught:
        translate(general("1.0", NATIONAL), "2.1", stored=stored)
    assert caught.value.path[: len(place)] == place
