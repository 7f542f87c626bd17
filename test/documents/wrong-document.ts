/** A text that is wrong in one way, and the one fault that it makes. */
export interface WrongDocument {
  readonly name: string;
  readonly text: string;
  readonly at: string;
  readonly found: string;
  readonly right: string;
}
