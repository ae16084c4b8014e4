"""What data to the track become in another system version, worked by hand from the rules.

Source: SUBSET-026 issue 3.6.0, 6.6.3.4.5 and 6.6.4.1.2, in ``fixtures/standard/x1_chapter6``
(translations.csv; tables 3b and 3d of translation_maps.csv); what issue 3.3.0 says otherwise
stands in the notes there. The way from X = 1 to X = 2 is the reverse, and derived.
"""

from __future__ import annotations

import pytest

from fishplate.translation import translate
from unit.translated import Tree, only, packets_of, to_track

POSITION = {
    "NID_PACKET": 0,
    "Q_SCALE": 1,
    "NID_LRBG": 905 << 14 | 9060,
    "D_LRBG": 300,
    "Q_DIRLRBG": 1,
    "Q_DLRBG": 1,
    "L_DOUBTOVER": 5,
    "L_DOUBTUNDER": 5,
    "Q_LENGTH": 0,
    "V_TRAIN": 20,
    "Q_DIRTRAIN": 1,
    "M_MODE": 0,
    "M_LEVEL": 3,
}
REPORT = {"NID_MESSAGE": 136}
TRAIN_2 = {
    "NID_PACKET": 11,
    "NC_CDTRAIN": 6,
    "NC_TRAIN": 5,
    "L_TRAIN": 400,
    "V_MAXTRAIN": 40,
    "M_LOADINGGAUGE": 3,
    "M_AXLELOADCAT": 9,
    "M_AIRTIGHT": 1,
    "N_AXLE": 24,
    "tractions": [{"M_VOLTAGE": 1, "NID_CTRACTION": 13}, {"M_VOLTAGE": 0}],
    "national_systems": [{"NID_NTC": 22}],
}
TRAIN_1 = {
    "NID_PACKET": 11,
    "NID_OPERATIONAL": "",
    # Table 3b: 210 mm is bit 8192; freight in P (1) is bit 512, passenger (4) bit 2048.
    "NC_TRAIN": 8192 | 512 | 2048,
    "L_TRAIN": 400,
    "V_MAXTRAIN": 40,
    "M_LOADINGGAUGE": 0,
    # Table 3d: D4 is 22.5 t, 45 steps of 0.5 t.
    "M_AXLELOAD": 45,
    "M_AIRTIGHT": 1,
    "tractions": [],
    "national_systems": [{"NID_NTC": 22}],
}


def test_train_data() -> None:
    # 6.6.3.4.5: rebuilt, the running number from what is stored, no traction list.
    tree = to_track("2.1", {"NID_MESSAGE": 129}, POSITION, TRAIN_2)
    for version in ("1.0", "1.1"):
        result = translate(tree, version)
        assert result.tree == {
            **to_track(version, {"NID_MESSAGE": 129}, POSITION, TRAIN_1),
            "issue": "3.6.0",
        }
        # The stored number is sent (6.6.3.4.5); what is sent where none is stored is not said.
        assert [each.kind for each in result.changes if not each.stated] == ["defaulted"]
        lost = {each.path[-1] for each in result.changes if each.lossy}
        assert lost == {"M_LOADINGGAUGE", "M_AXLELOADCAT", "N_AXLE", "tractions"}
    stored = {"NID_OPERATIONAL": "9092"}
    assert packets_of(tree, "1.0", stored=stored)[1] == TRAIN_1 | stored


def test_train_data_back() -> None:
    packet = TRAIN_1 | {"NID_OPERATIONAL": "9092", "tractions": [{"M_TRACTION": 3}]}
    tree = to_track("1.0", {"NID_MESSAGE": 129}, POSITION, packet)
    result = translate(tree, "2.1")
    assert result.tree is not None
    wanted = TRAIN_2 | {
        # Table 5: 22.5 t is D2; nothing is known of gauge and axles.
        "M_AXLELOADCAT": 7,
        "M_LOADINGGAUGE": 0,
        "N_AXLE": 1023,
        "tractions": [{"M_VOLTAGE": 1, "NID_CTRACTION": 13}],
    }
    assert result.tree["packets"][1] == wanted
    assert not any(each.stated for each in result.changes)
    assert [each.path[-1] for each in result.changes if each.lossy] == ["NID_OPERATIONAL"]


