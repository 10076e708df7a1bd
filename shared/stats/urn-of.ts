import { marginsOf } from './check-counts';
import type { Urn } from './distributions';
import type { FourfoldTable } from './fourfold-table';

/** A fourfold table with all margins fixed, as draws from an urn: members of the index group. */
export function urnOf(table: FourfoldTable): Urn {
  return {
    marked: table.index.total,
    unmarked: table.reference.total,
    drawn: marginsOf(table).events,
  };
}
