import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { ProblemNotice } from '../../components/notice.tsx';
import { PageHeading } from '../../components/page-heading.tsx';
import { Skeleton } from '../../components/skeleton.tsx';
import { keysQuery, type ApiKey } from '../../features/keys/api/keys.ts';
import { IssueKeyDialog } from '../../features/keys/components/issue-key-dialog.tsx';
import { KeyTable } from '../../features/keys/components/key-table.tsx';
import { RevokeKeyDialog } from '../../features/keys/components/revoke-key-dialog.tsx';
import { sessionQuery } from '../../features/session/api/session.ts';

export function Component() {
  const { data: person } = useQuery(sessionQuery);
  const { data: keys, error, isPending } = useQuery(keysQuery);
  const [issuing, setIssuing] = useState(false);
  const [revoking, setRevoking] = useState<ApiKey | null>(null);
  const administers = person?.role === 'administrator';
  return (
    <>
      <PageHeading title="API keys" action={administers && <Button kind="main" onClick={() => setIssuing(true)}>Issue a key</Button>}>
        {administers ? 'Every key of the workspace. A pipeline sends its key with each call; what it may do follows from the key’s role.' : 'The keys of your pipelines. An administrator issues and revokes them.'}
      </PageHeading>
      {isPending ? <Skeleton label="Fetching the keys" /> : error ? <ProblemNotice error={error} />
        : keys.length === 0 ? <EmptyState title="No keys yet">{administers ? 'Issue the first one and make a call with it.' : 'Ask an administrator for one.'}</EmptyState>
          : <KeyTable keys={keys} onRevoke={administers ? setRevoking : null} />}
      {issuing && <IssueKeyDialog onClose={() => setIssuing(false)} />}
      {revoking && <RevokeKeyDialog apiKey={revoking} onClose={() => setRevoking(null)} />}
    </>
  );
}
