import type { Comparison } from '../scenario/answer/comparison.ts';
import type { ResultDocument } from './resultSchema.ts';

/** Break-even, other prices and whole life as plain data; no keys where there is no comparison. */
export function comparisonDocument(
  comparison: Comparison | undefined,
): Pick<ResultDocument, 'breakEven' | 'sensitivity' | 'wholeLife'> {
  if (comparison === undefined) return {};
  const { breakEven, sensitivity, wholeLife } = comparison;
  return {
    breakEven: {
      electricityPrice: breakEven.price,
      meanElectricityPrice: breakEven.meanPrice,
      seasonalFactor: breakEven.factor,
      heatOverElectricity: breakEven.heatOverElectricity,
    },
    sensitivity: sensitivity.map((row) => ({ ...row })),
    ...(wholeLife === undefined ? {} : { wholeLife: wholeLifeOf(wholeLife) }),
  };
}

function wholeLifeOf({
  netCapital,
  netPresentValue,
  simplePayback,
  discountedPayback,
  terms,
  years,
}: NonNullable<Comparison['wholeLife']>): NonNullable<ResultDocument['wholeLife']> {
  const { discountRate, electricityDrift, fuelDrift } = terms;
  return {
    ...{ netCapital, netPresentValue, simplePayback, discountedPayback },
    ...{ discountRate, electricityDrift, fuelDrift },
    years: years.map(({ year, saving, presentValue, balance }) => ({ year, saving, presentValue, balance })),
  };
}
