import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useEffect, useRef, useState } from 'react';
import { Navigate, NavLink, Outlet, useLocation } from 'react-router-dom';
import { Mark } from '../components/mark.tsx';
import { ProblemNotice } from '../components/notice.tsx';
import { SheetFrame } from '../components/sheet-frame.tsx';
import { TitleBlock, type TitleCell } from '../components/title-block.tsx';
import { sessionQuery, type Person } from '../features/session/api/session.ts';
import { AccountMenu } from '../features/session/components/account-menu.tsx';
import { date } from '../lib/format.ts';
import { sheetAt, sheetsFor } from './sheets.ts';

const SignInAgain = lazy(async () => ({ default: (await import('../features/session/components/sign-in-again.tsx')).SignInAgain }));

/** The sheet every page is drawn on. Leads to the sign-in page and back when nobody is signed in. */
export function Layout() {
  const location = useLocation();
  const { data: person, error, isPending } = useQuery(sessionQuery);
  const [known, setKnown] = useState<Person | null>(null);
  if (person && person !== known) setKnown(person);
  if (isPending) return null;
  if (error && !known) return <main className="mx-auto max-w-xl p-6"><ProblemNotice error={error} /></main>;
  // Somebody was signed in on this page: it stays as it is, with all that was typed, until they are again.
  if (person == null && known) return <><Sheet person={known} /><Suspense><SignInAgain person={known} /></Suspense></>;
  if (person == null) return <Navigate to={`/sign-in?next=${encodeURIComponent(location.pathname + location.search)}`} replace />;
  return <Sheet person={person} />;
}

function Sheet({ person }: { person: Person }) {
  const { pathname } = useLocation();
  const main = useRef<HTMLElement>(null);
  const firstPage = useRef(true);
  const sheet = sheetAt(pathname);
  useEffect(() => {
    // After a change of page the keyboard starts at the top of the new one; on the first load it stays with the browser.
    if (firstPage.current) firstPage.current = false;
    else main.current?.focus();
  }, [pathname]);
  const cells: readonly TitleCell[] = [['Title', sheet?.title ?? 'Unlisted'], ['Sheet', sheet?.number ?? '—'], ['Drawn for', person.name], ['Date', date(new Date().toISOString())]];

  return (
    <div className="mx-auto flex min-h-dvh max-w-[96rem] flex-col p-2 sm:p-3">
      <a href="#content" className="absolute -top-20 left-4 z-20 bg-accent px-3 py-2 text-accent-ink focus:top-2">Skip to the content</a>
      <SheetFrame className="flex grow flex-col">
        <div className="flex grow flex-col xl:flex-row-reverse">
          <Strip person={person} cells={cells} />
          <div className="flex min-w-0 grow flex-col">
            <main id="content" ref={main} tabIndex={-1} className="grow px-4 py-6 outline-none sm:px-6 xl:px-8"><Outlet /></main>
            <footer className="xl:hidden">
              <p className="px-4 pb-3 text-sm text-soft sm:px-6"><Cautions /></p>
              <TitleBlock cells={cells} />
            </footer>
          </div>
        </div>
      </SheetFrame>
    </div>
  );
}

const Cautions = () => <>A working aid, not a qualified tool: verify independently. Applicable regulations and licensed practice decide.</>;

/** Name, list of sheets, notes and title block: down the right-hand edge as on a drawing, or across the top where the window is narrow. */
function Strip({ person, cells }: { person: Person; cells: readonly TitleCell[] }) {
  const [open, setOpen] = useState(false);
  return (
    <header className="shrink-0 border-b border-rule xl:w-60 xl:border-b-0 xl:border-l">
      <div className="flex flex-wrap items-stretch xl:sticky xl:top-9 xl:h-[calc(100dvh-1.5rem-3rem-2px)] xl:flex-col xl:flex-nowrap">
        <NavLink to="/" className="flex items-center gap-2 px-3 py-2.5 sm:px-4 no-underline xl:border-b xl:border-rule xl:py-4" aria-label="Dextral, overview">
          <Mark /><span className="font-bold tracking-[0.1em] sm:text-lg sm:tracking-[0.14em] uppercase [font-stretch:125%]">Dextral</span>
        </NavLink>
        <button type="button" className="lettering border-x border-hair px-3 py-3 hover:bg-well sm:px-4 xl:hidden" aria-expanded={open} aria-controls="index" onClick={() => setOpen(!open)}>Index</button>
        <nav id="index" aria-label="Pages" className={`${open ? '' : 'hidden'} order-last w-full border-t border-hair py-2 xl:order-none xl:block xl:min-h-0 xl:grow xl:overflow-y-auto xl:border-t-0 xl:py-3`}>
          <div className="grid grid-cols-2 sm:grid-cols-3 xl:block">
            {sheetsFor(person.role).map(({ title, sheets }) => (
              <section key={title} className="pb-2">
                {title && <p className="lettering px-4 py-1 text-soft">{title}</p>}
                <ul>
                  {sheets.map(({ number, path, title: name }) => (
                    <li key={path}>
                      <NavLink to={path} end={path === '/'} onClick={() => setOpen(false)}
                        className={({ isActive }) => `flex min-h-8 items-baseline gap-3 px-4 py-1 no-underline ${isActive ? 'bg-ink text-sheet hover:text-sheet' : 'hover:bg-well'}`}>
                        <span className="figures">{number}</span>{name}
                      </NavLink>
                    </li>
                  ))}
                  {title === 'Reference' && <li><a href="/docs/" className="flex min-h-8 items-baseline gap-3 px-4 py-1 no-underline hover:bg-well"><span className="figures">303</span>API reference</a></li>}
                </ul>
              </section>
            ))}
          </div>
        </nav>
        <div className="ml-auto flex items-center px-3 xl:ml-0 xl:border-t xl:border-hair xl:px-4 xl:py-1"><AccountMenu person={person} /></div>
        <div className="hidden xl:block">
          <p className="border-t border-hair px-4 py-3 text-sm text-soft"><span className="lettering block">Notes</span><Cautions /></p>
          <TitleBlock square cells={cells} />
        </div>
      </div>
    </header>
  );
}
