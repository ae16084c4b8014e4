"""An invented issue 9.9.9 of the standard, which introduces system version 5.0: literals only.

Composed from issue 3.6.0: one variable renamed, one packet new, one changed, one message that may
carry the new one. Tests put it beside the declared issues, to show that nothing else is needed.
"""

from __future__ import annotations

from fishplate.standard.compose import composed
from fishplate.standard.v3_6_0 import DECLARATIONS as V3_6_0
from fishplate.standard.v3_6_0.to_train import HEAD, SCALED_HEAD
from fishplate.standard.vocabulary import (
    TO_TRAIN,
    Codes,
    Eq,
    Field,
    Optional,
    Packet,
    Repeat,
    Revision,
    Variable,
    When,
)

GENERAL_MESSAGE = next(each for each in V3_6_0.messages if each.number == 24)

DECLARATIONS = composed(
    V3_6_0,
    Revision(
        renamed={"V_EMA": "V_END"},
        variables=(
            Variable(
                "M_LANTERN",
                "7.5.9.1",
                3,
                "unsigned",
                "colour of the lantern",
                codes=(
                    Codes(0, 0, "value", "dark"),
                    Codes(1, 1, "value", "amber"),
                    Codes(2, 6, "spare", "spare"),
                    Codes(7, 7, "special", "unknown"),
                ),
            ),
        ),
        recoded={
            "M_VERSION": (
                Codes(34, 35, "value", "2.2 and 2.3"),
                Codes(36, 47, "spare", "not valid"),
                Codes(48, 48, "value", "3.0"),
                Codes(49, 79, "spare", "not valid"),
                Codes(80, 80, "value", "5.0"),
                Codes(81, 127, "range", "reserved for later versions (valid value)"),
            )
        },
        packets=(
            Packet(
                190,
                TO_TRAIN,
                "7.4.9.1",
                "Lanterns ahead",
                ("Balise", "RBC"),
                nodes=(
                    *SCALED_HEAD,
                    Field("V_END"),
                    Repeat("lanterns", (Field("D_STATIC"), Field("M_LANTERN"))),
                ),
            ),
            Packet(
                66,
                TO_TRAIN,
                "7.4.2.18",
                "Temporary Speed Restriction Revocation",
                ("Any",),
                nodes=(
                    *HEAD,
                    Field("NID_TSR"),
                    Field("Q_FRONT"),
                    When(Eq("Q_FRONT", 1), (Field("M_LANTERN"),)),
                ),
            ),
        ),
        amended_messages={
            (TO_TRAIN, 24): {"optional": (*GENERAL_MESSAGE.optional, Optional(190, "RBC"))}
        },
    ),
    layouts="v9_9_9",
    version="5.0",
    issue="9.9.9",
    date="01/01/2031",
)
