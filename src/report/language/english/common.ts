/** Words that terminal, report and sheet share, in English. */
export const englishCommon = {
  months: ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October'].concat(
    'November',
    'December',
  ),
  month: 'Month',
  year: 'Year',
  beforeYouSign: 'Look at this before you sign',
  assumed: 'Assumed, because no file says otherwise',
  noBackup: 'The backup would never run',
  columns: {
    tariff: 'Tariff',
    energy: 'Energy',
    standing: 'Standing',
    demand: 'Demand',
    credits: 'Credits',
    household: 'Household alone',
    heating: 'Heating',
    boiler: 'Boiler',
    saving: 'Saved',
  },
  monthColumns: {
    heatPumpHeat: 'Heat pump heat',
    backupHeat: 'Backup heat',
    electricity: 'Electricity',
  },
};