@pytest.mark.parametrize(
    ("bits", "code", "rest"),
    [(0, 0, 0), (2 | 8, 2, 0), (256 | 1 | 512, 10, 1), (16384 | 64, 5, 0)],
)
def test_a_train_of_no_or_several_classes_is_said_to_lose_something(
    bits: int, code: int, rest: int
) -> None:
    # Table 3b: 80 mm 2, 130 mm 8, 180 mm 64, 275 mm 1, 300 mm 256, freight in P 512; 16384 spare.
    # Classes are ordered by the cant deficiency they allow (7.5.1.82.1): the highest counts.
    tree = to_track("1.0", {"NID_MESSAGE": 129}, POSITION, TRAIN_1 | {"NC_TRAIN": bits})
    result = translate(tree, "2.1")
    assert result.tree is not None
    packet = result.tree["packets"][1]
    assert (packet["NC_CDTRAIN"], packet["NC_TRAIN"]) == (code, rest)
    assert any(each.lossy and each.path[-1] == "NC_TRAIN" for each in result.changes)


def test_a_message_without_its_train_data_is_not_sent() -> None:
    # Categories 13 to 127 are spare (7.5.1.62): there is no axle load for them, and message 129
    # is not sent without packet 11 (8.6.1).
    packet = TRAIN_2 | {"M_AXLELOADCAT": 13}
    result = translate(to_track("2.1", {"NID_MESSAGE": 129}, POSITION, packet), "1.0")
    assert result.tree is None
    last = result.changes[-1]
    assert (last.kind, last.path) == ("rejected", ("header", "NID_MESSAGE"))
    assert not last.stated


@pytest.mark.parametrize(("mode", "wanted"), [(15, 3), (12, 12), (13, 13), (0, 0)])
def test_modes(mode: int, wanted: int) -> None:
    # Passive shunting is sent as shunting, limited supervision as 12.
    tree = to_track("2.1", REPORT, POSITION | {"M_MODE": mode})
    assert only(tree, "1.0")["M_MODE"] == wanted
    assert translate(tree, "1.0").lossy == (mode == 15)


def test_modes_back() -> None:
    # X = 1: 12 is the national system if level NTC is reported, else limited supervision
    # (6.5.1.5.28.1); X = 2: 13 is the national system (7.5.1.72).
    ordinary = POSITION | {"M_MODE": 12}
    assert only(to_track("1.0", REPORT, ordinary), "2.1")["M_MODE"] == 12
    national = ordinary | {"M_LEVEL": 1, "NID_NTC": 22}
    assert only(to_track("1.0", REPORT, national), "2.1")["M_MODE"] == 13


@pytest.mark.parametrize(("code", "wanted"), [(5, 5), (6, 7), (7, None), (8, None)])
def test_errors(code: int, wanted: int | None) -> None:
    packet = {"NID_PACKET": 4, "M_ERROR": code}
    packets = packets_of(to_track("2.1", REPORT, POSITION, packet), "1.0")
    assert packets[1:] == ([packet | {"M_ERROR": wanted}] if wanted else [])


@pytest.mark.parametrize(("code", "wanted"), [(5, 5), (7, 6), (6, None)])
def test_errors_back(code: int, wanted: int | None) -> None:
    packet = {"NID_PACKET": 4, "M_ERROR": code}
    packets = packets_of(to_track("1.0", REPORT, POSITION, packet), "2.1")
    assert packets[1:] == ([packet | {"M_ERROR": wanted}] if wanted else [])


