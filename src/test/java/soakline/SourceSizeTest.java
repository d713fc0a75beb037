package soakline;

import static org.assertj.core.api.Assertions.assertThat;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.LineMap;
import com.sun.source.tree.MethodTree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreeScanner;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import javax.tools.JavaCompiler;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Files and methods stay short, unless a comment beginning with {@code // long:} gives the reason. */
class SourceSizeTest {

    private static final int FILE_LINES = 400;
    private static final int METHOD_LINES = 60;
    private static final String REASON = "// long:";

    @Test
    void mainSourcesAreShort() throws IOException {
        try (Stream<Path> files = Files.walk(Path.of("src/main/java"))) {
            assertThat(tooLong(files.filter(f -> f.toString().endsWith(".java")).toList()))
                    .isEmpty();
        }
    }

    @Test
    void aLongMethodAndALongFileAreSeen(@TempDir Path folder) throws IOException {
        String body = "int x = 0;\n" + "x++;\n".repeat(METHOD_LINES);
        Path method = Files.writeString(folder.resolve("A.java"), "class A {\nvoid a() {\n" + body + "}\n}\n");
        Path file = Files.writeString(folder.resolve("B.java"), "class B {\n" + "\n".repeat(FILE_LINES) + "}\n");
        Path excused = Files.writeString(
                folder.resolve("C.java"), "class C {\nvoid c() {\n" + REASON + " one table\n" + body + "}\n}\n");

        assertThat(tooLong(List.of(method, file, excused)))
                .hasSize(2)
                .anyMatch(t -> t.contains("A.java") && t.contains("a()"))
                .anyMatch(t -> t.contains("B.java"));
    }

    private static List<String> tooLong(List<Path> files) throws IOException {
        List<String> found = new ArrayList<>();
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        try (StandardJavaFileManager manager = compiler.getStandardFileManager(null, null, null)) {
            JavacTask task = (JavacTask) compiler.getTask(
                    null, manager, null, List.of("-proc:none"), null, manager.getJavaFileObjectsFromPaths(files));
            SourcePositions positions = Trees.instance(task).getSourcePositions();
            for (CompilationUnitTree unit : task.parse()) {
                String source = unit.getSourceFile().getCharContent(true).toString();
                long lines = source.lines().count();
                boolean excused = source.lines().limit(3).anyMatch(l -> l.startsWith(REASON));
                if (lines > FILE_LINES && !excused) {
                    found.add(unit.getSourceFile().getName() + ": " + lines + " lines");
                }
                unit.accept(new Methods(unit, positions, source, found), null);
            }
        }
        return found;
    }

    private static final class Methods extends TreeScanner<Void, Void> {
        private final CompilationUnitTree unit;
        private final SourcePositions positions;
        private final String source;
        private final List<String> found;

        Methods(CompilationUnitTree unit, SourcePositions positions, String source, List<String> found) {
            this.unit = unit;
            this.positions = positions;
            this.source = source;
            this.found = found;
        }

        @Override
        public Void visitMethod(MethodTree method, Void nothing) {
            long from = positions.getStartPosition(unit, method);
            long to = positions.getEndPosition(unit, method);
            if (from >= 0 && to > from) {
                LineMap map = unit.getLineMap();
                long lines = map.getLineNumber(to) - map.getLineNumber(from) + 1;
                if (lines > METHOD_LINES
                        && !source.substring((int) from, (int) to).contains(REASON)) {
                    found.add(unit.getSourceFile().getName() + ": " + method.getName() + "() has " + lines + " lines");
                }
            }
            return super.visitMethod(method, null);
        }
    }
}
