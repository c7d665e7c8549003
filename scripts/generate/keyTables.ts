import * as z from 'zod';
import { allowedText } from '../../src/scenario/entries/allowedText.ts';
import { bare, choicesOf, type Field } from '../../src/scenario/entries/schemaField.ts';

/** Settings that stand in a scenario and in a file of their own: listed once, with the latter. */
const READ_PATH = 'weather.read';

/** One key of a file, as a row of the docs. */
interface Row {
  readonly path: string;
  readonly field: Field;
  /** Choices that the key goes with, such as `given: load`. */
  readonly goesWith?: string;
  readonly standing: 'required' | 'may be left out' | { readonly default: unknown };
}

/**
 * Tables of all keys of a kind of file, as Markdown: one for the keys of the file's top, one for each section.
 *
 * @param schema of the whole file
 */
export function keyTables(schema: z.ZodObject): string {
  const top: Row[] = [];
  const sections: string[] = [];
  for (const [key, entry] of Object.entries(schema.shape)) {
    const row = rowOf(key, entry);
    top.push(row);
    const inner = rowsBelow(row.field, key).filter(({ path }) => !path.startsWith(`${READ_PATH}.`));
    if (inner.length > 0)
      sections.push(
        `#### \`${key}\`${row.field.says === undefined ? '' : `\n\n${row.field.says}`}\n\n${tableOf(inner)}`,
      );
  }
  return [`### Keys\n\n${tableOf(top)}`, ...sections].join('\n');
}

function rowOf(path: string, entry: z.core.$ZodType, goesWith?: string): Row {
  return { path, field: bare(entry), standing: standingOf(entry), ...(goesWith === undefined ? {} : { goesWith }) };
}

function standingOf(entry: z.core.$ZodType): Row['standing'] {
  if (entry instanceof z.ZodDefault || entry instanceof z.ZodPrefault) return { default: entry.def.defaultValue };
  return entry instanceof z.ZodOptional ? 'may be left out' : 'required';
}

/** Rows of what stands inside a section or list. */
function rowsBelow(field: Field, path: string): Row[] {
  const { schema } = field;
  if (schema instanceof z.ZodObject) {
    return Object.entries(schema.shape).flatMap(([key, entry]) => withInner(rowOf(`${path}.${key}`, entry)));
  }
  if (schema instanceof z.ZodDiscriminatedUnion) {
    const by = schema.def.discriminator;
    const words = schema.options.flatMap((form) => choicesOf(form, by));
    const choice: Row = { path: `${path}.${by}`, field: { schema: z.enum(words) }, standing: 'required' };
    return [choice, ...schema.options.flatMap((form) => rowsOfForm(form, path, by))];
  }
  if (schema instanceof z.ZodArray) {
    const item = bare(schema.def.element);
    return rowsBelow(item, `${path}[]`);
  }
  if (schema instanceof z.ZodUnion) return schema.options.flatMap((form) => rowsBelow(bare(form), path));
  return [];
}

function rowsOfForm(form: z.core.$ZodType, path: string, by: string): Row[] {
  if (!(form instanceof z.ZodObject)) return [];
  const goesWith = `${by}: ${choicesOf(form, by).join(' or ')}`;
  return Object.entries(form.shape)
    .filter(([key]) => key !== by)
    .flatMap(([key, entry]) => withInner(rowOf(`${path}.${key}`, entry, goesWith)));
}

function withInner(row: Row): Row[] {
  return [row, ...rowsBelow(row.field, row.path)];
}

function tableOf(rows: readonly Row[]): string {
  const lines = rows.map(
    (row) =>
      `| ${keyCell(row)} | ${cell(row.field.says ?? '')} | ${cell(shownUnit(row.field))} | ${cell(allowedCell(row.field))} | ${standingCell(row)} |`,
  );
  return ['| Key | What it is | Unit | Allowed | Default |', '|---|---|---|---|---|', ...lines, ''].join('\n');
}

function keyCell({ path, goesWith }: Row): string {
  return goesWith === undefined ? `\`${path}\`` : `\`${path}\` with \`${goesWith}\``;
}

function allowedCell(field: Field): string {
  const { schema, format, usual } = field;
  let allowed = plainAllowed({ schema, ...(format === undefined ? {} : { format }) });
  if (schema instanceof z.ZodArray) {
    const item = bare(schema.def.element);
    if (!(item.schema instanceof z.ZodObject)) allowed += `, each ${plainAllowed(item)}`;
  }
  return usual === undefined ? allowed : `${allowed}; usual ${usual}`;
}

/** What may stand there, without the words that make a sentence of it. */
function plainAllowed(field: Field): string {
  if (field.schema instanceof z.ZodEnum) return Object.values(field.schema.enum).join(', ');
  return allowedText(field)
    .replace(/^it is (?:one of )?/, '')
    .replace(/^it lies /, '')
    .replaceAll(', or it is ', ', or ')
    .replaceAll(', or it lies ', ', or ');
}

function shownUnit(field: Field): string {
  return field.unit ?? '';
}

function standingCell({ standing }: Row): string {
  if (typeof standing === 'string') return standing === 'required' ? '**required**' : '';
  const value = standing.default;
  if (Array.isArray(value) && value.length === 0) return 'none';
  if (typeof value !== 'object' || value === null) return `\`${String(value)}\``;
  const inner = Object.entries(value).map(([key, each]) => `${key}: ${String(each)}`);
  return inner.length === 0 ? 'as below' : `\`${inner.join(', ')}\``;
}

function cell(text: string): string {
  return text.replaceAll('|', '\\|').replaceAll('\n', ' ');
}
