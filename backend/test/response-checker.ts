import { Ajv, type ValidateFunction } from 'ajv';
import addFormats from 'ajv-formats';
import { type OpenAPIObject } from '@nestjs/swagger';

type Json = Record<string, unknown>;

interface DocumentedResponse {
  content?: Record<string, { schema: Json } | undefined>;
}

interface DocumentedOperation {
  responses: Record<string, DocumentedResponse | undefined>;
}

export interface CheckedAnswer {
  method: string;
  /** With its query. */
  path: string;
  status: number;
  contentType: string;
  /** Parsed JSON; undefined for anything else. */
  body: unknown;
}

/** Compares answers with the OpenAPI document: documented status, documented type, no missing and no extra field. */
export class ResponseChecker {
  private readonly ajv = new Ajv({ strict: false, allErrors: true });
  private readonly compiled = new Map<object, ValidateFunction>();
  private readonly routes: { pattern: RegExp; path: string; literals: number }[];

  constructor(private readonly document: OpenAPIObject) {
    addFormats.default(this.ajv);
    this.ajv.addFormat('password', true);
    this.ajv.addSchema(jsonSchema({ components: document.components }) as Json, 'api');
    this.routes = Object.keys(document.paths)
      .map((path) => ({
        path,
        pattern: new RegExp(`^${path.replace(/[.]/g, '\\$&').replace(/\{[^}]+\}/g, '[^/]+')}$`),
        literals: path.split('/').filter((part) => !part.startsWith('{')).length,
      }))
      .sort((a, b) => b.literals - a.literals);
  }

  /** @throws Error saying how the answer differs from what is documented */
  check(answer: CheckedAnswer): void {
    const { method, status, contentType, body } = answer;
    const where = `${method} ${answer.path} → ${status}`;
    const operation = this.operationOf(answer);
    const documented = operation?.responses[String(status)];
    if (operation && !documented && status < 400) throw new Error(`${where}: this status is not documented.`);
    const content = (documented ?? operation?.responses.default ?? PROBLEM_RESPONSE).content;
    if (!content) {
      if (body !== undefined) throw new Error(`${where}: an answer without content is documented.`);
      return;
    }
    const type = contentType.split(';', 1)[0] ?? '';
    const media = content[type];
    if (!media) throw new Error(`${where}: sent ${type}, documented ${Object.keys(content).join(', ')}.`);
    if (type !== 'application/json') return;
    const validate = this.validatorOf(media.schema);
    if (!validate(body))
      throw new Error(`${where}: ${this.ajv.errorsText(validate.errors)}\n${JSON.stringify(body)}`);
  }

  private operationOf({ method, path }: CheckedAnswer): DocumentedOperation | undefined {
    const plain = path.split('?', 1)[0] ?? '';
    const route = this.routes.find(({ pattern }) => pattern.test(plain));
    const item = route && (this.document.paths[route.path] as Record<string, unknown> | undefined);
    return item?.[method.toLowerCase()] as DocumentedOperation | undefined;
  }

  private validatorOf(schema: Json): ValidateFunction {
    const known = this.compiled.get(schema);
    if (known) return known;
    const validate = this.ajv.compile(jsonSchema(schema) as Json);
    this.compiled.set(schema, validate);
    return validate;
  }
}

const PROBLEM_RESPONSE: DocumentedResponse = {
  content: { 'application/json': { schema: { $ref: '#/components/schemas/Problem' } } },
};

const EXCLUSIVE = [
  ['exclusiveMinimum', 'minimum'],
  ['exclusiveMaximum', 'maximum'],
] as const;

/** OpenAPI 3.0 as plain JSON Schema: `nullable` spelt out, references absolute, objects closed. */
function jsonSchema(node: unknown): unknown {
  if (Array.isArray(node)) return node.map(jsonSchema);
  if (typeof node !== 'object' || node === null) return node;
  const entries = Object.entries(node).filter(([key]) => key !== 'nullable' && key !== 'discriminator');
  const schema: Json = Object.fromEntries(entries.map(([key, value]) => [key, jsonSchema(value)]));
  if (typeof schema.$ref === 'string') schema.$ref = schema.$ref.replace(/^#/, 'api#');
  // The older dialect marks the bound as exclusive; JSON Schema gives the bound itself.
  for (const [flag, bound] of EXCLUSIVE) {
    if (typeof schema[flag] !== 'boolean') continue;
    if (schema[flag]) schema[flag] = schema[bound];
    else delete schema[flag];
  }
  const isClosed = schema.type === 'object' && schema.properties && schema.additionalProperties === undefined;
  if (isClosed) schema.additionalProperties = false;
  const isNullable = 'nullable' in node && node.nullable === true;
  return isNullable ? { anyOf: [schema, { type: 'null' }] } : schema;
}
