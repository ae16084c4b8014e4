"""What two editions of the standard say differently, as plain data."""

from __future__ import annotations

from typing import TYPE_CHECKING, Any

from fishplate.standard.as_json import node_to_json
from fishplate.standard.vocabulary import Header, Packet, RadioMessage, Variable, When
from fishplate_cli.compare import SETS, evidence_about, state

if TYPE_CHECKING:
    from collections.abc import Iterable

    from fishplate.standard.comparison import Comparison, Difference, Thing
    from fishplate.standard.fields import Meaning, Place
    from fishplate.standard.vocabulary import Evidence, Optional


def comparison_data(comparison: Comparison) -> dict[str, Any]:
    """Return a comparison as plain data; its shape is described in the how-to."""
    data: dict[str, Any] = {
        name: {
            "version": book.version,
            "issue": book.issue,
            "evidence": _evidence_data(book.evidence_of()),
        }
        for name, book in (("before", comparison.before), ("after", comparison.after))
    }
    for kind in SETS:
        data[kind] = [
            difference_data(each) | {"evidence": _evidence_data(evidence_about(comparison, each))}
            for each in getattr(comparison, kind)
        ]
    return data


def _evidence_data(found: Iterable[Evidence]) -> list[dict[str, str]]:
    return [{"kind": each.kind, "note": each.note} for each in found]


def difference_data(difference: Difference) -> dict[str, Any]:
    """Return one difference as plain data."""
    return {
        "state": state(difference),
        "before": reference(difference.before),
        "after": reference(difference.after),
        "instead": difference.instead,
        "attributes": [
            {"what": each.what, "before": each.before, "after": each.after}
            for each in difference.attributes
        ],
        "codes": [
            {
                "first": each.first,
                "last": each.last,
                "before": _meaning_data(each.before),
                "after": _meaning_data(each.after),
            }
            for each in difference.codes
        ],
        "fields": [
            {
                "aspects": list(each.aspects),
                "before": _place_data(each.before),
                "after": _place_data(each.after),
            }
            for each in difference.fields
        ],
        "optional": {
            "new": [_option_data(each) for each in difference.optional_new],
            "gone": [_option_data(each) for each in difference.optional_gone],
        },
    }


def reference(thing: Thing | None) -> dict[str, Any] | None:
    """Return what names a thing."""
    match thing:
        case None:
            return None
        case Variable():
            return {"variable": thing.name}
        case Packet():
            return {"packet": thing.number, "direction": thing.direction, "name": thing.name}
        case RadioMessage():
            return {"message": thing.number, "direction": thing.direction, "name": thing.name}
        case Header():
            return {"header": thing.medium}


def _meaning_data(meaning: Meaning | None) -> dict[str, str] | None:
    return {"kind": meaning.kind, "label": meaning.label} if meaning else None


def _option_data(option: Optional) -> dict[str, Any]:
    return {"packet": option.packet, "sender": option.sender}


def _place_data(place: Place | None) -> dict[str, Any] | None:
    if place is None:
        return None
    return {
        "path": list(place.path),
        "variable": place.variable,
        "bits": place.bits,
        "when": [node_to_json(When(each, ()))["when"] for each in place.when],
        "repeats": place.repeats,
        "behind": list(place.behind),
    }
