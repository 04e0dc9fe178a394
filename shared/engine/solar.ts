import type { WeatherAssumptions } from './weather';

/** Where the sun stands and how much it heats a conductor. */
export interface SolarPosition {
  declinationDeg: number;
  altitudeDeg: number;
  azimuthDeg: number;
  /** Angle between the sun's rays and the line. */
  incidenceDeg: number;
  /** Heat flux on a surface across the rays, at the line's elevation, W/m². */
  fluxWPerM2: number;
  /** Heat taken up by the conductor, W/m. */
  heatWPerM: number;
}

/** Flux at sea level as a polynomial in the sun's altitude in degrees, IEEE Std 738-2023 table 2 (SI), by atmosphere. */
const FLUX = {
  clear: [-42.2391, 63.8044, -1.922, 3.46921e-2, -3.61118e-4, 1.94318e-6, -4.07608e-9],
  industrial: [53.1821, 14.211, 0.66138, -3.1658e-2, 5.4654e-4, -4.3446e-6, 1.3236e-8],
} as const;

const RADIAN = Math.PI / 180;

/** Azimuth of the sun, degrees clockwise from north, from the hour angle (clause 4.4.5, table 3). */
function sunAzimuth(hourAngle: number, latitude: number, declination: number): number {
  const chi =
    Math.sin(hourAngle) /
    (Math.sin(latitude) * Math.cos(hourAngle) - Math.cos(latitude) * Math.tan(declination));
  const morning = hourAngle < 0;
  const constant = morning ? (chi >= 0 ? 0 : 180) : chi >= 0 ? 180 : 360;
  return constant + Math.atan(chi) / RADIAN;
}

/**
 * Solar heat gain of a conductor after IEEE Std 738-2023 clause 4.4.5–4.4.7.
 *
 * @param weather place, day, hour and atmosphere
 * @param diameterMm outer diameter, mm
 * @returns the sun's position and the heat; none at night
 */
export function solarHeat(weather: WeatherAssumptions, diameterMm: number): SolarPosition {
  const declinationDeg = 23.45 * Math.sin((((284 + weather.dayOfYear) % 365) / 365) * 2 * Math.PI);
  const declination = declinationDeg * RADIAN;
  const latitude = weather.latitudeDeg * RADIAN;
  const hourAngle = (weather.solarHour - 12) * 15 * RADIAN;
  const sine =
    Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle) +
    Math.sin(latitude) * Math.sin(declination);
  const altitude = Math.asin(Math.max(-1, Math.min(1, sine)));
  const altitudeDeg = altitude / RADIAN;
  const azimuthDeg = sunAzimuth(hourAngle, latitude, declination);
  const incidence = Math.acos(Math.cos(altitude) * Math.cos((azimuthDeg - weather.lineAzimuthDeg) * RADIAN));
  const seaLevel = FLUX[weather.atmosphere].reduceRight((sum, k) => sum * altitudeDeg + k, 0);
  const h = weather.elevationM;
  const elevation = 1 + 1.148e-4 * h - 1.108e-8 * h * h;
  const fluxWPerM2 = altitudeDeg > 0 ? Math.max(0, seaLevel * elevation) : 0;
  const heatWPerM = weather.absorptivity * fluxWPerM2 * Math.sin(incidence) * (diameterMm / 1000);
  return { declinationDeg, altitudeDeg, azimuthDeg, incidenceDeg: incidence / RADIAN, fluxWPerM2, heatWPerM };
}
