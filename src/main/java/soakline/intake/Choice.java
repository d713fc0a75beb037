package soakline.intake;

import soakline.problem.Place;

/**
 * What a file says about the estimate of a coupon, such as {@code fixed startContent: 0 %}. What it means is not known here.
 *
 * @param name as written, without the coupon's
 */
public record Choice(String name, String value, Place place) {}
