package skytally.storage;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.Arrays;
import java.util.Locale;
import org.flywaydb.core.Flyway;
import org.flywaydb.core.api.FlywayException;
import org.flywaydb.core.api.MigrationInfo;
import org.h2.api.ErrorCode;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Looks at the database before anything may write to it. A new one is let through; one that this version would
 * change is copied aside first; one that is damaged, in use or from a newer version is refused as it stands.
 */
final class DatabaseCheck {

    private static final Logger LOG = LoggerFactory.getLogger(DatabaseCheck.class);

    private final DataDirectory directory;
    private final String[] migrations;
    private final Clock clock;

    DatabaseCheck(DataDirectory directory, String[] migrations, Clock clock) {
        this.directory = directory;
        this.migrations = migrations.clone();
        this.clock = clock;
    }

    void run() {
        if (isNew()) {
            return;
        }
        String readOnly = directory.databaseUrl() + ";ACCESS_MODE_DATA=r;IFEXISTS=TRUE";
        try (Connection held = DriverManager.getConnection(readOnly, "sa", "")) {
            refuseIfCutOff(held);
            copyAsideIfBehind(
                    held,
                    Flyway.configure()
                            .dataSource(readOnly, "sa", "")
                            .locations(migrations)
                            .load()
                            .info()
                            .all());
        } catch (SQLException | FlywayException unreadable) {
            throw refusal(unreadable);
        }
    }

    private boolean isNew() {
        Path file = directory.databaseFile();
        try {
            return Files.notExists(file) || Files.size(file) == 0;
        } catch (IOException unreadable) {
            throw refusal(unreadable);
        }
    }

    /** A file cut short can open as an empty database; to start on it would look as if nothing had ever been kept. */
    private void refuseIfCutOff(Connection held) throws SQLException {
        try (Statement ask = held.createStatement();
                ResultSet tables = ask.executeQuery("""
                        SELECT COUNT(*) FROM INFORMATION_SCHEMA.TABLES
                        WHERE TABLE_NAME = 'flyway_schema_history'
                        """)) {
            tables.next();
            if (tables.getInt(1) == 0) {
                throw new StorageRefusal("The database " + directory.databaseFile()
                        + " is damaged: it opens, but nothing Skytally keeps is in it. Nothing was changed. "
                        + remedy());
            }
        }
    }

    private void copyAsideIfBehind(Connection held, MigrationInfo[] known) throws SQLException {
        if (Arrays.stream(known)
                .anyMatch(one -> one.getState().isApplied() && !one.getState().isResolved())) {
            throw new StorageRefusal("The database " + directory.databaseFile()
                    + " was made by a newer version of Skytally (" + lastOpenedBy(held)
                    + "). Nothing was changed. Start that version, or name another skytally.data-directory.");
        }
        MigrationInfo last = null;
        for (MigrationInfo one : known) {
            if (!one.getState().isApplied()) {
                last = one;
            }
        }
        if (last != null) {
            String version = last.getVersion() == null
                    ? "repeatable"
                    : "V" + last.getVersion().getVersion();
            Path copy = directory.copyDatabaseAside(version, clock.instant());
            LOG.info("The database is about to be changed for this version; as it was it is kept in {}", copy);
        }
    }

    private static String lastOpenedBy(Connection held) throws SQLException {
        try (Statement ask = held.createStatement();
                ResultSet newest =
                        ask.executeQuery("SELECT version FROM opened_by ORDER BY last_at DESC FETCH FIRST ROW ONLY")) {
            return newest.next() ? "last opened by " + newest.getString(1) : "which one is not written in it";
        }
    }

    private StorageRefusal refusal(Exception unreadable) {
        for (Throwable cause = unreadable; cause != null; cause = cause.getCause()) {
            if (cause instanceof SQLException sql) {
                switch (sql.getErrorCode()) {
                    case ErrorCode.DATABASE_ALREADY_OPEN_1:
                        return DataDirectory.inUse(directory.path(), unreadable);
                    case ErrorCode.FILE_VERSION_ERROR_1:
                        return new StorageRefusal(
                                "The database " + directory.databaseFile()
                                        + " was made by a newer version of Skytally. Nothing was changed. Start that"
                                        + " version, or name another skytally.data-directory.",
                                unreadable);
                    default:
                        return new StorageRefusal(
                                String.format(
                                        Locale.ROOT,
                                        "The database %s is damaged and cannot be read (code %d). Nothing was changed. %s",
                                        directory.databaseFile(),
                                        sql.getErrorCode(),
                                        remedy()),
                                unreadable);
                }
            }
        }
        return new StorageRefusal(
                "The database " + directory.databaseFile() + " cannot be read. Nothing was changed. " + remedy(),
                unreadable);
    }

    private static String remedy() {
        return "Put a copy of it in its place (the folder before-migration may hold one), or move it away to begin"
                + " with an empty one.";
    }
}
