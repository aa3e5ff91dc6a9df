/**
 * Bipolar complementary pairs: the small-signal class that most push-pull stages use, and a 500 mA class.
 * Figures of the transport form of the Ebers-Moll model; `gain` is the forward current gain, lowest at high current.
 */
import { memory } from '../figures';

export const model = memory('class values for a transport model', '25 degC');

export const limits = 'gain at least 100 at 10 mA, 60 at 50 mA, 30 at 100 mA';

export const source = 'Class values of several makers, to be confirmed';
