/**
 * Command ids, as the manifest declares them.
 */
export const sizeRailCommand = 'railLedger.sizeRail';
export const waysCommand = 'railLedger.waysToMake';
export const runYieldCommand = 'railLedger.runYield';
export const showLogCommand = 'railLedger.showLog';
