// A table of regular stamps and numbers in little room: stamps by their first and their step, each number by its difference
// from the one above. `web/model/unpackTable.ts` makes the same text of it again.

/** @param {string} text a CSV table whose first column holds ISO stamps, its rows behind comments and a header */
export function packTable(text) {
  const lines = text.split('\n');
  const from = lines.findIndex((line) => /^\d{4}-/.test(line));
  const rows = lines.slice(from, -1).map((line) => line.split(','));
  const minuteOf = (stamp) => Date.parse(`${stamp.slice(0, 16)}Z`) / 60_000;
  const columns = rows[0].slice(1).map((first, column) => {
    const decimals = first.split('.')[1]?.length ?? 0;
    const whole = rows.map((row) => Math.round(Number(row[column + 1]) * 10 ** decimals));
    return { decimals, steps: whole.map((value, i) => value - (whole[i - 1] ?? 0)).join(' ') };
  });
  return {
    head: lines.slice(0, from).join('\n'),
    first: rows[0][0].slice(0, 16),
    zone: rows[0][0].slice(16),
    minutes: minuteOf(rows[1][0]) - minuteOf(rows[0][0]),
    columns,
  };
}
