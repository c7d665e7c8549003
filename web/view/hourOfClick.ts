/** Where the field of a carpet lies in its drawing: the report's own measures. */
const FIELD = { left: 24, top: 14, width: 330, height: 96 };

/**
 * The hour of the year under a point of a carpet.
 *
 * @param x in the units of the drawing
 * @param y in the units of the drawing
 * @param days of the year
 * @returns nothing outside the field
 * @example hourOfClick(24, 109, 365) // 0
 */
export function hourOfClick(x: number, y: number, days: number): number | undefined {
  const day = Math.floor(((x - FIELD.left) / FIELD.width) * days);
  const hour = 23 - Math.floor(((y - FIELD.top) / FIELD.height) * 24);
  return day < 0 || day >= days || hour < 0 || hour > 23 ? undefined : 24 * day + hour;
}
