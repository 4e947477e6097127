"""Makes the shipped fonts and their table of advance widths.

    python3 src/drawing/font/make-fonts.py FOLDER-OF-DEJAVU-TTF

needs fontTools and brotli, and DejaVu 2.37. It writes public/fonts/*.woff2, the faces that go into a
PDF as public/fonts/*.ttf, and src/drawing/font/advances.ts; run the formatter afterwards.
"""

import sys
from pathlib import Path

from fontTools import subset
from fontTools.ttLib import TTFont
from fontTools.ttLib.tables._g_l_y_f import Glyph

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

# What a PDF is lettered with holds more of the same faces: names are written in many alphabets.
SYMBOLS = ("2009,2010,2011,2013,2014,2018-201E,2020-2022,2026,202F,2030,2032,2033,2039,203A,2044,2070,"
           "2074-2079,207B,2080-2089,20AC,2103,2116,2122,2126,2190-2195,21D2,2200,2202,2206,2211,2212,"
           "2215,221A,221D,221E,2220,2225,2229,222B,2234,223C,2245,2248,2260,2261,2264,2265,22A5,22C5,"
           "2300,2393,25A0,25A1,25B2,25B3,25BA,25CB,25CF,2713,2717,FFFD")
ALPHABETS = "100-17F,18F,192,1CD-1D4,218-21B,2BC,2C6,2C7,2D8-2DD,370-3FF,400-45F,490,491,1E80-1E85,1EF2,1EF3"
PRINTED = {
    "sans": ("DejaVuSans.ttf", "phasogon-print-sans.ttf"),
    "bold": ("DejaVuSans-Bold.ttf", "phasogon-print-bold.ttf"),
    "symbol": ("DejaVuSerif-Italic.ttf", "phasogon-print-symbol.ttf"),
}
PRINT_OPTIONS = ["--no-hinting", "--layout-features=", "--name-IDs=0,1,2,3,4,5,6,13,14",
                 "--drop-tables+=FFTM,GDEF,GPOS,GSUB,kern,gasp"]

# Empty letters at the start of the private use area of the upright face: whatever it lacks is painted, and
# these lie over the picture, each standing for one character, so that the text can be found and copied.
SPARE_LETTERS = 400
FIRST_SPARE = 0xE000

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


def add_spare_letters(path: Path) -> None:
    font = TTFont(path)
    order = list(font.getGlyphOrder())
    for at in range(SPARE_LETTERS):
        name = f"spare{at:03d}"
        order.append(name)
        font["glyf"].glyphs[name] = Glyph()
        font["hmtx"].metrics[name] = (1024, 0)
        for table in font["cmap"].tables:
            if table.isUnicode():
                table.cmap[FIRST_SPARE + at] = name
    font.setGlyphOrder(order)
    font["glyf"].glyphOrder = order
    font["maxp"].numGlyphs = len(order)
    font.save(path)


def main(source: Path, project: Path) -> None:
    lines = []
    for face, (original, made, characters) in FONTS.items():
        target = project / "public" / "fonts" / made
        subset.main([str(source / original), *OPTIONS, f"--unicodes={characters}",
                     f"--output-file={target}"])
        lines.append(f"  {face}:\n    '{advances(target)}',")
    for original, made in PRINTED.values():
        subset.main([str(source / original), *PRINT_OPTIONS,
                     f"--unicodes={BASIC_AND_LATIN_1},{ALPHABETS},{SYMBOLS}",
                     f"--output-file={project / 'public' / 'fonts' / made}"])
    add_spare_letters(project / "public" / "fonts" / PRINTED["sans"][1])
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
