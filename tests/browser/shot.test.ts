import { it } from 'vitest';
import { openBrowser } from './openBrowser.ts';
import { openSheet } from './sheetPage.ts';

it('shots', async () => {
  const b = await openBrowser();
  const { page } = await openSheet(b);
  await page.locator('.carpets').waitFor();
  await page.screenshot({ path: '/tmp/s1.png' });
  await page.locator('#part-heatPump').scrollIntoViewIfNeeded();
  await page.evaluate("location.hash='part-heatPump'");
  await page.waitForTimeout(700);
  await page.screenshot({ path: '/tmp/s2.png' });
  await page.evaluate("document.querySelector('.answer').scrollTop = 900");
  await page.evaluate("location.hash='part-tariffs'");
  await page.waitForTimeout(700);
  await page.screenshot({ path: '/tmp/s3.png' });
  const n = await openSheet(b, 360);
  await n.page.screenshot({ path: '/tmp/s4.png', fullPage: false });
  await n.page.evaluate("location.hash='part-heatPump'");
  await n.page.waitForTimeout(700);
  await n.page.screenshot({ path: '/tmp/s5.png' });
  await b.close();
});
