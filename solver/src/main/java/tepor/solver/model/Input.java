package tepor.solver.model;

import tepor.mesher.outline.Place;
import tepor.solver.quantity.Quantity;

/**
 * A quantity that decides answers, under its path.
 *
 * @param index its number in {@link Inputs}, from 0
 * @param path such as {@code material.resin.k} or {@code edge.outer skin.film}
 * @param quantity nominal value, unit and spread
 * @param place where the user wrote it
 */
public record Input(int index, String path, Quantity quantity, Place place) {}
