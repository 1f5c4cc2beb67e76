import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { checkDose } from '../steps/dose';
import type { Dose, ReagentKey, Refusal } from '../types';

/** What stands in a plant's tank: a reagent at a strength, with what else comes along. */
export interface Product {
  readonly reagent: ReagentKey;
  /** Mass of the reagent, on the basis it is dosed by, per mass of product: 0.485 of liquid alum, 0.104 Cl2 of hypochlorite. */
  readonly strength: number;
  /** kg/L at the temperature of the tank; needed for volumes only. */
  readonly densityKgL?: number;
  readonly hydrate?: number;
  readonly basicity?: number;
  /** Other compounds per mass of product: the caustic of hypochlorite, the free acid of a coagulant. */
  readonly byProducts?: readonly { readonly reagent: ReagentKey; readonly strength: number }[];
}

/** A kilogram of anything holds at most a kilogram; chlorine gas counts as itself. */
const WHOLE = 1;

/** Refuses strengths that cannot be, alone or together, and densities no solution has. */
export function checkProduct(product: Product): Refusal | undefined {
  const { reagent, strength, densityKgL, byProducts = [] } = product;
  const fault =
    checkDose({ ...product, reagent, doseMgL: 0 }) ??
    checkNumber(strength, 'strength', [1e-6, WHOLE]) ??
    (densityKgL === undefined ? undefined : checkNumber(densityKgL, 'densityKgL', [0.5, 3]));
  if (fault) return fault;
  let together = strength;
  for (const [i, part] of byProducts.entries()) {
    const wrong =
      checkDose({ reagent: part.reagent, doseMgL: 0 }, `byProducts.${i}`) ??
      checkNumber(part.strength, `byProducts.${i}.strength`, [0, WHOLE]);
    if (wrong) return wrong;
    together += part.strength;
  }
  return together > WHOLE
    ? refuse('badInput', 'The parts of a product weigh more than the product.', 'byProducts')
    : undefined;
}

/** The doses of pure compounds in `productMgL` of a product, main reagent first; `applyDoses` takes them as they are. */
export function dosesOfProduct(
  product: Product,
  productMgL: number,
): { readonly ok: true; readonly doses: readonly Dose[] } | Refusal {
  const fault = checkProduct(product) ?? checkNumber(productMgL, 'productMgL', [0, 1e6]);
  if (fault) return fault;
  const { reagent, strength, hydrate, basicity, byProducts = [] } = product;
  return {
    ok: true,
    doses: [
      {
        reagent,
        doseMgL: strength * productMgL,
        ...(hydrate === undefined ? {} : { hydrate }),
        ...(basicity === undefined ? {} : { basicity }),
      },
      ...byProducts.map((part) => ({
        reagent: part.reagent,
        doseMgL: part.strength * productMgL,
      })),
    ],
  };
}

/** Product to feed for a dose of its reagent, mg/L, and µL/L where its density is known. */
export function productFor(
  product: Product,
  doseMgL: number,
): { readonly ok: true; readonly productMgL: number; readonly microlitresPerL?: number } | Refusal {
  const fault = checkProduct(product) ?? checkNumber(doseMgL, 'doseMgL', [0, 1e5]);
  if (fault) return fault;
  const productMgL = doseMgL / product.strength;
  return {
    ok: true,
    productMgL,
    ...(product.densityKgL === undefined
      ? {}
      : { microlitresPerL: productMgL / product.densityKgL }),
  };
}
