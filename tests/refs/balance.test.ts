import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { centreOfMass, deviationOfCentre } from '#shared/checks/balance/centre-of-mass';
import { ngoBalance } from '#shared/checks/balance/ngo-balance';
import { ngoEquilibrium } from '#shared/checks/balance/ngo-equilibrium';
import { NGO_MEASURES, ngoMeasures, type NgoMeasure } from '#shared/checks/balance/ngo-measures';
import { ngoDensity } from '#shared/checks/balance/ngo-sizes';
import { readReference } from '../support/refs';

const exactSchema = z.object({ value: z.number() });
/** The reference gives rational values as a fraction and its decimal, the rest as a decimal. */
const valueSchema = z.union([z.number(), exactSchema.transform(({ value }) => value)]);
const measureSchemas = Object.fromEntries(
  NGO_MEASURES.filter((name) => name !== 'density' && name !== 'order').map((name) => [name, valueSchema]),
) as Record<Exclude<NgoMeasure, 'density' | 'order'>, typeof valueSchema>;
const rectSchema = z.object({ x: z.number(), y: z.number(), w: z.number(), h: z.number() });
const ngoSchema = z.object({
  cases: z.array(
    z.object({
      id: z.string(),
      frame: z.object({ b: z.number(), h: z.number() }),
      rects: z.array(rectSchema),
      values: z.object({
        ...measureSchemas,
        density_2003: valueSchema,
        density_2000: valueSchema,
        order_mean13: valueSchema,
        BM_vertical: exactSchema,
        BM_horizontal: exactSchema,
        com: z.tuple([exactSchema, exactSchema]),
        DCM_percent: z.number(),
      }),
      variants: z.object({ equilibrium_without_n: valueSchema }),
    }),
  ),
});
const dcmSchema = z.object({
  cases: z.array(z.object({ id: z.string(), width: z.number(), height: z.number(), black_rects: z.array(rectSchema), DCM_continuous: z.number() })),
});

const read = <T>(schema: z.ZodType<T>, name: string): T => schema.parse(JSON.parse(readReference(`balance/${name}`)));

const toRect = (r: z.infer<typeof rectSchema>) => ({ x: r.x, y: r.y, width: r.w, height: r.h });
const centreOf = (rects: readonly z.infer<typeof rectSchema>[]) =>
  centreOfMass(rects.map((r) => ({ x: r.x + r.w / 2, y: r.y + r.h / 2, mass: r.w * r.h })));

/** Equal to 1e-9. */
const within = (value: number): unknown => expect.closeTo(value, 9);

describe('measures of balance against the reference cases', () => {
  const ngo = read(ngoSchema, 'ngo_cases_open.json').cases;
  it.each(ngo.map((entry) => [entry.id, entry] as const))('%s: balance, centre and its deviation to 1e-9', (_, { frame, rects, values }) => {
    const size = { width: frame.b, height: frame.h };
    const found = ngoBalance(size, rects.map(toRect));
    const centre = centreOf(rects)!;
    expect(found.balance).toBeCloseTo(values.balance, 9);
    expect(found.vertical).toBeCloseTo(values.BM_vertical.value, 9);
    expect(found.horizontal).toBeCloseTo(values.BM_horizontal.value, 9);
    expect([centre.x, centre.y]).toEqual([expect.closeTo(values.com[0].value, 9), expect.closeTo(values.com[1].value, 9)]);
    expect(deviationOfCentre(centre, size)).toBeCloseTo(values.DCM_percent, 9);
  });

  it.each(ngo.map((entry) => [entry.id, entry] as const))('%s: all fourteen measures to 1e-9', (_, { frame, rects, values, variants }) => {
    const size = { width: frame.b, height: frame.h };
    const found = ngoMeasures(size, rects.map(toRect));
    const wanted: Record<NgoMeasure, number> = { ...values, density: values.density_2003, order: values.order_mean13 };
    for (const name of NGO_MEASURES) expect([name, found[name]]).toEqual([name, within(wanted[name])]);
    expect(ngoDensity(size, rects.map(toRect)).density2000).toEqual(within(values.density_2000));
    expect(ngoEquilibrium(size, rects.map(toRect)).withoutCount).toEqual(within(variants.equilibrium_without_n));
  });

  const dcm = read(dcmSchema, 'apb_dcm_open.json').cases;
  it.each(dcm.map((entry) => [entry.id, entry] as const))('%s: deviation of the centre of mass', (_, { width, height, black_rects: rects, DCM_continuous }) => {
    expect(deviationOfCentre(centreOf(rects)!, { width, height })).toBeCloseTo(DCM_continuous, 5);
  });
});
