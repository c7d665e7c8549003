import { shown } from '../../core/problem.ts';
import type { ColumnChoice } from '../readSettings.ts';
import { columnList } from './columnPlan.ts';
import type { Findings } from './findings.ts';
import type { TableHead } from './header.ts';

/**
 * The column that the settings choose, by number or by name; letter case matters only where it decides.
 *
 * @param choice name in the header, or number counted from 1
 * @param head the table's head
 * @param report where the setting stands, and where a wrong one is reported
 * @returns index counted from 0, or nothing with a problem
 */
export function chosenColumn(
  choice: ColumnChoice,
  head: TableHead,
  report: { readonly path: string; readonly findings: Findings },
): number | undefined {
  if (typeof choice === 'number') {
    if (choice >= 1 && choice <= head.width) return choice - 1;
    return refuse(choice, head, report);
  }
  const wanted = choice.trim();
  const same = indicesWhere(head, (name) => name === wanted);
  const alike = same.length > 0 ? same : indicesWhere(head, (name) => name.toLowerCase() === wanted.toLowerCase());
  if (alike.length === 1) return alike[0];
  if (alike.length === 0) return refuse(choice, head, report);
  report.findings.add({
    code: 'weather.repeated-name',
    severity: 'error',
    path: report.path,
    found: `“${shown(choice)}”`,
    allowed: `columns ${alike.map((index) => index + 1).join(', ')}`,
  });
  return undefined;
}

function indicesWhere(head: TableHead, fits: (name: string) => boolean): number[] {
  return head.names.flatMap((name, index) => (fits(name) ? [index] : []));
}

function refuse(
  choice: ColumnChoice,
  head: TableHead,
  { path, findings }: { readonly path: string; readonly findings: Findings },
): undefined {
  const all = Array.from({ length: head.width }, (_, index) => index);
  findings.add({
    code: 'weather.no-such-column',
    severity: 'error',
    path,
    found: typeof choice === 'number' ? `column ${choice}` : `“${shown(choice)}”`,
    allowed: head.headerRow < 0 ? `no header, and ${head.width} columns` : columnList(all, head.names),
  });
  return undefined;
}
