// Made by `npm run generate` from schemas/. Do not edit.

export interface SchemaError {
  readonly instancePath: string;
  readonly keyword: string;
  readonly params: Readonly<Record<string, unknown>>;
  /** The key that breaks the rule, where the rule is one for keys. */
  readonly propertyName?: string;
}

export interface Validator {
  (value: unknown): boolean;
  readonly errors?: readonly SchemaError[] | null;
}

export const recipe: Validator;
export const chamber: Validator;
export const substances: Validator;
export const process: Validator;
export const site: Validator;
