import { describe, expect, test } from 'vitest';
import { warningNote } from '../../../../src/report/englishNotes.ts';
import { type Change, changedAnswer, heatLossOf, unitWith } from './changedAnswer.ts';

/** The warnings of size of the sample house with changes: code, text and remedy. */
function sizesOf(...changes: Change[]) {
  return changedAnswer(changes)
    .warnings.map(warningNote)
    .filter(({ code }) => code.startsWith('size.'));
}

/*
 * The sample unit at −12 °C, three eighths of the way from its row of −15 to that of −7 °C:
 * 35 °C flow 5.0 + 0.375 = 5.375 kW; 45 °C 4.8 + 0.375 = 5.175 kW; 55 °C 4.6 + 0.375 = 4.975 kW.
 * Design load at 20 and −12 °C: 32 K times the heat loss.
 */
describe('the size of a unit', () => {
  test('is not spoken of where it fits: 5.175 kW for 180·32 = 5.76 kW', () => {
    expect(sizesOf()).toEqual([]);
  });

  test('far too small is said with both figures', () => {
    // 300·32 = 9.6 kW
    expect(sizesOf(heatLossOf(300))).toEqual([
      {
        code: 'size.far-under',
        text: 'The unit is far smaller than the house needs: 5.2 kW at -12 °C and 45 °C flow, the design load is 9.6 kW.',
        remedy: 'Take the next size, or make sure that backup power and cost are accepted.',
      },
    ]);
  });

  test('far too large is said with both figures', () => {
    // 100·32 = 3.2 kW
    expect(sizesOf(heatLossOf(100))).toEqual([
      {
        code: 'size.far-over',
        text: 'The unit is far larger than the house needs: 5.2 kW at -12 °C and 45 °C flow, the design load is 3.2 kW.',
        remedy: 'A smaller unit starts and stops less and costs less.',
      },
    ]);
  });

  test('is judged at 0.75 and 1.5 times the design load', () => {
    // 5.175/0.75/32 = 215.6 W/K; 5.175/1.5/32 = 107.8 W/K
    const codes = [215, 216, 108, 107].map((loss) => sizesOf(heatLossOf(loss)).map(({ code }) => code));
    expect(codes).toEqual([[], ['size.far-under'], [], ['size.far-over']]);
  });
});

describe('the flow at which the size is judged', () => {
  // 220·32 = 7.04 kW: too large for 5.175 kW (0.735 of it), but not for the 5.375 kW at 35 °C (0.763).
  test('is no higher than the unit gives at the design temperature', () => {
    expect(sizesOf(heatLossOf(220))).toHaveLength(1);
    expect(sizesOf(heatLossOf(220), unitWith('limits: { highestFlow: 35 }'))).toEqual([]);
    // 35 °C at −12 °C on the way from 30 °C at −20 to 50 °C at 12 °C; 300·32 = 9.6 kW
    const [warning] = sizesOf(heatLossOf(300), unitWith('limits: { highestFlow: [[-20, 30], [12, 50]] }'));
    expect(warning?.text).toContain(
      '5.4 kW at -12 °C and 35 °C flow, the highest it gives there, the design load is 9.6 kW',
    );
  });

  test('is that of the curve at the design temperature', () => {
    const emitters = 'method: emitters\n  flow: 45\n  return: 38';
    const curve = (points: string): Change => ['house.yaml', emitters, `method: curve\n  points: ${points}`];
    // 55 − 27·8/35 = 48.83 °C: 5.175 − 0.02·3.83 = 5.098 kW
    const [warning] = sizesOf(heatLossOf(300), curve('[[-20, 55], [15, 28]]'));
    expect(warning?.text).toContain('5.1 kW at -12 °C and 48.8 °C flow, the design');
  });

  test('is the fixed one, or the highest of the emitters', () => {
    const fixed: Change = ['house.yaml', 'method: emitters\n  flow: 45\n  return: 38', 'method: fixed\n  flow: 35'];
    expect(sizesOf(heatLossOf(300), fixed)[0]?.text).toContain('5.4 kW at -12 °C and 35 °C flow, the design');
    const highest: Change = ['house.yaml', 'return: 38', 'return: 38\n  highestFlow: 40'];
    // 5.375 − 0.1 = 5.275 kW
    expect(sizesOf(heatLossOf(300), highest)[0]?.text).toContain('5.3 kW at -12 °C and 40 °C flow, the design');
  });
});

describe('a unit that does not run at the design temperature', () => {
  test('has no size: the backup carries the design load', () => {
    expect(sizesOf(unitWith('limits: { lowestOutdoorTemperature: -10 }'))).toEqual([
      {
        code: 'size.cannot-run',
        text: 'The unit cannot run at the design temperature: -12 °C is colder than its lowest, -10 °C.',
        remedy: 'The backup must then carry the whole design load of 5.8 kW; else take a unit that runs in such cold.',
      },
    ]);
  });

  test('is one whose lowest temperature lies above it; at that temperature it runs', () => {
    expect(sizesOf(unitWith('limits: { lowestOutdoorTemperature: -12 }'))).toEqual([]);
    expect(sizesOf(unitWith('limits: { lowestOutdoorTemperature: -11.9 }'))).toHaveLength(1);
  });
});
