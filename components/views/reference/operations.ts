/** The OpenAPI document as the reference shows it: operations by tag, each with its parameters, bodies and answers. */

/** As much of a document as is read here; the rest passes. */
export interface DocumentLike {
  readonly [key: string]: unknown;
}

export interface Parameter {
  readonly name: string;
  readonly place: string;
  readonly required: boolean;
  readonly type: string;
  readonly about: string;
}

export interface AnswerLine {
  readonly status: string;
  readonly about: string;
  readonly shape: string;
}

export interface Operation {
  readonly id: string;
  readonly method: string;
  readonly path: string;
  readonly summary: string;
  readonly about: string;
  readonly access: string;
  readonly parameters: readonly Parameter[];
  /** The body's shape by name, and an example of it. */
  readonly body: { readonly shape: string; readonly about: string; readonly example: string } | null;
  readonly answers: readonly AnswerLine[];
}

export interface Group {
  readonly name: string;
  readonly about: string;
  readonly operations: readonly Operation[];
}

type Node = { readonly [key: string]: unknown };

const node = (value: unknown): Node => (typeof value === 'object' && value !== null ? (value as Node) : {});
const text = (value: unknown): string => (typeof value === 'string' ? value : '');
const list = (value: unknown): readonly unknown[] => (Array.isArray(value) ? value : []);

/** Every operation under its tag, tags in the document's order. */
export function operationsByTag(document: DocumentLike): Group[] {
  const operations = Object.entries(node(document.paths)).flatMap(([path, item]) =>
    Object.entries(node(item)).map(([method, call]) => ({
      tag: text(list(node(call).tags)[0]),
      ...operationOf(path, method, node(call)),
    })),
  );
  return list(document.tags).map((tag) => {
    const { name, description } = node(tag);
    return {
      name: text(name),
      about: text(description),
      operations: operations.filter((operation) => operation.tag === text(name)),
    };
  });
}

function operationOf(path: string, method: string, call: Node): Operation {
  const content = node(node(node(call.requestBody).content)['application/json']);
  return {
    id: text(call.operationId),
    method: method.toUpperCase(),
    path,
    summary: text(call.summary),
    about: text(call.description),
    access: accessOf(call),
    parameters: list(call.parameters).map((each) => {
      const { name, in: place, required, schema, description } = node(each);
      return {
        name: text(name),
        place: text(place),
        required: required === true,
        type: typeOf(schema),
        about: text(description),
      };
    }),
    body:
      call.requestBody === undefined
        ? null
        : {
            shape: typeOf(content.schema),
            about: text(node(call.requestBody).description),
            example: JSON.stringify(content.example, null, 2),
          },
    answers: Object.entries(node(call.responses)).map(([status, answer]) => {
      const [media, held] = Object.entries(node(node(answer).content))[0] ?? [];
      const shape = typeOf(node(held).schema);
      return {
        status,
        about: text(node(answer).description),
        shape: media === undefined ? '' : `${media}${shape && shape !== 'string' ? `: ${shape}` : ''}`,
      };
    }),
  };
}

/** Who may call, in words. */
function accessOf(call: Node): string {
  const security = list(call.security);
  if (security.length === 0) return 'open to everyone';
  if (security.some((each) => Object.keys(node(each)).length === 0))
    return 'open within an allowance; a key has a larger one';
  const takesKey = security.some((each) => 'key' in node(each));
  return takesKey
    ? `a key with the scope ${text(call['x-scope'])}, or a person whose role allows it`
    : 'a person who is signed in';
}

/** A schema's name or type in a few words. */
function typeOf(schema: unknown): string {
  const { $ref, type, enum: values, items, anyOf } = node(schema);
  if (typeof $ref === 'string') return $ref.slice($ref.lastIndexOf('/') + 1);
  if (list(values).length > 0) return list(values).map(String).join(' | ');
  if (type === 'array') return `list of ${typeOf(items)}`;
  if (list(anyOf).length > 0) return list(anyOf).map(typeOf).join(' or ');
  return text(type);
}
