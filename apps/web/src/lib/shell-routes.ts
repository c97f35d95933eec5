import type {
  listCalls as ListCalls,
  readCall as ReadCall,
  readMe as ReadMe,
  readUnit as ReadUnit,
  RouteContract,
  signIn as SignIn,
} from "@emberladder/contract";

/**
 * The routes that the first screens call, by method and address alone: the contract's schemas come later, with
 * the first form that is sent. The types are the contract's own, so that an address cannot drift.
 */
export const readMe = routeOf<typeof ReadMe>("get", "/api/auth/me");
export const signIn = routeOf<typeof SignIn>("post", "/api/auth/sign-in");
export const listCalls = routeOf<typeof ListCalls>("get", "/api/calls");
export const readCall = routeOf<typeof ReadCall>("get", "/api/calls/{callId}");
export const readUnit = routeOf<typeof ReadUnit>("get", "/api/units/{unitId}");

function routeOf<C extends RouteContract>(method: C["method"], path: C["path"]): C {
  return { method, path } as C;
}
