import { type Problem, shown } from '../../core/problem.ts';
import type { ListedTariff, LoadedTariff } from '../loadTariffs.ts';
import type { Scenario } from '../scenarioSchema.ts';
import { type TaxStatement, taxStatementOf } from '../taxStatement.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

const STATED: Record<TaxStatement, string> = {
  inPrices: 'hold the taxes',
  onTop: 'have the taxes added on the bill',
  notListed: 'are stated without tax, and none is listed',
  mixed: 'state the taxes in more than one way',
};

/**
 * What does not go together between a scenario and its tariffs: the currency, how taxes are stated, and a choice by price
 * without prices.
 *
 * @param listed in the scenario's order; undefined for one that could not be read
 * @param laid the same, laid on the year; undefined for one with errors
 */
export function checkPrices(
  yaml: YamlFile,
  scenario: Scenario,
  listed: readonly (ListedTariff | undefined)[],
  laid: readonly (LoadedTariff | undefined)[],
): Problem[] {
  const problems = listed.flatMap((each) => [
    ...currencyProblems(scenario, each),
    ...taxProblems(yaml, each, listed[0]),
  ]);
  if (scenario.backup?.mode.kind !== 'cheapest' || scenario.tariffs.length === 0) return problems;
  laid.forEach((tariff, i) => {
    if (tariff?.prepared.pricedByBlocksAlone !== true) return;
    const fault = { code: 'scenario.cheapest-needs-price', found: `'${shown(tariff.name)}'` } as const;
    const mild = {
      severity: 'warning',
      hint: 'its own run takes electricity as free by the hour: read its cost with care',
    } as const;
    problems.push(yaml.problem(['backup', 'mode'], i === 0 ? fault : { ...fault, ...mild }));
  });
  return problems;
}

function currencyProblems(scenario: Scenario, listed: ListedTariff | undefined): Problem[] {
  return (listed?.supplies ?? []).flatMap(({ read }) => {
    const { currency } = read.tariff;
    if (currency === undefined || currency.toUpperCase() === scenario.currency) return [];
    const fault = { code: 'scenario.currency', found: shown(currency), allowed: scenario.currency } as const;
    return [read.yaml.problem(['currency'], fault)];
  });
}

/** Bills of tariffs that state their taxes differently are not alike: said, so that nobody compares them unawares. */
function taxProblems(yaml: YamlFile, listed: ListedTariff | undefined, first: ListedTariff | undefined): Problem[] {
  if (listed === undefined || first === undefined) return [];
  const ways = [listed, first].map(({ supplies }) => taxStatementOf(supplies.map(({ read }) => read.tariff)));
  const [way, wayOfFirst] = ways;
  if (way === wayOfFirst && way !== 'mixed') return [];
  const fault = {
    code: way === 'mixed' ? 'scenario.taxes-mixed' : 'scenario.taxes-differ',
    severity: 'warning',
    found: STATED[way],
    allowed: STATED[wayOfFirst],
  } as const;
  if (listed.path !== undefined) return [yaml.problem(listed.path, fault)];
  return [listed.supplies[0].read.yaml.problem(['pricesStated'], fault)];
}
