// What a shipment costs, by supplier: as somebody says it, and in whole minor units.

/** Cost of one shipment, whole minor units: by supplier where named, else `each`. */
export interface ShipmentTerms {
  readonly each: number;
  readonly named: ReadonlyMap<string, number>;
}

/** The same as somebody says it, major money. */
export interface ShipmentWish {
  readonly each?: number;
  readonly named?: Readonly<Record<string, number>>;
}

export const shipmentTerms = ({ each = 0, named = {} }: ShipmentWish = {}, minor: number): ShipmentTerms => ({
  each: Math.round(each * minor),
  named: new Map(Object.entries(named).map(([name, cost]) => [name, Math.round(cost * minor)])),
});

export const NO_SHIPMENTS: ShipmentTerms = { each: 0, named: new Map() };
