/** Problems of files as such: reading, decoding, writing. */
export const fileProblems = {
  'file.missing': {
    says: 'there is no such file',
    cure: 'check the name; names in a scenario are relative to its own folder',
  },
  'file.unreadable': { says: 'the file cannot be read: {found}', cure: 'check its permissions, or name another file' },
  'file.not-a-file': { says: 'this is {found}, not a file', cure: 'name a regular file' },
  'file.too-large': {
    says: 'the file has {found}; at most {allowed} is read',
    cure: 'cut it to the year that is wanted',
  },
  'file.empty': { says: 'the file is empty', cure: 'name the file that holds the data' },
  'file.unwritable': {
    says: 'the file cannot be written: {found}',
    cure: 'choose a folder that exists and may be written',
  },
  'file.output-is-folder': {
    says: 'a result cannot be written here: this is a folder',
    cure: 'name a file in it, such as {path}',
  },
  'file.output-is-input': {
    says: 'the result would be written over this file, which is read as an input',
    cure: 'choose another name for the result',
  },
  'file.output-twice': {
    says: 'two results would be written to this same file',
    cure: 'give each result a name of its own',
  },
} as const;
