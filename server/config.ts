import { createSecretKey, randomBytes, type KeyObject } from 'node:crypto';
import path from 'node:path';

/** What the environment decides. */
export interface Config {
  readonly host: string;
  readonly port: number;
  readonly dataDirectory: string;
  /** Where people reach the console; decides the cookie's name and whether it is Secure. */
  readonly publicUrl: URL;
  readonly sessionSecret: KeyObject;
  /** Created at the first start, when the database holds no administrator. */
  readonly firstAdministrator: { readonly email: string; readonly password: string } | null;
  readonly demo: boolean;
}

/** The environment lacks something or holds something unusable; every problem is named at once. */
export class ConfigError extends Error {
  override readonly name = 'ConfigError';
  readonly problems: readonly string[];
  constructor(problems: readonly string[]) {
    super(problems.join('\n'));
    this.problems = problems;
  }
}

const SHORTEST_SECRET = 32;
const SHORTEST_PASSWORD = 12;

/**
 * Reads the environment. In the demo nothing is required: the session secret is made anew at each start.
 * @throws ConfigError naming every variable that is missing or unusable.
 */
export function readConfig(environment: NodeJS.ProcessEnv, { demo }: { demo: boolean }): Config {
  const problems: string[] = [];
  const port = Number(environment['PORT'] ?? '8787');
  if (!Number.isInteger(port) || port < 0 || port > 65_535) problems.push(`PORT must be a whole number from 0 to 65535, not "${environment['PORT']}".`);
  const host = environment['HOST'] ?? '127.0.0.1';

  const secret = environment['DEXTRAL_SESSION_SECRET'] ?? '';
  if (!demo && secret.length < SHORTEST_SECRET) {
    problems.push(`DEXTRAL_SESSION_SECRET must be set to at least ${SHORTEST_SECRET} random characters; it signs the sessions of the console.`);
  }
  const publicUrl = parseUrl(environment['DEXTRAL_PUBLIC_URL'] ?? `http://${host}:${port}`);
  if (!publicUrl) problems.push(`DEXTRAL_PUBLIC_URL must be an http or https address, not "${environment['DEXTRAL_PUBLIC_URL']}".`);

  const email = environment['DEXTRAL_ADMIN_EMAIL'];
  const password = environment['DEXTRAL_ADMIN_PASSWORD'];
  if (password !== undefined && password.length < SHORTEST_PASSWORD) problems.push(`DEXTRAL_ADMIN_PASSWORD must have at least ${SHORTEST_PASSWORD} characters.`);

  if (problems.length > 0 || !publicUrl) throw new ConfigError(problems);
  return {
    host, port, publicUrl, demo,
    dataDirectory: path.resolve(environment['DEXTRAL_DATA_DIR'] ?? 'data'),
    sessionSecret: createSecretKey(demo && secret === '' ? randomBytes(32) : Buffer.from(secret)),
    firstAdministrator: email !== undefined && password !== undefined ? { email, password } : null,
  };
}

function parseUrl(text: string): URL | null {
  const url = URL.parse(text);
  return url && ['http:', 'https:'].includes(url.protocol) ? url : null;
}
