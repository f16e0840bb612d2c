export type WeatherFormat = 'EPW' | 'TMY3';

/** A typical year of 8,760 hours at a weather station. Value h (0 to 8759) is the mean from hour h to hour h + 1. */
export interface WeatherFile {
  /** Name of the file. */
  name: string;
  /** The station, as the file names it. */
  place: string;
  latitude: number;
  longitude: number;
  /** Metres above sea level. */
  altitude: number;
  /** Minutes the file's standard time is ahead of UTC. */
  utcOffset: number;
  /** Irradiance, W/m2. */
  ghi: Float32Array;
  dni: Float32Array;
  dhi: Float32Array;
  /** Air temperature, °C. */
  temperature: Float32Array;
  format: WeatherFormat;
  warnings: readonly string[];
}
