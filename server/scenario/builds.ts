import { PIPELINES, type Fault, type Pipeline } from './pipelines.ts';
import { SeededRandom } from './random.ts';

/** One past build of a pipeline: everything it did hangs on this. */
export interface Build {
  readonly pipeline: Pipeline;
  readonly at: number;
  readonly daysAgo: number;
  /** 40 hexadecimal digits. */
  readonly commit: string;
  /** The mistake that the unit's output carried that day. */
  readonly fault: Fault | null;
  /** Seed for whatever else differs from build to build. */
  readonly seed: number;
}

export const DAY = 86_400_000;
export const HOUR = 3_600_000;
/** How far back the scenario goes. */
export const DAYS = 44;

export const isWeekend = (day: number): boolean => [0, 6].includes(new Date(day).getUTCDay());

/** Six weeks of builds before `now`, oldest first, with a working-day rhythm and more of them while something is wrong. */
export function pastBuilds(now: number): Build[] {
  const random = new SeededRandom(20_260_119);
  const today = Math.floor(now / DAY) * DAY;
  const builds: Build[] = [];
  for (let daysAgo = DAYS; daysAgo >= 0; daysAgo--) {
    const day = today - daysAgo * DAY;
    for (const pipeline of PIPELINES) {
      if (daysAgo > pipeline.since || (isWeekend(day) && !pipeline.weekends)) continue;
      const fault = pipeline.faults.find(({ from, until }) => daysAgo <= from && daysAgo >= until) ?? null;
      const count = pipeline.buildsADay === 1 ? 1 : Math.round(pipeline.buildsADay * random.between(0.5, 1.4) * (fault ? 1.5 : 1));
      for (let i = 0; i < count; i++) {
        const at = Math.round(day + (pipeline.hour + pipeline.spread * 0.6 * random.normal()) * HOUR);
        const commit = Array.from({ length: 40 }, () => Math.floor(random.between(0, 16)).toString(16)).join('');
        const seed = Math.floor(random.between(1, 2 ** 31));
        if (at < now) builds.push({ pipeline, at, daysAgo, commit, fault, seed });
      }
    }
  }
  return builds.sort((a, b) => a.at - b.at);
}
