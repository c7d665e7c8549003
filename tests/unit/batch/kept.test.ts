import { describe, expect, it } from 'vitest';
import { Kept, KeptKind } from '../../../src/scenario/kept.ts';

describe('what the scenarios of a batch have in common', () => {
  it('is made once for each key, in each batch', () => {
    const kind = new KeptKind<object>(10);
    const [one, other] = [new Kept(), new Kept()];
    const made = kind.of(one, 'a', () => ({}));
    expect(kind.of(one, 'a', () => ({}))).toBe(made);
    expect(kind.of(one, 'b', () => ({}))).not.toBe(made);
    expect(kind.of(other, 'a', () => ({}))).not.toBe(made);
    expect(kind.of(undefined, 'a', () => ({}))).not.toBe(made);
  });

  it('is let go when there is too much, the least recently asked first', () => {
    const kind = new KeptKind<object>(2);
    const kept = new Kept();
    const [a, b] = ['a', 'b'].map((key) => kind.of(kept, key, () => ({ key })));
    kind.of(kept, 'a', () => ({}));
    kind.of(kept, 'c', () => ({}));
    expect(kind.of(kept, 'a', () => ({}))).toBe(a);
    expect(kind.of(kept, 'b', () => ({}))).not.toBe(b);
  });

  it('is made again where it holds for one scenario alone', () => {
    const kind = new KeptKind<number>(2);
    const kept = new Kept();
    kind.of(
      kept,
      'a',
      () => 1,
      (made) => made > 1,
    );
    expect(kind.of(kept, 'a', () => 2)).toBe(2);
  });

  it('can be handed to another batch', () => {
    const kind = new KeptKind<object>(2);
    const [one, other] = [new Kept(), new Kept()];
    const made = kind.of(one, 'a', () => ({}));
    kind.put(other, kind.entriesOf(one));
    expect(kind.of(other, 'a', () => ({}))).toBe(made);
  });

  it('is told apart by the prepared things, and by the content of everything else', () => {
    const kept = new Kept();
    const [one, other] = [{ same: 1 }, { same: 1 }];
    expect(kept.key([one], { a: 1 })).toBe(kept.key([one], { a: 1 }));
    expect(kept.key([one], 1)).not.toBe(kept.key([other], 1));
    expect(kept.key([one], 1)).not.toBe(kept.key([one], '1'));
    expect(kept.key([one, other])).not.toBe(kept.key([other, one]));
  });
});
