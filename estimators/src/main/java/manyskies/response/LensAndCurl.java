package manyskies.response;

/**
 * A function of L for the lens and one for the curl, per mode. Arrays are read only to others.
 *
 * @param lens for the gradient estimate
 * @param curl for the curl estimate
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody
public record LensAndCurl(double[] lens, double[] curl) {}