def test_running_number_is_not_sent() -> None:
    packet = {"NID_PACKET": 5, "NID_OPERATIONAL": "9092"}
    result = translate(to_track("2.1", REPORT, POSITION, packet), "1.0")
    assert result.tree is not None
    assert result.tree["packets"] == [POSITION]
    assert [(each.kind, each.clause) for each in result.changes] == [("rejected", "6.6.3.4.5")]


SESSION = {"NID_MESSAGE": 159}
VERSIONS = {"NID_PACKET": 2, "versions": [{"M_VERSION": 33}, {"M_VERSION": 16}]}


@pytest.mark.parametrize(
    ("version", "clause"), [("1.0", "6.6.3.4.5"), ("1.1", "6.6.3.4.5"), ("2.0", "6.6.4.1.2")]
)
def test_supported_versions_give_way_to_telephone_numbers(version: str, clause: str) -> None:
    tree = to_track("2.1", SESSION, VERSIONS)
    assert only(tree, version) == {"NID_PACKET": 3, "telephone_numbers": []}
    kinds = [(each.kind, each.clause, each.stated) for each in translate(tree, version).changes]
    assert kinds == [("replaced", clause, True), ("defaulted", "6.5.1.5.25.1", False)]
    stored = {"telephone_numbers": ["00499050900", {"NID_RADIO": "00499050901"}]}
    assert packets_of(tree, version, stored=stored) == [
        {
            "NID_PACKET": 3,
            "telephone_numbers": [{"NID_RADIO": "00499050900"}, {"NID_RADIO": "00499050901"}],
        }
    ]


@pytest.mark.parametrize(("version", "code"), [("1.0", 16), ("1.1", 17), ("2.0", 32)])
def test_telephone_numbers_give_way_to_the_version_of_the_source(version: str, code: int) -> None:
    numbers = {"NID_PACKET": 3, "telephone_numbers": [{"NID_RADIO": "00499050900"}]}
    tree = to_track(version, SESSION, numbers)
    assert only(tree, "2.1") == {"NID_PACKET": 2, "versions": [{"M_VERSION": code}]}
    result = translate(tree, "2.1")
    assert result.lossy
    assert not any(each.stated for each in result.changes)


def test_telephone_numbers_are_sent_by_2_0() -> None:
    # 3.3.0: packet 3 in message 159 unchanged.
    numbers = {"NID_PACKET": 3, "telephone_numbers": [{"NID_RADIO": "00499050900"}]}
    assert only(to_track("2.0", SESSION, numbers), "1.0") == numbers
    assert only(to_track("1.0", SESSION, numbers), "2.0") == numbers
    assert not translate(to_track("1.0", SESSION, numbers), "2.0").changes


@pytest.mark.parametrize(
    ("bits", "deleted", "lossy"), [(0, 0, False), (8, 1, False), (7, 0, True), (25, 1, True)]
)
def test_reasons_for_a_request(bits: int, deleted: int, lossy: bool) -> None:  # noqa: FBT001
    header = {"NID_MESSAGE": 132}
    tree = to_track("2.1", header | {"Q_MARQSTREASON": bits}, POSITION)
    result = translate(tree, "1.0")
    assert result.tree is not None
    assert result.tree["header"]["Q_TRACKDEL"] == deleted
    assert "Q_MARQSTREASON" not in result.tree["header"]
    assert result.lossy == lossy
    back = translate(result.tree, "2.1").tree
    assert back is not None
    assert back["header"]["Q_MARQSTREASON"] == 8 * deleted


