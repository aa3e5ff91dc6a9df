/**
 * Command ids, as the manifest declares them.
 */
export const sizeRailCommand = 'railLedger.sizeRail';
export const showLogCommand = 'railLedger.showLog';
