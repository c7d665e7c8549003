import { clamp, lineAt, type PlainLine, type PlainTable } from './plainCase.ts';

/** MODEL section 6: κ, Carnot with 3 K and 7 K approach. */
export function kappa(outdoor: number, flow: number): number {
  return (flow + 3 + 273.15) / Math.max(flow - outdoor + 10, 15);
}

/** A table without gaps: capacity kW and η, [outdoor row][flow column]. */
export interface FilledTable {
  readonly outdoor: readonly number[];
  readonly flow: readonly number[];
  readonly capacity: readonly (readonly number[])[];
  readonly eta: readonly (readonly number[])[];
}

/** MODEL section 6: gaps are filled along the outdoor axis, in η and in capacity, the ends held. */
export function filled(table: PlainTable): FilledTable {
  const { outdoor, flow } = table;
  const fill = (value: (row: number, column: number) => number | null) => {
    const columns = flow.map(
      (_, column): PlainLine =>
        outdoor.flatMap((t, row) => {
          const there = value(row, column);
          return there === null ? [] : [[t, there] as const];
        }),
    );
    return outdoor.map((t, row) => flow.map((_, column) => value(row, column) ?? lineAt(columns[column], t)));
  };
  return {
    outdoor,
    flow,
    capacity: fill((row, column) => table.capacity[row][column]),
    eta: fill((row, column) => {
      const cop = table.cop[row][column];
      return cop === null ? null : cop / kappa(outdoor[row], flow[column]);
    }),
  };
}

/** Bilinear value inside the grid; a single column holds at every flow. */
function bilinear(table: FilledTable, values: readonly (readonly number[])[], outdoor: number, flow: number): number {
  const rows = values.map((row) =>
    lineAt(
      table.flow.map((f, column) => [f, row[column]] as const),
      flow,
    ),
  );
  return lineAt(
    table.outdoor.map((t, row) => [t, rows[row]] as const),
    outdoor,
  );
}

export interface PlainPoint {
  /** kW. */
  readonly capacity: number;
  readonly cop: number;
}

/** MODEL section 6: capacity and COP at any outdoor and flow temperature, °C. */
export function mapAt(table: FilledTable, outdoor: number, flow: number, linear: boolean): PlainPoint {
  const last = (axis: readonly number[]) => axis[axis.length - 1];
  const coldest = table.outdoor[0];
  const warmest = last(table.outdoor);
  const lowest = table.flow[0];
  const T = clamp(outdoor, coldest, warmest);
  const F = clamp(flow, lowest, last(table.flow));

  const copOnGrid = table.eta.map((row, r) =>
    row.map((eta, column) => eta * kappa(table.outdoor[r], table.flow[column])),
  );
  const eta = linear ? bilinear(table, copOnGrid, T, F) / kappa(T, F) : bilinear(table, table.eta, T, F);

  // Colder or hotter flow: κ at the true point. Warmer: at most 5 K above the warmest row. Lower flow: κ at F1, 2 % a kelvin.
  const carnotOutdoor = Math.min(outdoor, warmest + 5);
  const carnotFlow = Math.max(flow, lowest);
  const bonus = flow < lowest ? 1 + 0.02 * Math.min(lowest - flow, 10) : 1;
  const cop = eta * kappa(carnotOutdoor, carnotFlow) * bonus;

  const held = bilinear(table, table.capacity, T, F);
  if (outdoor >= coldest) return { capacity: held, cop };
  const nextRow = bilinear(table, table.capacity, table.outdoor[1], F);
  const slope = (nextRow - held) / (table.outdoor[1] - coldest);
  const falling = held - (coldest - outdoor) * Math.max(slope, 0.01 * held);
  return { capacity: Math.max(falling, 0.3 * held), cop };
}
