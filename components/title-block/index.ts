export { TitleBlock } from './title-block';
