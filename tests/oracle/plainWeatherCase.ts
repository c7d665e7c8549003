import type { PlainWeather } from './plainCase.ts';
import type { Draws } from './plainDraws.ts';
import { humidityRatio, saturationOverWater } from './plainFrost.ts';

/** Invented weather: a slow swing, a daily swing, spells of some days, damp and dry air; nothing that a place ever had. */
export function inventWeather(draws: Draws, hours: number): PlainWeather {
  const mean = draws.between(-8, 14);
  const slow = draws.between(0, 12);
  const daily = draws.between(0, 7);
  const restless = draws.between(0.1, 1);
  const sun = draws.chance(0.7) ? draws.between(100, 900) : 0;
  const height = draws.between(85_000, 102_500);
  // An unchanging whole number of degrees: its mean of a day is exact, to tell 'at' the heating limit from below it.
  const unchanging = draws.chance(0.05) ? draws.whole(0, 12) : null;
  let spell = 0;
  let damp = 70;
  const hour = (i: number) => {
    spell = 0.985 * spell + draws.between(-restless, restless);
    damp = Math.min(100, Math.max(25, damp + draws.between(-6, 6.5)));
    const day = Math.sin((2 * Math.PI * ((i % 24) - 9)) / 24);
    const temperature = unchanging ?? mean + slow * Math.sin((2 * Math.PI * i) / hours) + daily * day + spell;
    const pressure = height + draws.between(-1500, 1500);
    const vapour = (damp / 100) * saturationOverWater(temperature);
    const irradiance = Math.max(0, day) * sun * draws.between(0.2, 1);
    return { temperature, pressure, irradiance, humidityRatio: humidityRatio(vapour, pressure) };
  };
  const all = Array.from({ length: hours }, (_, i) => hour(i));
  return {
    temperature: all.map((one) => one.temperature),
    irradiance: all.map((one) => one.irradiance),
    humidityRatio: all.map((one) => one.humidityRatio),
    pressure: all.map((one) => one.pressure),
    monthStart: Array.from({ length: 13 }, (_, month) => Math.round((month * hours) / 12)),
  };
}
