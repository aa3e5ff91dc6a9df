/**
 * The catalogue: explicit lists, sorted by key, so that adding a part is one file and one line. The keys are those
 * written in `rails.yaml`.
 */
import { alkaline } from './batteries/alkaline';
import { liIon } from './batteries/li-ion';
import { lithiumCoin } from './batteries/lithium-coin';
import { c0g, x5r, x7r, y5v } from './capacitors/ceramic';
import { aluminium, polymer, tantalum } from './capacitors/electrolytic';
import { film } from './capacitors/film';
import { atmega328p } from './chips/atmega328p';
import { rp2040 } from './chips/rp2040';
import { rp2350 } from './chips/rp2350';
import { stm32f103 } from './chips/stm32f103';
import { schottky1A20V } from './diodes/schottky-1a-20v';
import { schottky1A30V } from './diodes/schottky-1a-30v';
import { schottky1A40V } from './diodes/schottky-1a-40v';
import { schottkySignal } from './diodes/schottky-signal';
import { siliconRectifier1A } from './diodes/silicon-rectifier-1a';
import { siliconSwitching } from './diodes/silicon-switching';
import type { Catalogue, PartEntry } from './part';
import { usb2Configured, usb2Unconfigured, usb3, usbC3A, usbC1500mA, usbCDefault } from './standards/usb';

export const catalogue: Catalogue = {
  chips: [atmega328p, rp2040, rp2350, stm32f103],
  diodes: [schottky1A20V, schottky1A30V, schottky1A40V, schottkySignal, siliconRectifier1A, siliconSwitching],
  capacitors: [aluminium, c0g, film, polymer, tantalum, x5r, x7r, y5v],
  transistors: [],
  mosfets: [],
  gates: [],
  timers: [],
  standards: [usb2Configured, usb2Unconfigured, usb3, usbC1500mA, usbC3A, usbCDefault],
  batteries: [alkaline, liIon, lithiumCoin],
};

/** The entry with that key, or undefined. */
export function findPart<T extends PartEntry>(list: readonly T[], key: string): T | undefined {
  return list.find((entry) => entry.key === key);
}
