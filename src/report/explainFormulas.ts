import type { FormulaName } from '../sim/explain/stage.ts';

/** A formula in words, the section of the model that fixes it, and where it is published. */
interface FormulaWords {
  readonly section: string;
  readonly says: string;
  readonly source?: string;
}

const ISO = 'ISO 13790:2008 annex C';
const ASHRAE = 'ASHRAE Handbook Fundamentals ch. 1';

/** The formulas of an explained hour, in English. */
export const formulaWords: Readonly<Record<FormulaName, FormulaWords>> = {
  humidityFromRelative: {
    section: '3',
    says: 'vapour = relative humidity/100 × saturation pressure; humidity ratio = 0.621945 × vapour / (air pressure − vapour)',
    source: `${ASHRAE} eq. 6, 20, 22`,
  },
  humidityFromDewPoint: {
    section: '3',
    says: 'vapour = saturation pressure at the dew point; humidity ratio = 0.621945 × vapour / (air pressure − vapour)',
    source: `${ASHRAE} eq. 6, 20`,
  },
  humidityFromWetBulb: {
    section: '3',
    says: 'humidity ratio from wet bulb and outdoor temperature by the psychrometer equations',
    source: `${ASHRAE} eq. 33, 35`,
  },
  trailingMeans: { section: '4', says: 'means of this hour and the 23 before it' },
  frostIndex: {
    section: '7',
    says: 'coil = outdoor temperature − 8; Δw = humidity ratio − that over ice, not below 0; φ = share that stays as frost × Δw / Δw_ref, at most 1.5',
  },
  baseFromGains: {
    section: '4',
    says: 'gains = internal gains + solar aperture/1000 × mean irradiance of the last 24 hours; base temperature = set point − gains / (heat loss/1000)',
  },
  baseEntered: {
    section: '4',
    says: 'base temperature = base as entered + set point − set point of the entered base',
  },
  degreeHours: {
    section: '4',
    says: 'space-heat need = heat loss/1000 × (base temperature − outdoor temperature), not below 0',
  },
  heatingLimit: {
    section: '4',
    says: 'no need while the mean temperature of the last 24 hours is at or above the heating limit',
  },
  fiveResistances: {
    section: '4',
    says: 'half the internal gains go into the air, the rest and the sun to surfaces and mass; the conductances and the outdoor temperature make of them the parts by weather and gains',
    source: `${ISO}, eq. C.1 to C.11`,
  },
  airAtRest: {
    section: '4',
    says: 'air at rest = share of the mass × mass temperature + part by weather and gains',
    source: ISO,
  },
  needWithMass: {
    section: '4',
    says: 'space-heat need = (set point − air at rest) / kelvins of the air per kW, not below 0',
    source: `${ISO}.4`,
  },
  draw: {
    section: '8',
    says: 'stored = heat of a kelvin × (cylinder temperature − cold water); served = the lesser of asked and stored; the rest is not delivered',
  },
  cylinderLoss: {
    section: '8',
    says: 'loss = loss coefficient × (cylinder temperature − temperature around it); after draw and loss = temperature − (served + loss) / heat of a kelvin',
  },
  reheatPoint: {
    section: '8',
    says: 'T_h = the lesser of the temperature wanted and the highest flow of the unit − 5; flow = (temperature after draw and loss + T_h)/2 + 5',
  },
  reheatByHeatPump: {
    section: '8',
    says: 'capacity = that of the map × (1 − frost loss), COP likewise × (1 − in-use allowance); τ = heat of a kelvin × (T_h − temperature after draw and loss) / capacity, at most 1; heat = τ × capacity; electricity = heat / COP',
  },
  reheatByHeater: {
    section: '8',
    says: 'heater or boiler = what lacks to the temperature wanted, at most power × (1 − τ), once the heat pump has finished; temperature at the end = after draw and loss + all heat / heat of a kelvin',
  },
  load: { section: '5', says: 'x = space-heat need / design load' },
  harderLoad: {
    section: '5',
    says: 'x = (space-heat need + heat waiting) / ((1 − τ) × design load), at most the greater of 1 and space-heat need / design load',
  },
  emitterFlow: {
    section: '5',
    says: 'flow = room temperature + over-temperature × x^(1/n) + x × spread / 2, held between lowest and highest flow of the emitters',
    source: 'EN 442-2, characteristic equation',
  },
  flowSet: { section: '5', says: 'the flow follows from the outdoor temperature alone, as entered' },
  returnTemperature: { section: '5', says: 'return = flow − x × spread, x held between 0.2 and 1' },
  mapInside: {
    section: '6',
    says: 'η and capacity = (1 − v) × [(1 − u) × colder + u × warmer] at the lower column + v × the same at the higher; COP = η × κ',
  },
  mapLinear: {
    section: '6',
    says: 'COP and capacity = (1 − v) × [(1 − u) × colder + u × warmer] at the lower column + v × the same at the higher; COP × κ / κ at the nearest point of the map',
  },
  kappa: {
    section: '6',
    says: 'κ = (flow + 3 + 273.15) / (flow − outdoor temperature + 10), the divisor at least 15; η = COP/κ at every point of the map',
    source: 'Carnot’s law with approach temperatures',
  },
  coldCapacity: {
    section: '6',
    says: 'capacity = that at the coldest row − capacity lost per kelvin × kelvins below it, at least 0.3 of it; per kelvin at least 0.01 of it',
  },
  lowFlow: {
    section: '6',
    says: 'COP × (1 + 0.02 × kelvins below the lowest column, at most 10)',
    source: 'common practice, no source',
  },
  frostByHumidity: {
    section: '7',
    says: 'capacity lost = d_q × φ, COP lost = d_c × φ, each at most 0.5; at the lowest level the part lowest over full capacity, both before frost loss',
  },
  frostByTable: {
    section: '7',
    says: 'lost = 1 − factor of the unit’s table at the outdoor temperature, alike at both levels',
  },
  afterFrost: { section: '7', says: 'capacity and COP of a level = those before × (1 − its share lost to frost)' },
  lowestByShare: {
    section: '9',
    says: 'lowest level before frost loss: m × capacity by the map, g × COP by the map',
  },
  shareThroughLimit: {
    section: '9',
    says: 'share = (highest flow − return) / (flow − return), between 0 and 1; top-up = need × (1 − share)',
  },
  givenByHeatPump: {
    section: '9',
    says: 'asked = part of the heat pump + heat waiting; could give = capacity × quiet share × (1 − τ); given = the lesser of the two',
  },
  waiting: {
    section: '9',
    says: 'displaced = waiting before + capacity − could give; waits = the least of asked − given, two hours of the design load, and displaced; 0 where the unit rests and in the last hour of the year',
  },
  waitingInRoom: {
    section: '9',
    says: 'the room waits for the lesser of asked − given and capacity − could give; the mass remembers it',
  },
  copBetween: {
    section: '9',
    says: 'r = heat / (1 − τ); COP linear in r between lowest level and full capacity',
  },
  copSingleSpeed: { section: '9', says: 'r = heat / (1 − τ); the COP of full capacity' },
  copCycling: {
    section: '9',
    says: 'r = heat / (1 − τ); CR = r / lowest rate; COP = that of the lowest level × (1 − C_d × (1 − CR))',
    source: 'degradation as in EN 14825 and AHRI 210/240',
  },
  copOffPower: { section: '9', says: 'r = heat / (1 − τ); CR = r / lowest rate; COP of the lowest level' },
  electricityOfRate: { section: '9', says: 'electricity = heat / (COP × (1 − in-use allowance))' },
  electricityWithOffPower: {
    section: '9',
    says: 'electricity = heat / (COP × (1 − in-use allowance)) + power while the compressor pauses × (1 − CR) × (1 − τ)',
  },
  starts: {
    section: '9',
    says: 'starts = lowest rate × CR × (1 − CR) × (1 − τ) / (water × 0.001163 × 5), at most 6',
    source: 'water of a run: common practice, no source',
  },
  backupParallel: {
    section: '10',
    says: 'asked = top-up + asked of the heat pump − given − waits; backup = the lesser of asked and power left; the rest is missing',
  },
  cheapest: {
    section: '10',
    says: 'cost by the heat pump = its electricity × price; by the boiler = the same heat / efficiency × price of the fuel; the cheaper carries, ties to the heat pump',
  },
  boilerCarries: {
    section: '10',
    says: 'backup = the lesser of top-up + asked of the heat pump and power left; the heat pump gives what is left of its part; nothing waits',
  },
  roomAfter: {
    section: '4',
    says: 'air = air at rest + kelvins of the air per kW × heat given; mass = share kept × mass temperature + part by weather and gains + kelvins of the mass per kW × heat given',
    source: ISO,
  },
  auxiliaries: {
    section: '11',
    says: 'the pump runs the whole hour when the rooms need heat, else for τ; standby and crankcase heater count when the compressor does nothing',
  },
  electricity: {
    section: '11',
    says: 'all electricity = the sum of the uses; an electric backup gives a kWh for a kWh',
  },
  fuel: { section: '11', says: 'fuel = heat to the rooms / efficiency + heat into the cylinder / its efficiency' },
  cost: {
    section: '12',
    says: 'cost = electricity × price; blocks, standing and demand charges belong to no single hour',
  },
  carbon: { section: '12', says: 'carbon dioxide = electricity × its factor + fuel × its factor' },
};
