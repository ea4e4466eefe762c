package manyskies.sky;

import java.util.Optional;
import manyskies.field.Modes;

/**
 * The modes of one unlensed sky and of what lenses it.
 *
 * @param temperature T in uK
 * @param gradient E in uK
 * @param curl B in uK; absent where the spectra have none
 * @param phi the lensing potential
 * @param psi the curl potential, d_i = d_i phi + eps_ij d_j psi; absent where there is none
 */
public record UnlensedSky(
        Modes temperature, Modes gradient, Optional<Modes> curl, Modes phi, Optional<Modes> psi) {}
