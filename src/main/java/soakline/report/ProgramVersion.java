package soakline.report;

import java.io.IOException;
import java.io.InputStream;
import java.util.Properties;

/** Which program wrote a result. */
public final class ProgramVersion {

    private ProgramVersion() {}

    /** Name and version, such as {@code Soakline 0.1.0}. */
    public static String text() {
        Properties properties = new Properties();
        try (InputStream in = ProgramVersion.class.getResourceAsStream("/soakline/version.properties")) {
            properties.load(in);
        } catch (IOException e) {
            return "Soakline of unknown version";
        }
        return "Soakline " + properties.getProperty("version");
    }
}
