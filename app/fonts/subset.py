"""Makes the two fonts of the pages, and the three of figures as files, from the npm package `source-sans` (Source Sans 3 by Adobe, SIL Open Font License 1.1).

Only Latin and Greek letters, the signs of formulas, and the weights 400 to 700 are kept, which makes a fifth of the size.
The licence reserves the name "Source" for unchanged fonts, so the results are called Longhence Sans; their licence stands in NOTICE.
Run from the top of the project with fonttools and brotli installed: python3 app/fonts/subset.py
"""
from io import BytesIO

from fontTools import subset
from fontTools.ttLib import TTFont
from fontTools.varLib import instancer

PACKAGE = 'node_modules/source-sans/WOFF2/VF/'


def characters(*ranges):
    return {code for first, last in ranges for code in range(first, last + 1)}


GREEK = [(0x391, 0x3A1), (0x3A3, 0x3A9), (0x3B1, 0x3C9)]
SIGNS = [(0x2009, 0x200A), (0x2010, 0x2015), (0x2018, 0x201E), (0x2070, 0x2071), (0x2074, 0x208E), (0x2190, 0x2193)]
SINGLE = {ord(sign) for sign in 'ȘșȚț…′″€−∕√∞≈≠≤≥∑∫∂•\u202f'}
UPRIGHT = characters((0x20, 0x7E), (0xA0, 0x17F), *GREEK, *SIGNS) | SINGLE
ITALIC = characters((0x20, 0x7E), (0xA0, 0xFF), *GREEK) | {ord(sign) for sign in '−’–—∞\u2009\u202f'}
FEATURES = 'kern mark mkmk ccmp locl tnum lnum pnum sups subs frac case liga'.split()


def fix_weight(font, weight):
    font = instancer.instantiateVariableFont(font, {'wght': weight})
    if 'gvar' in font:
        for glyph in font.getGlyphOrder():
            if glyph not in font['gvar'].variations:
                font['gvar'].variations[glyph] = []
    plain = BytesIO()
    font.flavor = None
    font.save(plain)
    plain.seek(0)
    return TTFont(plain)


def rename(font):
    for record in font['name'].names:
        if record.nameID != 0:
            text = record.toUnicode()
            for old in ('Source Sans 3 VF', 'Source Sans 3'):
                text = text.replace(old, 'Longhence Sans')
            for old in ('SourceSans3VF', 'SourceSans3'):
                text = text.replace(old, 'LonghenceSans')
            record.string = text


def make(source, target, codes, weight):
    font = fix_weight(TTFont(PACKAGE + source), weight)
    options = subset.Options()
    options.layout_features = FEATURES
    options.notdef_outline = True
    subsetter = subset.Subsetter(options)
    subsetter.populate(unicodes=codes)
    subsetter.subset(font)
    rename(font)
    font.flavor = 'woff2'
    font.save(target)


make('SourceSans3VF-Upright.ttf.woff2', 'app/fonts/longhence-sans.woff2', UPRIGHT, (400, 700))
make('SourceSans3VF-Italic.ttf.woff2', 'app/fonts/longhence-sans-italic.woff2', ITALIC, 400)


# Figures as files need single weights without compression, and no features but those that every program applies by itself.
def make_plain(source, target, codes):
    font = TTFont('node_modules/source-sans/TTF/' + source)
    options = subset.Options()
    options.layout_features = ['kern', 'mark', 'mkmk', 'ccmp']
    options.notdef_outline = True
    options.hinting = False
    subsetter = subset.Subsetter(options)
    subsetter.populate(unicodes=codes)
    subsetter.subset(font)
    rename(font)
    font.save(target)


make_plain('SourceSans3-Regular.ttf', 'app/fonts/longhence-sans-regular.ttf', UPRIGHT)
make_plain('SourceSans3-Semibold.ttf', 'app/fonts/longhence-sans-semibold.ttf', UPRIGHT)
make_plain('SourceSans3-It.ttf', 'app/fonts/longhence-sans-italic.ttf', ITALIC)
