import { describe, expect, it } from 'vitest';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { demoReport } from '../unit/report/html/reportsOf.ts';
import { layoutOf } from './layoutOf.ts';

describe('the report of the demo', () => {
  it('has the layout that was agreed', async () => {
    await expect(layoutOf(reportPage(demoReport()))).toMatchFileSnapshot('report.txt');
  });
});
