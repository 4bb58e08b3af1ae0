export { RailSwitch } from './components/rail-switch';
