import type { WeatherAssumptions } from '../../engine/index';

/**
 * Weather that ratings are weighed under where the owner has set none: the basis of the published conductor tables, a
 * summer day with 25 °C, 0.61 m/s of cross wind and full sun on a grey conductor at sea level.
 */
export const DEFAULT_WEATHER: WeatherAssumptions = {
  airTemperatureC: 25,
  windSpeedMPerS: 0.61,
  windAngleDeg: 90,
  emissivity: 0.5,
  absorptivity: 0.5,
  elevationM: 0,
  latitudeDeg: 40,
  lineAzimuthDeg: 90,
  dayOfYear: 172,
  solarHour: 12,
  atmosphere: 'clear',
};
