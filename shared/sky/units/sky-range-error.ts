/**
 * A wrong argument at the core's door. "There is no such date" is never an error; it is a result with a reason.
 * `field` names the argument (dots for nested ones), `remedy` is one English sentence that says what would be right.
 */
export class SkyRangeError extends RangeError {
  readonly field: string;
  readonly remedy: string;

  constructor(field: string, remedy: string) {
    super(`${field}: ${remedy}`);
    this.name = 'SkyRangeError';
    this.field = field;
    this.remedy = remedy;
  }
}
