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

type Listed = readonly (ListedTariff | undefined)[];

/**
 * A choice by price among tariffs without prices by the hour.
 *
 * @param laid in the scenario's order, laid on the year; undefined for one with errors
 */
export function checkCheapest(
  yaml: YamlFile,
  { backup, tariffs }: Pick<Scenario, 'backup' | 'tariffs'>,
  laid: readonly (LoadedTariff | undefined)[],
): Problem[] {
  if (backup?.mode.kind !== 'cheapest' || tariffs.length === 0) return [];
  return laid.flatMap((tariff, i) => {
    if (tariff?.prepared.pricedByBlocksAlone !== true) return [];
    const fault = { code: 'scenario.cheapest-needs-price', found: `'${shown(tariff.name)}'` } as const;
    const mild = {
      severity: 'warning',
      hint: 'its own run takes electricity as free by the hour: read its cost with care',
    } as const;
    return [yaml.problem(['backup', 'mode'], i === 0 ? fault : { ...fault, ...mild })];
  });
}

/** Tariffs in another currency than the scenario's; undefined stands for one that could not be read. */
export function checkCurrency(currencyOfAll: string, listed: Listed): Problem[] {
  return listed.flatMap((each) =>
    (each?.supplies ?? []).flatMap(({ read }) => {
      const { currency } = read.tariff;
      if (currency === undefined || currency.toUpperCase() === currencyOfAll) return [];
      const fault = { code: 'scenario.currency', found: shown(currency), allowed: currencyOfAll } as const;
      return [read.yaml.problem(['currency'], fault)];
    }),
  );
}

/** Tariffs that state their taxes in another way than the first; undefined stands for one that could not be read. */
export function checkTaxes(yaml: YamlFile, listed: Listed): Problem[] {
  return listed.flatMap((each) => taxProblems(yaml, each, listed[0]));
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
