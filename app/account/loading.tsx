export { default } from '../[league]/loading';
