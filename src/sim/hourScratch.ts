/**
 * Places of the scratch column in which the stages of one hour hand figures on: a typed array, so that nothing is
 * allocated in the loop.
 */
export const AT = {
  /** Full capacity and COP after frost loss. */
  capacity: 0,
  cop: 1,
  /** Capacity and COP of the lowest level after frost loss. */
  lowestCapacity: 2,
  lowestCop: 3,
  /** Share of the design load that sets flow and return. */
  load: 4,
  /** Heat asked of the heat pump (L + D), and what it could give. */
  asked: 5,
  canGive: 6,
  /** Heat above the unit's highest flow that only the backup can give. */
  topUp: 7,
  /** Electricity and starts of the last rate that was priced. */
  electricity: 8,
  starts: 9,
  size: 10,
} as const;

/**
 * Places of the scratch column of a cylinder: first the state that one hour hands to the next, then figures of the last
 * hour in which it was reheated.
 */
export const CYLINDER = {
  temperature: 0,
  /** 1 while a reheat is under way, and while a hygiene run is pending. */
  reheating: 1,
  hygienePending: 2,
  /** Capacity and COP of the map. */
  mapCapacity: 3,
  mapCop: 4,
  /** Temperature wanted, how far the heat pump reaches, and the flow for it, °C. */
  target: 5,
  reach: 6,
  flow: 7,
  /** Capacity after frost loss, and COP after frost loss and in-use allowance. */
  capacity: 8,
  cop: 9,
  size: 10,
} as const;
