/** Small MOSFETs for a push-pull stage. Threshold and resistance are magnitudes; a p-channel part mirrors the signs. */

export const source = 'Class values of several makers, to be confirmed';
