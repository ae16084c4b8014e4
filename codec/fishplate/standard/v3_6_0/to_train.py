"""Track to train packets of SUBSET-026 issue 3.6.0, clause 7.4.2: literals only.

Names of sets (`sections`, `links`, ...) and keys for variables that stand twice are our own.
"""

from __future__ import annotations

from fishplate.standard.vocabulary import (
    TO_TRAIN,
    Eq,
    Field,
    Group,
    In,
    Ne,
    Node,
    Opaque,
    Packet,
    Repeat,
    Series,
    Text,
    When,
)

HEAD = (Field("NID_PACKET"), Field("Q_DIR"), Field("L_PACKET"))
SCALED_HEAD = (*HEAD, Field("Q_SCALE"))

SECTIONS_AND_END: tuple[Node, ...] = (
    Repeat(
        "sections",
        (
            Field("L_SECTION"),
            Field("Q_SECTIONTIMER"),
            When(
                Eq("Q_SECTIONTIMER", 1), (Field("T_SECTIONTIMER"), Field("D_SECTIONTIMERSTOPLOC"))
            ),
        ),
    ),
    Field("L_ENDSECTION"),
    Field("Q_SECTIONTIMER"),
    When(Eq("Q_SECTIONTIMER", 1), (Field("T_SECTIONTIMER"), Field("D_SECTIONTIMERSTOPLOC"))),
    Field("Q_ENDTIMER"),
    When(Eq("Q_ENDTIMER", 1), (Field("T_ENDTIMER"), Field("D_ENDTIMERSTARTLOC"))),
    Field("Q_DANGERPOINT"),
    When(Eq("Q_DANGERPOINT", 1), (Field("D_DP"), Field("V_RELEASEDP"))),
    Field("Q_OVERLAP"),
    When(
        Eq("Q_OVERLAP", 1), (Field("D_STARTOL"), Field("T_OL"), Field("D_OL"), Field("V_RELEASEOL"))
    ),
)

TEXT_DISPLAY: tuple[Node, ...] = (
    Group(
        "start",
        (
            Field("D_TEXTDISPLAY"),
            Field("M_MODETEXTDISPLAY"),
            Field("M_LEVELTEXTDISPLAY"),
            When(Eq("M_LEVELTEXTDISPLAY", 1), (Field("NID_NTC"),)),
        ),
    ),
    Group(
        "end",
        (
            Field("L_TEXTDISPLAY"),
            Field("T_TEXTDISPLAY"),
            Field("M_MODETEXTDISPLAY"),
            Field("M_LEVELTEXTDISPLAY"),
            When(Eq("M_LEVELTEXTDISPLAY", 1), (Field("NID_NTC"),)),
        ),
    ),
)

DISPLAY_AND_CONFIRMATION: tuple[Node, ...] = (
    *TEXT_DISPLAY,
    Field("Q_TEXTCONFIRM"),
    When(
        Ne("Q_TEXTCONFIRM", 0),
        (
            Field("Q_CONFTEXTDISPLAY"),
            Field("Q_TEXTREPORT"),
            When(
                Eq("Q_TEXTREPORT", 1), (Field("NID_TEXTMESSAGE"), Field("NID_C"), Field("NID_RBC"))
            ),
        ),
    ),
)

CONVERSION_MODEL: tuple[Node, ...] = (
    When(
        Eq("Q_NVKINT", 1),
        (
            Series(
                "kv_sets",
                (
                    Field("Q_NVKVINTSET"),
                    When(Eq("Q_NVKVINTSET", 1), (Field("A_NVP12"), Field("A_NVP23"))),
                    Series(
                        "speed_steps",
                        (
                            Field("V_NVKVINT"),
                            Field("M_NVKVINT"),
                            When(
                                Eq("Q_NVKVINTSET", 1),
                                (Field("M_NVKVINT", key="M_NVKVINT_P23"),),
                            ),
                        ),
                    ),
                ),
            ),
            Series("length_steps", (Field("L_NVKRINT"), Field("M_NVKRINT"))),
            Field("M_NVKTINT"),
        ),
    ),
)

