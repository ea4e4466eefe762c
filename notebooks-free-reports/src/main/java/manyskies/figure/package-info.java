/**
 * Numbers to figures.
 *
 * <p><b>In</b>: arrays with titles and units. <b>Out</b>: pictures as bytes, the same for the same
 * numbers.
 *
 * <p><b>Uses</b> the JDK alone; no display and no fonts of the host.
 */
package manyskies.figure;
