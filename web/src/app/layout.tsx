import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { Navigate, NavLink, Outlet, useLocation } from 'react-router-dom';
import { AccountMenu } from '../features/session/components/account-menu.tsx';
import { sessionQuery, type Person } from '../features/session/api/session.ts';
import { Mark } from '../components/mark.tsx';
import { ProblemNotice } from '../components/notice.tsx';
import { TitleBlock } from '../components/title-block.tsx';
import { date } from '../lib/format.ts';
import { SHEETS, sheetAt } from './sheets.ts';

/** The sheet every page is drawn on: index above, title block below. Leads to the sign-in page and back when nobody is signed in. */
export function Layout() {
  const location = useLocation();
  const { data: person, error, isPending } = useQuery(sessionQuery);
  if (isPending) return null;
  if (error) return <main className="mx-auto max-w-xl p-6"><ProblemNotice error={error} /></main>;
  if (person === null) return <Navigate to={`/sign-in?next=${encodeURIComponent(location.pathname + location.search)}`} replace />;
  return <SheetFrame person={person} />;
}

function SheetFrame({ person }: { person: Person }) {
  const { pathname } = useLocation();
  const main = useRef<HTMLElement>(null);
  const firstPage = useRef(true);
  const sheet = sheetAt(pathname);
  useEffect(() => {
    // After a change of page the keyboard starts at the top of the new one; on the first load it stays with the browser.
    if (firstPage.current) firstPage.current = false;
    else main.current?.focus();
  }, [pathname]);

  return (
    <div className="mx-auto flex min-h-dvh max-w-[90rem] flex-col p-2 sm:p-4">
      <a href="#content" className="absolute -top-20 left-4 z-20 bg-accent px-3 py-2 text-accent-ink focus:top-2">Skip to the content</a>
      <div className="flex grow flex-col border border-rule bg-sheet">
        <header className="flex flex-wrap items-stretch border-b border-rule">
          <NavLink to="/" className="flex items-center gap-2 px-4 py-2 no-underline" aria-label="Dextral, overview">
            <Mark /><span className="text-lg font-bold tracking-[0.14em] uppercase [font-stretch:125%]">Dextral</span>
          </NavLink>
          <Index person={person} />
          <div className="ml-auto flex items-center px-3"><AccountMenu person={person} /></div>
        </header>
        <main id="content" ref={main} tabIndex={-1} className="grow px-4 py-6 outline-none sm:px-6 lg:px-8"><Outlet /></main>
        <footer>
          <p className="px-4 pb-3 text-sm text-soft sm:px-6 lg:px-8">
            A working aid, not a qualified tool: verify independently. Applicable regulations and licensed practice decide.
          </p>
          <TitleBlock cells={[
            ['Sheet', sheet ? `${sheet.number} of ${String(SHEETS.length).padStart(2, '0')}` : '—'],
            ['Title', sheet?.title ?? 'Unlisted'],
            ['Signed in', `${person.name}, ${person.role}`],
            ['Date', date(new Date().toISOString())],
          ]} />
        </footer>
      </div>
    </div>
  );
}

function Index({ person }: { person: Person }) {
  const [open, setOpen] = useState(false);
  const sheets = SHEETS.filter(({ roles }) => !roles || roles.includes(person.role));
  return (
    <>
      <button type="button" className="lettering border-l border-hair px-4 py-3 xl:hidden" aria-expanded={open} aria-controls="index" onClick={() => setOpen(!open)}>Index</button>
      <nav id="index" aria-label="Pages" className={`${open ? '' : 'hidden'} order-last w-full border-t border-hair xl:order-none xl:block xl:w-auto xl:border-t-0`}>
        <ul className="grid grid-cols-2 sm:grid-cols-3 xl:flex xl:h-full">
          {sheets.map(({ number, path, title }) => (
            <li key={path} className="flex">
              <NavLink to={path} end={path === '/'} onClick={() => setOpen(false)}
                className={({ isActive }) => `flex grow items-center gap-1.5 border-l border-hair px-3.5 py-3 no-underline xl:px-2.5 ${isActive ? 'bg-ink text-sheet hover:text-sheet' : 'hover:bg-well'}`}>
                <span className="figures opacity-80">{number}</span>{title}
              </NavLink>
            </li>
          ))}
          <li className="flex"><a href="/docs/" className="flex grow items-center border-x border-hair px-3.5 py-3 no-underline hover:bg-well xl:px-2.5">API reference</a></li>
        </ul>
      </nav>
    </>
  );
}

