import { createRequire } from 'node:module';
import type PDFKit from 'pdfkit';

const find = createRequire(import.meta.url).resolve;
const atkinson = (set: string, weight: number): string =>
  find(`@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-${set}-${String(weight)}-normal.woff`);

export type Weight = 'regular' | 'bold';
type Document = InstanceType<typeof PDFKit>;

/**
 * The files of each weight, tried in this order for each letter: our own face, its other Latin letters, and a face
 * with Greek, Cyrillic and signs such as ≥.
 */
const files: Record<Weight, readonly string[]> = {
  regular: [
    atkinson('latin', 400),
    atkinson('latin-ext', 400),
    find('pdfjs-dist/standard_fonts/LiberationSans-Regular.ttf'),
  ],
  bold: [
    atkinson('latin', 700),
    atkinson('latin-ext', 700),
    find('pdfjs-dist/standard_fonts/LiberationSans-Bold.ttf'),
  ],
};

/** What stands for a letter that no face has. */
const unknown = '□';

/** A stretch of text that one face can show. */
export interface Run {
  font: string;
  text: string;
}

/** The faces of one document. */
export class PdfFonts {
  private readonly faces: Record<Weight, { name: string; has: (codePoint: number) => boolean }[]>;

  constructor(private readonly document: Document) {
    this.faces = { regular: this.register('regular'), bold: this.register('bold') };
  }

  /** Cuts a text where the face changes. Letters that no face has become an empty box. */
  runs(text: string, weight: Weight): Run[] {
    const runs: Run[] = [];
    for (const letter of text) {
      const { font, text: shown } = this.faceOf(letter, weight);
      const last = runs.at(-1);
      if (last?.font === font) last.text += shown;
      else runs.push({ font, text: shown });
    }
    return runs;
  }

  private faceOf(letter: string, weight: Weight): Run {
    const codePoint = letter.codePointAt(0) ?? 0;
    const faces = this.faces[weight];
    const face = /\s/.test(letter) ? faces[0] : faces.find(({ has }) => has(codePoint));
    return face ? { font: face.name, text: letter } : { font: faces.at(-1)?.name ?? '', text: unknown };
  }

  private register(weight: Weight): { name: string; has: (codePoint: number) => boolean }[] {
    return files[weight].map((file, index) => {
      const name = `${weight}-${String(index)}`;
      this.document.registerFont(name, file).font(name);
      const { font } = (this.document as unknown as { _font: EmbeddedFont })._font;
      return { name, has: (codePoint) => font.hasGlyphForCodePoint(codePoint) };
    });
  }
}

/** What pdfkit keeps of the face in use; its types do not show it. */
interface EmbeddedFont {
  font: { hasGlyphForCodePoint(codePoint: number): boolean };
}
