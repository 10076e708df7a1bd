export type { HouseStyle } from './house-style';
