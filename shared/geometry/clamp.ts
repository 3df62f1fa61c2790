/** `value` kept between two limits; the lower one wins where they cross. */
export const clamp = (value: number, least: number, most: number): number => Math.max(least, Math.min(value, most));
