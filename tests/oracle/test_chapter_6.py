"""Versions with X = 1: chapter 6 before chapters 7 and 8, and nothing beyond what it allows.

Source: SUBSET-026 issue 3.6.0, 6.5.1.5 (packets, variables), 6.5.1.6 (messages), 6.5.1.7 (what
needs version 1.1) and 6.6.3 (translation), in ``fixtures/standard/x1_chapter6``, the lists of
numbers in `oracle.composed`; chapters 7 and 8 in ``fixtures/standard/v3_6_0``. `test_tables` holds
the registries against all of it put together; here each half is looked at by itself.
"""

from __future__ import annotations

import pytest

import fishplate
from oracle import composed, flatten, tables

CHAPTER_6 = tables.published("x1_chapter6")
CHAPTERS_7_AND_8 = tables.published("v3_6_0")
VERSIONS = ("1.0", "1.1")
OWN_CODES = sorted({line["variable"] for line in CHAPTER_6.table("codes")})
OWN_PACKETS = sorted(CHAPTER_6.packet_rows)
OTHER_PACKETS = sorted(
    (direction, number)
    for direction, number in CHAPTERS_7_AND_8.packet_rows
    if (direction, number) not in CHAPTER_6.packet_rows
    if number
    in (
        composed.X1_TO_TRACK
        if direction == "to-track"
        else composed.X1_TO_TRAIN | {composed.END_FLAG}
    )
)
BOTH = sorted(set(OWN_CODES) & set(CHAPTERS_7_AND_8.coding))
ONLY_X1 = {"M_AXLELOAD", "M_TRACKCONDBC", "M_TRACTION", "Q_TRACKDEL"}

each_version = pytest.mark.parametrize("version", VERSIONS)


def published_codes(book: tables.Tables, variable: str) -> list[tuple[int, int, str, str]]:
    """The codes of one variable, as the table lists them."""
    return sorted(
        (int(line["code_first"]), int(line["code_last"]), line["kind"], line["label"])
        for line in book.table("codes")
        if line["variable"] == variable
    )


def declared_codes(version: str, variable: str) -> list[tuple[int, int, str, str]]:
    """The same from the registry."""
    codes = fishplate.registry(version).variables[variable].codes
    return sorted((each.first, each.last, each.kind, each.label) for each in codes)


def declared_rows(version: str, key: tables.Key) -> list[flatten.Flat]:
    """The rows of a declared packet."""
    return flatten.from_layout(fishplate.registry(version).packets[key].nodes).rows


# --- packets -----------------------------------------------------------------------------------


@each_version
def test_no_packet_beyond_those_allowed(version: str) -> None:
    """6.5.1.5.2 and 6.5.1.5.2.1; packet 255 ends what balise and loop send."""
    packets = fishplate.registry(version).packets
    to_train = {number for direction, number in packets if direction == "to-train"}
    to_track = {number for direction, number in packets if direction == "to-track"}
    assert to_train == composed.X1_TO_TRAIN | {255}
    assert to_track == composed.X1_TO_TRACK
    # Packets of X = 2 that X = 1 does not know.
    assert not to_train & {0, 13, 40, 52, 64, 69, 76, 88, 143, 180, 181}


def test_the_lists_cover_the_tables() -> None:
    """Chapter 6 lays out no packet that it does not allow, 3.6.0 all the others."""
    assert len(OWN_PACKETS) == 16
    assert len(OWN_PACKETS) + len(OTHER_PACKETS) == len(composed.X1_TO_TRAIN) + 1 + 7
    status = {tables.key_of(line, "packet"): line["status"] for line in CHAPTER_6.table("packets")}
    # Train to track 3 was printed up to 3.3.0; 3.6.0 has no packet 3 in that direction.
    assert {key for key, said in status.items() if said == "added"} == set(
        CHAPTER_6.packet_rows
    ) - set(CHAPTERS_7_AND_8.packet_rows)


@each_version
@pytest.mark.parametrize("key", OWN_PACKETS, ids="{0[0]} {0[1]}".format)
def test_chapter_6_packets(version: str, key: tables.Key) -> None:
    """Rows and widths of 6.5.1.5.4 to 6.5.1.5.25.2 replace those of chapter 7."""
    published = CHAPTER_6.packet_rows[key]
    rows = declared_rows(version, key)
    variables = fishplate.registry(version).variables
    assert rows == flatten.from_table(published)
    assert [variables[row.variable].bits for row in rows] == [row.bits for row in published]


