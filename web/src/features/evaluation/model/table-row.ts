import type { Table } from '@merestone/engine';

export type TableRow = Table['rows'][number];
