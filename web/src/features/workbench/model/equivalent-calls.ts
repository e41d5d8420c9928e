import type { Statement } from './workbench-state.ts';

/** The call that answers what the workbench shows, in three languages; each runs as it stands once DEXTRAL_KEY is set. */
export function equivalentCalls(origin: string, from: Statement, to: Statement, numbers: readonly number[]) {
  const reference = ({ preset, convention }: Statement) => (preset === null ? convention : { preset });
  const body = JSON.stringify({ from: reference(from), to: reference(to), attitudes: [numbers] });
  const url = `${origin}/api/v1/convert`;
  return [
    ['curl', `curl -s ${url} \\\n  -H "Authorization: Bearer $DEXTRAL_KEY" \\\n  -H 'Content-Type: application/json' \\\n  -d '${body}'`],
    ['TypeScript', `const response = await fetch('${url}', {
  method: 'POST',
  headers: { Authorization: \`Bearer \${process.env.DEXTRAL_KEY}\`, 'Content-Type': 'application/json' },
  body: JSON.stringify(${body}),
});
if (!response.ok) throw new Error((await response.json()).detail);
const { attitudes, warnings } = await response.json();
console.log(attitudes, warnings);`],
    ['Python', `import json, os, urllib.request

request = urllib.request.Request(
    "${url}",
    data=json.dumps(json.loads(r'''${body}''')).encode(),
    headers={"Authorization": "Bearer " + os.environ["DEXTRAL_KEY"], "Content-Type": "application/json"},
)
with urllib.request.urlopen(request) as response:
    answer = json.load(response)
print(answer["attitudes"], answer["warnings"])`],
  ] as const;
}
