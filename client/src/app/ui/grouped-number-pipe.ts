import { Pipe, type PipeTransform } from '@angular/core';

/**
 * A count or a measurement of the data as the screen shows it: 2574 as "2,574", nothing as "".
 * Never for results, which are printed by the house style.
 */
@Pipe({ name: 'ehGrouped' })
export class GroupedNumberPipe implements PipeTransform {
  transform(value: number | null | undefined, mostDecimals = 3): string {
    if (value === null || value === undefined) return '';
    return new Intl.NumberFormat('en-GB', { maximumFractionDigits: mostDecimals }).format(value);
  }
}
