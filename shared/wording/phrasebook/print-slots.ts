/** Patterns of what stands around tables and figures. */
export const PRINT_SLOTS = {} as const satisfies Readonly<Record<string, readonly string[]>>;
