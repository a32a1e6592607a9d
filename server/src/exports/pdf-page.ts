import PDFDocument from 'pdfkit';
import { caution } from './caution.js';
import { PdfFonts, type Weight } from './pdf-fonts.js';

const margin = 56;
const footerHeight = 40;
const ink = '#1a1a1a';
const soft = '#5a5a5a';

/** A document on A4 in our own face, with the caution at the foot of every page. Sizes in points. */
export class PdfPage {
  private readonly document: PDFKit.PDFDocument;
  private readonly fonts: PdfFonts;
  private readonly chunks: Buffer[] = [];
  private readonly ended: Promise<void>;

  /**
   * @param title for the document's properties
   * @param foot stands at the foot of every page before the caution
   */
  constructor(
    title: string,
    private readonly foot: string,
    createdAt: Date,
  ) {
    this.document = new PDFDocument({
      size: 'A4',
      margins: { top: margin, left: margin, right: margin, bottom: margin + footerHeight },
      bufferPages: true,
      lang: 'en',
      displayTitle: true,
      info: { Title: title, Author: 'Weighhouse', CreationDate: createdAt },
    });
    this.ended = new Promise((resolve, reject) => {
      this.document.on('data', (chunk: Buffer) => this.chunks.push(chunk));
      this.document.on('end', () => resolve());
      this.document.on('error', reject);
    });
    this.fonts = new PdfFonts(this.document);
  }

  title(text: string): void {
    if (this.document.y > margin) this.gap(10);
    this.write(text, { size: 20, weight: 'bold' });
    this.gap(4);
  }

  heading(text: string): void {
    this.keepTogether(70);
    this.gap(14);
    this.write(text, { size: 13, weight: 'bold' });
    this.gap(3);
  }

  paragraph(text: string): void {
    for (const part of text.split(/\n+/).filter((line) => line.trim() !== '')) {
      this.write(part, {});
      this.gap(4);
    }
  }

  note(text: string): void {
    this.write(text, { size: 9, color: soft });
    this.gap(3);
  }

  /** A line with its label in front, for instance "By when: 5 March 2027". */
  labelled(label: string, text: string): void {
    this.write(`${label}: `, { weight: 'bold', continued: true });
    this.write(text, {});
    this.gap(3);
  }

  item(text: string): void {
    this.write(`– ${text}`, { indent: 10 });
    this.gap(3);
  }

  /** A candidate's line: its name, the share in words, and a beam as long as the share (0 to 1). */
  beam(name: string, words: string, share: number): void {
    this.keepTogether(34);
    this.labelled(name, words);
    const { x, y } = this.document;
    const width = this.document.page.width - 2 * margin;
    this.document.rect(x, y, width, 4).fill('#e4e0e4');
    this.document.rect(x, y, Math.max(1, width * share), 4).fill('#5b3a5e');
    this.document.y = y + 8;
  }

  /** Ends the document. @returns the whole file */
  async finish(): Promise<Buffer> {
    const { start, count } = this.document.bufferedPageRange();
    for (let index = start; index < start + count; index += 1) {
      this.document.switchToPage(index);
      this.footer(index - start + 1, count);
    }
    this.document.end();
    await this.ended;
    return Buffer.concat(this.chunks);
  }

  private footer(page: number, pages: number): void {
    const { document } = this;
    // Text below the bottom margin would begin a new page.
    document.page.margins.bottom = 0;
    document.x = margin;
    document.y = document.page.height - margin - footerHeight + 14;
    const text = `${this.foot} Page ${String(page)} of ${String(pages)}. ${caution}`;
    this.write(text, { size: 8, color: soft });
  }

  private write(
    text: string,
    style: { size?: number; weight?: Weight; color?: string; indent?: number; continued?: boolean },
  ): void {
    const runs = this.fonts.runs(text, style.weight ?? 'regular');
    this.document.fontSize(style.size ?? 10.5).fillColor(style.color ?? ink);
    runs.forEach((run, index) => {
      const continued = style.continued === true || index < runs.length - 1;
      this.document.font(run.font).text(run.text, { continued, lineGap: 2, indent: style.indent ?? 0 });
    });
  }

  private gap(points: number): void {
    this.document.y += points;
  }

  /** Begins a new page where less than this is left. */
  private keepTogether(points: number): void {
    const bottom = this.document.page.height - this.document.page.margins.bottom;
    if (this.document.y + points > bottom) this.document.addPage();
  }
}
