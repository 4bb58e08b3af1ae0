export { StandingWords } from './components/standing-words';
export { useSaveWheel, wheelQueries } from './queries';
export { sizeWords } from './sizes';
export { governingLimit, standingOf } from './standing';
export { LOOK_WORDS, MARKING_PLACE_WORDS, RING_WORDS } from './words';
