#!/bin/sh
# Cuts the report's fonts out of DejaVu 2.37 (Debian packages fonts-dejavu-core and fonts-dejavu-extra, python3-fonttools 4.38, python3-brotli).
# Run in this folder. Latin, Greek, punctuation, superscripts, arrows, operators and geometric shapes stay; layout tables go, since text is set without shaping.
set -eu
source=${1:-/usr/share/fonts/truetype/dejavu}
wide="U+0020-007E,U+00A0-017F,U+02C6,U+02C7,U+02D8-02DD,U+0302,U+0391-03C9,U+2009,U+200A,U+2010-2015,U+2018-201E,U+2020-2022,U+2026,U+202F,U+2030,U+2032,U+2033,U+2070-207E,U+2080-208E,U+20AC,U+2126,U+2190-2195,U+21D2,U+2200-2209,U+220F-221E,U+2220,U+2225-222B,U+2248,U+2260,U+2261,U+2264,U+2265,U+226A,U+226B,U+22A5,U+22C5,U+25A0,U+25A1,U+25B2-25B7,U+25BC-25C1,U+25C6,U+25C7,U+25CA,U+25CB,U+25CF,U+2713,U+2717,U+27C2"
narrow="U+0020-007E,U+00A0-00FF,U+2010-2015,U+2018-201D,U+2026,U+202F,U+2212"
cut() {
    python=${PYTHON:-/usr/bin/python3}
    "$python" -m fontTools.subset "$source/$1.ttf" --unicodes="$2" --layout-features= --no-hinting --desubroutinize \
        --name-IDs='0,1,2,3,4,5,6,13,14' --notdef-outline --no-recalc-timestamp --output-file="$1.ttf"
    "$python" -m fontTools.subset "$1.ttf" --unicodes='*' --flavor=woff2 --name-IDs='0,1,2,3,4,5,6,13,14' --notdef-outline --no-recalc-timestamp --output-file="$1.woff2"
}
cut DejaVuSans "$wide"
cut DejaVuSans-Bold "$wide"
cut DejaVuSansMono "$narrow"
rm DejaVuSansMono.woff2
