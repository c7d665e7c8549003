import * as z from 'zod';

/**
 * JSON Schema (draft 7) of what a file may hold, for completion and checks in an editor.
 *
 * Units and usual values join the descriptions, which editors show; the schema's own formats are no formats of JSON Schema
 * and are left out.
 */
export function editorSchema(schema: z.ZodType, title: string): object {
  const made = z.toJSONSchema(schema, {
    target: 'draft-7',
    io: 'input',
    override: ({ jsonSchema }) => {
      const { unit, usual } = jsonSchema;
      const extras = [
        ...(typeof unit === 'string' ? [`Unit: ${unit}.`] : []),
        ...(typeof usual === 'string' ? [`Usual: ${usual}.`] : []),
      ];
      if (extras.length > 0) jsonSchema.description = [jsonSchema.description, ...extras].filter(Boolean).join(' ');
      delete jsonSchema.unit;
      delete jsonSchema.usual;
      delete jsonSchema.format;
    },
  });
  const { $schema, ...rest } = made;
  return { $schema, title, ...rest };
}
