import { createBrowserRouter, Navigate } from "react-router-dom";
import { paths } from "#lib/paths.ts";
import { FailedScreen } from "./failed-screen.tsx";
import { NotFoundScreen } from "./not-found-screen.tsx";
import { RequireSession } from "./require-session.tsx";
import { DeskLayout } from "./layouts/desk-layout.tsx";
import { screen } from "./screen.tsx";

const trade = { trade: true };
const first = { first: true };

/** Routes compose features; a feature is fetched when its screen is first opened. */
export const router = createBrowserRouter([
  {
    errorElement: <FailedScreen />,
    // Nothing is drawn until the first screen is here: it takes a moment, and a frame would only jump.
    HydrateFallback: () => null,
    children: [
      {
        path: "/sign-in",
        lazy: screen(
          () => import("#features/sign-in/sign-in-screen.tsx"),
          (m) => m.SignInScreen,
          first,
        ),
      },
      {
        path: "/forgot",
        lazy: screen(
          () => import("#features/sign-in/forgot-screen.tsx"),
          (m) => m.ForgotScreen,
        ),
      },
      {
        path: "/reset/:token",
        lazy: screen(
          () => import("#features/sign-in/reset-screen.tsx"),
          (m) => m.ResetScreen,
        ),
      },
      {
        path: "/invite/:token",
        lazy: screen(
          () => import("#features/sign-in/invite-screen.tsx"),
          (m) => m.InviteScreen,
        ),
      },
      {
        path: "/first-run/:token",
        lazy: screen(
          () => import("#features/first-run/first-run-screen.tsx"),
          (m) => m.FirstRunScreen,
        ),
      },
      {
        path: "/r/:token",
        lazy: screen(
          () => import("#features/report/report-screen.tsx"),
          (m) => m.ReportScreen,
        ),
      },
      {
        element: <RequireSession />,
        children: [
          { path: "/", element: <Navigate to={paths.calls} replace /> },
          {
            path: "/diagnoses/:diagnosisId",
            lazy: screen(
              () => import("#features/diagnosis/diagnosis-route.tsx"),
              (m) => m.DiagnosisRoute,
              trade,
            ),
            children: [
              {
                index: true,
                lazy: screen(
                  () => import("#features/diagnosis/screens/next-screen.tsx"),
                  (m) => m.NextScreen,
                ),
              },
              {
                // Read before or after a visit, so it is no part of what a visit fetches.
                path: "record",
                lazy: screen(
                  () => import("#features/diagnosis/screens/record-screen.tsx"),
                  (m) => m.RecordScreen,
                ),
              },
              {
                path: ":screen",
                lazy: screen(
                  () => import("#features/diagnosis/screens/screen-switch.tsx"),
                  (m) => m.ScreenSwitch,
                ),
              },
            ],
          },
          {
            path: "/safety",
            lazy: screen(
              () => import("#features/diagnosis/screens/safety-screen.tsx"),
              (m) => m.GeneralSafetyScreen,
              trade,
            ),
          },
          {
            element: <DeskLayout />,
            children: [
              {
                // A screen that fails leaves the ways to the others.
                errorElement: <FailedScreen />,
                children: [
                  {
                    path: "/calls",
                    lazy: screen(
                      () => import("#features/calls/calls-screen.tsx"),
                      (m) => m.CallsScreen,
                      first,
                    ),
                  },
                  {
                    path: "/calls/new",
                    lazy: screen(
                      () => import("#features/calls/new-call-screen.tsx"),
                      (m) => m.NewCallScreen,
                    ),
                  },
                  {
                    path: "/calls/:callId",
                    lazy: screen(
                      () => import("#features/calls/call-screen.tsx"),
                      (m) => m.CallScreen,
                    ),
                  },
                  {
                    path: "/units/:unitId",
                    lazy: screen(
                      () => import("#features/units/unit-screen.tsx"),
                      (m) => m.UnitScreen,
                      trade,
                    ),
                  },
                  {
                    path: "/units/:unitId/edit",
                    lazy: screen(
                      () => import("#features/units/edit-unit-screen.tsx"),
                      (m) => m.EditUnitScreen,
                      trade,
                    ),
                  },
                  {
                    path: "/sites/:siteId/units/new",
                    lazy: screen(
                      () => import("#features/units/new-unit-screen.tsx"),
                      (m) => m.NewUnitScreen,
                      trade,
                    ),
                  },
                  {
                    path: "/customers",
                    lazy: screen(
                      () => import("#features/customers/customers-screen.tsx"),
                      (m) => m.CustomersScreen,
                    ),
                  },
                  {
                    path: "/customers/new",
                    lazy: screen(
                      () => import("#features/customers/new-customer-screen.tsx"),
                      (m) => m.NewCustomerScreen,
                    ),
                  },
                  {
                    path: "/customers/:customerId",
                    lazy: screen(
                      () => import("#features/customers/customer-screen.tsx"),
                      (m) => m.CustomerScreen,
                    ),
                  },
                  {
                    path: "/team",
                    lazy: screen(
                      () => import("#features/team/team-screen.tsx"),
                      (m) => m.TeamScreen,
                    ),
                  },
                  {
                    path: "/settings",
                    lazy: screen(
                      () => import("#features/team/settings-screen.tsx"),
                      (m) => m.SettingsScreen,
                    ),
                  },
                  {
                    path: "/review",
                    lazy: screen(
                      () => import("#features/review/review-list-screen.tsx"),
                      (m) => m.ReviewListScreen,
                      trade,
                    ),
                  },
                  {
                    path: "/review/:diagnosisId",
                    lazy: screen(
                      () => import("#features/review/review-screen.tsx"),
                      (m) => m.ReviewScreen,
                      trade,
                    ),
                  },
                  {
                    path: "/account",
                    lazy: screen(
                      () => import("#features/account/account-screen.tsx"),
                      (m) => m.AccountScreen,
                    ),
                  },
                  {
                    path: "/sync",
                    lazy: screen(
                      () => import("#features/sync/sync-screen.tsx"),
                      (m) => m.SyncScreen,
                      trade,
                    ),
                  },
                ],
              },
            ],
          },
        ],
      },
      { path: "*", element: <NotFoundScreen /> },
    ],
  },
]);
