"""Errors: their place is data, their sentence is one line, and each blames one party."""

from __future__ import annotations

import pickle

import pytest

import fishplate
from fishplate import errors

PATHS = {
    (): "",
    ("header",): "header",
    ("header", "NID_LRBG"): "header.NID_LRBG",
    ("packets", 0): "packets[0]",
    ("packets", 0, "sections", 1, "L_SECTION"): "packets[0].sections[1].L_SECTION",
    (0, 1, "a"): "[0][1].a",
}


@pytest.mark.parametrize("path", PATHS)
def test_a_path_as_text(path: errors.Path) -> None:
    assert errors.path_text(path) == PATHS[path]


@pytest.mark.parametrize(
    ("path", "bit", "line"),
    [
        ((), None, "it broke"),
        ((), 0, "bit 0: it broke"),
        (("header",), None, "header: it broke"),
        (("packets", 2, "Q_DIR"), 81, "packets[2].Q_DIR at bit 81: it broke"),
    ],
)
def test_an_error_is_one_line_with_its_place(path: errors.Path, bit: int | None, line: str) -> None:
    error = errors.FishplateError("it broke", path=path, bit=bit)
    assert str(error) == line
    assert (error.reason, error.path, error.bit) == ("it broke", path, bit)


KINDS = {
    errors.RegistryError("no"): errors.FishplateError,
    errors.DecodeError("no"): errors.FishplateError,
    errors.Truncated("no", missing=3): errors.DecodeError,
    errors.Unknown("no", kind="unknown-packet"): errors.DecodeError,
    errors.LengthMismatch("no"): errors.DecodeError,
    errors.Ambiguous("no"): errors.DecodeError,
    errors.EncodeError("no"): errors.FishplateError,
}


@pytest.mark.parametrize("error", KINDS, ids=lambda error: type(error).__name__)
def test_every_error_is_ours_and_public(error: errors.FishplateError) -> None:
    assert isinstance(error, KINDS[error])
    assert isinstance(error, errors.FishplateError)
    assert getattr(fishplate, type(error).__name__) is type(error)


@pytest.mark.parametrize(
    ("error", "kind"),
    [
        (errors.Truncated("no", missing=3), "truncated"),
        (errors.Unknown("no", kind="unknown-message"), "unknown-message"),
        (errors.LengthMismatch("no"), "length-mismatch"),
        (errors.Ambiguous("no"), "ambiguous"),
    ],
)
def test_a_decode_error_has_the_kind_of_its_problem(error: errors.DecodeError, kind: str) -> None:
    assert error.kind == kind


@pytest.mark.parametrize(
    "error",
    [
        errors.FishplateError("no", path=("header",), bit=3),
        errors.Truncated("no", missing=3, path=("header",), bit=3),
        errors.Unknown("no", kind="unknown-message", bit=0),
        errors.EncodeError("no", path=("header",), expected="5", got=6),
    ],
    ids=lambda error: type(error).__name__,
)
def test_errors_travel_between_processes(error: errors.FishplateError) -> None:
    again = pickle.loads(pickle.dumps(error))  # noqa: S301  our own object
    assert type(again) is type(error)
    assert str(again) == str(error)
    assert vars(again) == vars(error)


def test_the_public_names_are_there() -> None:
    for name in fishplate.__all__:
        assert getattr(fishplate, name) is not None
    assert set(fishplate.__all__) <= set(dir(fishplate))
    with pytest.raises(AttributeError, match="no attribute 'lynt'"):
        fishplate.lynt  # noqa: B018  the access is the test
