/** One line of the navigation. `count` is what waits there for the reader; `countLabel` says it in words ("7 with blockers"). */
export type NavigationItem = {
  href: string;
  label: string;
  count?: number | undefined;
  countLabel?: string | undefined;
};

/** Lines under one heading, such as Plan or Make. */
export type NavigationGroup = { title: string; items: readonly NavigationItem[] };

/** The address among these that the reader is at or below, the deepest one, or null. */
export function findCurrent(pathname: string, hrefs: readonly string[]): string | null {
  const holding = hrefs.filter((href) => pathname === href || pathname.startsWith(`${href}/`));
  return holding.sort((a, b) => b.length - a.length)[0] ?? null;
}
