import { describe, expect, it } from 'vitest';
import { type Change, changeAt, overlap, withChanges } from '../../../src/batch/changes.ts';

const origin = { file: 'plan.yaml', line: 3, column: 1 };
const change = (path: Change['path'], value: unknown): Change => ({ path, value, origin });

describe('a scenario with changes', () => {
  it('has the new entry, and shares what is not changed', () => {
    const raw = { house: { need: { setPoint: 20 } }, site: { zone: 'Europe/Berlin' } };
    const made = withChanges(raw, [change(['house', 'need', 'setPoint'], 21)]) as typeof raw;
    expect(made).toEqual({ house: { need: { setPoint: 21 } }, site: { zone: 'Europe/Berlin' } });
    expect(made.site).toBe(raw.site);
    expect(raw.house.need.setPoint).toBe(20);
  });

  it('gets sections and lists that are not there, and loses a value that stands in their way', () => {
    expect(withChanges({ boiler: 0.9 }, [change(['boiler', 'fuel', 'price'], 1)])).toEqual({
      boiler: { fuel: { price: 1 } },
    });
    expect(withChanges({}, [change(['tariffs', 0], 'a.yaml')])).toEqual({ tariffs: ['a.yaml'] });
  });

  it('loses an entry that is null, from a section and from a list', () => {
    expect(withChanges({ a: 1, b: 2 }, [change(['a'], null)])).toEqual({ b: 2 });
    expect(withChanges({ list: [1, 2, 3] }, [change(['list', 1], null)])).toEqual({ list: [1, 3] });
  });

  it('takes the last of two changes of one place', () => {
    expect(withChanges({ a: 1 }, [change(['a'], 2), change(['a'], 3)])).toEqual({ a: 3 });
  });

  it('cannot change what all objects have in common', () => {
    withChanges({}, [change(['__proto__', 'polluted'], 1)]);
    expect('polluted' in {}).toBe(false);
  });
});

describe('the change that an entry comes from', () => {
  const outer = change(['backup'], { source: 'electric' });
  const inner = change(['house', 'need', 'setPoint'], 21);

  it('is that of the place, of a section around it, or of an entry in it', () => {
    expect(changeAt([outer, inner], ['house', 'need', 'setPoint'])).toBe(inner);
    expect(changeAt([outer, inner], ['backup', 'mode', 'kind'])).toBe(outer);
    expect(changeAt([outer, inner], ['house'])).toBe(inner);
    expect(changeAt([outer, inner], ['boiler'])).toBeUndefined();
  });

  it('does not mistake a neighbour for the place', () => {
    expect(overlap(['house', 'need'], ['house', 'heatLoss'])).toBe(false);
    expect(overlap(['tariffs', 0], ['tariffs', 1])).toBe(false);
  });
});
