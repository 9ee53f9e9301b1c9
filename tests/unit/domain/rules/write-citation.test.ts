import { describe, expect, it } from 'vitest';
import { listCataloguePresets } from '@/lib/domain/rules/catalogue/catalogue';
import { sayHowKnown, writeCitation } from '@/lib/domain/rules/write-citation';

describe('a citation in words', () => {
  it('names a body once and leaves out what is empty', () => {
    const base = { known: 'read', edition: '', rule: 'Art. 4' } as const;
    expect(writeCitation({ ...base, body: 'Body', document: 'Rules of Play' })).toBe(
      'Body, Rules of Play, Art. 4',
    );
    expect(writeCitation({ ...base, body: 'Body', document: 'Body Rules' })).toBe('Body Rules, Art. 4');
  });

  it('says of common practice that there is no source', () => {
    expect(
      writeCitation({ body: 'No body', document: 'x', edition: '', rule: '', known: 'common practice' }),
    ).toBe('Common practice, no source');
  });

  it('has no gap in it for any citation of the catalogue', () => {
    for (const citation of listCataloguePresets().flatMap((preset) => preset.citations)) {
      expect(writeCitation(citation)).not.toMatch(/, ,|,\s*$|^,/);
      expect(sayHowKnown(citation.known)).not.toBe('');
    }
  });
});
