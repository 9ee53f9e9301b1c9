/** Lower case without accents, so that "Jose" finds José; letters that do not decompose (ø, ł, đ, ß) have their plain form. */
export function foldForSearch(text: string): string {
  return text
    .normalize('NFD')
    .replace(/\p{Diacritic}/gu, '')
    .toLowerCase()
    .replace(/[øłđßæœ]/g, (letter) => plain[letter] ?? letter);
}

const plain: Record<string, string> = { ø: 'o', ł: 'l', đ: 'd', ß: 'ss', æ: 'ae', œ: 'oe' };

/** Whether a folded text holds every word of what was typed, in any order. */
export function holdsEveryWord(folded: string, typed: string): boolean {
  return foldForSearch(typed)
    .split(/\s+/)
    .every((word) => folded.includes(word));
}
