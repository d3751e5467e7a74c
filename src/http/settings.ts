/** What the house is built with; every member has a default in defaultSettings. */
export interface Settings {
  /** bytes of one question */
  readonly bodyLimit: number;
  /** how often each operation answers its own example before the service is ready */
  readonly warmUpRounds: number;
}

export const defaultSettings: Settings = { bodyLimit: 64 * 1024, warmUpRounds: 12 };
