import { shown } from '../../core/problem.ts';
import { readFormattedStamps } from './formattedStamps.ts';
import { readHoursOfYear, readPartStamps } from './partStamps.ts';
import { nominalStart, type StampSource, type Stamps } from './stampFields.ts';
import { readWrittenStamps } from './writtenStamps.ts';

/**
 * Reads the stamps of all rows, whatever columns they are made of; rows without any are numbered as they stand.
 *
 * @returns minutes of the stamps' own clock; a stamp that cannot be read is a problem and NaN
 */
export function readStamps(source: StampSource): Stamps {
  const { raw, stampFormat } = source;
  const read = () => {
    if (raw.stamps.has('hourOfYear')) return readHoursOfYear(source);
    if (raw.stamps.has('month') && raw.stamps.has('day')) return readPartStamps(source);
    if (!raw.stamps.has('stamp') && !raw.stamps.has('date')) return numberRows(source);
    return stampFormat === undefined ? readWrittenStamps(source) : readFormattedStamps(source, stampFormat);
  };
  const stamps = read();
  return stamps.offsets === undefined ? stamps : { ...stamps, offsets: completeOffsets(source, stamps.offsets) };
}

/** Rows without stamps: whole years only, in the order of the file. */
function numberRows({ raw, findings }: StampSource): Stamps {
  const { count } = raw;
  if (count !== 8760 && count !== 8784) {
    findings.add({ code: 'weather.row-count', severity: 'error', found: String(count), allowed: '8760 or 8784' });
  }
  const start = nominalStart(count === 8784);
  const minutes = Float64Array.from({ length: count }, (_, i) => start + i * 60);
  return {
    minutes,
    hasYears: false,
    to24: false,
    form: 'none; the rows are taken as they stand, from 1 January 00:00 on',
  };
}

/** Stamps carry offsets all or none. */
function completeOffsets({ raw, findings }: StampSource, offsets: Float64Array): Float64Array {
  const cells = raw.stamps.get('stamp') ?? raw.stamps.get('date') ?? [];
  const first = offsets.findIndex((offset) => Number.isNaN(offset));
  if (first >= 0 && !findings.failed('weather.stamp')) {
    const found = `“${shown(cells[first] ?? '', 40)}”`;
    findings.add({ code: 'weather.some-offsets', severity: 'error', line: raw.lines[first] as number, found });
  }
  return offsets;
}
