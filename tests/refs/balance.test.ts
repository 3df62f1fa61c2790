import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { centreOfMass, deviationOfCentre } from '#shared/checks/balance/centre-of-mass';
import { readReference } from '../support/refs';

const exactSchema = z.object({ value: z.number() });
const rectSchema = z.object({ x: z.number(), y: z.number(), w: z.number(), h: z.number() });
const ngoSchema = z.object({
  cases: z.array(
    z.object({
      id: z.string(),
      frame: z.object({ b: z.number(), h: z.number() }),
      rects: z.array(rectSchema),
      values: z.object({ com: z.tuple([exactSchema, exactSchema]), DCM_percent: z.number() }),
    }),
  ),
});
const dcmSchema = z.object({
  cases: z.array(z.object({ id: z.string(), width: z.number(), height: z.number(), black_rects: z.array(rectSchema), DCM_continuous: z.number() })),
});

const read = <T>(schema: z.ZodType<T>, name: string): T => schema.parse(JSON.parse(readReference(`balance/${name}`)));

const centreOf = (rects: readonly z.infer<typeof rectSchema>[]) =>
  centreOfMass(rects.map((r) => ({ x: r.x + r.w / 2, y: r.y + r.h / 2, mass: r.w * r.h })));

describe('measures of balance against the reference cases', () => {
  const ngo = read(ngoSchema, 'ngo_cases_open.json').cases;
  it.each(ngo.map((entry) => [entry.id, entry] as const))('%s: centre and its deviation to 1e-9', (_, { frame, rects, values }) => {
    const size = { width: frame.b, height: frame.h };
    const centre = centreOf(rects)!;
    expect([centre.x, centre.y]).toEqual([expect.closeTo(values.com[0].value, 9), expect.closeTo(values.com[1].value, 9)]);
    expect(deviationOfCentre(centre, size)).toBeCloseTo(values.DCM_percent, 9);
  });

  const dcm = read(dcmSchema, 'apb_dcm_open.json').cases;
  it.each(dcm.map((entry) => [entry.id, entry] as const))('%s: deviation of the centre of mass', (_, { width, height, black_rects: rects, DCM_continuous }) => {
    expect(deviationOfCentre(centreOf(rects)!, { width, height })).toBeCloseTo(DCM_continuous, 5);
  });
});
