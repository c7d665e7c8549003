/**
 * Values by the group that each belongs to, in their order.
 *
 * @param values any numbers; those that are NaN belong to no group
 * @param groups how many there are
 * @param groupOf group of a place in `values`, 0 … groups − 1; a place with another number belongs to none
 * @returns the values of each group; empty where it has none
 * @example partedValues(Float64Array.of(7, 8, 9), 2, (i) => i % 2)[0].length // 2
 */
export function partedValues(values: Float64Array, groups: number, groupOf: (place: number) => number): Float64Array[] {
  const group = Int32Array.from(values, (value, place) => (Number.isNaN(value) ? -1 : groupOf(place)));
  const counts = new Uint32Array(groups);
  for (const each of group) if (each >= 0 && each < groups) counts[each]++;
  const parts = Array.from(counts, (count) => new Float64Array(count));
  counts.fill(0);
  for (let place = 0; place < values.length; place++) {
    const each = group[place];
    if (each < 0 || each >= groups) continue;
    parts[each][counts[each]] = values[place];
    counts[each]++;
  }
  return parts;
}
