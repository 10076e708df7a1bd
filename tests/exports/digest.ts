import { createHash } from 'node:crypto';
import { EXPORT_FORMATS, type ExportFormatId } from '../../server/exports/export-format';
import { sampleRequest } from './sample-request';

/** The hash of the sample in a format, for comparing one making with another. */
export async function digestOf(formatId: ExportFormatId): Promise<string> {
  const render = await EXPORT_FORMATS[formatId].load();
  return createHash('sha256')
    .update(await render(sampleRequest()))
    .digest('hex');
}
