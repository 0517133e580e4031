/** The figures of a state that the user may put in place of the model's. */
export const OVERRIDES = ['density', 'viscosity', 'isentropicExponent', 'vapourPressure'] as const;
export type Override = (typeof OVERRIDES)[number];

export const overridePath = (name: Override): string => `fluid.override.${name}`;

export const isOverride = (id: string): id is Override => (OVERRIDES as readonly string[]).includes(id);
