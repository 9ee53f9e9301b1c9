import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readUpload, type UploadResult } from '@/lib/platform/files/read-upload';
import { makeCompoundFile, makeSheet, makeZip } from '../../../factories/workbooks';

const utf8 = (text: string): Uint8Array => new TextEncoder().encode(text);
const codeOf = (result: UploadResult): string => (result.ok ? 'ok' : result.code);
const messageOf = (result: UploadResult): string => (result.ok ? '' : result.message);

describe('readUpload', () => {
  it('goes by what a file is, not by what it is called', async () => {
    const workbook = await readUpload({
      bytes: await makeSheet([['Name'], ['Ana Quill']]),
      name: 'roster.csv',
    });
    expect(workbook.ok && workbook.kind).toBe('workbook');
    expect(workbook.ok && workbook.tables[0]?.rows).toEqual([['Name'], ['Ana Quill']]);
    const text = await readUpload({ bytes: utf8('Name;Number\nAna Quill;7\n'), name: 'roster.xlsx' });
    expect(text.ok && text.kind).toBe('text');
    expect(text.ok && text.text).toEqual({ encoding: 'UTF-8', sure: true, sample: [], delimiter: ';' });
    expect(text.ok && text.tables[0]).toMatchObject({
      name: 'roster.xlsx',
      rows: [
        ['Name', 'Number'],
        ['Ana Quill', '7'],
      ],
    });
  });

  it('reads a text file again in the encoding and with the separator a person chose', async () => {
    const bytes = Uint8Array.from([...utf8('Name,Number\n'), 0xa3, ...utf8('ukasz Marl,7\n')]);
    const guessed = await readUpload({ bytes, name: 'a.csv' });
    expect(guessed.ok && guessed.text).toMatchObject({
      encoding: 'Windows-1252',
      sure: false,
      sample: ['£ukasz Marl'],
    });
    const chosen = await readUpload({ bytes, name: 'a.csv' }, { encoding: 'windows-1250', delimiter: ';' });
    expect(chosen.ok && chosen.tables[0]?.rows).toEqual([['Name,Number'], ['Łukasz Marl,7']]);
  });

  it.each([
    ['a PDF document', utf8('%PDF-1.7\n')],
    ['a picture (PNG)', Uint8Array.from([0x89, 0x50, 0x4e, 0x47, 0x0d])],
    ['a picture (JPEG)', Uint8Array.from([0xff, 0xd8, 0xff, 0xe0])],
    ['a text document (RTF)', utf8('{\\rtf1 hello}')],
    ['a web page (HTML)', utf8('\uFEFF<html><table><tr><td>Ana</td></tr></table></html>')],
    ['an XML file', utf8('<?xml version="1.0"?><Workbook/>')],
    ['a text document (.doc)', makeCompoundFile('WordDocument')],
  ])('names %s and says what to do instead', async (what, bytes) => {
    const result = await readUpload({ bytes, name: 'roster.xlsx' });
    expect(codeOf(result)).toBe('wrong-type');
    expect(messageOf(result)).toContain(what);
    expect(messageOf(result)).toContain('.xlsx');
  });

  it.each([
    ['a text document (.docx)', { 'word/document.xml': '' }],
    ['a presentation (.pptx)', { 'ppt/presentation.xml': '' }],
    ['a Numbers or Pages document', { 'Index/Document.iwa': '', 'Metadata/Properties.plist': '' }],
    [
      'an OpenDocument file (.ods or .odt)',
      { mimetype: 'application/vnd.oasis.opendocument.spreadsheet', 'content.xml': '' },
    ],
    ['a packed folder (ZIP)', { 'roster.csv': 'Name' }],
  ])('names %s, which is an archive too', async (what, files) => {
    const result = await readUpload({ bytes: await makeZip(files), name: 'roster.xlsx' });
    expect(codeOf(result)).toBe('wrong-type');
    expect(messageOf(result)).toContain(what);
  });

  it('refuses a binary workbook, an empty file and an oversized one', async () => {
    expect(
      codeOf(await readUpload({ bytes: await makeZip({ 'xl/workbook.bin': '' }), name: 'a.xlsb' })),
    ).toBe('old-workbook');
    const empty = await readUpload({ bytes: new Uint8Array(), name: 'otters.csv' });
    expect(codeOf(empty)).toBe('empty');
    expect(messageOf(empty)).toContain('otters.csv is empty');
    expect(codeOf(await readUpload({ bytes: new Uint8Array(6_000_000), name: 'a.csv' }))).toBe('too-large');
  });

  it('answers for any bytes at all', async () => {
    await fc.assert(
      fc.asyncProperty(fc.uint8Array({ maxLength: 400 }), async (bytes) => {
        const result = await readUpload({ bytes, name: 'x' });
        if (!result.ok) expect(result.message).toMatch(/\.$/);
        else expect(result.tables.length).toBeGreaterThan(0);
      }),
      { numRuns: 400 },
    );
  });
});
