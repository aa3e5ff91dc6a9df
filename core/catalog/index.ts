/**
 * The catalogue: explicit lists, sorted by key, so that adding a part is one file and one line. The keys are those
 * written in `rails.yaml`.
 */
import { alkaline } from './batteries/alkaline';
import { liIon } from './batteries/li-ion';
import { lithiumCoin } from './batteries/lithium-coin';
import { nimh } from './batteries/nimh';
import { aluminium } from './capacitors/aluminium';
import { c0g } from './capacitors/c0g';
import { film } from './capacitors/film';
import { polymer } from './capacitors/polymer';
import { tantalum } from './capacitors/tantalum';
import { x5r } from './capacitors/x5r';
import { x7r } from './capacitors/x7r';
import { y5v } from './capacitors/y5v';
import { atmega32u4 } from './chips/atmega32u4';
import { atmega328p } from './chips/atmega328p';
import { atmega2560 } from './chips/atmega2560';
import { atmega4809 } from './chips/atmega4809';
import { attiny85 } from './chips/attiny85';
import { attiny1614 } from './chips/attiny1614';
import { esp32 } from './chips/esp32';
import { esp32c3 } from './chips/esp32-c3';
import { esp32s3 } from './chips/esp32-s3';
import { msp430g2553 } from './chips/msp430g2553';
import { nrf52840 } from './chips/nrf52840';
import { pic16f1939 } from './chips/pic16f1939';
import { pic16f18877 } from './chips/pic16f18877';
import { pic18f47k42 } from './chips/pic18f47k42';
import { rp2040 } from './chips/rp2040';
import { rp2350 } from './chips/rp2350';
import { samd21 } from './chips/samd21';
import { stm32f103 } from './chips/stm32f103';
import { stm32f303 } from './chips/stm32f303';
import { stm32f407 } from './chips/stm32f407';
import { stm32g071 } from './chips/stm32g071';
import { stm32l476 } from './chips/stm32l476';
import { schottky1A20V } from './diodes/schottky-1a-20v';
import { schottky1A30V } from './diodes/schottky-1a-30v';
import { schottky1A40V } from './diodes/schottky-1a-40v';
import { schottkySignal } from './diodes/schottky-signal';
import { siliconRectifier1A } from './diodes/silicon-rectifier-1a';
import { siliconSwitching } from './diodes/silicon-switching';
import { ac } from './gates/ac';
import { ahc } from './gates/ahc';
import { hc } from './gates/hc';
import { hcBusDriver } from './gates/hc-bus-driver';
import { hcSchmitt } from './gates/hc-schmitt';
import { hcSchmittSingle } from './gates/hc-schmitt-single';
import { hcSingle } from './gates/hc-single';
import { lvc } from './gates/lvc';
import { lvcSingle } from './gates/lvc-single';
import { nmosLogicLevel } from './mosfets/nmos-logic-level';
import { nmosSmallSignal } from './mosfets/nmos-small-signal';
import { pmosLogicLevel } from './mosfets/pmos-logic-level';
import { pmosSmallSignal } from './mosfets/pmos-small-signal';
import type { Catalogue, PartEntry } from './part';
import { usb2Configured } from './standards/usb-2-configured';
import { usb2Unconfigured } from './standards/usb-2-unconfigured';
import { usb3 } from './standards/usb-3';
import { usbC1500mA } from './standards/usb-c-1.5a';
import { usbC3A } from './standards/usb-c-3a';
import { usbCDefault } from './standards/usb-c-default';
import { bipolarAstable } from './timers/bipolar-astable';
import { cmosAstable } from './timers/cmos-astable';
import { npn500mA } from './transistors/npn-500ma';
import { npnSmallSignal } from './transistors/npn-small-signal';
import { pnp500mA } from './transistors/pnp-500ma';
import { pnpSmallSignal } from './transistors/pnp-small-signal';

export const catalogue: Catalogue = {
  chips: [
    atmega2560,
    atmega328p,
    atmega32u4,
    atmega4809,
    attiny1614,
    attiny85,
    esp32,
    esp32c3,
    esp32s3,
    msp430g2553,
    nrf52840,
    pic16f18877,
    pic16f1939,
    pic18f47k42,
    rp2040,
    rp2350,
    samd21,
    stm32f103,
    stm32f303,
    stm32f407,
    stm32g071,
    stm32l476,
  ],
  diodes: [schottky1A20V, schottky1A30V, schottky1A40V, schottkySignal, siliconRectifier1A, siliconSwitching],
  capacitors: [aluminium, c0g, film, polymer, tantalum, x5r, x7r, y5v],
  transistors: [npn500mA, npnSmallSignal, pnp500mA, pnpSmallSignal],
  mosfets: [nmosLogicLevel, nmosSmallSignal, pmosLogicLevel, pmosSmallSignal],
  gates: [ac, ahc, hc, hcBusDriver, hcSchmitt, hcSchmittSingle, hcSingle, lvc, lvcSingle],
  timers: [bipolarAstable, cmosAstable],
  standards: [usb2Configured, usb2Unconfigured, usb3, usbC1500mA, usbC3A, usbCDefault],
  batteries: [alkaline, liIon, lithiumCoin, nimh],
};

/** The entry with that key, or undefined. */
export function findPart<T extends PartEntry>(list: readonly T[], key: string): T | undefined {
  return list.find((entry) => entry.key === key);
}
