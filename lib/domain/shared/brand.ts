declare const brand: unique symbol;

/** A value that is told apart from its plain type where mixing hurts: `type Midi = Brand<number, 'Midi'>`. */
export type Brand<T, Name extends string> = T & { readonly [brand]: Name };
