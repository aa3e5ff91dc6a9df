/**
 * The two classes of timer chip that run as an astable: bipolar, strong but more than a volt short of its supply
 * when high, and CMOS, which reaches both rails but drives little.
 */
import { dataSheet } from '../figures';

export const bipolarSheet = (note: string) => dataSheet(`bipolar timer data sheets of two makers: ${note}`);

export const cmosSheet = (note: string) => dataSheet(`CMOS timer data sheet: ${note}`);
