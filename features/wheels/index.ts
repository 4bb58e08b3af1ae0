export { SetAside } from './components/set-aside';
export { StandingWords } from './components/standing-words';
export { wheelQueries } from './queries';
export { standingOf } from './standing';
export { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS } from './words';
