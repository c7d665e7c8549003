/**
 * Capacity and COP of one level of a unit as printed: row-major outdoor × flow, both axes strictly rising, °C.
 * A gap is null.
 */
export interface PerformanceTable {
  readonly outdoor: readonly number[];
  readonly flow: readonly number[];
  /** Heating capacity, kW. */
  readonly capacity: readonly (number | null)[];
  readonly cop: readonly (number | null)[];
}
