/** Facts: added, never changed or removed, neither by the application's user nor by anybody through the triggers. */
export const APPEND_ONLY_TABLES = ["movement", "movement_leg", "audit_event"] as const;
