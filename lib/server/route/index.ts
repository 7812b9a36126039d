export { json, openRoute, route, versionTag } from './route';
