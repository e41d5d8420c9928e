import type { Role } from '../features/session/api/session.ts';

/** The pages of the console, numbered like the sheets of a drawing set: the hundreds tell what a sheet is for. */
export interface Sheet {
  readonly number: string;
  readonly path: string;
  readonly title: string;
  /** Roles that have this page; everybody when absent. */
  readonly roles?: readonly Role[];
}

export interface SheetGroup {
  /** Empty for the cover. */
  readonly title: string;
  readonly sheets: readonly Sheet[];
}

const COMPUTE: readonly Role[] = ['administrator', 'integrator', 'engineer'];

export const SHEET_GROUPS: readonly SheetGroup[] = [
  { title: '', sheets: [{ number: '001', path: '/', title: 'Overview' }] },
  { title: 'Work', sheets: [
    { number: '101', path: '/workbench', title: 'Workbench', roles: COMPUTE },
    { number: '102', path: '/verify', title: 'Verify', roles: COMPUTE },
    { number: '103', path: '/identify', title: 'Identify', roles: COMPUTE },
  ] },
  { title: 'Records', sheets: [
    { number: '201', path: '/runs', title: 'Runs' },
    { number: '202', path: '/history', title: 'History' },
    { number: '203', path: '/usage', title: 'Usage' },
  ] },
  { title: 'Reference', sheets: [
    { number: '301', path: '/conventions', title: 'Conventions' },
    { number: '302', path: '/first-call', title: 'First call' },
  ] },
  { title: 'Office', sheets: [{ number: '401', path: '/keys', title: 'Keys', roles: COMPUTE }] },
];

const SHEETS = SHEET_GROUPS.flatMap(({ sheets }) => sheets);

export function sheetAt(path: string): Sheet | undefined {
  return SHEETS.find((sheet) => sheet.path === path) ?? SHEETS.find((sheet) => sheet.path !== '/' && path.startsWith(`${sheet.path}/`));
}

/** What a role has, group by group; a group without a page for it is left out. */
export function sheetsFor(role: Role): readonly SheetGroup[] {
  return SHEET_GROUPS.map(({ title, sheets }) => ({ title, sheets: sheets.filter(({ roles }) => !roles || roles.includes(role)) })).filter(({ sheets }) => sheets.length > 0);
}
