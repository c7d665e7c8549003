/** Problems of batches: plans, tables of homes, and the folders that results go to. */
export const batchProblems = {
  'batch.nothing-varies': {
    says: 'the plan has neither axes nor homes, so there is one year to simulate',
    cure: 'add axes or homes, or use “winterledger simulate” for one house',
  },
  'batch.unknown-place': {
    says: '{path}: {found} is no place in a scenario',
    cure: 'write the keys of docs/formats.md joined by points; known here: {allowed}',
  },
  'batch.not-a-single-value': {
    says: '{path}: {found} holds {allowed}, not a single value',
    cure: 'name one of the entries in it, or use an axis with options',
  },
  'batch.repeated-name': {
    says: '{path} is {found}, which an earlier one is called already',
    cure: 'give each a name of its own',
  },
  'batch.reserved-name': {
    says: '{path} is {found}, which is a column of every result',
    cure: 'give the axis another name',
  },
  'batch.bad-range': { says: '{path}: {found}', cure: 'let step lead from the first value towards the last' },
  'batch.too-many-years': {
    says: 'the plan comes to {found} years; at most {allowed} are simulated unless more are allowed',
    cure: 'vary less, or allow more with --limit {found}',
  },
  'batch.no-name-column': {
    says: 'the table of homes has no column {found}; its columns are {allowed}',
    cure: 'call the column with the names of the homes so, or name it in the plan as nameColumn',
  },
  'batch.unknown-column': {
    says: 'column {found} is no place in a scenario',
    cure: 'call it as in docs/formats.md, such as house.heatLoss.value, or take it out; known here: {allowed}',
  },
  'batch.column-not-single': {
    says: 'column {found} holds {allowed}, not a single value',
    cure: 'name one of the entries in it, a column each',
  },
  'batch.repeated-column': { says: 'column {found} stands twice', cure: 'keep one of the two' },
  'batch.no-homes': {
    says: 'the table holds no homes',
    cure: 'write a row for each home below the names of the columns',
  },
  'batch.row-length': {
    says: 'cells in this row: {found}; names of columns: {allowed}',
    cure: 'look for a delimiter too many, or put a text that holds one in quotes',
  },
  'batch.open-quote': {
    says: 'a quoted text begins in this row and does not end within {allowed}',
    cure: 'close the quote, or write two quotes where one belongs to the text',
  },
  'batch.worker-failed': {
    says: 'this year could not be simulated: {found}',
    cure: 'run its scenario alone with “winterledger simulate”; with little memory use fewer --workers',
  },
  'batch.folder-busy': {
    says: 'another run ({found}) is writing into this folder',
    cure: 'wait for it, or name another folder; if no such run exists any more, remove {path}',
  },
  'batch.other-run': {
    says: 'this folder holds {allowed} of another run: {found}',
    cure: 'name another folder with --out, or empty this one',
  },
  'batch.foreign-file': {
    says: 'the folder holds a file {found} that no batch has written',
    cure: 'name another folder with --out',
  },
  'batch.homes-changed': {
    says: 'the table of homes was changed while its homes were simulated',
    cure: 'empty the folder of results and begin again',
  },
  'batch.no-results': {
    says: 'the folder holds no finished results of a batch',
    cure: 'name the folder that “winterledger batch --out” or “winterledger gather --out” has finished',
  },
  'batch.results-differ': {
    says: 'these results are not what their manifest says: {found}',
    cure: 'take the folder as it was written, or run the batch again into an empty one',
  },
  'batch.parts-differ': {
    says: 'this part does not belong to the first one: {found}',
    cure: 'gather parts of one plan, made with the same files and the same version',
  },
  'batch.part-twice': { says: 'part {found} is there already', cure: 'name each part once' },
  'batch.not-a-part': {
    says: 'these results are whole already, no part of a batch',
    cure: 'gather folders made with --shard',
  },
  'batch.part-missing': {
    says: 'part {found} is missing: the years {allowed}',
    cure: 'run it with --shard {found}, and gather again',
  },
} as const;
