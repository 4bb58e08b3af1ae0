import type { GrinderData, LatheData, QuillData, Rotation, ThreadHand } from '../domain/machines';
import { finding } from './findings';
import type { Finding, Plan } from './types';

function opposite(rotation: Rotation): Rotation {
  return rotation === 'clockwise' ? 'anticlockwise' : 'clockwise';
}

/**
 * Which way the work must turn, seen from the tailstock, so that wheel and work meet where they touch.
 *
 * Outside, both turn the same way: at the contact their rims then run against each other. Inside, the wheel
 * touches the far side of a circle that surrounds it, so the work turns the other way.
 *
 * @param side - outside surfaces, or bores and jaws.
 * @param wheel - which way the wheel turns, seen from the tailstock.
 * @returns the work's direction, seen from the tailstock.
 * @source derived-directions
 * @example requiredWorkRotation('inside', 'clockwise') // 'anticlockwise'
 */
export function requiredWorkRotation(side: 'outside' | 'inside', wheel: Rotation): Rotation {
  return side === 'outside' ? wheel : opposite(wheel);
}

/**
 * The hand of thread that a turning wheel keeps tight.
 *
 * A nut lags behind its spindle when it starts, so it tightens when it lags clockwise: with a right-hand
 * thread the spindle must turn anticlockwise, seen by someone who looks at the nut. (So the right-hand end of
 * a bench grinder, which turns anticlockwise seen from that end, carries a right-hand thread.) Directions
 * here are seen from the tailstock, and on the tool post the wheel's end points at the headstock: its nut is
 * seen from the other side, and the direction appears reversed.
 *
 * Worked case: a wheel that turns clockwise seen from the tailstock turns anticlockwise seen from the
 * headstock, where its nut is; a right-hand thread tightens.
 *
 * @param wheel - which way the wheel turns, seen from the tailstock.
 * @returns the hand that tightens.
 * @source practice-rotation
 * @example tighteningHand('clockwise') // 'right'
 */
export function tighteningHand(wheel: Rotation): Exclude<ThreadHand, 'none'> {
  const seenFromNut = opposite(wheel);
  return seenFromNut === 'anticlockwise' ? 'right' : 'left';
}

export interface Turning {
  side: 'outside' | 'inside';
  lathe: LatheData | null;
  grinder: GrinderData | null;
  quill: QuillData | null;
  /** As chosen; null takes the way that is asked for. */
  workRotation: Rotation | null;
}

/**
 * Which way the work turns in this plan, and why.
 *
 * @param turning - side of the surface, lathe, grinder and the rotation chosen, if any.
 * @returns the direction seen from the tailstock, null while the wheel's is unknown, and words for it.
 * @source derived-directions
 * @example workRotation({ side: 'inside', lathe, grinder, quill, workRotation: null }).work // 'anticlockwise'
 */
export function workRotation(turning: Turning): Plan['work']['rotation'] {
  const wheel = turning.grinder?.wheelRotation ?? null;
  if (wheel === null) return { work: turning.workRotation, note: 'not known yet' };
  const required = requiredWorkRotation(turning.side, wheel);
  const work = turning.workRotation ?? required;
  return {
    work,
    note: `wheel ${wheel}, work ${work}, seen from the tailstock`,
  };
}

/**
 * What speaks against the directions of turning: unknown ones, a chuck that can unscrew, a nut that loosens.
 *
 * @param turning - side of the surface, lathe, grinder, quill and the rotation chosen, if any; machines that
 * are not chosen yet raise nothing.
 * @returns findings.
 * @source practice-rotation
 * @example rotationFindings({ side: 'inside', lathe, grinder, quill, workRotation: null }) // []
 */
export function rotationFindings(turning: Turning): Finding[] {
  const { side, lathe, grinder, quill } = turning;
  const found: Finding[] = [];
  const wheel = grinder?.wheelRotation ?? null;
  if (grinder !== null && wheel === null) found.push(finding('wheel-rotation-unknown'));
  if (lathe !== null && lathe.spindleNose === null) found.push(finding('nose-unknown'));
  if (quill !== null && quill.threadHand === null) found.push(finding('thread-hand-unknown'));

  const { work } = workRotation(turning);
  if (work === 'clockwise' && lathe?.spindleNose === 'threaded')
    found.push(finding('chuck-can-unscrew'));
  if (wheel === null) return found;

  const required = requiredWorkRotation(side, wheel);
  if (work !== null && work !== required)
    found.push(finding('work-rotation-other', { names: { rotation: work, needed: required } }));
  const hand = quill?.threadHand ?? null;
  const needed = tighteningHand(wheel);
  if (hand !== null && hand !== 'none' && hand !== needed)
    found.push(finding('nut-loosens', { names: { rotation: wheel, hand, needed } }));
  return found;
}
