import { cloneElement, useSyncExternalStore, type ReactElement, type ReactNode } from 'react';

type Params = Record<string, string | undefined>;
type Href = string | { pathname: string; params?: Params };

/** Stands in for the router where a screen is shown alone: the address is a set of params and a list of visits. */
let params: Params = {};
let visits: string[] = [];
const listeners = new Set<() => void>();

export function addressOf(href: Href): string {
  if (typeof href === 'string') return href;
  const rest = { ...href.params };
  const path = href.pathname.replace(/\[(\w+)\]/g, (_, name: string) => {
    const value = rest[name] ?? '';
    delete rest[name];
    return value;
  });
  const query = new URLSearchParams(
    Object.entries(rest).filter((part): part is [string, string] => Boolean(part[1])),
  );
  return String(query) === '' ? path : `${path}?${query}`;
}

const visit = (href: Href) => visits.push(addressOf(href));
const router = {
  push: visit,
  replace: visit,
  dismissTo: visit,
  canGoBack: () => false,
  back: () => undefined,
  setParams: (changed: Params) => {
    params = { ...params, ...changed };
    listeners.forEach((listener) => listener());
  },
};

export const useRouter = () => router;
export const useLocalSearchParams = () =>
  useSyncExternalStore(
    (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    () => params,
  );

interface LinkProps {
  href: Href;
  asChild?: boolean;
  children: ReactNode;
}

export function Link({ href, asChild, children }: LinkProps) {
  const address = addressOf(href);
  return asChild ? (
    cloneElement(children as ReactElement<{ href: string }>, { href: address })
  ) : (
    <a href={address}>{children}</a>
  );
}

export function Redirect({ href }: { href: Href }) {
  return <p>{`led to ${addressOf(href)}`}</p>;
}

/** Opens an address with these params, nothing visited yet. */
export function openAddress(given: Params = {}) {
  params = given;
  visits = [];
}
export const visited = () => visits;
export const addressParams = () => params;
