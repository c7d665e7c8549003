import type { PackedTable } from '../web/model/unpackTable.ts';

export function packTable(text: string): PackedTable;
