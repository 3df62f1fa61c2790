import { z } from 'zod';
import { memberSchema, sessionSchema, studioSchema } from '../../shared/contracts/accounts';
import { albumSchema, spreadDetailSchema, spreadSummarySchema } from '../../shared/contracts/albums';
import { problemSchema } from '../../shared/contracts/common';
import { cutSizeSchema } from '../../shared/contracts/cut-sizes';
import { bindingSchema, contentSchema, documentSchema, matSchema, pageFormatSchema, paneGroupSchema, schemeSchema } from '../../shared/contracts/document';
import { editSchema, loggedEditSchema } from '../../shared/contracts/edits';
import { jobSchema } from '../../shared/contracts/exports';
import { grantSchema } from '../../shared/contracts/grants';
import { pileSchema, printSchema, swatchSchema } from '../../shared/contracts/prints';
import { stashSheetSchema, stashSideSchema } from '../../shared/contracts/stash';

export type JsonSchema = Record<string, unknown>;

/** Schemas that have a name of their own in the description; all others are written out where they are used. */
const NAMED: Readonly<Record<string, z.ZodType>> = {
  Album: albumSchema,
  Binding: bindingSchema,
  Content: contentSchema,
  CutSize: cutSizeSchema,
  Document: documentSchema,
  Edit: editSchema,
  Grant: grantSchema,
  Job: jobSchema,
  LoggedEdit: loggedEditSchema,
  Mat: matSchema,
  Member: memberSchema,
  PageFormat: pageFormatSchema,
  PaneGroup: paneGroupSchema,
  Pile: pileSchema,
  Print: printSchema,
  Problem: problemSchema,
  Scheme: schemeSchema,
  Session: sessionSchema,
  SpreadDetail: spreadDetailSchema,
  SpreadSummary: spreadSummarySchema,
  StashSheet: stashSheetSchema,
  StashSide: stashSideSchema,
  Studio: studioSchema,
  Swatch: swatchSchema,
};

export interface Components {
  /** What may be sent. */
  input(schema: z.ZodType): JsonSchema;
  /** What comes back. */
  output(schema: z.ZodType): JsonSchema;
  problem(): JsonSchema;
  /** Every named schema that was used, after all else was described. */
  schemas(): Record<string, JsonSchema>;
}

/** Turns Zod schemas into JSON Schema in which named ones are references. */
export function createComponents(): Components {
  const input = createHalf('input', 'Input');
  const output = createHalf('output', '');
  return {
    input: input.describe,
    output: output.describe,
    problem: () => output.describe(problemSchema),
    schemas: () => ({ ...output.definitions, ...input.definitions }),
  };
}

/** A schema may look different when sent and when received, so each side has names of its own. */
function createHalf(io: 'input' | 'output', suffix: string) {
  const names = z.registry<{ id: string }>();
  for (const [name, schema] of Object.entries(NAMED)) names.add(schema, { id: name + suffix });
  const definitions: Record<string, JsonSchema> = {};

  const describe = (schema: z.ZodType): JsonSchema => {
    const { $defs, $schema: _dialect, ...root } = z.toJSONSchema(schema, { io, metadata: names, unrepresentable: 'any' }) as JsonSchema & {
      $defs?: Record<string, JsonSchema>;
    };
    for (const [name, definition] of Object.entries($defs ?? {})) definitions[name] ??= pointToComponents(definition);
    const own = names.get(schema)?.id;
    if (own === undefined) return pointToComponents(root);
    definitions[own] ??= pointToComponents(root);
    return { $ref: `#/components/schemas/${own}` };
  };
  return { describe, definitions };
}

/** Zod's references point into the schema itself; here they point to the description's components. */
function pointToComponents(schema: JsonSchema): JsonSchema {
  return JSON.parse(JSON.stringify(schema).replaceAll('"#/$defs/', '"#/components/schemas/')) as JsonSchema;
}
