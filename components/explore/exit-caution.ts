/** Stands by every exit time, rate and budget. */
export const EXIT_CAUTION =
  'Exit times hold for the model and the noise as stated; figures of rare events extrapolate. They are no safety assessment: the codes that apply and a licensed engineer decide.';
