/** The part of the published library psychrolib (MIT) that the checks use; it brings no types of its own. */
declare module 'psychrolib' {
  const library: {
    readonly SI: number;
    SetUnitSystem(system: number): void;
    GetSatVapPres(temperature: number): number;
    GetHumRatioFromVapPres(vapourPressure: number, pressure: number): number;
    GetHumRatioFromRelHum(temperature: number, share: number, pressure: number): number;
    GetHumRatioFromTDewPoint(dewPoint: number, pressure: number): number;
    GetHumRatioFromTWetBulb(temperature: number, wetBulb: number, pressure: number): number;
    GetTWetBulbFromHumRatio(temperature: number, ratio: number, pressure: number): number;
    GetTDewPointFromRelHum(temperature: number, share: number): number;
    GetStandardAtmPressure(altitude: number): number;
  };
  export default library;
}
