export const calcErrorCodes = [
  'schema',
  'unsupported',
  'too-few-units',
  'no-effect',
  'not-estimable',
  'impossible-correlation',
  'counted-twice',
] as const;

export type CalcErrorCode = (typeof calcErrorCodes)[number];

/** A request that breaks the schema or a method's conditions; `path` names the field, as in `outcome.sd`. */
export class CalcError extends Error {
  override readonly name = 'CalcError';

  constructor(
    readonly code: CalcErrorCode,
    readonly path: string,
    message: string,
  ) {
    super(message);
  }

  toJSON(): { code: CalcErrorCode; path: string; message: string } {
    return { code: this.code, path: this.path, message: this.message };
  }
}
