import { readDemoFile, writeDemoFile } from './demo-file.ts';

/** Tells whoever started the demo where to go, and writes the same facts to demo.json. */
export async function announceDemo(dataDirectory: string, url: string): Promise<void> {
  const facts = { ...(await readDemoFile(dataDirectory))!, url };
  await writeDemoFile(dataDirectory, facts);
  const secret = facts.keys.find(({ role }) => role === 'engineer')!.secret;
  console.log(`
Dextral is running at ${url}

  Console        ${url}/
  API reference  ${url}/docs

Demo accounts:
${facts.accounts.map(({ email, password, role }) => `  ${role.padEnd(14)} ${email.padEnd(38)} ${password}`).join('\n')}

A first call: nose 30° true, 10° up, right wing 20° down, as a quaternion.

  curl -s ${url}/api/v1/convert \\
    -H 'Authorization: Bearer ${secret}' \\
    -H 'Content-Type: application/json' \\
    -d '{"from":{"preset":"aircraft-euler-deg"},"to":{"preset":"aircraft-quaternion"},"attitudes":[[30,10,20]]}'

These facts are also in ${dataDirectory}/demo.json. Stop with Ctrl+C; the data are kept.
Dextral is a working aid, not a qualified tool: verify independently; applicable regulations and licensed practice decide.
`);
}
