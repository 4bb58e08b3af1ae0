export { machineQueries } from './queries';
