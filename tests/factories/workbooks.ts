import ExcelJS from 'exceljs';
import JSZip from 'jszip';

/** A cell to write: a formula may come without a result, as some programs write it. */
type Cell = ExcelJS.CellValue;
export type SheetToWrite = {
  name: string;
  rows: readonly (readonly Cell[])[];
  hidden?: boolean;
  /** Number formats by column letter, such as `{ B: '00' }`. */
  formats?: Record<string, string>;
};

/** Writes a workbook with a library the product does not read with, so that a test compares two hands. */
export async function makeWorkbook(sheets: readonly SheetToWrite[]): Promise<Uint8Array> {
  const workbook = new ExcelJS.Workbook();
  for (const { name, rows, hidden, formats } of sheets) {
    const sheet = workbook.addWorksheet(name, { state: hidden ? 'hidden' : 'visible' });
    for (const [column, format] of Object.entries(formats ?? {})) sheet.getColumn(column).numFmt = format;
    for (const row of rows) sheet.addRow([...row]);
  }
  return new Uint8Array(await workbook.xlsx.writeBuffer());
}

/** A workbook of one sheet. */
export const makeSheet = (rows: SheetToWrite['rows'], name = 'Roster'): Promise<Uint8Array> =>
  makeWorkbook([{ name, rows }]);

/** Packs files as a ZIP archive. */
export async function makeZip(files: Record<string, string | Uint8Array>): Promise<Uint8Array> {
  const zip = new JSZip();
  for (const [name, content] of Object.entries(files)) zip.file(name, content, { createFolders: false });
  return zip.generateAsync({ type: 'uint8array', compression: 'DEFLATE' });
}

/** The same archive with one file put in or replaced. */
export async function replaceInZip(
  bytes: Uint8Array,
  name: string,
  change: (content: string) => string | Uint8Array,
): Promise<Uint8Array> {
  const zip = await JSZip.loadAsync(bytes);
  const before = (await zip.file(name)?.async('string')) ?? '';
  zip.file(name, change(before), { createFolders: false });
  return zip.generateAsync({ type: 'uint8array', compression: 'DEFLATE' });
}

/** The smallest workbook that a reader accepts, around the XML of its one sheet. */
export const makeBareWorkbook = (sheetXml: string): Promise<Uint8Array> =>
  makeZip({
    'xl/workbook.xml':
      '<workbook xmlns:r="http://schemas.openxmlformats.org/officeDocument/2006/relationships">' +
      '<sheets><sheet name="Roster" sheetId="1" r:id="rId1"/></sheets></workbook>',
    'xl/_rels/workbook.xml.rels':
      '<Relationships><Relationship Id="rId1" Target="worksheets/sheet1.xml" ' +
      'Type="http://schemas.openxmlformats.org/officeDocument/2006/relationships/worksheet"/></Relationships>',
    'xl/worksheets/sheet1.xml': sheetXml,
  });

/** Makes the directory of an archive claim another unpacked size for every file: what a bomb does to pass a check. */
export function lieAboutSizes(bytes: Uint8Array, claimed: number): Uint8Array {
  const lying = bytes.slice();
  const view = new DataView(lying.buffer);
  for (let at = 0; at + 46 < lying.length; at += 1) {
    if (view.getUint32(at, true) === 0x02014b50) view.setUint32(at + 24, claimed, true);
  }
  return lying;
}

/** An office compound file as far as its signature and the name of one stream in its directory. */
export function makeCompoundFile(stream: string): Uint8Array {
  const bytes = new Uint8Array(1536);
  bytes.set([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]);
  bytes.set(Buffer.from(stream, 'utf16le'), 1024);
  return bytes;
}
