/** Problems of reports: those that are read back, and those that a browser prints. */
export const reportProblems = {
  'report.no-data': {
    says: 'this is no report of a house by Winterledger: it does not hold the data of one',
    cure: 'name a report of a scenario as winterledger report has written it; the report of a batch is made again from its folder',
  },
  'report.broken-data': {
    says: 'the data in this report are not what a report holds',
    cure: 'take the file as it was written; one that was changed by hand, or by another version, cannot be verified',
  },
  'report.no-browser': {
    says: 'no Chromium was found that could print the report as PDF',
    cure: 'install Chromium or Chrome, or name its program in the variable CHROMIUM; any browser prints the HTML report',
  },
  'report.browser-failed': {
    says: 'the browser {path} did not print the report: {found}',
    cure: 'name another Chromium in the variable CHROMIUM, or print the HTML report from any browser',
  },
} as const;
