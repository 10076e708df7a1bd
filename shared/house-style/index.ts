export type {
  CaptionStyle,
  DenominatorStep,
  DifferenceUnit,
  FigureStyle,
  HouseStyle,
  IntervalStyle,
  NumberStyle,
  PageStyle,
  PercentStyle,
  PValueStyle,
  SentenceStyle,
  TableStyle,
} from './house-style';
export { parseHouseStyle } from './parse-house-style';
export type { HouseStyleIssue } from './field-readers';
