import { ansiFlanges } from './ansi-flanges';
import { beamWithTipMass } from './beam-with-tip-mass';
import { colvin } from './colvin';
import { commonPracticeBoreWheel } from './common-practice-bore-wheel';
import { commonPracticeJaws } from './common-practice-jaws';
import { commonPracticeOverrun } from './common-practice-overrun';
import { firstPrinciplesDressing } from './first-principles-dressing';
import { firstPrinciplesRunOut } from './first-principles-run-out';
import { firstPrinciplesSpeed } from './first-principles-speed';
import { firstPrinciplesSpring } from './first-principles-spring';
import { gradeWords } from './grade-words';
import { groover } from './groover';
import { grooverProblems } from './groover-problems';
import { guards } from './guards';
import { iso525 } from './iso-525';
import { jones } from './jones';
import { jonesSetover } from './jones-setover';
import { kalpakjian } from './kalpakjian';
import { lautard } from './lautard';
import { machinerysHandbookDiamonds } from './machinerys-handbook-diamonds';
import { machinerysHandbookMarks } from './machinerys-handbook-marks';
import { machinerysHandbookWork, recalledMaterials } from './machinerys-handbook-work';
import { marinescu } from './marinescu';
import { modernGrindingDressing } from './modern-grinding-technology-dressing';
import { modernGrindingSpeed } from './modern-grinding-technology-speed';
import { mountedWheels } from './mounted-wheels';
import { navy14345 } from './navy-14345';
import { nistUnits } from './nist-units';
import { nptelRotorDynamics } from './nptel-rotor-dynamics';
import { ringTest } from './ring-test';
import { trialRun } from './trial-run';
import type { PublishedCase } from './types';
import { washingtonFlanges } from './washington-flanges';
import { woodTurning } from './wood-turning';
import { wornWheels } from './worn-wheels';

export { allowance, expectedWords, gotWords, isNumberCheck, judge, toleranceWords } from './case';
export type { PublishedCase } from './types';

/** Everything the rules are held against outside the project, by kind of source. */
export const PUBLISHED: readonly PublishedCase[] = [
  ...[guards, ringTest, trialRun, washingtonFlanges, wornWheels],
  ...[ansiFlanges, mountedWheels, iso525, nistUnits],
  ...[machinerysHandbookDiamonds, machinerysHandbookMarks, machinerysHandbookWork],
  ...[modernGrindingSpeed, modernGrindingDressing],
  ...[jones, jonesSetover, navy14345, colvin, woodTurning, lautard],
  ...[groover, kalpakjian, marinescu, nptelRotorDynamics, beamWithTipMass],
  ...[firstPrinciplesSpeed, firstPrinciplesDressing, firstPrinciplesRunOut, firstPrinciplesSpring],
  ...[commonPracticeJaws, commonPracticeOverrun, commonPracticeBoreWheel],
  ...[recalledMaterials, gradeWords, grooverProblems],
].flat();