CONDITIONS: tuple[Node, ...] = (
    *SCALED_HEAD,
    Field("Q_TRACKINIT"),
    When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
    When(
        Eq("Q_TRACKINIT", 0),
        (
            Series(
                "conditions",
                (Field("D_TRACKCOND"), Field("L_TRACKCOND"), Field("M_TRACKCOND")),
            ),
        ),
    ),
)

TRACTION_CHANGE: tuple[Node, ...] = (
    *SCALED_HEAD,
    Field("D_TRACTION"),
    Field("M_VOLTAGE"),
    When(Ne("M_VOLTAGE", 0), (Field("NID_CTRACTION"),)),
)

SUITABILITIES: tuple[Node, ...] = (
    *SCALED_HEAD,
    Field("Q_TRACKINIT"),
    When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
    When(
        Eq("Q_TRACKINIT", 0),
        (
            Series(
                "suitabilities",
                (
                    Field("D_SUITABILITY"),
                    Field("Q_SUITABILITY"),
                    When(Eq("Q_SUITABILITY", 0), (Field("M_LINEGAUGE"),)),
                    When(Eq("Q_SUITABILITY", 1), (Field("M_AXLELOADCAT"),)),
                    When(
                        Eq("Q_SUITABILITY", 2),
                        (
                            Field("M_VOLTAGE"),
                            When(Ne("M_VOLTAGE", 0), (Field("NID_CTRACTION"),)),
                        ),
                    ),
                ),
            ),
        ),
    ),
)

