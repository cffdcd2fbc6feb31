/**
 * A schema to a function that writes values as JSON.
 *
 * Only the fields that the schema names are written, so what was never promised never leaves, checked or not. Knowing
 * the shape beforehand also makes it faster than JSON.stringify, which has to ask each value what it is. Values are taken to be
 * of the schema's type; whether they are is for lib/api/check.ts to say.
 */
import { z } from 'zod';

/** Gives the JSON of a value; undefined where there is none, as for a missing field. */
type Write = (value: unknown) => string | undefined;

const written: Write = (value) => JSON.stringify(value);

/** The writer of a schema. Made once a route; each named schema once in it. */
export function jsonWriter(schema: z.ZodType): Write {
  return writerOf(schema, new Map());
}

function writerOf(schema: z.ZodType, made: Map<z.ZodType, Write>): Write {
  const known = made.get(schema);
  if (known) return known;
  const write = newWriter(schema, made);
  made.set(schema, write);
  return write;
}

function newWriter(schema: z.ZodType, made: Map<z.ZodType, Write>): Write {
  if (schema instanceof z.ZodNullable || schema instanceof z.ZodOptional) {
    const inner = writerOf(schema.unwrap() as z.ZodType, made);
    return (value) => (value === null ? 'null' : value === undefined ? undefined : inner(value));
  }
  if (schema instanceof z.ZodArray) return arrayWriter(writerOf(schema.element as z.ZodType, made));
  if (schema instanceof z.ZodEnum) return choiceWriter(schema.options);
  if (schema instanceof z.ZodNumber) return (value) => (Number.isFinite(value) ? `${value}` : 'null');
  if (schema instanceof z.ZodBoolean) return (value) => (value ? 'true' : 'false');
  if (schema instanceof z.ZodObject && isClosed(schema))
    return objectWriter(Object.entries(schema.shape as Record<string, z.ZodType>), made);
  if (schema instanceof z.ZodUnion) return unionWriter(schema.options as readonly z.ZodType[], made);
  return written;
}

/** Whether the schema drops or refuses what it does not name. */
function isClosed(schema: z.ZodObject): boolean {
  const { catchall } = schema.def;
  return catchall === undefined || catchall instanceof z.ZodNever;
}

function arrayWriter(element: Write): Write {
  return (value) => {
    const list = value as readonly unknown[];
    if (list.length === 0) return '[]';
    let text = `[${element(list[0]) ?? 'null'}`;
    for (let index = 1; index < list.length; index += 1) text += `,${element(list[index]) ?? 'null'}`;
    return `${text}]`;
  };
}

/** Choices are few: their quoted forms are made beforehand. */
function choiceWriter(choices: readonly (string | number)[]): Write {
  const quoted = new Map<unknown, string>(choices.map((choice) => [choice, JSON.stringify(choice)]));
  return (value) => quoted.get(value) ?? JSON.stringify(value);
}

function objectWriter(fields: readonly (readonly [string, z.ZodType])[], made: Map<z.ZodType, Write>): Write {
  const names = fields.map(([name]) => name);
  const writers = fields.map(([, schema]) => writerOf(schema, made));
  return fields.some(([, schema]) => schema instanceof z.ZodOptional)
    ? anyFieldsWriter(names, writers)
    : allFieldsWriter(names, writers);
}

/** Fields that may be missing are left out. */
function anyFieldsWriter(names: readonly string[], writers: readonly Write[]): Write {
  const keys = names.map((name) => `${JSON.stringify(name)}:`);
  return (value) => {
    const object = value as Readonly<Record<string, unknown>>;
    let text = '';
    for (let index = 0; index < names.length; index += 1) {
      const part = writers[index]?.(object[names[index] as string]);
      if (part !== undefined) text += text === '' ? `{${keys[index]}${part}` : `,${keys[index]}${part}`;
    }
    return text === '' ? '{}' : `${text}}`;
  };
}

/**
 * Fields that are always there. The loop over them is written out as source once, for each field's own place in the object and
 * each field's own writer can then be remembered by the machine: twice as fast on a reading. The source holds nothing but
 * names of schemas, quoted as JSON.
 */
function allFieldsWriter(names: readonly string[], writers: readonly Write[]): Write {
  const fields = names.map((name, index) => {
    const before = `${index === 0 ? '{' : ','}${JSON.stringify(name)}:`;
    return `${JSON.stringify(before)} + w${index}(o[${JSON.stringify(name)}])`;
  });
  const parameters = writers.map((_, index) => `w${index}`);
  const make = new Function(...parameters, `return (o) => ${fields.join(' + ') || '"{"'} + '}'`) as (
    ...given: readonly Write[]
  ) => Write;
  return make(...writers);
}

/** A choice of objects is written by all their fields together; those that a value does not have are left out. */
function unionWriter(options: readonly z.ZodType[], made: Map<z.ZodType, Write>): Write {
  const fields = new Map<string, z.ZodType>();
  for (const option of options) {
    if (!(option instanceof z.ZodObject) || !isClosed(option)) return written;
    for (const [name, field] of Object.entries(option.shape as Record<string, z.ZodType>)) {
      const bare = field instanceof z.ZodOptional ? (field.unwrap() as z.ZodType) : field;
      const before = fields.get(name);
      if (before && before !== bare) return written;
      fields.set(name, bare);
    }
  }
  return objectWriter(
    [...fields].map(([name, field]) => [name, field.optional()]),
    made,
  );
}
