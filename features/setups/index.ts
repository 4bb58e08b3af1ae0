export { SetupList } from './components/setup-list';
export { NewSetup } from './components/setup-list-new';
export { setupQueries } from './queries';
