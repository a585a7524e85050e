import * as pack from 'fast-check';

export const check = pack.check;
