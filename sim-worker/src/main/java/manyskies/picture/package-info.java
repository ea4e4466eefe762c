/**
 * Maps as files to look at.
 *
 * <p><b>In</b>: maps of a patch, with names and units. <b>Out</b>: FITS files with the patch's
 * coordinates in their headers.
 *
 * <p><b>Uses</b> flat for the patch's shape, result for writing whole files. Alone imports the FITS
 * library.
 */
package manyskies.picture;
