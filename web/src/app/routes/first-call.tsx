import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { CodeBlock } from '../../components/code-block.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { firstCall } from '../../features/keys/components/issue-key-dialog.tsx';
import { sessionQuery } from '../../features/session/api/session.ts';

export function Component() {
  const { data: person } = useQuery(sessionQuery);
  return (
    <>
      <PageHeading title="First call">From here to an answer in your terminal. You need an API key.</PageHeading>
      <ol className="max-w-3xl list-decimal space-y-6 pl-6 marker:font-semibold">
        <li>
          <p className="mb-2">{person?.role === 'administrator' ? <><Link to="/keys">Issue a key</Link> for the role engineer and copy its secret; the dialog shows this call with the secret filled in.</> : <>Take the secret of one of <Link to="/keys">your keys</Link>, or ask an administrator to issue one.</>}</p>
          <CodeBlock label="Keep it in your shell" text="export DEXTRAL_KEY='dxt_…'" />
        </li>
        <li>
          <p className="mb-2">Convert an attitude, nose 30° true, 10° up, right wing 20° down, to a quaternion.</p>
          <CodeBlock label="curl" text={firstCall(location.origin, '$DEXTRAL_KEY').replace("'Authorization: Bearer $DEXTRAL_KEY'", '"Authorization: Bearer $DEXTRAL_KEY"')} />
          <p className="mt-2">The answer’s attitudes are <code>[[0.9515485246437886, 0.14487812541736916, 0.12767944069578066, 0.23929833774473033]]</code>: w, x, y, z.</p>
        </li>
        <li>
          <p>Find the call in the <Link to="/history">history</Link> by its request id, which the answer carries in <code>X-Request-Id</code>.</p>
        </li>
        <li>
          <p>Try your own conventions in the <Link to="/workbench">workbench</Link>, which shows the call for what it displays, or read the <a href="/docs/">API reference</a>.</p>
        </li>
      </ol>
    </>
  );
}
