import * as z from 'zod';
import type { HouseStyle } from '#shared/house-style';
import type { Outcome } from '../../errors/server-issue';
import { json, signedInRoute } from '../define-route';
import type { Call, Route, Unchanging } from '../route';

const houseStyleSchema = z.custom<HouseStyle>(
  (value) => typeof value === 'object' && value !== null,
);

/** House styles, which are templates of the installation. */
export const houseStyleRoutes: readonly Route[] = [
  signedInRoute({
    method: 'get',
    path: '/api/house-styles',
    summary: 'Lists the house styles that a report may follow.',
    reply: json(z.array(houseStyleSchema)),
    handle: listHouseStyles,
  }),
];

function listHouseStyles({ dependencies }: Call): Promise<Outcome<Unchanging<HouseStyle[]>>> {
  return Promise.resolve({ ok: true, value: dependencies.houseStyles });
}
