"""Packets written as ASN.1 whose unaligned PER encoding is the packet of SUBSET-026.

Sources: SUBSET-026 issue 3.6.0, clauses 7.4.2, 7.4.3 and 8.4; ITU-T X.691 (unaligned variant).
Clause numbers of X.691 are from memory. What of PER is used:

* a constrained INTEGER whose range is a power of two is written in exactly so many bits (11.5);
* SEQUENCE OF with SIZE(0..31) is its count in 5 bits, then the elements (11.9, 20): N_ITER;
* a SEQUENCE without extension whose only component is OPTIONAL is one bit, 1 when the component
  is there, then the component (19): a qualifier such as Q_NEWCOUNTRY or Q_OVERLAP and what it
  governs.

Conditions on codes of more than one bit have no such form; packets that hold them are not here.
"""

from __future__ import annotations

MODULE = """
Packets DEFINITIONS AUTOMATIC TAGS ::= BEGIN

B1 ::= INTEGER (0..1)
B2 ::= INTEGER (0..3)
B3 ::= INTEGER (0..7)
B4 ::= INTEGER (0..15)
B6 ::= INTEGER (0..63)
B7 ::= INTEGER (0..127)
B8 ::= INTEGER (0..255)
B10 ::= INTEGER (0..1023)
B13 ::= INTEGER (0..8191)
B14 ::= INTEGER (0..16383)
B15 ::= INTEGER (0..32767)
B24 ::= INTEGER (0..16777215)

-- 8.4.2.1 header of a balise telegram
BaliseHeader ::= SEQUENCE {
  q-updown B1, m-version B7, q-media B1, n-pig B3, n-total B3, m-dup B2, m-mcount B8,
  nid-c B10, nid-bg B14, q-link B1 }

-- 7.4.2.0
ToTrain0 ::= SEQUENCE { nid-packet B8, nid-vbcmk B6 }

-- 7.4.2.1
ToTrain2 ::= SEQUENCE { nid-packet B8, q-dir B2, l-packet B13, m-version B7 }

-- Q_NEWCOUNTRY and NID_C
Country ::= SEQUENCE { nid-c B10 OPTIONAL }

-- 7.4.2.2
Link ::= SEQUENCE {
  d-link B15, country Country, nid-bg B14, q-linkorientation B1, q-linkreaction B2, q-locacc B6 }
ToTrain5 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  first Link, further SEQUENCE (SIZE (0..31)) OF Link }

-- 7.4.2.3, 7.4.2.4
SectionTimer ::= SEQUENCE {
  timer SEQUENCE { t-sectiontimer B10, d-sectiontimerstoploc B15 } OPTIONAL }
Section ::= SEQUENCE { l-section B15, section-timer SectionTimer }
EndTimer ::= SEQUENCE { timer SEQUENCE { t-endtimer B10, d-endtimerstartloc B15 } OPTIONAL }
DangerPoint ::= SEQUENCE { point SEQUENCE { d-dp B15, v-releasedp B7 } OPTIONAL }
Overlap ::= SEQUENCE {
  area SEQUENCE { d-startol B15, t-ol B10, d-ol B15, v-releaseol B7 } OPTIONAL }
Authority ::= SEQUENCE {
  v-ema B7, t-ema B10, sections SEQUENCE (SIZE (0..31)) OF Section,
  l-endsection B15, section-timer SectionTimer, end-timer EndTimer,
  danger-point DangerPoint, overlap Overlap }
ToTrain12 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2, v-main B7, authority Authority }
ToTrain15 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2, authority Authority }

-- 7.4.2.5
ToTrain16 ::= SEQUENCE { nid-packet B8, q-dir B2, l-packet B13, q-scale B2, l-section B15 }

-- 7.4.2.6
Gradient ::= SEQUENCE { d-gradient B15, q-gdir B1, g-a B8 }
ToTrain21 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  first Gradient, further SEQUENCE (SIZE (0..31)) OF Gradient }

-- 7.4.2.12
ToTrain49 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13,
  groups SEQUENCE (SIZE (0..31)) OF SEQUENCE { country Country, nid-bg B14 } }

-- 7.4.2.14
ToTrain57 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, t-mar B8, t-timeoutrqst B10, t-cycrqst B8 }

-- 7.4.2.15
ToTrain58 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2, t-cycloc B8, d-cycloc B15, m-loc B3,
  locations SEQUENCE (SIZE (0..31)) OF SEQUENCE { d-loc B15, q-lgtloc B1 } }

-- 7.4.2.17
ToTrain65 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  nid-tsr B8, d-tsr B15, l-tsr B15, q-front B1, v-tsr B7 }

-- 7.4.2.19
Mass ::= SEQUENCE { d-trackcond B15, l-trackcond B15 }
ToTrain67 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  first Mass, further SEQUENCE (SIZE (0..31)) OF Mass }

-- 7.4.2.22
ToTrain71 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  d-adhesion B15, l-adhesion B15, m-adhesion B1 }

-- 7.4.2.25
Position ::= SEQUENCE {
  country Country, nid-bg B14, d-posoff B15, q-mposition B1, m-position B24 }
ToTrain79 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  first Position, further SEQUENCE (SIZE (0..31)) OF Position }

-- 7.4.2.26
Profile ::= SEQUENCE {
  d-mamode B15, m-mamode B2, v-mamode B7, l-mamode B15, l-ackmamode B15, q-mamode B1 }
ToTrain80 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  first Profile, further SEQUENCE (SIZE (0..31)) OF Profile }

-- 7.4.2.30
ToTrain134 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2,
  nid-loop B14, d-loop B15, l-loop B15, q-loopdir B1, q-sscode B4 }

-- 7.4.2.34
ToTrain138 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2, d-startreverse B15, l-reversearea B15 }

-- 7.4.2.35
ToTrain139 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, q-scale B2, d-reverse B15, v-reverse B7 }

-- 7.4.2.37
ToTrain141 ::= SEQUENCE { nid-packet B8, q-dir B2, l-packet B13, q-gdir B1, g-tsr B8 }

-- 7.4.2.37.3
ToTrain180 ::= SEQUENCE {
  nid-packet B8, q-dir B2, l-packet B13, display SEQUENCE { t-lssma B8 OPTIONAL } }

-- 7.4.3.3
ToTrack2 ::= SEQUENCE {
  nid-packet B8, l-packet B13, first B7, further SEQUENCE (SIZE (0..31)) OF B7 }

-- 7.4.3.4
ToTrack4 ::= SEQUENCE { nid-packet B8, l-packet B13, m-error B8 }

-- 7.4.3.4.2
ToTrack9 ::= SEQUENCE { nid-packet B8, l-packet B13, nid-ltrbg B24 }

END
"""

QUALIFIERS = {
    "country": "Q_NEWCOUNTRY",
    "section-timer": "Q_SECTIONTIMER",
    "end-timer": "Q_ENDTIMER",
    "danger-point": "Q_DANGERPOINT",
    "overlap": "Q_OVERLAP",
    "display": "Q_LSSMA",
}
"""The qualifier that the presence bit of each SEQUENCE with one OPTIONAL component stands for."""

PACKETS = {
    ("to-train", number): f"ToTrain{number}"
    for number in (0, 2, 5, 12, 15, 16, 21, 49, 57, 58, 65, 67, 71, 79, 80, 134, 138, 139, 141, 180)
} | {("to-track", number): f"ToTrack{number}" for number in (2, 4, 9)}
"""The type of each packet."""

SETS = {5: "links", 21: "gradients", 67: "areas", 79: "positions", 80: "profiles", 2: "versions"}
"""What fishplate calls the list of `first` and `further`, by packet number."""
