/**
 * What an analyst asks for: patch, spectra, survey (the truth), analysis (the belief), sets, seed.
 *
 * <p><b>In</b>: YAML text. <b>Out</b>: an immutable {@link manyskies.specification.Specification}
 * with every default resolved, or all faults of the text at once, each with its line.
 *
 * <p><b>Flow</b>: text to nodes with line numbers, nodes to values with units, values to records;
 * and back to canonical YAML text, from which the hash of a run is taken.
 *
 * <p>Records: what others use. {@code *Reader}: one section of the file each, all on {@link
 * manyskies.specification.Section}, which knows lines and adds faults. {@code Entries}: the way
 * back, for the canonical text, hash and difference alike.
 *
 * <p><b>To add a key</b>: a component of its record, its name in the KEYS of its reader, a line in
 * Entries, an edit in the tests of hash and faults.
 *
 * <p><b>Uses</b> spectrum. Alone reads YAML (SnakeYAML Engine, which builds no objects).
 */
package manyskies.specification;
