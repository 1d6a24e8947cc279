// Rows for the bulk loader's tests; a thread imports this file as it stands.

/** Teeth 12 to 111, so that the gear of any row is known. */
export const teethOf = (index) => 12 + (index % 100);

/**
 * Gears with `1 + index % 3` offers each; every second one was counted on the shelf.
 * @param options `count`; `supplier`: its code; `changes`: what some rows say otherwise, by index
 */
export default async function* bulkRows({ count, supplier, changes = {} }) {
  for (let index = 0; index < count; index += 1) {
    const row = {
      part: {
        kind: 'gear',
        description: `Loaded gear ${index}`,
        standing: 'cleared',
        material: 'C45',
        attributes: { teeth: teethOf(index), module: 2, faceWidth: 20, bore: 8 },
      },
      offers: Array.from({ length: 1 + (index % 3) }, (_, nth) => ({
        supplierCode: supplier,
        supplierPartNumber: `${index}-${nth}`,
        breaks: [{ quantity: 1, unitPrice: 500 + index }],
      })),
      opening: index % 2 === 0 ? { place: `Rack ${index % 20}`, quantity: index } : null,
      leastStock: index % 10 === 0 ? 5 : null,
    };
    yield { ...row, ...changes[index] };
  }
}
