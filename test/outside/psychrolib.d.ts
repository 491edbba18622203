declare module 'psychrolib' {
  const psychrolib: {
    SI: number;
    SetUnitSystem(system: number): void;
    GetTDewPointFromRelHum(celsius: number, humidity: number): number;
    GetSatVapPres(celsius: number): number;
    GetStandardAtmPressure(metres: number): number;
  };
  export default psychrolib;
}
