import type { Convention } from '#shared/attitude/convention.ts';
import { UNITS, type Resolution, type ScenarioUnit } from './units.ts';

/** A mistake that a unit's output carried for a while. Days are counted back from today. */
export interface Fault {
  readonly says: string;
  /** First and last day, in days ago. */
  readonly from: number;
  readonly until: number;
  /** What the numbers really were, while the document went on saying the unit's convention. */
  readonly really: { readonly convention?: Convention; readonly resolution?: Resolution };
}

/** A supplier's or the programme's pipeline, which feeds recorded flight through the service at every build. */
export interface Pipeline {
  /** Name of its API key. */
  readonly key: string;
  readonly sends: ScenarioUnit;
  readonly receives: ScenarioUnit;
  /** Largest error that its verification lets pass. */
  readonly tolerance: { readonly angle: number; readonly unit: 'deg' | 'rad' | 'arcsec' };
  /** Legs of the flight that each build converts, one call each; longer ones in parts. */
  readonly legs: readonly string[];
  readonly buildsADay: number;
  /** Hour of day (UTC) around which its builds gather, and how widely. */
  readonly hour: number;
  readonly spread: number;
  readonly weekends: boolean;
  /** Days ago on which it began. */
  readonly since: number;
  readonly faults: readonly Fault[];
}

const { inertialUnit, autopilot, cameraGimbal, flightSimulator, groundDisplay } = UNITS;

export const PIPELINES: readonly Pipeline[] = [
  {
    key: 'Autopilot pipeline', sends: autopilot, receives: groundDisplay, tolerance: { angle: 0.01, unit: 'arcsec' }, buildsADay: 6, hour: 12.5, spread: 2.6, weekends: false, since: 44,
    legs: ['take-off', 'climb', 'survey line 1', 'procedure turn 1, back', 'steep turn', 'loop with vertical line'],
    faults: [{ says: 'sends degrees, stated radians', from: 34, until: 32, really: { convention: { ...autopilot.convention, unit: 'deg' } } }],
  },
  {
    key: 'Integration rig', sends: inertialUnit, receives: flightSimulator, tolerance: { angle: 0.1, unit: 'arcsec' }, buildsADay: 3, hour: 10, spread: 2.2, weekends: false, since: 43,
    legs: ['transit', 'survey line 2', 'procedure turn 2, back', 'stall', 'wing-over', 'loop with vertical line', 'spiral descent', 'flare'],
    faults: [],
  },
  {
    key: 'Gimbal pipeline', sends: cameraGimbal, receives: autopilot, tolerance: { angle: 0.1, unit: 'arcsec' }, buildsADay: 4, hour: 14.5, spread: 2, weekends: false, since: 40,
    legs: ['survey line 1', 'survey line 2', 'survey line 3', 'wing-over', 'loop with vertical line'],
    faults: [
      { says: 'writes 16-bit fractions, whose norm is not 1', from: 40, until: 38, really: { resolution: 'fraction16' } },
      { says: 'changed to scalar first, stated scalar last', from: 24, until: 18, really: { convention: { ...cameraGimbal.convention, scalar: 'first' } } },
    ],
  },
  {
    key: 'Simulator nightly', sends: flightSimulator, receives: groundDisplay, tolerance: { angle: 0.001, unit: 'arcsec' }, buildsADay: 1, hour: 2.2, spread: 0.2, weekends: true, since: 38,
    legs: ['take-off', 'climb', 'transit', 'survey line 1', 'survey line 2', 'survey line 3', 'steep turn', 'stall', 'wing-over', 'loop with vertical line', 'spiral descent', 'approach', 'roll-out'],
    faults: [{ says: 'writes the matrix by rows, stated by columns', from: 38, until: 36, really: { convention: { ...flightSimulator.convention, layout: 'row-major' } } }],
  },
  {
    key: 'Inertial unit acceptance', sends: inertialUnit, receives: autopilot, tolerance: { angle: 0.1, unit: 'arcsec' }, buildsADay: 2, hour: 8.5, spread: 1.2, weekends: false, since: 36,
    legs: ['before take-off', 'take-off', 'survey line 3', 'stall', 'after landing'],
    faults: [{ says: 'sends east-north-up, stated north-east-down', from: 14, until: 12, really: { convention: { ...inertialUnit.convention, reference: 'ENU' } } }],
  },
  {
    // Two decimals of a degree in three angles: within the tolerance but for the unluckiest of attitudes.
    key: 'Ground display build', sends: groundDisplay, receives: inertialUnit, tolerance: { angle: 0.0088, unit: 'deg' }, buildsADay: 3, hour: 11.5, spread: 2.4, weekends: false, since: 30,
    legs: ['climb', 'survey line 2', 'steep turn', 'wing-over', 'loop with vertical line', 'approach'],
    faults: [{ says: 'shows bank left wing down positive', from: 29, until: 27, really: { convention: { ...groundDisplay.convention, signs: [1, 1, -1] } } }],
  },
];
