import { cellKind } from '../weather/read/cellKinds.ts';
import { scenarioSchema } from './scenarioSchema.ts';

/** Kinds of tables that a file may hold. */
export type TableKind = 'weather' | 'priceSeries' | 'carbonFactors' | 'meter' | 'readings' | 'homes';

/** What a table was taken for, and by which columns. */
export interface RecognisedTable {
  readonly kind: TableKind;
  /** Kinds that its columns would fit as well. */
  readonly others: readonly TableKind[];
  /** Whether the header says it; a table that says nothing is taken for weather, whose reader looks at the values too. */
  readonly byHeader: boolean;
  /** Names of the columns of stamps and of values, where there is just one of each. */
  readonly timeColumn?: string;
  readonly valueColumn?: string;
}

type Quantity = 'temperature' | 'radiation' | 'carbon' | 'price' | 'energy';

/** Words in the names of columns, in the languages of most such files; the first that fits decides. */
const QUANTITIES: readonly (readonly [Quantity, RegExp])[] = [
  ['temperature', /temp|°\s*[CF]|dry.?bulb|tair/i],
  ['radiation', /radiat|strahl|irradi|rayonn|\/\s*m(?:2|²)/i],
  ['carbon', /carbon|co2|co₂|emission|\b(?:k?g|grams?)\s*\/\s*[km]wh/i],
  ['price', /price|preis|prijs|prix|precio|prezzo|tariff|€|\beur\b|\bct\b|cent\/|\/\s*[km]wh/i],
  [
    'energy',
    /[km]?wh\b|energ|consum|verbrauch|verbruik|usage|\buse[ds]?\b|reading|stand\b|\bindex\b|counter|lectura|lettura|\bfill|deliver|liefer|livraison|m³|\bm3\b|lit(?:re|er)/i,
  ],
];

const KIND_OF = { price: 'priceSeries', carbon: 'carbonFactors' } as const;

/** Lines above the names of the columns that are looked through. */
const MOST_LINES_ABOVE = 200;
/** Characters of a line that are looked at: a line without end is not parted into its cells. */
const LOOKED_AT = 10_000;

/**
 * What kind of table a text is: of temperatures, weather; of prices or carbon factors, such a series; of energies, readings
 * of a meter where dates have no time of day, else the meter of a household; of places in a scenario, homes of a batch.
 *
 * @param lines of the text, without blank lines and remarks
 */
export function tableKind(lines: readonly string[]): RecognisedTable {
  const rows = lines.slice(0, MOST_LINES_ABOVE).map(cellsOf);
  if ((rows[0] ?? []).some(isPlace)) return { kind: 'homes', others: [], byHeader: true };
  const first = rows.findIndex((row) => row.some(isStamp));
  const names = rows[Math.max(0, first - 1)] ?? [];
  const quantities = first === 0 ? [] : names.map(quantityOf);
  const above = lines.slice(0, 3).map(quantityOf);
  if ([...above, ...quantities].includes('temperature')) return { kind: 'weather', others: [], byHeader: true };
  const time = (rows[first] ?? []).findIndex(isStamp);
  const energyKind = cellKind(rows[first]?.[time] ?? '') === 'date' ? 'readings' : 'meter';
  const found = (['price', 'carbon', 'energy'] as const).filter((quantity) => quantities.includes(quantity));
  const [kind, ...others] = found.map((quantity) => (quantity === 'energy' ? energyKind : KIND_OF[quantity]));
  if (kind === undefined) return { kind: 'weather', others: [], byHeader: false };
  const columns = names.filter((_, i) => quantities[i] === found[0]);
  const settled = columns.length === 1 ? { timeColumn: names[time], valueColumn: columns[0] } : {};
  return { kind, others, byHeader: true, ...settled };
}

function quantityOf(name: string): Quantity | undefined {
  return QUANTITIES.find(([, words]) => words.test(name))?.[0];
}

function cellsOf(whole: string): string[] {
  const line = whole.slice(0, LOOKED_AT);
  const mark = ['\t', ';', '|'].find((each) => line.includes(each)) ?? ',';
  return line.split(mark).map((cell) => cell.trim().replace(/^"(.*)"$/, '$1'));
}

function isStamp(cell: string): boolean {
  return ['stamp', 'date'].includes(cellKind(cell));
}

/** Whether a name is written as a place in a scenario, `house.heatLoss.value`. */
function isPlace(name: string): boolean {
  const [section, ...rest] = name.split('.');
  return rest.length > 0 && rest.every((key) => /^\w+$/.test(key)) && Object.hasOwn(scenarioSchema.shape, section);
}
