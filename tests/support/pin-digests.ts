/** Pins the digests of tests/support/digests.json anew, after a change of the core that is meant to change bits: `npx tsx tests/support/pin-digests.ts`. */
import { writeFileSync } from 'node:fs';
import { DIGESTED, digests } from './digest.ts';

writeFileSync(new URL('digests.json', import.meta.url), `${JSON.stringify(digests(DIGESTED), null, 2)}\n`);
