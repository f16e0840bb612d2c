/** A weather file kept for later use, without its contents. */
export interface WeatherFileSummary {
  /** SHA-256 of the bytes, lower-case hex: the key. */
  sha256: string;
  /** File name as picked. */
  name: string;
  bytes: number;
  /** Milliseconds since 1970. */
  keptAt: number;
}

/** Where weather files are kept, by the hash of their contents: the same file picked twice is kept once. */
export interface WeatherStore {
  list(): Promise<WeatherFileSummary[]>;
  /** The contents, or null where no such file is kept. */
  bytes(sha256: string): Promise<ArrayBuffer | null>;
  keep(name: string, contents: ArrayBuffer): Promise<WeatherFileSummary>;
  forget(sha256: string): Promise<void>;
}
