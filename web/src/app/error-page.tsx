import { useRouteError } from 'react-router-dom';
import { Button } from '../components/button.tsx';
import { Notice } from '../components/notice.tsx';

/** When a page fails in a way it did not foresee: nothing typed is saved, but nothing on the server is harmed either. */
export function ErrorPage() {
  const error = useRouteError();
  return (
    <main className="mx-auto max-w-2xl p-6">
      <h1 className="mb-4 text-2xl font-semibold">This page failed</h1>
      <Notice kind="problem" title="The console met an error it did not expect">
        <p>{error instanceof Error ? error.message : 'No more is known.'}</p>
      </Notice>
      <p className="mt-4"><Button onClick={() => location.reload()}>Load the page again</Button></p>
    </main>
  );
}
