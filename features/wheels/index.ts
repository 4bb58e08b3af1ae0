export { wheelQueries } from './queries';
