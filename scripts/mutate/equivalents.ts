/** A change that no test can notice because nothing that is computed changes. */
export interface Equivalent {
  readonly file: string;
  /** The line as it stands, without its indent, and the change. */
  readonly text: string;
  readonly was: string;
  readonly becomes: string;
  readonly why: string;
}

/** Argued one by one; they are counted neither as noticed nor as survivors. */
export const equivalents: readonly Equivalent[] = [
  {
    file: 'src/sim/backup.ts',
    text: 'if (c.heatPumpSpaceHeat[i] <= 0) return false;',
    was: '<=',
    becomes: '<',
    why: 'no heat costs nothing by either source, and a tie goes to the heat pump all the same',
  },
  {
    file: 'src/sim/heatingSignature.ts',
    text: "if (ownShare < LEAST_OWN_SHARE) return { refused: 'alike' };",
    was: '<',
    becomes: '<=',
    why: 'a share that is the bound to the last bit is no more alike than one beside it',
  },
  {
    file: 'src/sim/lumpedHouse.ts',
    text: 'const hMassOutdoor = opaque === 0 ? 0 : 1 / (1 / opaque - 1 / hSurfaceMass);',
    was: '0',
    becomes: '1',
    why: 'where nothing is opaque the formula gives 1 / ∞, which is 0 as well (the other 0 of the line is held by tests)',
  },
  {
    file: 'src/sim/mapOnWeather.ts',
    text: 'direct[i] = map.linear || outdoor < coldest ? 1 : 0;',
    was: '0',
    becomes: '1',
    why: 'the map is then read where it stands instead of from what was laid out for the hour: slower, the same figures',
  },
  {
    file: 'src/sim/roomsKernel.ts',
    text: 'let atRest = 0;',
    was: '0',
    becomes: '1',
    why: 'a house with mass sets it before it is read, and no other reads it',
  },
  {
    file: 'src/sim/spaceHeat.ts',
    text: 'if (given / (1 - c.hotWaterShare[i]) < least * (1 - ROUNDING)) c.marks[i] |= MARK.cycling;',
    was: '<',
    becomes: '<=',
    why: 'the bound is a rounding of the last bits: a rate just on it is neither below nor above the lowest level',
  },
  {
    file: 'src/sim/unitOnWeather.ts',
    text: 'for (let i = 0; i < hours; i++) {',
    was: '<',
    becomes: '<=',
    why: 'what is written behind the end of a typed array goes nowhere',
  },
  {
    file: 'src/tariffs/bill.ts',
    text: 'const LEDGER_LENGTH = 84;',
    was: '84',
    becomes: '85',
    why: 'one place more in the array, which nobody reads',
  },
  {
    file: 'src/tariffs/fixedCharges.ts',
    text: 'const daysOfMonth = new Float64Array(12);',
    was: '12',
    becomes: '13',
    why: 'a month more of no days, which costs nothing',
  },
  {
    file: 'src/tariffs/prepareTariff.ts',
    text: 'if (series && means) problems.push(...seriesReach(series, means, PRICES));',
    was: '&&',
    becomes: '||',
    why: 'both are there or neither is',
  },
  {
    file: 'src/tariffs/rateSlices.ts',
    text: 'const last = slices.at(-1);',
    was: '1',
    becomes: '2',
    why: 'slices that could be one stay two of the same price: slower, the same sums',
  },
  {
    file: 'src/tariffs/readSeries.ts',
    text: 'if (found.length > 0 || stepMinutes === undefined || startMinute === undefined) return { problems: found };',
    was: '||',
    becomes: '&&',
    why: 'a step or a beginning that is not known has brought a fault already',
  },
  {
    file: 'src/tariffs/seriesMeans.ts',
    text: 'if (index >= 0 && index < values.length && end <= (index + 1) * stepMinutes) return values[index];',
    was: '<=',
    becomes: '<',
    why: 'a short cut: the sum over the minutes of one value, divided by them, is that value',
  },
  {
    file: 'src/tariffs/seriesTimes.ts',
    text: "else if (distance < 0) faults.add({ code: 'series.disorder', ...place });",
    was: '0',
    becomes: '1',
    why: 'distances are whole minutes, and that of none was dealt with before',
  },
  {
    file: 'src/sim/partLoad.ts',
    text: 'if (rate < least) {',
    was: '<',
    becomes: '<=',
    why: 'at the lowest level itself nothing pauses: both formulas give its COP',
  },
  {
    file: 'src/sim/roomWithMass.ts',
    text: 'for (let step = -START_UP_HOURS; step < hours; step++) {',
    was: '<',
    becomes: '<=',
    why: 'what is written behind the end of a typed array goes nowhere',
  },
  {
    file: 'src/sim/season/declaredSeason.ts',
    text: 'if (limit === undefined || outdoor <= limit.outdoor) return { capacity: limit?.capacity ?? atBivalent, cop };',
    was: '<=',
    becomes: '<',
    why: 'at the point itself the line to it ends at its capacity',
  },
  {
    file: 'src/tariffs/bill.ts',
    text: 'for (let r = 0; r < runs.cell.length; r++) {',
    was: '<',
    becomes: '<=',
    why: 'a run without an end has no hours, and is written nowhere',
  },
  {
    file: 'src/tariffs/rateRules.ts',
    text: "from: minuteOfDay(rate.from ?? '00:00') ?? 0,",
    was: '0',
    becomes: '1',
    why: 'a time that cannot be read has brought a fault already, and its rule is not used',
  },
  {
    file: 'src/tariffs/rateSlices.ts',
    text: 'return from < to ? minute >= from && minute < to : minute >= from || minute < to;',
    was: '<',
    becomes: '<=',
    why: 'a rate that ends where it begins is refused (the other two bounds of the line are held by tests)',
  },
  {
    file: 'src/sim/explain/explainMap.ts',
    text: 'const v = laid.direct[i] === 1 ? shareInCell(map.flow, column, heldFlow) : shareInFlowCell(laid, column, flow);',
    was: '1',
    becomes: '2',
    why: 'both ways come to the same share but for rounding',
  },
  {
    file: 'src/sim/heatingSignature.ts',
    text: 'const TIE = 1e-12;',
    was: '1e-12',
    becomes: '1.01e-12',
    why: 'any share far above rounding and far below a real difference does',
  },
  {
    file: 'src/sim/heatingSignature.ts',
    text: 'if (best === undefined || line.residualSum < best.line.residualSum - tie) best = { base, x, line };',
    was: '<',
    becomes: '<=',
    why: 'a sum that is the bound to the last bit is no better than one beside it',
  },
  {
    file: 'src/sim/mapOnWeather.ts',
    text: 'if (single) values.copyWithin((i * columns + 1) * 2, i * columns * 2, i * columns * 2 + 2);',
    was: '2',
    becomes: '3',
    why: 'the place beyond is written by the next hour, or lies behind the end',
  },
  {
    file: 'src/sim/roomsKernel.ts',
    text: "const capacityShare = unit.lowest.given === 'share' ? unit.lowest.capacity : 1;",
    was: '1',
    becomes: '2',
    why: 'without a share there is a table of the lowest level, and then it is not read',
  },
  {
    file: 'src/sim/roomsKernel.ts',
    text: 'if (reached < firstColumn - ON_THE_EDGE) mark |= MARK.belowLowestFlow;',
    was: '<',
    becomes: '<=',
    why: 'a flow that is the bound to the last bit is no more on the edge than one beside it',
  },
  {
    file: 'src/sim/season/declaredSeason.ts',
    text: 'if (outdoor >= bivalent) return { capacity: Math.max(load, atBivalent), cop };',
    was: '>=',
    becomes: '>',
    why: 'at the bivalent point itself the line to it ends at its capacity',
  },
  {
    file: 'src/tariffs/seriesMeans.ts',
    text: 'if (index >= 0 && index < values.length && end <= (index + 1) * stepMinutes) return values[index];',
    was: '+',
    becomes: '-',
    why: 'a short way for most steps: the way by pieces below comes to the same mean',
  },
];
