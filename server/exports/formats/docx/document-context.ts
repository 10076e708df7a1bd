import type { HouseStyle } from '#shared/house-style';
import type { FigureElement } from '#shared/layout';
import type { FigurePicture } from '../../figures/figure-picture';
import type { Bookmarks } from './text-runs';

/** What every part of a document is drawn with. */
export interface DocumentContext {
  readonly houseStyle: HouseStyle;
  readonly bookmarks: Bookmarks;
  readonly pictures: ReadonlyMap<FigureElement, FigurePicture>;
  /** A number for a list that begins; each list counts its own items. */
  readonly nextList: () => number;
}