@each_version
@pytest.mark.parametrize("key", OTHER_PACKETS, ids="{0[0]} {0[1]}".format)
def test_other_packets_are_those_of_chapter_7(version: str, key: tables.Key) -> None:
    """What chapter 6 does not lay out is in 1.0 and 1.1 as 7.4 of issue 3.6.0 has it for 2.1."""
    published = CHAPTERS_7_AND_8.packet_rows[key]
    rows = declared_rows(version, key)
    variables = fishplate.registry(version).variables
    assert rows == flatten.from_table(published)
    assert [variables[row.variable].bits for row in rows] == [row.bits for row in published]
    assert fishplate.registry(version).packets[key].clause.startswith("7.4.")


@each_version
def test_what_needs_version_1_1(version: str) -> None:
    """6.5.1.7.1 to 6.5.1.7.4: packets 2, 6, 135, 145, 200, 203, 206, 207 and 239."""
    packets = fishplate.registry(version).packets
    assert {key for key, packet in packets.items() if packet.since == "1.1"} == {
        ("to-train", number) for number in (2, 6, 135, 145, 200, 203, 206, 207, 239)
    }
    assert {packet.since for packet in packets.values()} == {"", "1.1"}


# --- variables ---------------------------------------------------------------------------------


@each_version
@pytest.mark.parametrize("variable", OWN_CODES)
def test_chapter_6_codes_win_wholly(version: str, variable: str) -> None:
    """6.5.1.5.26 to 6.5.1.5.35.1: these codes and no others, whatever 7.5 says beside them."""
    assert declared_codes(version, variable) == published_codes(CHAPTER_6, variable)


@pytest.mark.parametrize("variable", BOTH)
def test_precedence_makes_a_difference(variable: str) -> None:
    """Every variable of 6.5.1.5 that 7.5 has too is coded differently there.

    So the test above would fail if 7.5 came first.
    """
    assert published_codes(CHAPTER_6, variable) != published_codes(CHAPTERS_7_AND_8, variable)
    assert declared_codes("2.1", variable) == published_codes(CHAPTERS_7_AND_8, variable)


@each_version
def test_chapter_6_variables(version: str) -> None:
    """Clause and width of each variable of 6.5.1.5; four of them chapter 7.5 does not have."""
    variables = fishplate.registry(version).variables
    lines = CHAPTER_6.table("variables")
    assert (
        {line["variable"] for line in lines if line["note"] == "only in X=1"}
        == ONLY_X1
        == set(OWN_CODES) - set(BOTH)
    )
    for line in lines:
        variable = variables[line["variable"]]
        assert (variable.clause, variable.bits) == (line["clause"], int(line["bits"]))


@each_version
def test_other_variables_are_those_of_chapter_7(version: str) -> None:
    """Clause, width, step, plain range, title and codes of 7.5, save the one renamed."""
    ours = fishplate.registry(version).variables
    own = {line["variable"] for line in CHAPTER_6.table("variables")}
    former = {new: old for old, new in composed.RENAMED.items()}
    lines = {line["variable"]: line for line in CHAPTERS_7_AND_8.table("variables")}
    assert len(own & set(ours)) == 17
    for name in set(ours) - own:
        variable, line = ours[name], lines[former.get(name, name)]
        assert (
            variable.clause,
            variable.bits,
            variable.unit,
            variable.resolution,
            "" if variable.plain is None else "{}..{}".format(*variable.plain),
            variable.title,
        ) == (
            line["clause"],
            int(line["bits"]),
            line["unit"],
            line["resolution"],
            f"{line['code_min']}..{line['code_max']}" if line["code_min"] else "",
            line["title"],
        )
        codes = published_codes(CHAPTERS_7_AND_8, former.get(name, name))
        assert declared_codes(version, name) == codes


@each_version
def test_names_of_x1(version: str) -> None:
    """Packet 3 says Q_NVSRBKTRG (6.5.1.5.4); NID_NTC and NID_PRVLRBG have their new names."""
    variables = fishplate.registry(version).variables
    assert "Q_NVSRBKTRG" in variables
    assert "Q_NVSBTSMPERM" not in variables
    assert {"NID_NTC", "NID_PRVLRBG"} <= set(variables)
    assert not {"NID_STM", "NID_PRVBG"} & set(variables)
    assert variables["Q_NVSRBKTRG"].lineage == "Q_NVSBTSMPERM"


# --- messages ----------------------------------------------------------------------------------


