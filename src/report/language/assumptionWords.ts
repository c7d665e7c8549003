import type { Assumption, AssumptionValues, RuleAssumption } from '../../scenario/answer/assumption.ts';
import type { DefaultUsed } from '../../scenario/entries/defaultsUsed.ts';

/** The sentences of everything a result rests on, in one language. */
export interface AssumptionWords {
  readonly ofDefault: (used: DefaultUsed) => string;
  readonly rules: { readonly [C in keyof AssumptionValues]: (values: AssumptionValues[C]) => string };
}

/** Something the result rests on, in the sentences of a language. */
export function assumptionText(assumption: Assumption, words: AssumptionWords): string {
  return assumption.code === 'default' ? words.ofDefault(assumption.used) : ruleText(assumption, words);
}

function ruleText<C extends keyof AssumptionValues>(
  { code, values }: RuleAssumption<C>,
  { rules }: AssumptionWords,
): string {
  return rules[code](values);
}
