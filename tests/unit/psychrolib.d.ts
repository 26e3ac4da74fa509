/** The few functions that the tests ask of psychrolib, which carries no types. */
declare module 'psychrolib' {
  const psychrolib: {
    SI: number
    SetUnitSystem: (system: number) => void
    /** @returns °C */
    GetTDewPointFromRelHum: (dryC: number, humidity: number) => number
    /** @returns °C */
    GetTWetBulbFromRelHum: (dryC: number, humidity: number, pressurePa: number) => number
    /** @returns Pa */
    GetSatVapPres: (dryC: number) => number
  }
  export default psychrolib
}
