import { PUBLISHED } from '@/shared/rules/published';

import { publishedTable } from './table';

const { text, missed } = publishedTable(PUBLISHED);
process.stdout.write(`${text}\n`);
process.exitCode = missed > 0 ? 1 : 0;
