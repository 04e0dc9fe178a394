/** The owner's weather assumptions. */
export interface WeatherAssumptions {
  airTemperatureC: number;
  windSpeedMPerS: number;
  /** Angle between wind and line, degrees. */
  windAngleDeg: number;
  /** Of the conductor's surface, 0 to 1. */
  emissivity: number;
  absorptivity: number;
  /** Elevation of the line above sea level, m. */
  elevationM: number;
  /** Northern latitude, degrees. */
  latitudeDeg: number;
  /** Direction of the line, degrees clockwise from north. */
  lineAzimuthDeg: number;
  /** Day of the year, 1 to 366, and solar hour, 12 = noon. */
  dayOfYear: number;
  solarHour: number;
  atmosphere: 'clear' | 'industrial';
}
