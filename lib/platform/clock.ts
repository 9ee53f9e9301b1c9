/** The present instant. The only place in the product that reads the clock; everything else is told the time. */
export const readClock = (): Date => new Date();
