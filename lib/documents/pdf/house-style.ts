import type { BatchSnapshot } from '@/lib/domain/batch/batch-snapshot';
import type { Stroke } from './canvas';

/** The colours of the house on paper: ink and its greys, damson for the mark, care for what needs a hand. */
export const ink = '#1d1a16';
export const dusk = '#655f54';
export const thread = '#b7af9d';
export const linen = '#f3f0e7';
export const damson = '#55264f';
export const care = '#8a5a00';

/** Widths in mm: a hairline between rows, a rule under a heading, and the dashed seam that divides a page. */
export const hairline: Stroke = { colour: '#cfc8b8', width: 0.2 };
export const rule: Stroke = { colour: ink, width: 0.45 };
export const seam: Stroke = { colour: thread, width: 0.35, dash: [1.6, 1.1] };
export const tickBox: Stroke = { colour: ink, width: 0.25 };

/** Sheets in mm (sources: ISO 216, A4; ANSI/ASME Y14.1, size A). */
export const sheets: Record<BatchSnapshot['batch']['paper'], { width: number; height: number }> = {
  A4: { width: 210, height: 297 },
  Letter: { width: 215.9, height: 279.4 },
};

/** A label of 4 by 6 inches in mm. */
export const labelSize = { width: 101.6, height: 152.4 };

/** White margin of a sheet in mm, wider than the strip that office printers leave bare (common practice, no source). */
export const margin = { side: 14, top: 13, foot: 12 };
