"""Frames written bit by bit, for the tests beside this file."""

from __future__ import annotations

from typing import Any

import fishplate

END = "11111111"
"""NID_PACKET of packet 255, the end of a telegram or loop message (SUBSET-026 7.4.2.39)."""


def field(value: int, width: int) -> str:
    """Return a variable as '0101' text."""
    assert 0 <= value < 1 << width
    return f"{value:0{width}b}"


def balise(*packets: str, version: int = 33, media: int = 0) -> str:
    """Write a header of 50 bits (8.4.2.1) and packets behind it."""
    fields = [(1, 1), (version, 7), (media, 1), (0, 3), (0, 3), (0, 2), (255, 8), (300, 10)]
    head = "".join(field(*each) for each in [*fields, (1207, 14), (1, 1)])
    assert len(head) == 50
    return head + "".join(packets)


def loop(*packets: str, version: int = 33) -> str:
    """Write a header of 33 bits (8.4.3.1) and packets behind it."""
    fields = [(1, 1), (version, 7), (1, 1), (300, 10), (77, 14)]
    head = "".join(field(*each) for each in fields)
    assert len(head) == 33
    return head + "".join(packets)


def packet(number: int, body: str, length: int | None = None) -> str:
    """Write a packet to the train: NID_PACKET, Q_DIR 1, L_PACKET, body."""
    length = 23 + len(body) if length is None else length
    return field(number, 8) + "01" + field(length, 13) + body


def packet_back(number: int, body: str, length: int | None = None) -> str:
    """Write a packet to the trackside: NID_PACKET, L_PACKET, body."""
    length = 21 + len(body) if length is None else length
    return field(number, 8) + field(length, 13) + body


def radio(number: int, body: str, length: int | None = None, padding: str | None = None) -> str:
    """Write NID_MESSAGE, L_MESSAGE and the rest, padded with zeros to whole bytes."""
    text = field(number, 8) + "0" * 10 + body
    text += "0" * (-len(text) % 8) if padding is None else padding
    length = len(text) // 8 if length is None else length
    return text[:8] + field(length, 10) + text[18:]


def ack(*packets: str, **more: Any) -> str:
    """Write message 146, acknowledgement: T_TRAIN, NID_ENGINE, T_TRAIN (8.6.7)."""
    return radio(146, field(5, 32) + field(9, 24) + field(4, 32) + "".join(packets), **more)


def general(*packets: str, **more: Any) -> str:
    """Write message 24, general message: T_TRAIN, M_ACK, NID_LRBG (8.7.9)."""
    return radio(24, field(5, 32) + "0" + field(9, 24) + "".join(packets), **more)


def decode(text: str, **given: Any) -> fishplate.Message:
    """Decode '0101' text."""
    return fishplate.decode("0b" + text, **given)


def rows(text: str, **given: Any) -> list[fishplate.FieldRow]:
    """Walk '0101' text."""
    return list(fishplate.walk("0b" + text, **given))


TEMPORARY = packet(66, field(9, 8))
"""Packet 66, temporary speed restriction revocation: NID_TSR (7.4.2.18)."""

ORDER = packet(2, field(33, 7))
"""Packet 2, system version order: M_VERSION (7.4.2.1)."""


def position(*, mode_bits: int = 4, previous: bool = False, integrity: int = 0) -> str:
    """Write packet 0 to the trackside, or packet 1 with a previous group (7.4.3.1, 7.4.3.2).

    M_MODE is 4 bits wide up to issue 3.6.0, 5 bits in issue 4.0.0; full supervision (0), level 2.
    """
    fields = [(1, 2), (9050, 24), *([(9051, 24)] if previous else []), (1200, 15), (1, 2), (1, 2)]
    fields += [(40, 15), (50, 15), (integrity, 2), *([(400, 15)] if integrity in (1, 2) else [])]
    fields += [(24, 7), (1, 2), (0, mode_bits), (3, 3)]
    return packet_back(1 if previous else 0, "".join(field(*each) for each in fields))


def report(*packets: str, **more: Any) -> str:
    """Write message 136, train position report: T_TRAIN, NID_ENGINE (8.6.5)."""
    return radio(136, field(5, 32) + field(9, 24) + "".join(packets), **more)
