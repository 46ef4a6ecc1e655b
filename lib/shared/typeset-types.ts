// Types only: pages draw a typeset formula; reading one belongs to the worker and the server.
export type { Typeset as TypesetFormula } from '@/kernels/formula/typeset';
