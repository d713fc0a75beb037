package soakline.estimate;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.BiFunction;
import org.apache.commons.math3.analysis.differentiation.DerivativeStructure;

/**
 * The nonlinear regression sets of NIST as {@link ResidualModel}s, with derivatives by automatic differentiation (Apache Commons Math).
 */
final class NistSets {

    private static final Map<String, BiFunction<DerivativeStructure[], double[], DerivativeStructure>> MODELS =
            Map.ofEntries(
                    Map.entry("Misra1a", NistSets::rise),
                    Map.entry("BoxBOD", NistSets::rise),
                    Map.entry("Chwirut1", NistSets::chwirut),
                    Map.entry("Chwirut2", NistSets::chwirut),
                    Map.entry("Lanczos1", NistSets::lanczos),
                    Map.entry("Lanczos2", NistSets::lanczos),
                    Map.entry("Lanczos3", NistSets::lanczos),
                    Map.entry("Gauss1", NistSets::gauss),
                    Map.entry("Gauss2", NistSets::gauss),
                    Map.entry("Gauss3", NistSets::gauss),
                    Map.entry(
                            "DanWood",
                            (b, x) ->
                                    b[0].multiply(b[1].multiply(Math.log(x[0])).exp())),
                    Map.entry(
                            "Misra1b",
                            (b, x) -> b[0].multiply(b[1].multiply(x[0] / 2)
                                    .add(1)
                                    .pow(-2)
                                    .negate()
                                    .add(1))),
                    Map.entry(
                            "Misra1c",
                            (b, x) -> b[0].multiply(b[1].multiply(2 * x[0])
                                    .add(1)
                                    .pow(-0.5)
                                    .negate()
                                    .add(1))),
                    Map.entry(
                            "Misra1d",
                            (b, x) -> b[0].multiply(b[1])
                                    .multiply(x[0])
                                    .divide(b[1].multiply(x[0]).add(1))),
                    Map.entry(
                            "Kirby2",
                            (b, x) -> polynomial(b, x[0], 0, 3)
                                    .divide(polynomial(b, x[0], 3, 5)
                                            .multiply(x[0])
                                            .add(1))),
                    Map.entry("Hahn1", NistSets::cubic),
                    Map.entry("Thurber", NistSets::cubic),
                    Map.entry(
                            "Nelson",
                            (b, x) -> b[0].subtract(b[1].multiply(x[0])
                                    .multiply(b[2].multiply(-x[1]).exp()))),
                    Map.entry(
                            "MGH17",
                            (b, x) -> b[0].add(
                                            b[1].multiply(b[3].multiply(-x[0]).exp()))
                                    .add(b[2].multiply(b[4].multiply(-x[0]).exp()))),
                    Map.entry(
                            "Roszman1",
                            (b, x) -> b[0].subtract(b[1].multiply(x[0]))
                                    .subtract(b[2].divide(b[3].negate().add(x[0]))
                                            .atan()
                                            .divide(Math.PI))),
                    Map.entry("ENSO", NistSets::enso),
                    Map.entry(
                            "MGH09",
                            (b, x) -> b[0].multiply(b[1].multiply(x[0]).add(x[0] * x[0]))
                                    .divide(b[2].multiply(x[0]).add(x[0] * x[0]).add(b[3]))),
                    Map.entry(
                            "Rat42",
                            (b, x) -> b[0].divide(
                                    b[1].subtract(b[2].multiply(x[0])).exp().add(1))),
                    Map.entry(
                            "MGH10",
                            (b, x) -> b[0].multiply(b[1].divide(b[2].add(x[0])).exp())),
                    Map.entry(
                            "Eckerle4",
                            (b, x) -> b[0].divide(b[1])
                                    .multiply(b[2].negate()
                                            .add(x[0])
                                            .divide(b[1])
                                            .pow(2)
                                            .multiply(-0.5)
                                            .exp())),
                    Map.entry(
                            "Rat43",
                            (b, x) -> b[0].divide(b[1].subtract(b[2].multiply(x[0]))
                                    .exp()
                                    .add(1)
                                    .pow(b[3].reciprocal()))),
                    Map.entry(
                            "Bennett5",
                            (b, x) -> b[0].multiply(
                                    b[1].add(x[0]).pow(b[2].reciprocal().negate()))));

    private NistSets() {}

    /** One set. */
    static final class NistSet implements ResidualModel {
        final String name;
        final List<double[]> rows;
        final List<double[]> starts;
        final double[] certified;
        final double[] certifiedSd;

        NistSet(String name, List<double[]> rows, List<double[]> starts, double[] certified, double[] certifiedSd) {
            this.name = name;
            this.rows = rows;
            this.starts = starts;
            this.certified = certified;
            this.certifiedSd = certifiedSd;
        }