@each_version
def test_messages_that_differ(version: str) -> None:
    """6.5.1.6: no D_REF in 15 and 34, Q_TRACKDEL in 132, packet 3 in 159, and no 158."""
    messages = fishplate.registry(version).messages
    names = {
        key: [row.variable for row in flatten.from_layout(message.nodes).rows]
        for key, message in messages.items()
    }
    head = ["NID_MESSAGE", "L_MESSAGE", "T_TRAIN", "M_ACK", "NID_LRBG"]
    assert names["to-train", 15] == [*head, "NID_EM", "Q_SCALE", "Q_DIR", "D_EMERGENCYSTOP"]
    assert names["to-train", 34] == [*head, "Q_SCALE", "Q_DIR", "D_TAFDISPLAY", "L_TAFDISPLAY"]
    assert names["to-track", 132][-1] == "Q_TRACKDEL"
    assert fishplate.registry(version).variables["Q_TRACKDEL"].bits == 1
    assert messages["to-track", 159].required.packets == ((3,),)
    assert messages["to-track", 159].optional == ()
    assert ("to-track", 158) not in messages


@each_version
def test_other_messages_are_those_of_chapter_8(version: str) -> None:
    """All others have the fixed variables of 8.6 and 8.7 of issue 3.6.0."""
    messages = fishplate.registry(version).messages
    differ = {("to-train", 15), ("to-train", 34), ("to-track", 132), ("to-track", 159)}
    published = CHAPTERS_7_AND_8.message_rows
    assert set(messages) == set(published) - {("to-track", 158)}
    for key in set(messages) - differ:
        assert flatten.from_layout(messages[key].nodes).rows == flatten.from_table(published[key])
        assert messages[key].required.packets == CHAPTERS_7_AND_8.required_packets[key]


@each_version
def test_messages_carry_allowed_packets_only(version: str) -> None:
    """No message of X = 1 lists a packet that X = 1 does not have."""
    registry = fishplate.registry(version)
    for (direction, number), message in registry.messages.items():
        carried = {one.packet for one in message.optional}
        carried |= {packet for some in message.required.packets for packet in some}
        unknown = {packet for packet in carried if (direction, packet) not in registry.packets}
        assert unknown == set(), number


# --- translation -------------------------------------------------------------------------------


@each_version
def test_what_is_translated_exists(version: str) -> None:
    """6.6.3 translates every packet and message that X = 1 sends to trains, and no others.

    Listed besides: packet 76, rejected, for it is not allowed (6.5.1.5.16), and message 38, only
    in issue 3.3.0. Packet 255 ends a telegram and needs no translation.
    """
    registry = fishplate.registry(version)
    lines = [line for line in CHAPTER_6.table("translations") if line["direction"] == "down"]
    listed = {
        kind: {int(line["number"]) for line in lines if line["kind"] == kind}
        for kind in ("packet", "message")
    }
    packets = {number for direction, number in registry.packets if direction == "to-train"}
    messages = {number for direction, number in registry.messages if direction == "to-train"}
    assert listed["packet"] - packets == {76}
    assert packets - listed["packet"] == {255}
    assert listed["message"] - messages == {38}
    assert messages - listed["message"] == set()


@each_version
def test_what_is_translated_back_exists(version: str) -> None:
    """6.6.3.4.5 lists what 2.1 sends to X = 1: all of its messages to the track, and packets."""
    lines = [line for line in CHAPTER_6.table("translations") if line["direction"] == "up"]
    messages = {int(line["number"]) for line in lines if line["kind"] == "message"}
    ours = {number for direction, number in fishplate.registry(version).messages if number > 128}
    assert {number for direction, number in CHAPTERS_7_AND_8.message_rows if number > 128} == (
        messages
    )
    assert messages - ours == {158}
    packets = {int(line["number"]) for line in lines if line["kind"] == "packet"}
    assert packets == {
        number for direction, number in CHAPTERS_7_AND_8.packet_rows if direction == "to-track"
    } - {44}


def test_maps_name_variables_that_exist() -> None:
    """The value lists of 6.6.3 lead from variables of X = 1 to variables of 2.1, or back."""
    x1, x2 = fishplate.registry("1.1").variables, fishplate.registry("2.1").variables
    for line in CHAPTER_6.table("translation_maps"):
        # "NC_TRAIN bit (or)" is one bit of NC_TRAIN.
        source, target = (line[name].split()[0] for name in ("from_variable", "to_variable"))
        forth = source in x1 and target in x2
        back = source in x2 and target in x1
        assert forth or back, line
