const DEG = Math.PI / 180;

/** A part of the flight: what the aircraft steers for, in radians and m/s. */
export interface Leg {
  readonly name: string;
  readonly seconds: number;
  /** Steers for this heading with at most `bank`; without a heading it holds `bank`. */
  readonly heading?: number;
  readonly bank: number;
  readonly pitch: number;
  readonly airspeed: number;
  /** 0 is still air, 1 a bumpy day. */
  readonly turbulence: number;
  /** Pulls through a whole turn about the right wing instead. */
  readonly loop?: boolean;
}

const leg = (name: string, seconds: number, airspeed: number, pitch: number, rest: { heading?: number; bank?: number; turbulence?: number; loop?: boolean }): Leg => ({
  name, seconds, airspeed, pitch: pitch * DEG, bank: (rest.bank ?? 25) * DEG, turbulence: rest.turbulence ?? 0.6,
  ...(rest.heading === undefined ? {} : { heading: rest.heading * DEG }), ...(rest.loop ? { loop: true } : {}),
});

/** A quarter of an hour: out to the survey area, three lines with procedure turns, the exercise, home in a spiral. */
export const FLIGHT_PLAN: readonly Leg[] = [
  leg('take-off run', 20, 45, 0, { heading: 240, bank: 3, turbulence: 0.2 }),
  leg('climb', 90, 58, 9, { heading: 240 }),
  leg('transit', 80, 70, 1, { heading: 285 }),
  leg('survey line 1', 75, 62, 2, { heading: 10, bank: 30 }),
  leg('procedure turn, right', 20, 62, 2, { bank: 28 }),
  leg('survey line 2', 80, 62, 2, { heading: 190, bank: 30 }),
  leg('procedure turn, left', 20, 62, 2, { bank: -28 }),
  leg('survey line 3', 75, 62, 2, { heading: 10, bank: 30 }),
  leg('speed for the exercise', 25, 95, -8, { heading: 90, bank: 40 }),
  leg('wings level', 14, 95, -2, { bank: 0, turbulence: 0.1 }),
  leg('loop', 18, 80, 0, { loop: true, turbulence: 0.02 }),
  leg('recovery', 22, 75, 0, { heading: 90 }),
  leg('steep turn', 40, 72, 3, { bank: 55 }),
  leg('transit home', 80, 70, 0, { heading: 120 }),
  leg('spiral descent', 125, 60, -9, { bank: -35 }),
  leg('approach', 75, 48, -4, { heading: 240 }),
  leg('flare and roll-out', 25, 12, 1, { heading: 240, bank: 4, turbulence: 0.2 }),
];
