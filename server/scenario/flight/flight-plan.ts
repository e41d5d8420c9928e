import { loopWithVerticalLine, stall, wingOver } from './exercises.ts';
import { approach, flare, rollOut, stand, takeOff } from './ground-legs.ts';
import { level, line, turn, type Leg, type Place } from './legs.ts';

/** Runway 24: heading 240° true, (cos 240°, sin 240°). */
export const RUNWAY: Place = [-0.5, -0.8660254037844386];

/** A place so many metres along the runway's direction and to its right, from the threshold. */
const fromRunway = (along: number, right: number): Place => [along * RUNWAY[0] - right * RUNWAY[1], along * RUNWAY[1] + right * RUNWAY[0]];

/** Out to the survey block, three lines with procedure turns, the exercises at height, home in a spiral. */
export function flightPlan(): Leg[] {
  const survey = { height: 520, speed: 62, bank: 0.5 };
  // Lines run towards 010° and back; sin and cos of 10°.
  const [sine, cosine] = [0.17364817766693033, 0.984807753012208];
  const inBlock = (along: number, right: number): Place => [-2600 + along * cosine - right * sine, -8600 + along * sine + right * cosine];
  return [
    stand('before take-off', 6),
    takeOff(RUNWAY),
    line('climb', [0, 0], fromRunway(4300, 0), { height: 520, speed: 57 }),
    line('transit', fromRunway(4300, 0), inBlock(-300, 0), { height: 520, speed: 70 }),
    line('survey line 1', inBlock(-300, 0), inBlock(3600, 0), survey),
    turn('procedure turn 1, out', -0.45, { ...survey, by: 70 }),
    turn('procedure turn 1, back', 0.5, { ...survey, by: 240 }),
    line('survey line 2', inBlock(4000, 600), inBlock(300, 600), survey),
    turn('procedure turn 2, out', 0.45, { ...survey, by: 70 }),
    turn('procedure turn 2, back', -0.5, { ...survey, by: 240 }),
    line('survey line 3', inBlock(0, 1200), inBlock(3900, 1200), survey),
    line('climb to exercise height', inBlock(3900, 1200), [3600, -1200], { height: 1350, speed: 62, steepest: 0.14 }),
    turn('steep turn', 0.82, { height: 1300, speed: 72, by: 355, turbulence: 0.3 }),
    level('settle', 6, { height: 1300, speed: 52 }),
    stall(),
    level('speed for the wing-over', 18, { height: 1200, speed: 88 }),
    wingOver(),
    level('speed for the loop', 22, { height: 1100, speed: 98 }),
    loopWithVerticalLine(2.5),
    level('recovery', 8, { height: 1200, speed: 75 }),
    line('transit home', [2600, 3000], [4200, 5700], { height: 1200, speed: 72 }),
    turn('spiral descent', -0.57, { height: 420, speed: 72, climb: -0.1 }),
    line('intercept', fromRunway(-9000, 0), fromRunway(-4300, 0), { height: 300, speed: 55 }),
    approach(RUNWAY, { speed: 46, slope: 0.0612 }),
    flare(RUNWAY),
    rollOut(RUNWAY),
    stand('after landing', 8),
  ];
}
