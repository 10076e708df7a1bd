import { writeFileSync } from 'node:fs';
import { COVERAGE_TOPIC, coverageTopic } from './coverage-markdown';

writeFileSync(COVERAGE_TOPIC, coverageTopic());
