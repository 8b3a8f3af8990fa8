/** Sheets of paper: outer size, mm (ISO 216; ANSI/ASME Y14.1 A). */
export const paperSizes = {
  A4: { width_mm: 210, height_mm: 297 },
  Letter: { width_mm: 215.9, height_mm: 279.4 },
} as const;
export type PaperSize = keyof typeof paperSizes;

export const margin_mm = 12;

/** Type sizes that are tried from large to small until a page holds everything, pt. Below the last nobody reads. */
export const typeSizes_pt = [9.5, 9, 8.5, 8, 7.5, 7, 6.5] as const;
