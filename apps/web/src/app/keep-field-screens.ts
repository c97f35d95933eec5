import { loadDeskWords, loadTradeWords } from "#lib/i18n.ts";

/**
 * Fetches the screens of a visit and their words while there is a signal, so that none of them has to be fetched
 * on site: the call, the field flow, the gas and CO acts, what waits to be sent. Without a signal it does nothing;
 * a screen that is missing then is asked for again when it is opened.
 */
export async function keepFieldScreens(): Promise<void> {
  await Promise.allSettled([
    import("#features/calls/call-screen.tsx"),
    import("#lib/start-diagnosis.ts"),
    import("#features/diagnosis/diagnosis-route.tsx"),
    import("#features/diagnosis/screens/next-screen.tsx"),
    import("#features/diagnosis/screens/screen-switch.tsx"),
    import("#features/diagnosis/screens/safety-screen.tsx"),
    import("#features/sync/sync-screen.tsx"),
    loadDeskWords(),
    loadTradeWords(),
  ]);
}
