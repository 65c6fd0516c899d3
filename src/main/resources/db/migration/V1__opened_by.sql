-- Which versions of the tool have opened this database, and when each last did.
-- A version that finds the database ahead of itself reads here which one to start instead.
-- No result is kept yet, so none changes.

CREATE TABLE opened_by (
    version VARCHAR(100) PRIMARY KEY,
    last_at TIMESTAMP WITH TIME ZONE NOT NULL
);
