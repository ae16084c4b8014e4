"""Trees that the tests of translation share: messages of any version, and packets to the train.

Layouts: SUBSET-026 issue 3.6.0, 6.5.1.5 for X = 1, 7.4.2 for X = 2.
"""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.meaning import explain
from fishplate.translation import translate
from property.trees import Maker

if TYPE_CHECKING:
    from collections.abc import Callable, Sequence

Tree = dict[str, Any]

HEAD = {"Q_DIR": 1, "Q_SCALE": 1}


def general(version: str, *packets: Tree) -> Tree:
    """Message 24, general message (8.7.11), with these packets."""
    header = {"NID_MESSAGE": 24, "T_TRAIN": 7, "M_ACK": 0, "NID_LRBG": 905 << 14 | 9060}
    return {
        "medium": "radio",
        "direction": "to-train",
        "version": version,
        "header": header,
        "packets": list(packets),
    }


def telegram(version: int, *packets: Tree) -> Tree:
    """A balise telegram (8.4.2.1) of the version with this M_VERSION."""
    header = {
        "Q_UPDOWN": 1,
        "M_VERSION": version,
        "Q_MEDIA": 0,
        "N_PIG": 0,
        "N_TOTAL": 0,
        "M_DUP": 0,
        "M_MCOUNT": 255,
        "NID_C": 905,
        "NID_BG": 9060,
        "Q_LINK": 1,
    }
    return {"medium": "balise", "header": header, "packets": list(packets)}


def to_track(version: str, header: Tree, *packets: Tree) -> Tree:
    """A message to the track; time stamp and engine are the same for all."""
    return {
        "medium": "radio",
        "direction": "to-track",
        "version": version,
        "header": {"T_TRAIN": 7, "NID_ENGINE": 9091, **header},
        "packets": list(packets),
    }


def packets_of(tree: Tree, to: str, **more: Any) -> list[Tree]:
    """The packets that become of those of a message."""
    found = translate(tree, to, **more).tree
    assert found is not None
    packets: list[Tree] = found["packets"]
    return packets


def only(tree: Tree, to: str) -> Tree:
    """The packet that becomes of the only one."""
    (packet,) = packets_of(tree, to)
    return packet


def kinds(tree: Tree, to: str, **more: Any) -> list[tuple[str, tuple[Any, ...], bool]]:
    """Kind, place and loss of each change."""
    return [(each.kind, each.path, each.lossy) for each in translate(tree, to, **more).changes]


def traction(number: int, **codes: int) -> Tree:
    return {"NID_PACKET": number, **HEAD, "D_TRACTION": 500, **codes}


def conditions(number: int, name: str, *codes: int) -> Tree:
    """Track conditions, each 100 m behind the one before it."""
    each = [{"D_TRACKCOND": 100, "L_TRACKCOND": 50, name: code} for code in codes]
    return {"NID_PACKET": number, **HEAD, "Q_TRACKINIT": 0, "conditions": each}


def suitabilities(*elements: Tree) -> Tree:
    each = [{"D_SUITABILITY": 100, **element} for element in elements]
    return {"NID_PACKET": 70, **HEAD, "Q_TRACKINIT": 0, "suitabilities": each}


def speeds(*categories: Tree) -> Tree:
    step = {"D_STATIC": 0, "V_STATIC": 24, "Q_FRONT": 1, "categories": list(categories)}
    return {"NID_PACKET": 27, **HEAD, "steps": [step]}


def loads(*categories: Tree) -> Tree:
    area = {"D_AXLELOAD": 0, "L_AXLELOAD": 900, "Q_FRONT": 1, "categories": list(categories)}
    return {"NID_PACKET": 51, **HEAD, "Q_TRACKINIT": 0, "areas": [area]}


def profiles(*elements: Tree) -> Tree:
    each = [
        {"D_MAMODE": 100, "V_MAMODE": 6, "L_MAMODE": 300, "L_ACKMAMODE": 50, **element}
        for element in elements
    ]
    return {"NID_PACKET": 80, **HEAD, "profiles": each}


def positions(*codes: int) -> Tree:
    each = [
        {"Q_NEWCOUNTRY": 0, "NID_BG": 9060, "D_POSOFF": 0, "Q_MPOSITION": 1, "M_POSITION": code}
        for code in codes
    ]
    return {"NID_PACKET": 79, **HEAD, "positions": each}


def text(**codes: int) -> Tree:
    bounds = {"M_MODETEXTDISPLAY": 15, "M_LEVELTEXTDISPLAY": 5}
    return {
        "NID_PACKET": 72,
        **HEAD,
        "Q_TEXTCLASS": 0,
        "Q_TEXTDISPLAY": 0,
        "start": {"D_TEXTDISPLAY": 0, **bounds},
        "end": {"L_TEXTDISPLAY": 500, "T_TEXTDISPLAY": 1023, **bounds},
        **codes,
        "X_TEXT": "mind the sheep",
    }


class UsableMaker(Maker):
    """Draws no spare codes, of which one makes a message unusable (3.16.1.1.1)."""

    def code(self, name: str) -> int | str:
        """Draw a code that has a meaning."""
        return self._until_it_means_something(name, lambda: super(UsableMaker, self).code(name))

    def flag(self, name: str, codes: Sequence[int]) -> int | str:
        """Draw a code that a condition asks about, and that has a meaning."""
        draw = super().flag
        return self._until_it_means_something(name, lambda: draw(name, codes))

    def _until_it_means_something(self, name: str, draw: Callable[[], int | str]) -> int | str:
        variable = self.codes.variables[name]
        spare = {each.first for each in variable.codes if each.kind == "spare"}
        while True:
            code = draw()
            if code not in spare and explain(variable, code, 1).kind != "spare":
                return code
