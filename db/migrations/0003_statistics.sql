-- Oldest code served: 0000_ledger
-- What the planner knows of the tables is the owner's to gather, and until then it takes a table that
-- was just filled for an empty one: whoever writes much at once asks for it, also before the commit.
create function refresh_statistics() returns void
language plpgsql security definer
set search_path = public, pg_temp
as $$
begin
  analyze clock_events, event_ids, segments, shifts, reports, loose_ends, dirty_marks,
    timeline_heads, kiosk_sessions, planned_shifts, workers, standards, orders, tickets,
    ticket_options, ticket_operations;
end $$;
--> statement-breakpoint
revoke all on function refresh_statistics() from public;
--> statement-breakpoint
grant execute on function refresh_statistics() to bookmatch_app;
