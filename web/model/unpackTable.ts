/** A table of regular stamps and numbers in little room, as the build packs it. */
export interface PackedTable {
  /** Comments and header. */
  readonly head: string;
  /** First stamp, to the minute, and what stands behind the minutes. */
  readonly first: string;
  readonly zone: string;
  /** Step of the stamps. */
  readonly minutes: number;
  /** Decimals of each column, and its numbers as differences from the one above, without the decimal point. */
  readonly columns: readonly { readonly decimals: number; readonly steps: string }[];
}

const MILLIS_PER_MINUTE = 60_000;

/** The text of a packed table, byte for byte. */
export function unpackTable({ head, first, zone, minutes, columns }: PackedTable): string {
  const start = Date.parse(`${first}Z`);
  const values = columns.map(({ decimals, steps }) => {
    let sum = 0;
    return steps.split(' ').map((step) => {
      sum += Number(step);
      return (sum / 10 ** decimals).toFixed(decimals);
    });
  });
  const rows = values[0].map((_, i) => {
    const stamp = new Date(start + i * minutes * MILLIS_PER_MINUTE).toISOString().slice(0, 16) + zone;
    return [stamp, ...values.map((column) => column[i])].join(',');
  });
  return `${head}\n${rows.join('\n')}\n`;
}
