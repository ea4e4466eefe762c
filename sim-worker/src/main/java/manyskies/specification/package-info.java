/**
 * What an analyst asks for: patch, spectra, survey (the truth), analysis (the belief), sets, seed.
 *
 * <p><b>In</b>: YAML text. <b>Out</b>: an immutable {@link manyskies.specification.Specification}
 * with every default resolved, or all faults of the text at once, each with its line.
 *
 * <p><b>Flow</b>: text to nodes with line numbers, nodes to values with units, values to records;
 * and back to canonical YAML text, from which the hash of a run is taken.
 *
 * <p><b>Uses</b> spectrum. Alone reads YAML (SnakeYAML Engine, which builds no objects).
 */
package manyskies.specification;
