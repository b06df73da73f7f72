/**
 * Numbers of the colours that buildings can take. Each way of colouring has numbers of its own, so that going
 * from one to another changes what buildings are told and no layer.
 */
export const FIRST_SHADE = { category: 0, stage: 10, settlement: 20 } as const;
