import { useMemo } from 'react';
import { parseTable } from './parse-table.ts';
import { readRecording, type ReadRecording, type Recording } from './recording.ts';

/** Reads the text once, however often the convention or the columns change. */
export function useReadRecording(recording: Recording): ReadRecording {
  const table = useMemo(() => parseTable(recording.text), [recording.text]);
  return useMemo(() => readRecording(recording, table), [recording, table]);
}
