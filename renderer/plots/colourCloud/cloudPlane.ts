/** Side of the a*b* square and of the lightness column beside it, px, for a drawing `width` wide. */
export function cloudMargin(width: number): { top: number; right: number; bottom: number; left: number } {
  const left = 66;
  const side = Math.max(160, Math.min(420, width - left - lightnessColumn));
  return { top: 24, bottom: 46, left, right: Math.max(lightnessColumn, width - left - side) };
}

/** Room for the lightness scale to the right of the square, px. */
export const lightnessColumn = 104;

/** Width at which the square has its full size, px. */
export const cloudWidest = 66 + 420 + lightnessColumn;

export function cloudHeight(width: number): number {
  const { top, bottom, left, right } = cloudMargin(width);
  return width - left - right + top + bottom;
}

/** Half the side of the square in a*b* units: round, and large enough for everything that is drawn. */
export function planeReach(
  places: readonly { readonly a: number; readonly b: number; readonly margin?: number }[],
): number {
  const furthest = places.reduce(
    (reach, { a, b, margin = 0 }) => Math.max(reach, Math.abs(a) + margin, Math.abs(b) + margin),
    20,
  );
  return Math.ceil((furthest * 1.08) / 10) * 10;
}
