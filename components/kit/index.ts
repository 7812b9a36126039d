export { KitShelf } from './kit-shelf';
