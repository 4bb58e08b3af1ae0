import { convertUnit } from '../../units/entry-units';
import { compoundAngle } from '../dial';
import { casesOf } from './case';

/** As the trade writes an angle: whole minutes. */
function degreesAndMinutes(degrees: number): string {
  const minutes = Math.round(60 * degrees);
  return `${Math.floor(minutes / 60)}° ${minutes % 60}′`;
}

const angle = (wantedIn: number) =>
  degreesAndMinutes(
    compoundAngle(convertUnit(wantedIn, 'in', 'mm'), convertUnit(0.001, 'in', 'mm')).value ?? NaN,
  );

export const lautard = casesOf('lautard', [
  {
    checks: 'Angle of the compound slide that feeds a tenth for a thousandth',
    inputs: '0.0001 in for 0.001 in of the dial',
    expected: '5° 44′',
    got: () => angle(0.0001),
  },
  {
    checks: 'Angle of the compound slide that feeds a tenth on diameter',
    inputs: '0.00005 in on radius for 0.001 in of the dial',
    expected: '2° 52′',
    got: () => angle(0.00005),
  },
]);
