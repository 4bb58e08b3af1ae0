export { figureNumber, figureText, sourceWords } from './figure-text';
export { FigureReadout, FigureRow } from './figure-readout';
export { FindingList } from './finding-list';
export { MarkingField } from './marking-field';
export { MarkingFold } from './marking-fold';
export { PlanReader, useReader } from './reader';
