import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import openapiTS, { astToString } from 'openapi-typescript';
import { stringify } from 'yaml';
import { projectFile } from '../project-file.ts';
import { openApiDocument } from './document.ts';

/** Writes openapi.yaml and the console's types from the endpoint table; with --check only compares and fails on a difference. */
const contract = `# Generated from shared/api by \`npm run contract\`; do not edit.\n${stringify(openApiDocument(), { lineWidth: 0, aliasDuplicateObjects: false })}`;
const types = `/* Generated from openapi.yaml by \`npm run contract\`; do not edit. */\n${astToString(await openapiTS(openApiDocument() as never))}`;

const outdated = [['openapi.yaml', contract], ['web/src/lib/contract.gen.ts', types]].filter(([file, text]) => {
  const target = projectFile(file!);
  return !existsSync(target) || readFileSync(target, 'utf8') !== text;
});

if (process.argv.includes('--check')) {
  for (const [file] of outdated) console.error(`${file} differs from the endpoint table: run npm run contract and commit the result.`);
  process.exitCode = outdated.length > 0 ? 1 : 0;
  if (outdated.length === 0) console.log('openapi.yaml and the console\'s types agree with the endpoint table.');
} else {
  for (const [file, text] of outdated) {
    writeFileSync(projectFile(file!), text!);
    console.log(`wrote ${file}`);
  }
}
