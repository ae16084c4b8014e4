"""Sentences that several help texts share."""

from __future__ import annotations

CAUTION = (
    "fishplate is an engineering aid, not a tool qualified under EN 50128 or EN 50716: it "
    "replaces neither the standard, nor national rules, nor licensed practice."
)

EXAMPLES = {
    "decode": """\
  fishplate decode capture.jsonl
  fishplate decode --medium radio --direction to-track 9306400133260008E0E4...
  fishplate decode --as jsonl capture.csv > trees.jsonl
  fishplate decode --version 1.0 --issue 2.3.0 frames.txt
  cat frames.txt | fishplate decode -""",
    "encode": """\
  fishplate encode telegram.yaml
  fishplate encode --length 830 --as capture line/*.yaml > line.jsonl
  fishplate decode --as jsonl run.jsonl | fishplate encode --as capture -
  fishplate encode '{"header": {"NID_MESSAGE": 39, "T_TRAIN": 5, ...}}'""",
    "fields": """\
  fishplate fields frames.txt
  fishplate fields --as jsonl capture.jsonl | grep V_EMA""",
    "list": """\
  fishplate list capture.jsonl
  fishplate list line.csv run.jsonl | grep '!!'""",
    "translate": """\
  fishplate translate --to 2.1 capture.jsonl
  fishplate translate --to 1.0 --as capture run.jsonl > run-in-1.0.jsonl
  fishplate translate --to 2.1 --stored values.yaml --version 1.0 frames.txt""",
    "about": """\
  fishplate about L_ENDSECTION
  fishplate about packet 15
  fishplate about 44 to-track
  fishplate about movement authority
  fishplate about --version 1.1 packet 203
  fishplate about --between 2.0 2.1
  fishplate about message 3 --schema > message-3.schema.json""",
}

SHORT = {
    "decode": "Say what frames mean, or write them as trees.",
    "encode": "Write trees of codes or meanings as frames.",
    "fields": "List every field with its place, code and meaning.",
    "list": "List frames, one line each.",
    "translate": "Translate frames into another system version.",
    "about": "Look up a variable, packet or message, and what versions have otherwise.",
}

OVERVIEW = """\
ERTMS/ETCS packets, telegrams and radio messages: from bits to values and back.

INPUT is a file, - for standard input, or a frame typed as hex digits, 0b and bits, or base64: and
text.

\b
Examples:
  fishplate decode capture.jsonl
  fishplate fields --as jsonl frames.txt
  fishplate encode telegram.yaml
  fishplate translate --to 2.1 capture.jsonl
  fishplate about packet 15
  fishplate about --between 2.0 2.1

\b
Exit codes:
  0  done
  1  kept for findings
  2  wrong usage
  3  some input could not be read, encoded or translated; the rest was"""
