export { figureNumber, figureText, sourceWords } from './figure-text';
export { FigureReadout, FigureRow } from './figure-readout';
export { FindingList } from './finding-list';
export { PlanReader, useReader } from './reader';
