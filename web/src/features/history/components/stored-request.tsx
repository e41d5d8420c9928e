import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { SelectField } from '../../../components/field.tsx';
import { Notice, ProblemNotice } from '../../../components/notice.tsx';
import { count, plural } from '../../../lib/format.ts';
import type { HistoryEntry } from '../api/history.ts';
import { historyRecordQuery, useSendAgain } from '../api/history-record.ts';
import { readStoredConversion, workbenchAddress, type StoredConversion } from '../model/stored-conversion.ts';

/** Attitudes of a batch that can be picked for the workbench. */
const LISTED = 200;

/** What the history holds of a call's body; a conversion can be opened in the workbench and sent again. */
export function StoredRequest({ entry, computes }: { entry: HistoryEntry; computes: boolean }) {
  const { data: record, error } = useQuery(historyRecordQuery(entry.id));
  if (error) return <ProblemNotice error={error} />;
  if (!record?.body) return null;
  const { body } = record;
  const conversion = body.text !== null && entry.route === '/api/v1/convert' ? readStoredConversion(body.text) : null;
  return (
    <section aria-label="Body of the request" className="mt-4 space-y-3 border-t border-hair pt-4">
      <p className="text-sm">Body of {plural(body.bytes, 'byte')}, {body.text === null ? 'not kept; its' : 'kept;'} SHA-256 <code className="break-all">{body.sha256}</code></p>
      {computes && conversion && body.text !== null && <Conversion conversion={conversion} text={body.text} />}
    </section>
  );
}

function Conversion({ conversion, text }: { conversion: StoredConversion; text: string }) {
  const [index, setIndex] = useState(0);
  const again = useSendAgain();
  const { attitudes } = conversion;
  return (
    <>
      {attitudes.length > 1 && (
        <SelectField label={`Attitude of ${count(attitudes.length)}`} value={index} onChange={(event) => setIndex(Number(event.target.value))}>
          {attitudes.slice(0, LISTED).map((numbers, i) => <option key={i} value={i}>{i}: {numbers.join(', ')}</option>)}
        </SelectField>
      )}
      <div className="flex flex-wrap gap-3">
        <Link to={workbenchAddress(conversion, index)} className="inline-flex min-h-10 items-center border border-rule px-3.5 no-underline hover:bg-well">Open in the workbench</Link>
        <Button busy={again.isPending} onClick={() => again.mutate(text)}>Send again</Button>
      </div>
      {again.error && <ProblemNotice error={again.error} />}
      {again.data && <Notice kind="done" title={`Answered: ${plural(again.data.attitudes, 'attitude')}`}><p>Request id <code className="break-all">{again.data.requestId}</code></p></Notice>}
    </>
  );
}
