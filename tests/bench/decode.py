"""Speed of `fishplate.decode` and `fishplate.encode` as ratios: ``python tests/bench/decode.py``.

All contestants must first give the same result. Then they take turns in one process: in each
round every one is timed for about as long as fishplate, and fishplate again beside each, so that
a change of the machine's speed meets both. A ratio is the median over the rounds.

``--rounds N`` sets how many (default 40); exit code 1 when a target is missed.
"""

from __future__ import annotations

import argparse
import gc
import platform
import statistics
import sys
from dataclasses import dataclass
from functools import partial
from importlib.metadata import version
from time import perf_counter
from typing import TYPE_CHECKING, Any

import with_bitstring
import with_bitstruct
import with_construct
import workload

import fishplate

if TYPE_CHECKING:
    from collections.abc import Callable

BATCH_S = 0.004
"""How long one contestant is timed in one round."""


@dataclass
class Contestant:
    """One way to do the job; `target` is how often fishplate shall do it meanwhile."""

    name: str
    run: Callable[[], Any]
    target: float | None


def decoders(data: bytes) -> list[Contestant]:
    """Every decoder of the workload, the results asserted equal."""
    ours = fishplate.decode(data)
    assert ours.tree() == workload.TREE
    expected = workload.bare(workload.TREE)
    assert workload.integers(expected) + workload.TREE["padding"]["bits"] == workload.INTEGERS
    for parse in (with_construct.decode_as_used, with_construct.decode_best):
        assert with_construct.to_ours(parse(data)) == expected
    for read in (
        with_bitstring.decode_by_value,
        with_bitstring.decode_by_list,
        with_bitstruct.decode,
    ):
        assert read(data) == expected
    return [
        Contestant("construct, BitStruct", partial(with_construct.decode_as_used, data), 40),
        Contestant("construct, best idiom", partial(with_construct.decode_best, data), 8),
        Contestant("bitstring, read_value", partial(with_bitstring.decode_by_value, data), 5.5),
        Contestant(
            "bitstring, read_list a run", partial(with_bitstring.decode_by_list, data), None
        ),
        Contestant(
            f"{with_bitstruct.LIBRARY} in C, a call a run",
            partial(with_bitstruct.decode, data),
            0.8,
        ),
    ]


def encoders(data: bytes) -> list[Contestant]:
    """Every encoder of the workload, the results asserted equal."""
    tree = workload.TREE
    theirs = with_construct.from_ours(tree)
    assert fishplate.encode(tree).tobytes() == data
    assert with_construct.encode_as_used(theirs) == data
    assert with_construct.encode_best(theirs) == data
    assert with_bitstring.encode_by_run(tree) == data
    assert with_bitstring.encode_at_once(tree) == data
    assert with_bitstruct.encode(tree) == data
    return [
        Contestant("construct, BitStruct", partial(with_construct.encode_as_used, theirs), 50),
        Contestant("construct, best idiom", partial(with_construct.encode_best, theirs), 13),
        Contestant("bitstring, pack a run", partial(with_bitstring.encode_by_run, tree), 5),
        Contestant(
            "bitstring, pack, shape known", partial(with_bitstring.encode_at_once, tree), None
        ),
        Contestant(
            f"{with_bitstruct.LIBRARY} in C, a call a run",
            partial(with_bitstruct.encode, tree),
            0.6,
        ),
    ]


def timed(run: Callable[[], Any], count: int) -> float:
    """Seconds a call, over `count` calls."""
    repeats = [None] * count
    start = perf_counter()
    for _ in repeats:
        run()
    return (perf_counter() - start) / count


def calls(run: Callable[[], Any]) -> int:
    """How many calls fill a batch."""
    run()
    return max(1, round(BATCH_S / min(timed(run, 3) for _ in range(5))))


def table(title: str, ours: Callable[[], Any], others: list[Contestant], rounds: int) -> bool:
    """Measure and print one table; True when every target is reached."""
    counts = [calls(each.run) for each in others]
    own_count = calls(ours)
    ratios: list[list[float]] = [[] for _ in others]
    best = [float("inf")] * len(others)
    own_best = float("inf")
    for _ in range(rounds):
        before = timed(ours, own_count)
        for index, each in enumerate(others):
            theirs = timed(each.run, counts[index])
            after = timed(ours, own_count)
            ratios[index].append(2 * theirs / (before + after))
            best[index] = min(best[index], theirs)
            own_best = min(own_best, before, after)
            before = after
    print(f"\n{title:32}{'best us':>9}{'ratio':>8}{'target':>8}")
    print(f"{'fishplate':32}{own_best * 1e6:>9.1f}{1:>8}")
    reached = True
    for each, times, lowest in zip(others, ratios, best, strict=True):
        ratio = statistics.median(times)
        verdict = ""
        if each.target is not None:
            verdict = f"{each.target:>8g}  {'reached' if ratio >= each.target else 'MISSED'}"
            reached &= ratio >= each.target
        print(f"{each.name:32}{lowest * 1e6:>9.1f}{ratio:>8.2f}{verdict}")
    return reached


def main() -> int:
    """Print both tables."""
    parser = argparse.ArgumentParser(description=__doc__.partition("\n")[0])
    parser.add_argument("--rounds", type=int, default=40)
    rounds = parser.parse_args().rounds
    data = with_construct.encode_as_used(with_construct.from_ours(workload.TREE))
    assert len(data) == workload.BYTES
    names = ("construct", "bitstring", with_bitstruct.LIBRARY)
    libraries = ", ".join(f"{each} {version(each)}" for each in names)
    print(f"Python {platform.python_version()}, {libraries}; times a message of {len(data)} bytes")
    tree = workload.TREE
    contests = [
        ("decode", partial(fishplate.decode, data), decoders(data)),
        ("encode", partial(fishplate.encode, tree), encoders(data)),
    ]
    gc.collect()
    gc.freeze()
    reached = [table(*contest, rounds) for contest in contests]
    return 0 if all(reached) else 1


if __name__ == "__main__":
    sys.exit(main())
