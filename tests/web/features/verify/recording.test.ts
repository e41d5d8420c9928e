import { expect, it } from 'vitest';
import { readRecording } from '../../../../web/src/features/verify/model/recording.ts';
import { statementOf } from '../../../../web/src/features/workbench/model/workbench-state.ts';

const euler = statementOf('aircraft-euler-deg');
const read = (text: string, columns: readonly (number | null)[] = []) => readRecording({ statement: euler, text, columns });

it('takes all columns where there are as many as the convention takes numbers', () => {
  expect(read('30,10,20')).toMatchObject({ columns: [0, 1, 2], attitudes: [[30, 10, 20]], error: null });
});

it('asks rather than guesses where there are more', () => {
  expect(read('t,roll,pitch,yaw\n0,20,10,30')).toMatchObject({ columns: [null, null, null], attitudes: [], error: 'There are 4 columns; choose the 3 that the convention means.' });
  expect(read('t,roll,pitch,yaw\n0,20,10,30', [3, 2, 1])).toMatchObject({ attitudes: [[30, 10, 20]], error: null });
});

it('refuses a column chosen twice, one that is gone, and too few columns', () => {
  expect(read('0,20,10,30', [3, 3, 1]).error).toBe('A column is chosen twice.');
  expect(read('0,20,10,30', [3, 2, 4]).error).toMatch(/choose the 3/);
  expect(read('20,10').error).toBe('Each line has 2 numbers; the convention takes 3.');
});

it('passes on what is wrong with the text, and nothing for no text', () => {
  expect(read('1,2,x').error).toBe('Line 1: "x" is not a number.');
  expect(read('')).toMatchObject({ attitudes: [], error: null });
});
