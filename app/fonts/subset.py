"""Makes the three fonts of the pages, and the three of figures as files, from the npm package `source-sans` (Source Sans 3 by Adobe, SIL Open Font License 1.1).

Only Latin and Greek letters and the signs of formulas are kept, which makes a fifth of the size. Single weights, for one browser refuses
the variations of the variable font. The licence reserves the name "Source" for unchanged fonts, so the results are called Longhence Sans;
their licence stands in NOTICE. Run from the top of the project with fonttools and brotli installed: python3 app/fonts/subset.py
"""
from fontTools import subset
from fontTools.ttLib import TTFont

PACKAGE = 'node_modules/source-sans/TTF/'


def characters(*ranges):
    return {code for first, last in ranges for code in range(first, last + 1)}


GREEK = [(0x391, 0x3A1), (0x3A3, 0x3A9), (0x3B1, 0x3C9)]
SIGNS = [(0x2009, 0x200A), (0x2010, 0x2015), (0x2018, 0x201E), (0x2070, 0x2071), (0x2074, 0x208E), (0x2190, 0x2193)]
SINGLE = {ord(sign) for sign in 'ȘșȚț…′″€−∕√∞≈≠≤≥∑∫∂•\u202f'}
UPRIGHT = characters((0x20, 0x7E), (0xA0, 0x17F), *GREEK, *SIGNS) | SINGLE
ITALIC = characters((0x20, 0x7E), (0xA0, 0xFF), *GREEK) | {ord(sign) for sign in '−’–—∞\u2009\u202f'}
FEATURES = 'kern mark mkmk ccmp locl tnum lnum pnum sups subs frac case liga'.split()


def rename(font):
    for record in font['name'].names:
        if record.nameID != 0:
            text = record.toUnicode()
            for old in ('Source Sans 3 VF', 'Source Sans 3'):
                text = text.replace(old, 'Longhence Sans')
            for old in ('SourceSans3VF', 'SourceSans3'):
                text = text.replace(old, 'LonghenceSans')
            record.string = text


def make(source, target, codes, features, web):
    font = TTFont(PACKAGE + source)
    options = subset.Options()
    options.layout_features = features
    options.notdef_outline = True
    options.hinting = False
    subsetter = subset.Subsetter(options)
    subsetter.populate(unicodes=codes)
    subsetter.subset(font)
    rename(font)
    font.flavor = 'woff2' if web else None
    font.save(target + ('.woff2' if web else '.ttf'))


# Figures as files are without compression, and with no features but those that every program applies by itself.
BARE = ['kern', 'mark', 'mkmk', 'ccmp']

for style, name, codes in [('Regular', 'regular', UPRIGHT), ('Semibold', 'semibold', UPRIGHT), ('It', 'italic', ITALIC)]:
    for features, web in [(FEATURES, True), (BARE, False)]:
        make(f'SourceSans3-{style}.ttf', f'app/fonts/longhence-sans-{name}', codes, features, web)
