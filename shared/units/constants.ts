import convert from 'convert-units';

/** Exact by definition; convert-units' own millimetres to the inch drift in the eighth digit. */
export const MM_PER_INCH = 25.4;

export const MM_PER_FOOT = convert(1).from('ft').to('in') * MM_PER_INCH;
export const MM_PER_M = convert(1).from('m').to('mm');
export const SECONDS_PER_MINUTE = convert(1).from('min').to('s');

/** Exact by definition. */
export const NEWTONS_PER_POUND_FORCE = 4.4482216152605;
export const KILOGRAMS_PER_POUND = 0.45359237;
export const WATTS_PER_HORSEPOWER = (550 * NEWTONS_PER_POUND_FORCE * MM_PER_FOOT) / MM_PER_M;
