/**
 * A linear operator on densities, known by two actions only; every solver is written against this pair.
 *
 * Densities and observables are values on the operator's nodes; ⟨u, v⟩ = Σ weights·u·v approximates ∫ u v dx.
 * ⟨apply(ρ), g⟩ = ⟨ρ, applyAdjoint(g)⟩ to round-off. `out` must not be the argument itself.
 */
export interface OperatorPair {
  /** number of nodes */
  readonly size: number;
  /** quadrature weight of each node, positive, in units of the variable */
  readonly weights: Float64Array;
  /** out ← the density one step later */
  apply(rho: Float64Array, out: Float64Array): void;
  /** out ← the observable's expectation one step later */
  applyAdjoint(observable: Float64Array, out: Float64Array): void;
}
