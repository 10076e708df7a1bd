/**
 * One line of the form that edits a block. `path` is where the value stands in the content, with
 * dots ("show.risk"); `fieldValue` and `withFieldValue` read and write it.
 */
export type BlockField =
  | { readonly kind: 'analysis'; readonly path: string; readonly label: string }
  | {
      /** Crude, a stratum or pooled: a `ResultScope` of the analysis at `analysisPath`. */
      readonly kind: 'scope';
      readonly path: string;
      readonly label: string;
      readonly analysisPath: string;
    }
  | {
      /** A level id of the exposure, the reference level left out. */
      readonly kind: 'indexLevel';
      readonly path: string;
      readonly label: string;
      readonly analysisPath: string;
    }
  | { readonly kind: 'toggle'; readonly path: string; readonly label: string }
  | {
      readonly kind: 'choice';
      readonly path: string;
      readonly label: string;
      /** A null value means "as the report or the analysis says". */
      readonly options: readonly {
        readonly value: string | number | null;
        readonly label: string;
      }[];
    }
  | {
      /** A text document; null (where `optional`) means that the words are generated. */
      readonly kind: 'text';
      readonly path: string;
      readonly label: string;
      readonly paragraphs: 'one' | 'many';
      readonly optional: boolean;
      /** Shown beside the field: what stands there when it is left alone. */
      readonly hint: string;
    };

/** The value of a field in a content; undefined where the path leads nowhere. */
export function fieldValue(content: unknown, path: string): unknown {
  return path
    .split('.')
    .reduce<unknown>((part, key) => (isRecord(part) ? part[key] : undefined), content);
}

/** A copy of the content in which the field has another value; the rest is shared. */
export function withFieldValue(content: unknown, path: string, value: unknown): unknown {
  const [key = '', ...rest] = path.split('.');
  const record = isRecord(content) ? content : {};
  const inner = rest.length === 0 ? value : withFieldValue(record[key], rest.join('.'), value);
  return { ...record, [key]: inner };
}

function isRecord(value: unknown): value is Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null;
}
