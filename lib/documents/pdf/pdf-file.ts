import { createHash } from 'node:crypto';
import { PDFDocument, PDFHexString, PDFName, PDFString, type PDFRef } from 'pdf-lib';
import { mmPerPoint } from '../text/fit-text';
import type { FaceName } from '../text/font-faces';
import type { PlacedGlyph, SubsetFace, TypeCase } from '../text/type-case';
import { Canvas } from './canvas';

export type PdfHead = { title: string; subject: string; releasedAt: string };

/**
 * A PDF made page by page. Its dates are the batch's release, its identifier is a hash of what it holds, its fonts are
 * embedded whole from the type case: the same calls give the same bytes. Save it once.
 */
export class PdfFile {
  private readonly pages: Canvas[] = [];

  constructor(
    readonly type: TypeCase,
    private readonly head: PdfHead,
  ) {}

  /** Adds a page of this size in mm and answers the canvas to draw on. */
  addPage(size: { width: number; height: number }): Canvas {
    const canvas = new Canvas(this.type, size);
    this.pages.push(canvas);
    return canvas;
  }

  get pageCount(): number {
    return this.pages.length;
  }

  /** The pages so far, to add what is only known at the end, such as "page 1 of 3". */
  listPages(): readonly Canvas[] {
    return this.pages;
  }

  async save(): Promise<Uint8Array> {
    const doc = await PDFDocument.create({ updateMetadata: false });
    const released = new Date(this.head.releasedAt);
    doc.setTitle(this.head.title, { showInWindowTitleBar: true });
    doc.setSubject(this.head.subject);
    doc.setCreator('Raglan');
    doc.setProducer('Raglan');
    doc.setCreationDate(released);
    doc.setModificationDate(released);
    doc.setLanguage('en');
    const fonts = this.embedFonts(doc);
    const hash = createHash('sha256').update(JSON.stringify(this.head));
    for (const canvas of this.pages) {
      const content = canvas.content();
      hash.update(content);
      const page = doc.addPage([canvas.width / mmPerPoint, canvas.height / mmPerPoint]);
      page.node.set(PDFName.of('Contents'), doc.context.register(doc.context.flateStream(content)));
      const used = [...canvas.used.keys()].map((face) => [face, fonts.get(face)] as const);
      page.node.set(PDFName.of('Resources'), doc.context.obj({ Font: Object.fromEntries(used) }));
    }
    const id = PDFHexString.of(hash.digest('hex').slice(0, 32));
    doc.context.trailerInfo.ID = doc.context.obj([id, id]);
    return doc.save({ addDefaultPage: false, updateFieldAppearances: false, objectsPerTick: 2000 });
  }

  private embedFonts(doc: PDFDocument): Map<FaceName, PDFRef> {
    const used = new Map<FaceName, Map<number, PlacedGlyph>>();
    for (const [face, glyphs] of this.pages.flatMap((page) => [...page.used])) {
      const all = used.get(face) ?? new Map<number, PlacedGlyph>();
      glyphs.forEach((glyph, id) => all.set(id, all.get(id) ?? glyph));
      used.set(face, all);
    }
    const names = [...used.keys()].sort();
    return new Map(
      names.flatMap((name) => {
        const face = this.type.faces.get(name);
        return face ? [[name, embedFont(doc, face, used.get(name) ?? new Map())] as const] : [];
      }),
    );
  }
}

/** A composite TrueType font with glyph numbers as codes (ISO 32000-1, 9.7), widths and a map back to text. */
function embedFont(doc: PDFDocument, face: SubsetFace, used: ReadonlyMap<number, PlacedGlyph>): PDFRef {
  const { context } = doc;
  const { font } = face;
  const scale = 1000 / font.unitsPerEm;
  const ids = [...used.keys()].sort((a, b) => a - b);
  const baseFont = `${face.tag}+${font.postscriptName ?? face.name}`;
  const box = font.bbox;
  const descriptor = context.register(
    context.obj({
      Type: 'FontDescriptor',
      FontName: baseFont,
      Flags: 4,
      FontBBox: [box.minX, box.minY, box.maxX, box.maxY].map((side) => Math.round(side * scale)),
      ItalicAngle: 0,
      Ascent: Math.round(font.ascent * scale),
      Descent: Math.round(font.descent * scale),
      CapHeight: Math.round((font.capHeight || font.ascent) * scale),
      StemV: 80,
      FontFile2: context.register(context.flateStream(face.file, { Length1: face.file.length })),
    }),
  );
  const descendant = context.register(
    context.obj({
      Type: 'Font',
      Subtype: 'CIDFontType2',
      BaseFont: baseFont,
      CIDSystemInfo: { Registry: PDFString.of('Adobe'), Ordering: PDFString.of('Identity'), Supplement: 0 },
      FontDescriptor: descriptor,
      CIDToGIDMap: 'Identity',
      DW: 0,
      W: ids.flatMap((id) => [id, [Math.round(font.getGlyph(id).advanceWidth * scale)]]),
    }),
  );
  return context.register(
    context.obj({
      Type: 'Font',
      Subtype: 'Type0',
      BaseFont: baseFont,
      Encoding: 'Identity-H',
      DescendantFonts: [descendant],
      ToUnicode: context.register(context.flateStream(writeUnicodeMap(ids, used))),
    }),
  );
}

/** Which characters each glyph stands for, so that text can be searched and copied (ISO 32000-1, 9.10.3). */
function writeUnicodeMap(ids: readonly number[], used: ReadonlyMap<number, PlacedGlyph>): string {
  const hex = (unit: number): string => unit.toString(16).padStart(4, '0');
  const rows = ids.flatMap((id) => {
    const text = used.get(id)?.text ?? '';
    const units = Array.from({ length: text.length }, (_, at) => hex(text.charCodeAt(at)));
    return units.length > 0 ? [`<${hex(id)}> <${units.join('')}>`] : [];
  });
  const blocks = Array.from({ length: Math.ceil(rows.length / 100) }, (_, at) => {
    const block = rows.slice(at * 100, at * 100 + 100);
    return `${block.length} beginbfchar\n${block.join('\n')}\nendbfchar`;
  });
  return [
    '/CIDInit /ProcSet findresource begin 12 dict begin begincmap',
    '/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def',
    '/CMapName /Adobe-Identity-UCS def /CMapType 2 def',
    '1 begincodespacerange <0000> <ffff> endcodespacerange',
    ...blocks,
    'endcmap CMapName currentdict /CMap defineresource pop end end',
  ].join('\n');
}