PACKETS: tuple[Packet, ...] = (
    Packet(
        0,
        TO_TRAIN,
        "7.4.2.0",
        "Virtual Balise Cover marker",
        ("Balise",),
        nodes=(Field("NID_PACKET"), Field("NID_VBCMK")),
    ),
    Packet(
        2,
        TO_TRAIN,
        "7.4.2.1",
        "System Version order",
        ("Balise",),
        nodes=(*HEAD, Field("M_VERSION")),
    ),
    Packet(
        3,
        TO_TRAIN,
        "7.4.2.1.1",
        "National Values",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("D_VALIDNV"),
            Series("countries", (Field("NID_C"),)),
            Field("V_NVSHUNT"),
            Field("V_NVSTFF"),
            Field("V_NVONSIGHT"),
            Field("V_NVLIMSUPERV"),
            Field("V_NVUNFIT"),
            Field("V_NVREL"),
            Field("D_NVROLL"),
            Field("Q_NVSBTSMPERM"),
            Field("Q_NVEMRRLS"),
            Field("Q_NVGUIPERM"),
            Field("Q_NVSBFBPERM"),
            Field("Q_NVINHSMICPERM"),
            Field("V_NVALLOWOVTRP"),
            Field("V_NVSUPOVTRP"),
            Field("D_NVOVTRP"),
            Field("T_NVOVTRP"),
            Field("D_NVPOTRP"),
            Field("M_NVCONTACT"),
            Field("T_NVCONTACT"),
            Field("M_NVDERUN"),
            Field("D_NVSTFF"),
            Field("Q_NVDRIVER_ADHES"),
            Field("A_NVMAXREDADH1"),
            Field("A_NVMAXREDADH2"),
            Field("A_NVMAXREDADH3"),
            Field("Q_NVLOCACC"),
            Field("M_NVAVADH"),
            Field("M_NVEBCL"),
            Field("Q_NVKINT"),
            *CONVERSION_MODEL,
        ),
    ),
    Packet(
        5,
        TO_TRAIN,
        "7.4.2.2",
        "Linking",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series(
                "links",
                (
                    Field("D_LINK"),
                    Field("Q_NEWCOUNTRY"),
                    When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
                    Field("NID_BG"),
                    Field("Q_LINKORIENTATION"),
                    Field("Q_LINKREACTION"),
                    Field("Q_LOCACC"),
                ),
            ),
        ),
    ),
    Packet(
        6,
        TO_TRAIN,
        "7.4.2.2.1",
        "Virtual Balise Cover order",
        ("Balise",),
        nodes=(
            *HEAD,
            Field("Q_VBCO"),
            Field("NID_VBCMK"),
            Field("NID_C"),
            When(Eq("Q_VBCO", 1), (Field("T_VBC"),)),
        ),
    ),
    Packet(
        12,
        TO_TRAIN,
        "7.4.2.3",
        "Level 1 Movement Authority",
        ("Balise", "loop", "RIU"),
        nodes=(*SCALED_HEAD, Field("V_MAIN"), Field("V_EMA"), Field("T_EMA"), *SECTIONS_AND_END),
    ),
    Packet(
        13,
        TO_TRAIN,
        "7.4.2.3.1",
        "Staff Responsible distance Information from loop",
        ("Loop",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_NEWCOUNTRY"),
            When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
            Field("NID_BG"),
            Series(
                "distances",
                (
                    Field("Q_NEWCOUNTRY"),
                    When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
                    Field("NID_BG"),
                    Field("D_SR"),
                ),
            ),
        ),
    ),
    Packet(
        15,
        TO_TRAIN,
        "7.4.2.4",
        "Level 2/3 Movement Authority",
        ("RBC",),
        nodes=(*SCALED_HEAD, Field("V_EMA"), Field("T_EMA"), *SECTIONS_AND_END),
    ),
    Packet(
        16,
        TO_TRAIN,
        "7.4.2.5",
        "Repositioning Information",
        ("Balise",),
        nodes=(*SCALED_HEAD, Field("L_SECTION")),
    ),
    Packet(
        21,
        TO_TRAIN,
        "7.4.2.6",
        "Gradient Profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series("gradients", (Field("D_GRADIENT"), Field("Q_GDIR"), Field("G_A"))),
        ),
    ),
    Packet(
        27,
        TO_TRAIN,
        "7.4.2.7",
        "International Static Speed Profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series(
                "steps",
                (
                    Field("D_STATIC"),
                    Field("V_STATIC"),
                    Field("Q_FRONT"),
                    Repeat(
                        "categories",
                        (
                            Field("Q_DIFF"),
                            When(Eq("Q_DIFF", 0), (Field("NC_CDDIFF"),)),
                            When(In("Q_DIFF", (1, 2)), (Field("NC_DIFF"),)),
                            Field("V_DIFF"),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        39,
        TO_TRAIN,
        "7.4.2.8",
        "Track Condition Change of traction system",
        ("Any",),
        nodes=TRACTION_CHANGE,
    ),
    Packet(
        40,
        TO_TRAIN,
        "7.4.2.8.1",
        "Track Condition Change of allowed current consumption",
        ("Any",),
        nodes=(*SCALED_HEAD, Field("D_CURRENT"), Field("M_CURRENT")),
    ),
    Packet(
        41,
        TO_TRAIN,
        "7.4.2.9",
        "Level Transition Order",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("D_LEVELTR"),
            Series(
                "levels",
                (
                    Field("M_LEVELTR"),
                    When(Eq("M_LEVELTR", 1), (Field("NID_NTC"),)),
                    Field("L_ACKLEVELTR"),
                ),
            ),
        ),
    ),
    Packet(
        42,
        TO_TRAIN,
        "7.4.2.10",
        "Session Management",
        ("Balise", "RBC"),
        nodes=(
            *HEAD,
            Field("Q_RBC"),
            Field("NID_C"),
            Field("NID_RBC"),
            Field("NID_RADIO"),
            Field("Q_SLEEPSESSION"),
        ),
    ),
    Packet(
        44,
        TO_TRAIN,
        "7.4.2.11",
        "Data used by applications outside the ERTMS/ETCS system",
        ("Any",),
        nodes=(
            *HEAD,
            Field("NID_XUSER"),
            When(Eq("NID_XUSER", 102), (Field("NID_NTC"),)),
            Opaque("data"),
        ),
    ),
    Packet(
        45,
        TO_TRAIN,
        "7.4.2.11.1",
        "Radio Network registration",
        ("Balise", "RBC", "RIU"),
        nodes=(*HEAD, Field("NID_MN")),
    ),
    Packet(
        46,
        TO_TRAIN,
        "7.4.2.11.2",
        "Conditional Level Transition Order",
        ("Balise",),
        nodes=(
            *HEAD,
            Series("levels", (Field("M_LEVELTR"), When(Eq("M_LEVELTR", 1), (Field("NID_NTC"),)))),
        ),
    ),
    Packet(
        49,
        TO_TRAIN,
        "7.4.2.12",
        "List of balises for SH Area",
        ("Any",),
        nodes=(
            *HEAD,
            Repeat(
                "groups",
                (
                    Field("Q_NEWCOUNTRY"),
                    When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
                    Field("NID_BG"),
                ),
            ),
        ),
    ),
    Packet(
        51,
        TO_TRAIN,
        "7.4.2.13",
        "Axle Load Speed Profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TRACKINIT"),
            When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
            When(
                Eq("Q_TRACKINIT", 0),
                (
                    Series(
                        "areas",
                        (
                            Field("D_AXLELOAD"),
                            Field("L_AXLELOAD"),
                            Field("Q_FRONT"),
                            Repeat("categories", (Field("M_AXLELOADCAT"), Field("V_AXLELOAD"))),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        52,
        TO_TRAIN,
        "7.4.2.13.1",
        "Permitted Braking Distance Information",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TRACKINIT"),
            When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
            When(
                Eq("Q_TRACKINIT", 0),
                (
                    Series(
                        "restrictions",
                        (
                            Field("D_PBD"),
                            Field("Q_GDIR"),
                            Field("G_PBDSR"),
                            Field("Q_PBDSR"),
                            Field("D_PBDSR"),
                            Field("L_PBDSR"),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        57,
        TO_TRAIN,
        "7.4.2.14",
        "Movement Authority Request Parameters",
        ("RBC",),
        nodes=(*HEAD, Field("T_MAR"), Field("T_TIMEOUTRQST"), Field("T_CYCRQST")),
    ),
    Packet(
        58,
        TO_TRAIN,
        "7.4.2.15",
        "Position Report Parameters",
        ("RBC",),
        nodes=(
            *SCALED_HEAD,
            Field("T_CYCLOC"),
            Field("D_CYCLOC"),
            Field("M_LOC"),
            Repeat("locations", (Field("D_LOC"), Field("Q_LGTLOC"))),
        ),
    ),
    Packet(
        63,
        TO_TRAIN,
        "7.4.2.16",
        "List of Balises in SR Authority",
        ("RBC",),
        nodes=(
            *HEAD,
            Repeat(
                "groups",
                (
                    Field("Q_NEWCOUNTRY"),
                    When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
                    Field("NID_BG"),
                ),
            ),
        ),
    ),
    Packet(
        64,
        TO_TRAIN,
        "7.4.2.16.1",
        "Inhibition of revocable TSRs from balises in L2/3",
        ("RBC",),
        nodes=HEAD,
    ),
    Packet(
        65,
        TO_TRAIN,
        "7.4.2.17",
        "Temporary Speed Restriction",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("NID_TSR"),
            Field("D_TSR"),
            Field("L_TSR"),
            Field("Q_FRONT"),
            Field("V_TSR"),
        ),
    ),
    Packet(
        66,
        TO_TRAIN,
        "7.4.2.18",
        "Temporary Speed Restriction Revocation",
        ("Any",),
        nodes=(*HEAD, Field("NID_TSR")),
    ),
    Packet(
        67,
        TO_TRAIN,
        "7.4.2.19",
        "Track Condition Big Metal Masses",
        ("Balise",),
        nodes=(*SCALED_HEAD, Series("areas", (Field("D_TRACKCOND"), Field("L_TRACKCOND")))),
    ),
    Packet(
        68,
        TO_TRAIN,
        "7.4.2.20",
        "Track Condition",
        ("Any",),
        nodes=CONDITIONS,
    ),
    Packet(
        69,
        TO_TRAIN,
        "7.4.2.20.1",
        "Track Condition Station Platforms",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TRACKINIT"),
            When(Eq("Q_TRACKINIT", 1), (Field("D_TRACKINIT"),)),
            When(
                Eq("Q_TRACKINIT", 0),
                (
                    Series(
                        "platforms",
                        (
                            Field("D_TRACKCOND"),
                            Field("L_TRACKCOND"),
                            Field("M_PLATFORM"),
                            Field("Q_PLATFORM"),
                        ),
                    ),
                ),
            ),
        ),
    ),
    Packet(
        70,
        TO_TRAIN,
        "7.4.2.21",
        "Route Suitability Data",
        ("Any",),
        nodes=SUITABILITIES,
    ),
    Packet(
        71,
        TO_TRAIN,
        "7.4.2.22",
        "Adhesion factor",
        ("Any",),
        nodes=(*SCALED_HEAD, Field("D_ADHESION"), Field("L_ADHESION"), Field("M_ADHESION")),
    ),
    Packet(
        72,
        TO_TRAIN,
        "7.4.2.23",
        "Packet for sending plain text messages",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *DISPLAY_AND_CONFIRMATION,
            Text("L_TEXT", "X_TEXT"),
        ),
    ),
    Packet(
        76,
        TO_TRAIN,
        "7.4.2.24",
        "Packet for sending fixed text messages",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("Q_TEXTCLASS"),
            Field("Q_TEXTDISPLAY"),
            *DISPLAY_AND_CONFIRMATION,
            Field("Q_TEXT"),
        ),
    ),
    Packet(
        79,
        TO_TRAIN,
        "7.4.2.25",
        "Geographical Position Information",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Series(
                "positions",
                (
                    Field("Q_NEWCOUNTRY"),
                    When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
                    Field("NID_BG"),
                    Field("D_POSOFF"),
                    Field("Q_MPOSITION"),
                    Field("M_POSITION"),
                ),
            ),
        ),
    ),
    Packet(
        80,
        TO_TRAIN,
        "7.4.2.26",
        "Mode profile",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Series(
                "profiles",
                (
                    Field("D_MAMODE"),
                    Field("M_MAMODE"),
                    Field("V_MAMODE"),
                    Field("L_MAMODE"),
                    Field("L_ACKMAMODE"),
                    Field("Q_MAMODE"),
                ),
            ),
        ),
    ),
    Packet(
        88,
        TO_TRAIN,
        "7.4.2.26.1",
        "Level Crossing information",
        ("Any",),
        nodes=(
            *SCALED_HEAD,
            Field("NID_LX"),
            Field("D_LX"),
            Field("L_LX"),
            Field("Q_LXSTATUS"),
            When(
                Eq("Q_LXSTATUS", 1),
                (Field("V_LX"), Field("Q_STOPLX"), When(Eq("Q_STOPLX", 1), (Field("L_STOPLX"),))),
            ),
        ),
    ),
    Packet(
        90,
        TO_TRAIN,
        "7.4.2.26.2",
        "Track Ahead Free up to level 2/3 transition location",
        ("Balise",),
        nodes=(
            *HEAD,
            Field("Q_NEWCOUNTRY"),
            When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
            Field("NID_BG"),
        ),
    ),
    Packet(
        131,
        TO_TRAIN,
        "7.4.2.27",
        "RBC transition order",
        ("Balise", "RBC"),
        nodes=(
            *SCALED_HEAD,
            Field("D_RBCTR"),
            Field("NID_C"),
            Field("NID_RBC"),
            Field("NID_RADIO"),
            Field("Q_SLEEPSESSION"),
        ),
    ),
    Packet(
        132,
        TO_TRAIN,
        "7.4.2.28",
        "Danger for Shunting information",
        ("Balise",),
        nodes=(*HEAD, Field("Q_ASPECT")),
    ),
    Packet(
        133,
        TO_TRAIN,
        "7.4.2.29",
        "Radio infill area information",
        ("Balise",),
        nodes=(
            *SCALED_HEAD,
            Field("Q_RIU"),
            Field("NID_C"),
            Field("NID_RIU"),
            Field("NID_RADIO"),
            Field("D_INFILL"),
            Field("NID_C", key="NID_C_BG"),
            Field("NID_BG"),
        ),
    ),
    Packet(
        134,
        TO_TRAIN,
        "7.4.2.30",
        "EOLM Packet",
        ("Balise",),
        nodes=(
            *SCALED_HEAD,
            Field("NID_LOOP"),
            Field("D_LOOP"),
            Field("L_LOOP"),
            Field("Q_LOOPDIR"),
            Field("Q_SSCODE"),
        ),
    ),
    Packet(135, TO_TRAIN, "7.4.2.31", "Stop Shunting on desk opening", ("Balise",), nodes=HEAD),
    Packet(
        136,
        TO_TRAIN,
        "7.4.2.32",
        "Infill location reference",
        ("Balise", "loop", "RIU"),
        nodes=(
            *HEAD,
            Field("Q_NEWCOUNTRY"),
            When(Eq("Q_NEWCOUNTRY", 1), (Field("NID_C"),)),
            Field("NID_BG"),
        ),
    ),
    Packet(
        137,
        TO_TRAIN,
        "7.4.2.33",
        "Stop if in Staff Responsible",
        ("Balise",),
        nodes=(*HEAD, Field("Q_SRSTOP")),
    ),
    Packet(
        138,
        TO_TRAIN,
        "7.4.2.34",
        "Reversing area information",
        ("Any",),
        nodes=(*SCALED_HEAD, Field("D_STARTREVERSE"), Field("L_REVERSEAREA")),
    ),
    Packet(
        139,
        TO_TRAIN,
        "7.4.2.35",
        "Reversing supervision information",
        ("Any",),
        nodes=(*SCALED_HEAD, Field("D_REVERSE"), Field("V_REVERSE")),
    ),
    Packet(
        140,
        TO_TRAIN,
        "7.4.2.36",
        "Train running number from RBC",
        ("RBC",),
        nodes=(*HEAD, Field("NID_OPERATIONAL")),
    ),
    Packet(
        141,
        TO_TRAIN,
        "7.4.2.37",
        "Default Gradient for Temporary Speed Restriction",
        ("Balise",),
        nodes=(*HEAD, Field("Q_GDIR"), Field("G_TSR")),
    ),
    Packet(
        143,
        TO_TRAIN,
        "7.4.2.37.1",
        "Session Management with neighbouring Radio Infill Unit",
        ("RIU",),
        nodes=(*HEAD, Field("Q_RIU"), Field("NID_C"), Field("NID_RIU"), Field("NID_RADIO")),
    ),
    Packet(
        145,
        TO_TRAIN,
        "7.4.2.37.2",
        "Inhibition of balise group message consistency reaction",
        ("Balise",),
        nodes=HEAD,
    ),
    Packet(
        180,
        TO_TRAIN,
        "7.4.2.37.3",
        "LSSMA display toggle order",
        ("Any",),
        nodes=(*HEAD, Field("Q_LSSMA"), When(Eq("Q_LSSMA", 1), (Field("T_LSSMA"),))),
    ),
    Packet(181, TO_TRAIN, "7.4.2.37.4", "Generic LS function marker", ("Balise",), nodes=HEAD),
    Packet(
        254,
        TO_TRAIN,
        "7.4.2.38",
        "Default balise, loop or RIU information",
        ("Balise", "loop", "RIU"),
        nodes=HEAD,
    ),
    Packet(
        255,
        TO_TRAIN,
        "7.4.2.39",
        "End of Information",
        ("Balise", "Loop"),
        nodes=(Field("NID_PACKET"),),
    ),
)
