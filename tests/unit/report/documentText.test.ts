import { describe, expect, it } from 'vitest';
import { documentText } from '../../../src/report/documentText.ts';

describe('the text of a document', () => {
  it('keeps the order of the keys and every digit', () => {
    const document = { b: 0.1 + 0.2, a: [1e-7, 'x'] };
    const text = documentText(document);
    expect(text).toBe('{\n  "b": 0.30000000000000004,\n  "a": [\n    1e-7,\n    "x"\n  ]\n}\n');
    expect(JSON.parse(text)).toEqual(document);
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY])(
    'refuses %s instead of a silent null',
    (value) => {
      expect(() => documentText({ annual: { heat: value } })).toThrow('heat is not a finite number');
    },
  );
});
