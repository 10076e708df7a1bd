/** How a house style prints confidence limits, p-values, decimals and signs. */
export interface HouseStyle {
  readonly schemaVersion: 1;
  readonly id: string;
  readonly name: string;
}
