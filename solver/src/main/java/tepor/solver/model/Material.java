package tepor.solver.model;

import tepor.mesher.outline.Place;

/**
 * A material.
 *
 * @param name its name in the case
 * @param conductivity how it conducts
 * @param density kg/m³; null where not stated; printed in the report
 * @param heatCapacity J/(kg·K); null where not stated; printed in the report
 * @param source where the values come from, as the user says; empty where not stated
 * @param place where the user wrote it
 */
public record Material(
        String name, Conductivity conductivity, Input density, Input heatCapacity, String source, Place place) {}
