/** A JSON Schema, as far as records need one. */
export interface JsonSchema {
  readonly [keyword: string]: unknown;
}

/**
 * What a value of a record looks like: its type for the compiler, its JSON Schema for the editor, its check for the
 * reader. One place for all three, so that they cannot disagree.
 */
export interface Shape<T> {
  readonly schema: JsonSchema;
  /** where and how a value is otherwise, in words; null where it fits */
  readonly fault: (value: unknown, path: string) => string | null;
  /** whether the key it stands under may be left out */
  readonly optional?: true;
  /** carries the type, never a value */
  readonly type?: T;
}

/** A shape whose key is left out where there is nothing to say. */
export type Optional<T> = Shape<T> & { readonly optional: true };

/** The type of the values of a shape. */
export type ValueOf<S> = S extends Shape<infer T> ? T : never;

type Shapes = Readonly<Record<string, Shape<unknown>>>;
type OptionalKeys<S extends Shapes> = { [K in keyof S]: S[K] extends { optional: true } ? K : never }[keyof S];
type ObjectOf<S extends Shapes> = { readonly [K in Exclude<keyof S, OptionalKeys<S>>]: ValueOf<S[K]> } & {
  readonly [K in OptionalKeys<S>]?: ValueOf<S[K]>;
};

function primitive<T>(type: string, words: string, is: (value: unknown) => boolean): (help: string) => Shape<T> {
  return (help) => ({
    schema: { description: help, type },
    fault: (value, path) => (is(value) ? null : `${path} is no ${words}`),
  });
}

export const text = primitive<string>("string", "text", (value) => typeof value === "string");
export const numeric = primitive<number>("number", "number", (value) => typeof value === "number");
export const truth = primitive<boolean>("boolean", "true or false", (value) => typeof value === "boolean");
export const count = primitive<number>("integer", "whole number", (value) => Number.isInteger(value));

/** 64 hexadecimal digits. */
export function sha256(help: string): Shape<string> {
  const pattern = "^[0-9a-f]{64}$";
  return {
    schema: { description: help, type: "string", pattern },
    fault: (value, path) =>
      typeof value === "string" && new RegExp(pattern).test(value) ? null : `${path} is no SHA-256`,
  };
}

/** One of a few words or numbers. */
export function oneOf<const T extends string | number>(help: string, ...values: readonly T[]): Shape<T> {
  const known: readonly unknown[] = values;
  return {
    schema: { description: help, enum: values },
    fault: (value, path) => (known.includes(value) ? null : `${path} is not ${values.join(" or ")}`),
  };
}

export function nullable<T>(shape: Shape<T>): Shape<T | null> {
  const { description, ...rest } = shape.schema;
  return {
    schema: { description, anyOf: [rest, { type: "null" }] },
    fault: (value, path) => (value === null ? null : shape.fault(value, path)),
  };
}

export function optional<T>({ schema, fault }: Shape<T>): Optional<T> {
  return { schema, fault, optional: true };
}

export function list<T>(help: string, entry: Shape<T>): Shape<readonly T[]> {
  return {
    schema: { description: help, type: "array", items: entry.schema },
    fault(value, path) {
      if (!Array.isArray(value)) return `${path} is no list`;
      for (const [index, one] of value.entries()) {
        const found = entry.fault(one, `${path}[${index}]`);
        if (found !== null) return found;
      }
      return null;
    },
  };
}

/** An object with these keys and no others; the reader passes over keys it does not know. */
export function object<S extends Shapes>(help: string, fields: S): Shape<ObjectOf<S>> {
  const properties = Object.fromEntries(Object.entries(fields).map(([key, { schema }]) => [key, schema]));
  return {
    schema: {
      description: help,
      type: "object",
      properties,
      required: Object.keys(fields).filter((key) => fields[key]?.optional !== true),
      additionalProperties: false,
    },
    fault(value, path) {
      if (!isObject(value)) return `${path} is no object`;
      for (const [key, shape] of Object.entries(fields)) {
        if (!Object.hasOwn(value, key)) {
          if (shape.optional === true) continue;
          return `${path} lacks ${key}`;
        }
        const found = shape.fault(value[key], path === "" ? key : `${path}.${key}`);
        if (found !== null) return found;
      }
      return null;
    },
  };
}

export function isObject(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === "object" && value !== null && !Array.isArray(value);
}
