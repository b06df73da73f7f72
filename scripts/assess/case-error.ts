/** A fault of the input, in one line that names the place; the program ends with status 2. */
export class CaseError extends Error {
  constructor(message: string) {
    super(message.replaceAll(/\s+/g, ' '));
    this.name = 'CaseError';
  }
}
