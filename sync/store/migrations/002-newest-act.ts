/**
 * What undo would take back is kept with each count, so that opening reads a row a count however
 * many taps there are; and answers to requests are forgotten by their time as new ones come.
 */
export const keepNewestAct = `
ALTER TABLE view_tally ADD COLUMN newest_ord INTEGER;
UPDATE view_tally SET newest_ord = NULLIF(MAX(
  COALESCE((SELECT MAX(own.ord) FROM tap AS own WHERE own.tally_no = view_tally.tally_no
    AND own.session IN (SELECT id FROM sync_session)
    AND NOT EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = own.scope_id
      AND undo.target_session = own.session AND undo.target_seq = own.seq)), 0),
  COALESCE((SELECT MAX(own.ord) FROM tap_set AS own WHERE own.tally_no = view_tally.tally_no
    AND own.session IN (SELECT id FROM sync_session)
    AND NOT EXISTS (SELECT 1 FROM tap_undo AS undo WHERE undo.scope_id = own.scope_id
      AND undo.target_session = own.session AND undo.target_seq = own.seq)), 0)), 0);
CREATE INDEX request_by_time ON request (at_ms);
`;
