import { describe, expect, it, test } from 'vitest';
import { problemText } from '../../../../src/core/problemText.ts';
import { isLooseForm } from '../../../../src/weather/read/looseForm.ts';
import { read } from './syntheticYear.ts';

describe('a form of stamps leaves too much open', () => {
  it.each(['MdMdMdMd', 'H:mm – H:mm', 'yMLdoHhms', 'z z', 'yy.MM.yy'])('as %s', (form) => {
    expect(isLooseForm(form)).toBe(true);
  });

  it.each([
    'd/M/y H:m',
    'yyyy-MM-dd HH:mm',
    'dd-MMM-yyyy HH:mm',
    'HH:mm – HH:mm',
    'EEE, dd.MM.yy h:mm a ZZ',
    'd.M.y H:m:s.S',
  ])('and not as %s', (form) => {
    expect(isLooseForm(form)).toBe(false);
  });
});

test('digits that could be parted among sixty varying parts in more ways than there is time for are not tried', () => {
  const form = 'Md'.repeat(30);
  const rows = Array.from({ length: 50 }, () => `${'1'.repeat(90)}x,1.5`);
  for (const settings of [{ stampFormat: form }, { stampFormat: form, columns: { stamp: 1 } }]) {
    const { problems } = read(['time,temperature °C', ...rows].join('\n'), settings);
    expect(problems.map(problemText).join('\n')).toContain(
      `stampFormat is “${form.slice(0, 59)}…”: it holds a part of varying length twice, or more than eight of them`.replace(
        '…',
        form.length > 60 ? '…' : form.slice(59),
      ),
    );
  }
});

test('a cell longer than any stamp is none, whatever the form', () => {
  const form = "z'!'";
  const rows = Array.from({ length: 50 }, () => `${'a'.repeat(50_000)},1.5`);
  const { problems } = read(['time,temperature °C', ...rows].join('\n'), { stampFormat: form, columns: { stamp: 1 } });
  expect(problems.map(problemText).join('\n')).toContain('no stamp of the file has this form');
});
