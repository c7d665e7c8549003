import { type Problem, shown } from '../../core/problem.ts';
import type { PreparedTariff } from '../../tariffs/preparedTariff.ts';
import type { ReadTariff } from '../loadTariff.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/**
 * What does not go together between a scenario and its tariffs: the currency, and a choice by price without prices.
 *
 * @param tariffs in the scenario's order; undefined for one that could not be read
 * @param present the first one laid on the year, where it could be
 */
export function checkPrices(
  yaml: YamlFile,
  scenario: Scenario,
  tariffs: readonly (ReadTariff | undefined)[],
  present: PreparedTariff | undefined,
): Problem[] {
  const problems = tariffs.flatMap((read) => {
    const currency = read?.tariff.currency;
    if (read === undefined || currency === undefined || currency.toUpperCase() === scenario.currency) return [];
    const fault = { code: 'scenario.currency', found: shown(currency), allowed: scenario.currency } as const;
    return [read.yaml.problem(['currency'], fault)];
  });
  if (scenario.backup?.mode.kind === 'cheapest' && tariffs[0] !== undefined && present?.pricedByBlocksAlone) {
    const found = `'${shown(present.name)}'`;
    problems.push(yaml.problem(['backup', 'mode'], { code: 'scenario.cheapest-needs-price', found }));
  }
  return problems;
}
