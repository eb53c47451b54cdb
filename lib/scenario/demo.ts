/** Scenarios of our own, shown when an address names none. */

export const DEMO: { readonly title: string; readonly codes: readonly string[] } = {
  title: 'Three ways to run down a clock',
  codes: [
    // Dark energy that never changes: expands for ever at a constant rate.
    'h0:67.66,matter:0.3111,as:Steady light',
    // Dark energy that thins out in a closed universe: turns round and ends in a crunch.
    'h0:67.66,matter:0.4,dark:0.85,eos:cpl,w0:-0.6,wa:-1.6,as:Fading light',
    // Dark energy that gathers as space grows: ends in a rip.
    'h0:72,matter:0.28,eos:constant,w:-1.25,as:Gathering light',
  ],
}
