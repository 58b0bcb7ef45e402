/**
 * What each database role may do, applied again after every migration. `ruckle_app` serves people: it may only add to the
 * audit and to readings. `ruckle_purge` erases what has lain in the bin long enough.
 */
export const ROLE_GRANTS = `
GRANT USAGE ON SCHEMA public TO ruckle_app, ruckle_purge;
GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA public TO ruckle_app;
GRANT SELECT, DELETE ON ALL TABLES IN SCHEMA public TO ruckle_purge;
GRANT INSERT ON tombstones, doomed_objects TO ruckle_purge;
GRANT USAGE ON ALL SEQUENCES IN SCHEMA public TO ruckle_app, ruckle_purge;
REVOKE UPDATE, DELETE, TRUNCATE ON audit, readings, tombstones FROM ruckle_app;
REVOKE DELETE, TRUNCATE ON audit FROM ruckle_purge;
GRANT USAGE ON SCHEMA pgboss TO ruckle_app, ruckle_purge;
GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA pgboss TO ruckle_app, ruckle_purge;
GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA pgboss TO ruckle_app, ruckle_purge;
`;
