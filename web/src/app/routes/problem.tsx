import { useParams } from 'react-router-dom';
import { PROBLEMS } from '../../../../shared/api/problems.ts';
import { PageHeading } from '../../components/page-heading.tsx';

/** What a problem document's `type` leads to. */
export function Component() {
  const { code = '' } = useParams();
  const problem = Object.hasOwn(PROBLEMS, code) ? PROBLEMS[code as keyof typeof PROBLEMS] : null;
  return problem
    ? <><PageHeading title={problem.title}>Problem code <code>{code}</code>, answered with status {problem.status}.</PageHeading><p className="max-w-[68ch]">The document’s <code>detail</code> says what was wrong with the very request, and its <code>errors</code> point at each field. Branch on <code>code</code>: it never changes its meaning.</p></>
    : <PageHeading title="No such problem">The service has no problem code <code>{code}</code>.</PageHeading>;
}
