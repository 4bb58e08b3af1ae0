export { ReadingsSheet } from './readings-sheet';
