import { z } from 'zod';

type JsonSchema = Record<string, unknown>;

/** Schemas with an id, gathered from every endpoint; they become components of the document. */
export class SchemaCollection {
  readonly components: Record<string, JsonSchema> = {};

  /** The JSON schema of what comes in (`input`) or goes out (`output`), with its named parts as references. */
  of(schema: z.ZodType, io: 'input' | 'output'): JsonSchema {
    const converted = z.toJSONSchema(schema, {
      io, target: 'draft-2020-12', unrepresentable: 'any', reused: 'inline',
      override: ({ zodSchema, jsonSchema }) => {
        const override = (z.globalRegistry.get(zodSchema) as { override?: JsonSchema } | undefined)?.override;
        if (!override) return;
        delete (jsonSchema as JsonSchema)['override'];
        Object.assign(jsonSchema, override);
      },
    }) as JsonSchema;
    const { $schema: _schema, $defs: definitions = {}, ...rest } = converted;
    for (const [name, definition] of Object.entries(definitions as Record<string, JsonSchema>)) this.#add(name, definition);
    const { id } = rest as { id?: string };
    if (id === undefined) return rewrite(rest);
    this.#add(id, rest);
    return { $ref: `#/components/schemas/${id}` };
  }

  #add(name: string, definition: JsonSchema): void {
    const rewritten = rewrite(definition);
    delete rewritten['id'];
    const present = this.components[name];
    if (present && JSON.stringify(present) !== JSON.stringify(rewritten)) throw new Error(`Two different schemas are named ${name}.`);
    this.components[name] = rewritten;
  }
}

/** Points references at the document's components and drops what OpenAPI does not know. */
function rewrite(schema: JsonSchema): JsonSchema {
  return JSON.parse(JSON.stringify(schema, (key, value: unknown) => {
    if (key === '$ref' && typeof value === 'string') return value.replace('#/$defs/', '#/components/schemas/');
    return value;
  })) as JsonSchema;
}
