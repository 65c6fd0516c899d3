-- Projects, each kept whole as the text of its project file, and every change ever made to one.
-- Nothing was kept before, so no result changes.

CREATE TABLE project (
    id         UUID PRIMARY KEY,
    version    BIGINT NOT NULL,
    title      VARCHAR(400) NOT NULL,
    document   CHARACTER LARGE OBJECT NOT NULL,
    changed_at TIMESTAMP WITH TIME ZONE NOT NULL
);

-- Taken by the program 500 at a time, so that the rows of a large save go in together.
CREATE SEQUENCE project_change_id START WITH 1 INCREMENT BY 500;

-- One row a key that changed; the rows of one save share their step. Only ever added to.
CREATE TABLE project_change (
    id          BIGINT PRIMARY KEY,
    project_id  UUID NOT NULL REFERENCES project (id) ON DELETE CASCADE,
    step        BIGINT NOT NULL,
    changed_at  TIMESTAMP WITH TIME ZONE NOT NULL,
    who         VARCHAR(200) NOT NULL,
    why         VARCHAR(1000) NOT NULL,
    undoes      BIGINT,
    change_key  VARCHAR(1000) NOT NULL,
    text_before CHARACTER LARGE OBJECT,
    text_after  CHARACTER LARGE OBJECT
);

CREATE INDEX project_change_step ON project_change (project_id, step);

-- The bytes of the files of documents, by their hash. They go with their project and not before, because a step back
-- may bring a document back.
CREATE TABLE project_attachment (
    project_id UUID NOT NULL REFERENCES project (id) ON DELETE CASCADE,
    sha256     VARCHAR(64) NOT NULL,
    content    BINARY LARGE OBJECT NOT NULL,
    PRIMARY KEY (project_id, sha256)
);
