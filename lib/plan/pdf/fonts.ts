import fontkit from '@pdf-lib/fontkit';
import type { PDFDocument, PDFFont, PDFRef } from 'pdf-lib';

export type Face = 'text' | 'bold' | 'mono';

/** The font files' bytes (TrueType). They come in as arguments: this code reads no disk. */
export type PlanFonts = Readonly<Record<Face, Uint8Array>>;

export interface Typeface {
  /** Name in a page's resources. */
  readonly resource: string;
  readonly ref: PDFRef;
  /** Font size for a cap height, in the same unit. */
  readonly sizeForCap: (capMm: number) => number;
  /** Width of a text at a cap height, same unit. */
  readonly width: (text: string, capMm: number) => number;
  /** The text as a string operand; characters that the font lacks print as a question mark. */
  readonly encode: (text: string) => string;
}
export type Typefaces = Readonly<Record<Face, Typeface>>;

/** Height of a capital over the font size, from each font's OS/2 table. */
const CAP_SHARE: Readonly<Record<Face, number>> = { text: 0.686, bold: 0.686, mono: 0.75 };
const RESOURCE: Readonly<Record<Face, string>> = { text: 'T', bold: 'B', mono: 'M' };
/** Without ligatures and kerning a glyph stands for one character and widths add up as the viewer adds them. */
const FEATURES = { liga: false, clig: false, kern: false };

const typeface = (face: Face, font: PDFFont): Typeface => {
  const known = new Set(font.getCharacterSet());
  const printable = (text: string): string =>
    [...text].map((char) => (known.has(char.codePointAt(0) ?? 0) ? char : '?')).join('');
  const sizeForCap = (capMm: number): number => capMm / CAP_SHARE[face];
  return {
    resource: RESOURCE[face],
    ref: font.ref,
    sizeForCap,
    width: (text, capMm) => font.widthOfTextAtSize(printable(text), sizeForCap(capMm)),
    encode: (text) => font.encodeText(printable(text)).toString(),
  };
};

/** Embeds the three faces as subsets that grow with the texts that are encoded. */
export async function embedFonts(doc: PDFDocument, fonts: PlanFonts): Promise<Typefaces> {
  doc.registerFontkit(fontkit);
  const embed = async (face: Face, name: string): Promise<Typeface> => {
    const font = await doc.embedFont(fonts[face], { subset: true, customName: name, features: FEATURES });
    return typeface(face, font);
  };
  return {
    text: await embed('text', 'AAAAAA+Archivo-Regular'),
    bold: await embed('bold', 'AAAAAB+Archivo-Bold'),
    mono: await embed('mono', 'AAAAAC+B612Mono-Regular'),
  };
}
