CREATE FUNCTION refuse_version_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'version % of layout % is kept as it is', OLD.number, OLD.layout_id
    USING ERRCODE = 'integrity_constraint_violation';
END;
$$;
--> statement-breakpoint
CREATE TRIGGER versions_never_change
  BEFORE UPDATE OR DELETE ON versions
  FOR EACH ROW EXECUTE FUNCTION refuse_version_change();
--> statement-breakpoint
CREATE FUNCTION refuse_versions_truncate() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION 'versions are kept as they are' USING ERRCODE = 'integrity_constraint_violation';
END;
$$;
--> statement-breakpoint
CREATE TRIGGER versions_never_truncated
  BEFORE TRUNCATE ON versions
  FOR EACH STATEMENT EXECUTE FUNCTION refuse_versions_truncate();
