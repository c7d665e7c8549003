import type { HeatLossParts } from './heatLoss.ts';

/** Heat storage of a building, ISO 13790:2008 table 12. */
export type MassClass = 'veryLight' | 'light' | 'medium' | 'heavy' | 'veryHeavy';

/** Effective mass area A_m in m² and capacity C_m in kJ/K, both per m² of floor, by class (ISO 13790:2008 table 12, from memory). */
const massClasses: Record<MassClass, { readonly area: number; readonly capacity: number }> = {
  veryLight: { area: 2.5, capacity: 80 },
  light: { area: 2.5, capacity: 110 },
  medium: { area: 2.5, capacity: 165 },
  heavy: { area: 3.0, capacity: 260 },
  veryHeavy: { area: 3.5, capacity: 370 },
};

/** All inner surfaces per m² of floor; W/(m²·K) between air and surface, and between surface and mass (ISO 13790:2008 section 7.2.2, from memory). */
const SURFACES_PER_FLOOR = 4.5;
const AIR_TO_SURFACE = 3.45;
const SURFACE_TO_MASS = 9.1;
const KILOJOULES_PER_KILOWATT_HOUR = 3600;

/**
 * Constants of the simple hourly method of ISO 13790 (five resistances, one capacity), made once per house.
 * Conductances in kW/K, capacity in kWh/K.
 */
export interface MassParameters {
  readonly hVentilation: number;
  readonly hAirSurface: number;
  readonly hWindows: number;
  readonly hSurfaceMass: number;
  readonly hMassOutdoor: number;
  readonly capacity: number;
  /** Air-to-outdoor conductances of annex C: H_tr,1, H_tr,2, H_tr,3. */
  readonly h1: number;
  readonly h2: number;
  readonly h3: number;
  /** Shares of half the internal gains and of the sun that reach mass and surfaces. */
  readonly gainsToMass: number;
  readonly gainsToSurface: number;
  /** Share of a heat flow into the air that is felt at the surfaces, and of one at the surfaces that is felt at the mass. */
  readonly airToSurface: number;
  readonly surfaceToMass: number;
  /** 1 / (C_m + ½(H_tr,3 + H_em)): kelvins of mass for one kW during the hour. */
  readonly massPerHeat: number;
  /** The hour in short: air at rest = airFromMass·θ_m + (weather), θ_m' = keep·θ_m + (weather) + massFromAirHeat·heat. */
  readonly airFromMass: number;
  readonly keep: number;
  readonly airPerHeat: number;
  readonly massFromAirHeat: number;
}

/** Scaled conductances of the three ways, W/K, or why there are none. */
export type MassResult =
  | { readonly mass: MassParameters }
  | { readonly reason: 'too much through opaque elements'; readonly opaque: number; readonly most: number };

/**
 * Constants of the lumped house.
 *
 * @param floorArea heated floor A_f, m², above 0
 * @param massClass class of heat storage
 * @param heatLoss steady loss H from air to outdoors, W/K, above 0
 * @param parts how it is parted; only the ratios count: one factor scales all three so that the steady loss is H
 * @returns the constants, or a reason: H_op must stay below H_ms, and H must be reachable
 *
 * Reference: ISO 13790:2008 annex C; MODEL section 4.
 */
export function massParameters(
  floorArea: number,
  massClass: MassClass,
  heatLoss: number,
  parts: HeatLossParts,
): MassResult {
  const { area, capacity } = massClasses[massClass];
  const massArea = area * floorArea;
  const surfaces = SURFACES_PER_FLOOR * floorArea;
  const hAirSurface = (AIR_TO_SURFACE * surfaces) / 1000;
  const hSurfaceMass = (SURFACE_TO_MASS * massArea) / 1000;
  const scale = lossScale(parts, heatLoss, hAirSurface * 1000);
  const opaque = scale === UNREACHABLE ? UNREACHABLE : (parts.opaque * scale) / 1000;
  if (!(opaque < hSurfaceMass)) {
    return { reason: 'too much through opaque elements', opaque: opaque * 1000, most: hSurfaceMass * 1000 };
  }
  const hWindows = (parts.windows * scale) / 1000;
  const hVentilation = (parts.ventilation * scale) / 1000;
  const hMassOutdoor = opaque === 0 ? 0 : 1 / (1 / opaque - 1 / hSurfaceMass);
  const h1 = (hVentilation * hAirSurface) / (hVentilation + hAirSurface);
  const h2 = h1 + hWindows;
  const h3 = (h2 * hSurfaceMass) / (h2 + hSurfaceMass);
  const capacityKwh = (capacity * floorArea) / KILOJOULES_PER_KILOWATT_HOUR;
  const half = (h3 + hMassOutdoor) / 2;
  const massPerHeat = 1 / (capacityKwh + half);
  const keep = (capacityKwh - half) * massPerHeat;
  const airToSurface = hAirSurface / (hAirSurface + hVentilation);
  const surfaceToMass = hSurfaceMass / (hSurfaceMass + h2);
  const massFromAirHeat = airToSurface * surfaceToMass * massPerHeat;
  const surfaceSum = hSurfaceMass + hWindows + h1;
  const toMass = massArea / surfaces;
  return {
    mass: {
      hVentilation,
      hAirSurface,
      hWindows,
      hSurfaceMass,
      hMassOutdoor,
      capacity: capacityKwh,
      h1,
      h2,
      h3,
      gainsToMass: toMass,
      gainsToSurface: 1 - toMass - (hWindows * 1000) / (SURFACE_TO_MASS * surfaces),
      airToSurface,
      surfaceToMass,
      massPerHeat,
      airFromMass: (airToSurface * hSurfaceMass * (1 + keep)) / (2 * surfaceSum),
      keep,
      airPerHeat:
        (airToSurface * (hSurfaceMass * 0.5 * massFromAirHeat + airToSurface)) / surfaceSum +
        1 / (hAirSurface + hVentilation),
      massFromAirHeat,
    },
  };
}

/** Stands for a factor that does not exist: without ventilation the surfaces pass on at most H_is. */
const UNREACHABLE = Number.POSITIVE_INFINITY;

/**
 * Factor s for which ventilation v·s in parallel with air-to-surface H_is in series with (w + o)·s equals H: the
 * positive root of v·b·s² + (v·H_is + H_is·b − H·b)·s − H·H_is = 0 with b = w + o.
 */
function lossScale(parts: HeatLossParts, heatLoss: number, hAirSurface: number): number {
  const v = parts.ventilation;
  const b = parts.windows + parts.opaque;
  if (b === 0) return heatLoss / v;
  const linear = v * hAirSurface + hAirSurface * b - heatLoss * b;
  if (v === 0) return linear > 0 ? (heatLoss * hAirSurface) / linear : UNREACHABLE;
  const root = Math.sqrt(linear * linear + 4 * v * b * heatLoss * hAirSurface);
  // the form without cancellation, whichever sign the linear term has
  return linear >= 0 ? (2 * heatLoss * hAirSurface) / (linear + root) : (root - linear) / (2 * v * b);
}
