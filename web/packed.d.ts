/** A table of the demo, packed by the build. */
declare module '*.csv?packed' {
  const table: import('./model/unpackTable.ts').PackedTable;
  export default table;
}
