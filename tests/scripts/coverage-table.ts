import { writeFileSync } from 'node:fs';
import { format, resolveConfig } from 'prettier';
import { COVERAGE_TOPIC, coverageTopic } from './coverage-markdown';

const style = await resolveConfig(COVERAGE_TOPIC);
writeFileSync(COVERAGE_TOPIC, await format(coverageTopic(), { ...style, parser: 'markdown' }));
