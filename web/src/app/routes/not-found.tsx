import { Link } from 'react-router-dom';
import { PageHeading } from '../../components/page-heading.tsx';

export function Component() {
  return (
    <>
      <PageHeading title="No such sheet">There is no page at this address.</PageHeading>
      <p><Link to="/">Back to the overview</Link></p>
    </>
  );
}
