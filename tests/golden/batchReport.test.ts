import { describe, expect, it } from 'vitest';
import { batchPage } from '../../src/report/html/batch/batchPage.ts';
import { sampleBatch } from '../unit/report/html/batch/batchReports.ts';
import { layoutOf } from './layoutOf.ts';

describe('the report of a batch', () => {
  it('has the layout that was agreed', async () => {
    await expect(layoutOf(batchPage(sampleBatch()))).toMatchFileSnapshot('batchReport.txt');
  });
});
