import type { Role } from '../features/session/api/session.ts';

/** The pages of the console, numbered like the sheets of a drawing set. */
export interface Sheet {
  readonly number: string;
  readonly path: string;
  readonly title: string;
  /** Roles that have this page; everybody when absent. */
  readonly roles?: readonly Role[];
}

export const SHEETS: readonly Sheet[] = [
  { number: '01', path: '/', title: 'Overview' },
  { number: '02', path: '/workbench', title: 'Workbench', roles: ['administrator', 'integrator', 'engineer'] },
  { number: '03', path: '/verify', title: 'Verify', roles: ['administrator', 'integrator', 'engineer'] },
  { number: '04', path: '/runs', title: 'Runs' },
  { number: '05', path: '/conventions', title: 'Conventions' },
  { number: '06', path: '/keys', title: 'Keys', roles: ['administrator', 'integrator', 'engineer'] },
  { number: '07', path: '/history', title: 'History' },
  { number: '08', path: '/usage', title: 'Usage' },
  { number: '09', path: '/first-call', title: 'First call' },
];

export function sheetAt(path: string): Sheet | undefined {
  return SHEETS.find((sheet) => sheet.path === path) ?? SHEETS.find((sheet) => sheet.path !== '/' && path.startsWith(`${sheet.path}/`));
}
