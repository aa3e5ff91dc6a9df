/** Polarised capacitors: wet aluminium, solid tantalum and conductive polymer. */
import { practice } from '../figures';

export const twentyPercent = practice('20 % parts are the stocked ones');
