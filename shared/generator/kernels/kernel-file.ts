import { StraightLine, type Pair } from '../straight-line.ts';

export interface Kernel {
  readonly name: string;
  readonly doc: string;
  readonly body: (b: StraightLine) => void;
}

/** The text of a module of straight-line kernels over the scratch. */
export function kernelFile(source: string, kernels: readonly Kernel[]): string {
  const functions = kernels.map(({ name, doc, body }) => {
    const b = new StraightLine();
    body(b);
    const comment = doc.trim().split('\n').map((line) => ` * ${line.trim()}`.trimEnd()).join('\n');
    return `/**\n${comment}\n */\nexport function ${name}(): void {\n  const S = scratch;\n${b.text()}\n}\n`;
  });
  return `// Written by shared/generator/write.ts from shared/generator/kernels/${source}. Do not edit.
import { scratch } from '../arithmetic/scratch.ts';

${functions.join('\n')}`;
}

export const sum = (b: StraightLine, first: Pair, ...rest: readonly Pair[]): Pair => rest.reduce((total, term) => b.plus(total, term), first);