@pytest.mark.parametrize(("code", "wanted"), [(0, 0), (1, 0), (2, 2), (3, 1)])
@pytest.mark.parametrize("version", ["2.0", "2.1"])
def test_answers_to_an_emergency_stop(version: str, code: int, wanted: int) -> None:
    # 2.0 does not say whether a rejected stop was conditional: 1 is for a conditional one.
    header: Tree = {"NID_MESSAGE": 147, "NID_EM": 9}
    tree = to_track(version, header | {"Q_EMERGENCYSTOP": code}, POSITION)
    result = translate(tree, "1.0")
    assert result.tree is not None
    assert result.tree["header"]["Q_EMERGENCYSTOP"] == wanted
    guessed = version == "2.0" and code == 3
    assert any("unconditional" in each.message for each in result.changes) == guessed
    if guessed:
        (change,) = result.changes
        assert (change.stated, change.lossy) == (False, True)
        assert change.message == (
            "Q_EMERGENCYSTOP 3 (stop rejected) becomes Q_EMERGENCYSTOP 1 (conditional stop "
            "rejected): 2.0 does not say whether the stop was conditional; of an unconditional "
            "one X = 1 reports 2"
        )


@pytest.mark.parametrize(("code", "wanted"), [(0, 0), (1, 3), (2, 2), (3, None)])
def test_answers_to_an_emergency_stop_back(code: int, wanted: int | None) -> None:
    header: Tree = {"NID_MESSAGE": 147, "NID_EM": 9}
    tree = to_track("1.0", header | {"Q_EMERGENCYSTOP": code}, POSITION)
    result = translate(tree, "2.1").tree
    assert (result["header"]["Q_EMERGENCYSTOP"] if result else None) == wanted


@pytest.mark.parametrize("version", ["2.0", "2.1"])
def test_texts_acknowledged_are_not_reported(version: str) -> None:
    tree = to_track(version, {"NID_MESSAGE": 158, "NID_TEXTMESSAGE": 90}, POSITION)
    result = translate(tree, "1.0")
    assert result.tree is None
    assert [(each.kind, each.path) for each in result.changes] == [("rejected", ("header",))]
    assert result.lossy


def test_codes_that_2_1_reads_otherwise_are_said() -> None:
    # 7.5.1.107 and 7.5.1.118.3 in the codes of issues 3.3.0 and 3.6.0: Q_EMERGENCYSTOP
    # 2 and 3, and bit 2 of Q_MARQSTREASON; 0 and 1 differ in words only.
    for code in range(4):
        header: Tree = {"NID_MESSAGE": 147, "NID_EM": 9, "Q_EMERGENCYSTOP": code}
        for source, to in (("2.0", "2.1"), ("2.1", "2.0")):
            result = translate(to_track(source, header, POSITION), to)
            assert result.tree is not None
            assert result.tree["header"]["Q_EMERGENCYSTOP"] == code
            assert [each.kind for each in result.changes] == ["differs"] * (code > 1)
    asked = to_track("2.0", {"NID_MESSAGE": 132, "Q_MARQSTREASON": 3}, POSITION)
    (change,) = translate(asked, "2.1").changes
    assert (change.kind, change.path) == ("differs", ("header", "Q_MARQSTREASON"))
    assert "pre-indication" in change.message
    assert change.message.endswith("perturbation location reached in version 2.1")
    other = to_track("2.0", {"NID_MESSAGE": 132, "Q_MARQSTREASON": 9}, POSITION)
    assert not translate(other, "2.1").changes


def test_no_telephone_numbers_are_no_loss() -> None:
    tree = to_track("1.0", SESSION, {"NID_PACKET": 3, "telephone_numbers": []})
    assert not translate(tree, "2.1").lossy


def test_traction_systems_that_are_not_sent_are_named() -> None:
    # 6.6.3.4.5: packet 11 has no traction list (N_ITER 0).
    result = translate(to_track("2.1", {"NID_MESSAGE": 129}, POSITION, TRAIN_2), "1.0")
    said = {each.path[-1]: each.message for each in result.changes}
    assert "NID_CTRACTION 13" in said["tractions"]
    assert "M_VOLTAGE 0" in said["tractions"]
    assert said["N_AXLE"] == "N_AXLE 24 is left out: packet 11 of version 1.0 has none"