        @Override
        public int parameters() {
            return certified.length;
        }

        @Override
        public int observations() {
            return rows.size();
        }

        @Override
        public void fill(double[] point, int from, int count, double[][] block) {
            int p = point.length;
            DerivativeStructure[] b = new DerivativeStructure[p];
            for (int k = 0; k < p; k++) {
                b[k] = new DerivativeStructure(p, 1, k, point[k]);
            }
            int[] order = new int[p];
            for (int i = 0; i < count; i++) {
                double[] row = rows.get(from + i);
                double y = row[row.length - 1];
                DerivativeStructure value = MODELS.get(name).apply(b, row);
                for (int k = 0; k < p; k++) {
                    order[k] = 1;
                    block[k][i] = value.getPartialDerivative(order);
                    order[k] = 0;
                }
                block[p][i] = (name.equals("Nelson") ? Math.log(y) : y) - value.getValue();
            }
        }
    }

    /** All sets of a folder, in the order of its list. */
    static List<NistSet> all(Path folder) throws IOException {
        List<NistSet> sets = new ArrayList<>();
        List<String[]> certified = cells(folder.resolve("certified.csv"));
        for (String[] set : cells(folder.resolve("certified_sets.csv"))) {
            List<String[]> lines =
                    certified.stream().filter(c -> c[0].equals(set[0])).toList();
            List<double[]> rows = new ArrayList<>();
            for (String[] row : cells(folder.resolve(set[0] + ".csv"))) {
                rows.add(numbers(row, 0));
            }
            sets.add(new NistSet(
                    set[0], rows, List.of(column(lines, 2), column(lines, 3)), column(lines, 4), column(lines, 5)));
        }
        return sets;
    }

    private static List<String[]> cells(Path file) throws IOException {
        return Files.readAllLines(file, StandardCharsets.UTF_8).stream()
                .filter(l -> !l.startsWith("#") && !l.isBlank())
                .skip(1)
                .map(l -> l.split(","))
                .toList();
    }

    private static double[] numbers(String[] cells, int from) {
        double[] numbers = new double[cells.length - from];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = Double.parseDouble(cells[from + i]);
        }
        return numbers;
    }

    private static double[] column(List<String[]> lines, int column) {
        return lines.stream().mapToDouble(c -> Double.parseDouble(c[column])).toArray();
    }

    private static DerivativeStructure rise(DerivativeStructure[] b, double[] x) {
        return b[0].multiply(b[1].multiply(-x[0]).exp().negate().add(1));
    }

    private static DerivativeStructure chwirut(DerivativeStructure[] b, double[] x) {
        return b[0].multiply(-x[0]).exp().divide(b[1].add(b[2].multiply(x[0])));
    }

    private static DerivativeStructure lanczos(DerivativeStructure[] b, double[] x) {
        DerivativeStructure sum = b[0].multiply(0);
        for (int k = 0; k < 6; k += 2) {
            sum = sum.add(b[k].multiply(b[k + 1].multiply(-x[0]).exp()));
        }
        return sum;
    }

    private static DerivativeStructure gauss(DerivativeStructure[] b, double[] x) {
        DerivativeStructure sum = b[0].multiply(b[1].multiply(-x[0]).exp());
        for (int k = 2; k < 8; k += 3) {
            DerivativeStructure z = b[k + 1].negate().add(x[0]).divide(b[k + 2]);
            sum = sum.add(b[k].multiply(z.multiply(z).negate().exp()));
        }
        return sum;
    }

    private static DerivativeStructure cubic(DerivativeStructure[] b, double[] x) {
        return polynomial(b, x[0], 0, 4)
                .divide(polynomial(b, x[0], 4, 7).multiply(x[0]).add(1));
    }

    /** b[from] + b[from+1] x + … up to b[to−1]. */
    private static DerivativeStructure polynomial(DerivativeStructure[] b, double x, int from, int to) {
        DerivativeStructure sum = b[to - 1];
        for (int k = to - 2; k >= from; k--) {
            sum = sum.multiply(x).add(b[k]);
        }
        return sum;
    }

    private static DerivativeStructure enso(DerivativeStructure[] b, double[] x) {
        double year = 2 * Math.PI * x[0] / 12;
        DerivativeStructure sum = b[0].add(b[1].multiply(Math.cos(year))).add(b[2].multiply(Math.sin(year)));
        for (int k = 3; k < 9; k += 3) {
            DerivativeStructure angle = b[k].reciprocal().multiply(2 * Math.PI * x[0]);
            sum = sum.add(b[k + 1].multiply(angle.cos())).add(b[k + 2].multiply(angle.sin()));
        }
        return sum;
    }
}
