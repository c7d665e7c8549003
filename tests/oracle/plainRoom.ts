import type { PlainCase, PlainMass } from './plainCase.ts';

/** A_m per A_f, and C_m in kJ/K per m² of A_f (MODEL section 4). */
const classes = {
  veryLight: [2.5, 80],
  light: [2.5, 110],
  medium: [2.5, 165],
  heavy: [3.0, 260],
  veryHeavy: [3.5, 370],
} as const;

/** Constants of the 5R1C network: conductances W/K, areas m², storage Wh/K. */
export interface PlainRoom {
  readonly Hve: number;
  readonly Hw: number;
  readonly Hop: number;
  readonly Hem: number;
  readonly His: number;
  readonly Hms: number;
  readonly Am: number;
  readonly At: number;
  /** C_m/3600. */
  readonly storage: number;
}

/** MODEL section 4, lumped: the network's constants, windows, opaque parts and ventilation scaled to the loss H (W/K). */
export function roomOf(mass: PlainMass, heatLoss: number): PlainRoom {
  const [area, capacity] = classes[mass.massClass];
  const At = 4.5 * mass.floorArea;
  const Am = area * mass.floorArea;
  const His = 3.45 * At;
  const Hms = 9.1 * Am;
  const lossAt = (f: number) => f * mass.ventilation + 1 / (1 / His + 1 / (f * (mass.windows + mass.opaque)));
  let low = 0;
  let high = 1;
  while (lossAt(high) < heatLoss) high *= 2;
  for (let k = 0; k < 200; k++) {
    const middle = (low + high) / 2;
    if (lossAt(middle) < heatLoss) low = middle;
    else high = middle;
  }
  const f = (low + high) / 2;
  const Hop = f * mass.opaque;
  return {
    Hve: f * mass.ventilation,
    Hw: f * mass.windows,
    Hop,
    Hem: 1 / (1 / Hop - 1 / Hms),
    His,
    Hms,
    Am,
    At,
    storage: (capacity * mass.floorArea * 1000) / 3600,
  };
}

/** Air temperature of the hour and mass temperature at its end, °C. */
export interface PlainRoomState {
  readonly air: number;
  readonly mass: number;
}

/**
 * ISO 13790:2008 annex C, equations C.1 to C.11, for hour i with `heat` W into the air, the mass at `massBefore`.
 * Supply air is outdoor air.
 */
export function roomAfter(
  plain: PlainCase,
  room: PlainRoom,
  i: number,
  massBefore: number,
  heat: number,
): PlainRoomState {
  const { Hve, Hw, Hem, His, Hms, Am, At, storage } = room;
  const outdoor = plain.weather.temperature[i];
  const internal = plain.house.internalGains;
  const solar = plain.house.solarAperture * plain.weather.irradiance[i];

  const toAir = 0.5 * internal; // C.1
  const toMass = (Am / At) * (0.5 * internal + solar); // C.2
  const toSurface = (1 - Am / At - Hw / (9.1 * At)) * (0.5 * internal + solar); // C.3

  const H1 = 1 / (1 / Hve + 1 / His); // C.6
  const H2 = H1 + Hw; // C.7
  const H3 = 1 / (1 / H2 + 1 / Hms); // C.8
  const total = toMass + Hem * outdoor + (H3 * (toSurface + Hw * outdoor + H1 * ((toAir + heat) / Hve + outdoor))) / H2; // C.5
  const massAfter = (massBefore * (storage - 0.5 * (H3 + Hem)) + total) / (storage + 0.5 * (H3 + Hem)); // C.4
  const massMean = (massBefore + massAfter) / 2; // C.9
  const surface = (Hms * massMean + toSurface + Hw * outdoor + H1 * (outdoor + (toAir + heat) / Hve)) / (Hms + Hw + H1); // C.10
  const air = (His * surface + Hve * outdoor + toAir + heat) / (His + Hve); // C.11
  return { air, mass: massAfter };
}

/** Heat that brings the air of hour i to its set point at once, W, never negative: C.13, the air being linear in the heat. */
export function roomNeed(plain: PlainCase, room: PlainRoom, i: number, massBefore: number): number {
  const trial = 10 * (plain.house.mass?.floorArea ?? 0);
  const free = roomAfter(plain, room, i, massBefore, 0).air;
  const heated = roomAfter(plain, room, i, massBefore, trial).air;
  return Math.max(0, (trial * (plain.house.setPoint[i] - free)) / (heated - free));
}
