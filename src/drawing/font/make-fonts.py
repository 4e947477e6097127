"""Makes the shipped fonts and their table of advance widths.

    python3 src/drawing/font/make-fonts.py FOLDER-OF-DEJAVU-TTF

needs fontTools and brotli, and DejaVu 2.37. It writes public/fonts/*.woff2 and
src/drawing/font/advances.ts; run the formatter afterwards.
"""

import sys
from pathlib import Path

from fontTools import subset
from fontTools.ttLib import TTFont

LETTERS = "41-5A,61-7A"
GREEK = "391-3A1,3A3-3A9,3B1-3C9"
BASIC_AND_LATIN_1 = "20-7E,A0-FF"

FONTS = {
    "sans": (
        "DejaVuSans.ttf",
        "phasogon-sans.woff2",
        f"{BASIC_AND_LATIN_1},{GREEK},2009,2010,2011,2013,2014,2018,2019,201C,201D,2022,2026,202F,"
        "2030,2032,2033,2074,207B,2080-2089,2126,2190-2193,2206,2212,221A,221E,2220,2225,2248,2260,"
        "2264,2265,22C5,25B3,2713",
    ),
    "bold": (
        "DejaVuSans-Bold.ttf",
        "phasogon-bold.woff2",
        f"{BASIC_AND_LATIN_1},394,3A3,3A9,3B8,3BC,3C0,3C6,2009,2013,2014,2019,2026,202F,2126,2212,2220",
    ),
    "symbol": (
        "DejaVuSerif-Italic.ttf",
        "phasogon-symbol.woff2",
        f"20,{LETTERS},{GREEK},2126,2206",
    ),
}

OPTIONS = ["--flavor=woff2", "--no-hinting", "--layout-features=", "--name-IDs=1,2,4,6",
           "--drop-tables+=FFTM,GDEF,GPOS,GSUB,kern,gasp"]


def advances(path: Path) -> str:
    """Runs of neighbouring characters: the first in hexadecimal, then each width, `20:651 821;A0:651`."""
    font = TTFont(path)
    widths, names = font["hmtx"].metrics, font.getBestCmap()
    runs: list[list[int]] = []
    for character in sorted(names):
        if not runs or character != runs[-1][0] + len(runs[-1]) - 1:
            runs.append([character])
        runs[-1].append(widths[names[character]][0])
    return ";".join(f"{run[0]:X}:{' '.join(map(str, run[1:]))}" for run in runs)


def main(source: Path, project: Path) -> None:
    lines = []
    for face, (original, made, characters) in FONTS.items():
        target = project / "public" / "fonts" / made
        subset.main([str(source / original), *OPTIONS, f"--unicodes={characters}",
                     f"--output-file={target}"])
        lines.append(f"  {face}:\n    '{advances(target)}',")
    table = "\n".join(lines)
    (project / "src" / "drawing" / "font" / "advances.ts").write_text(
        "/** How many of its units the em of every shipped font has. */\n"
        "export const UNITS_PER_EM = 2048\n\n"
        "/**\n"
        " * The advance widths of the shipped fonts, in units of the em: runs of neighbouring characters, the\n"
        " * first in hexadecimal, then a width each. Made by `make-fonts.py`.\n"
        " */\n"
        f"export const ADVANCES = {{\n{table}\n}} as const\n",
        encoding="utf-8",
    )


main(Path(sys.argv[1]), Path(__file__).resolve().parents[3])
