import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { at, escaped, markup } from '../../../../src/report/charts/markup.ts';

describe('markup', () => {
  it('escapes text in its gaps and leaves markup as it is', () => {
    expect(markup`<p title="${'"'}">${'<b>'}${markup`<i>${'&'}</i>`}</p>`.text).toBe(
      '<p title="&quot;">&lt;b&gt;<i>&amp;</i></p>',
    );
  });

  it('writes numbers and lists, and nothing for what is not there', () => {
    expect(markup`${1}${undefined}${['a', markup`<br>`, ['<']]}`.text).toBe('1a<br>&lt;');
  });

  it('lets no text open a tag, close an attribute or begin an entity', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        const safe = escaped(text);
        expect(safe).not.toMatch(/[<>"']/);
        expect(safe.replace(/&(?:amp|lt|gt|quot|#39);/g, '')).not.toContain('&');
      }),
      { seed: 11 },
    );
  });

  it('replaces halves of characters, which no file can hold', () => {
    expect(escaped('a\ud800b😀')).toBe('a\ufffdb😀');
  });

  it.each([
    [5.4321, '5.4'],
    [-0.04, '0'],
    [12, '12'],
    [-2.25, '-2.2'],
  ])('writes the coordinate %d as %s', (value, text) => {
    expect(at(value)).toBe(text);
  });
});
