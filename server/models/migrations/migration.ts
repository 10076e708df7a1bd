/** One change of the schema; its statements run in one transaction, and only forward. */
export interface Migration {
  readonly name: string;
  readonly statements: readonly string[];
}
