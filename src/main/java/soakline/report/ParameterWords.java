package soakline.report;

import soakline.estimate.Parameter;

/** The names of parameters for people. */
final class ParameterWords {

    private ParameterWords() {}

    static String of(Parameter parameter, boolean apparent) {
        return switch (parameter.name()) {
            case "diffusivity" -> apparent ? "apparent D" : "D, diffusivity";
            case "equilibriumContent" -> "M∞, equilibrium content";
            case "startContent" -> "M0, start content";
            case "initialSlope" -> "initial slope on √t";
            default -> parameter.name();
        };
    }
}
