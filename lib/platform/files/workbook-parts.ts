import { decodeEntities, listTags, readAttribute } from './read-xml';

/** A sheet as the workbook lists it: its name, whether it is hidden, and the part that holds it (null for a chart). */
export type SheetEntry = { name: string; hidden: boolean; part: string | null };

/** The parts of a workbook that reading cells needs. Source: ECMA-376 Part 1, 12.3 and 18.2; Part 2 for relationships. */
export const workbookPart = 'xl/workbook.xml';
export const relationsPart = 'xl/_rels/workbook.xml.rels';

const decoder = new TextDecoder();

/** The XML of a part as text: UTF-8, which every writer uses. */
export const readPart = (bytes: Uint8Array): string => decoder.decode(bytes);

/** Where a relationship's target lies in the archive: from its root, or from xl/. */
const resolveTarget = (target: string): string => (target.startsWith('/') ? target.slice(1) : `xl/${target}`);

/** What the workbook's relationships point to: sheets by id, and the parts for texts and styles. */
export type Relations = { sheets: Map<string, string>; sharedStrings: string; styles: string };

/** Reads the relationships of a workbook; links to other files are not followed and not listed. */
export function readRelations(xml: string): Relations {
  const relations: Relations = {
    sheets: new Map(),
    sharedStrings: 'xl/sharedStrings.xml',
    styles: 'xl/styles.xml',
  };
  for (const tag of listTags(xml, 'Relationship')) {
    const type = readAttribute(tag, 'Type') ?? '';
    const part = resolveTarget(decodeEntities(readAttribute(tag, 'Target') ?? ''));
    if (type.endsWith('/worksheet')) relations.sheets.set(readAttribute(tag, 'Id') ?? '', part);
    else if (type.endsWith('/sharedStrings')) relations.sharedStrings = part;
    else if (type.endsWith('/styles')) relations.styles = part;
  }
  return relations;
}

/** The sheets of a workbook in their order. */
export const listSheets = (xml: string, relations: Relations): SheetEntry[] =>
  listTags(xml, 'sheet').map((tag) => ({
    name: decodeEntities(readAttribute(tag, 'name') ?? ''),
    hidden: /^(?:hidden|veryHidden)$/.test(readAttribute(tag, 'state') ?? ''),
    part: relations.sheets.get(readAttribute(tag, 'id') ?? '') ?? null,
  }));

/**
 * Cell styles that show a whole number with leading zeros (format 00, 000 …), by index: how many digits they show. A
 * number is a label here, so a 7 that the sheet shows as 07 is 07.
 */
export function listPadding(stylesXml: string): Map<number, number> {
  const digitsOfFormat = new Map<string, number>();
  for (const tag of listTags(stylesXml, 'numFmt')) {
    const code = decodeEntities(readAttribute(tag, 'formatCode') ?? '').replace(/["\\@]/g, '');
    const zeros = /^(0{2,20})(?:;.*)?$/.exec(code)?.[1];
    if (zeros !== undefined) digitsOfFormat.set(readAttribute(tag, 'numFmtId') ?? '', zeros.length);
  }
  const padding = new Map<number, number>();
  if (digitsOfFormat.size === 0) return padding;
  const formats =
    /<(?:[^\s<>/:]+:)?cellXfs[\s>]([\s\S]*?)<\/(?:[^\s<>/:]+:)?cellXfs\s*>/.exec(stylesXml)?.[1] ?? '';
  for (const [index, tag] of listTags(formats, 'xf').entries()) {
    const digits = digitsOfFormat.get(readAttribute(tag, 'numFmtId') ?? '');
    if (digits !== undefined) padding.set(index, digits);
  }
  return padding;
}
