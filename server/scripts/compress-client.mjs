import { readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { brotliCompressSync, constants } from 'node:zlib';

const WORTH_IT = /\.(js|css|svg)$/;
const SMALLEST_IN_BYTES = 1024;

/**
 * Writes a `.br` beside every script and style of a build: the smallest form, which takes too long
 * to be made for each request.
 */
export function compressClient(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true, recursive: true })) {
    if (!entry.isFile() || !WORTH_IT.test(entry.name)) continue;
    const file = `${entry.parentPath}/${entry.name}`;
    const bytes = readFileSync(file);
    if (bytes.length >= SMALLEST_IN_BYTES) writeFileSync(`${file}.br`, smallest(bytes));
  }
}

function smallest(bytes) {
  const { BROTLI_PARAM_QUALITY, BROTLI_PARAM_SIZE_HINT, BROTLI_MAX_QUALITY } = constants;
  return brotliCompressSync(bytes, {
    params: { [BROTLI_PARAM_QUALITY]: BROTLI_MAX_QUALITY, [BROTLI_PARAM_SIZE_HINT]: bytes.length },
  });
}
