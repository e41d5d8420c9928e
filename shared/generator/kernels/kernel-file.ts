import { StraightLine, type Pair, type Scalar } from '../straight-line.ts';

interface Named {
  readonly name: string;
  readonly doc: string;
}

/** A kernel that only leaves its results, or one that also answers yes or no. */
export type Kernel = Named & ({ readonly body: (b: StraightLine) => void } | { readonly test: (b: StraightLine) => Scalar });

/** The text of a module of straight-line kernels over the scratch. */
export function kernelFile(source: string, kernels: readonly Kernel[]): string {
  const functions = kernels.map((kernel) => {
    const { name, doc } = kernel;
    const b = new StraightLine();
    if ('test' in kernel) b.answer(kernel.test(b));
    else kernel.body(b);
    const comment = doc.trim().split('\n').map((line) => ` * ${line.trim()}`.trimEnd()).join('\n');
    return `/**\n${comment}\n */\nexport function ${name}(): ${'test' in kernel ? 'boolean' : 'void'} {\n  const S = scratch;\n${b.text()}\n}\n`;
  });
  return `// Written by shared/generator/write.ts from shared/generator/kernels/${source}. Do not edit.
import { scratch } from '../arithmetic/scratch.ts';

${functions.join('\n')}`;
}

export const sum = (b: StraightLine, first: Pair, ...rest: readonly Pair[]): Pair => rest.reduce((total, term) => b.plus(total, term), first);
