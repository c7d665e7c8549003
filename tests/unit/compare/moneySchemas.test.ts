import { describe, expect, test } from 'vitest';
import * as z from 'zod';
import type { BoilerFuel } from '../../../src/compare/fuel.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { boilerSchema } from '../../../src/scenario/boilerSchema.ts';
import { carbonSchema } from '../../../src/scenario/carbonSchema.ts';
import { readEntries } from '../../../src/scenario/entries/readEntries.ts';
import { wholeLifeSchema } from '../../../src/scenario/wholeLifeSchema.ts';
import { inputOf } from '../scenario/memoryFiles.ts';

/** What a section says, with its defaults; a test fails where it has a fault. */
function read<S extends z.ZodType>(schema: S, text: string): z.output<S> {
  const { entries, problems } = readEntries(inputOf('house.yaml', text), schema);
  if (entries === undefined) throw new Error(problems.map(problemText).join('\n'));
  return entries.value;
}

function faults(schema: z.ZodType, text: string): string {
  return readEntries(inputOf('house.yaml', text), schema).problems.map(problemText).join('\n');
}

const gas = 'fuel: { kind: naturalGas, price: 0.11 }';

describe('the boiler', () => {
  test('may have one efficiency', () => {
    expect(read(boilerSchema, `efficiency: 0.9\n${gas}\n`)).toEqual({
      efficiency: 0.9,
      fuel: { kind: 'naturalGas', price: 0.11, calorificValue: 'gross', standingPerYear: 0, taxes: [] },
      pumpPower: 0,
      servicePerYear: 0,
    });
  });

  const condensing = `efficiency:
  byReturnTemperature: [[30, 0.97], [50, 0.91]]
  flowTemperature: { method: emitters, flow: 60, return: 45 }
cylinderLoss: 500
${gas}
`;

  test('may have an efficiency by the return temperature of its own flow setting', () => {
    const { efficiency, cylinderLoss } = read(boilerSchema, condensing);
    expect(cylinderLoss).toBe(500);
    expect(efficiency).toMatchObject({
      byReturnTemperature: [
        [30, 0.97],
        [50, 0.91],
      ],
      flowTemperature: { method: 'emitters', flow: 60, return: 45, exponent: 1.3 },
    });
  });

  test('is told what is wrong in either form of efficiency', () => {
    expect(faults(boilerSchema, `efficiency: 90\n${gas}\n`)).toContain('write 0.9 for 90 %');
    const inList = faults(boilerSchema, condensing.replace('0.91', '91'));
    expect(inList).toContain('efficiency.byReturnTemperature[1][1] is 91; it lies between 0.3 and 1.1');
    const inFlow = faults(boilerSchema, condensing.replace('flow: 60', 'flow: 600'));
    expect(inFlow).toContain('efficiency.flowTemperature.flow is 600; a temperature lies between 25 and 90 °C');
    const lone = condensing.replace(/ {2}flowTemperature.*\n/, '');
    expect(faults(boilerSchema, lone)).toContain('efficiency.flowTemperature is missing');
  });

  test('needs a price for its fuel, but not for electricity, which may be on the household’s tariff', () => {
    expect(faults(boilerSchema, 'efficiency: 0.9\nfuel: { kind: pellets }\n')).toContain('fuel.price is missing');
    const { fuel } = read(boilerSchema, 'efficiency: 1\nfuel: { kind: electricity }\n');
    const bought: BoilerFuel = fuel;
    expect(bought.price).toBeUndefined();
    expect(read(boilerSchema, 'efficiency: 1\nfuel: { kind: electricity, price: 0.2 }\n').fuel.price).toBe(0.2);
  });

  test('is told which fuels there are', () => {
    const text = faults(boilerSchema, 'efficiency: 0.9\nfuel: { kind: naturalgas, price: 0.1 }\n');
    expect(text).toContain("fuel.kind is 'naturalgas'");
    expect(text).toContain('perhaps naturalGas is meant');
  });
});

describe('the whole life', () => {
  test('needs the capital; all else has a default', () => {
    expect(read(wholeLifeSchema, 'capital: 18000\n')).toEqual({
      capital: 18_000,
      grant: 0,
      replacedBoiler: 0,
      years: 20,
      discountRate: 3,
      electricityDrift: 0,
      fuelDrift: 0,
      servicePerYear: 0,
    });
    expect(faults(wholeLifeSchema, 'grant: 5000\n')).toContain('capital is missing');
  });

  test('takes whole years and rates in per cent', () => {
    expect(faults(wholeLifeSchema, 'capital: 1\nyears: 12.5\n')).toContain('years is 12.5');
    expect(faults(wholeLifeSchema, 'capital: 1\ndiscountRate: 300\n')).toContain('between −5 and 30');
  });
});

describe('the carbon of electricity', () => {
  test('may be one factor', () => {
    expect(read(carbonSchema, 'electricity: 0.3\n')).toEqual({ electricity: 0.3 });
  });

  test('may be a factor for each rate', () => {
    const text =
      'electricity: { given: byRate, factors: [{ rate: night, factor: 0.2 }, { rate: day, factor: 0.4 }] }\n';
    expect(read(carbonSchema, text).electricity).toEqual({
      given: 'byRate',
      factors: [
        { rate: 'night', factor: 0.2 },
        { rate: 'day', factor: 0.4 },
      ],
    });
  });

  test('may be a series of a file', () => {
    const text = 'electricity: { given: series, file: grid.csv, unit: gPerKWh }\n';
    expect(read(carbonSchema, text).electricity).toEqual({
      given: 'series',
      file: 'grid.csv',
      unit: 'gPerKWh',
      stamps: 'withOffset',
    });
  });

  test('is told its forms', () => {
    const allowed =
      'a carbon factor lies between 0 and 5 kg/kWh, or it is a section whose given is one of byRate and series';
    expect(faults(carbonSchema, 'electricity: [0.3]\n')).toContain(allowed);
    expect(faults(carbonSchema, 'electricity: 300\n')).toContain('electricity is 300; a carbon factor lies between 0');
  });
});

test.each([
  ['boiler', boilerSchema],
  ['whole life', wholeLifeSchema],
  ['carbon', carbonSchema],
])('an editor’s schema can be made of the %s section', (_, schema) => {
  const made = z.toJSONSchema(schema, { target: 'draft-7', io: 'input' });
  expect(Object.keys(made.properties ?? {})).toEqual(Object.keys(schema.shape));
});
