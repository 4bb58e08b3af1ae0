/** Where one wheel is read: beside the rack on a wide screen, on a page of its own on a phone. */
export function wheelPlace(shopId: string, wheelId: string, wide: boolean) {
  return wide
    ? ({ pathname: '/shops/[shopId]/wheels', params: { shopId, wheel: wheelId } } as const)
    : ({ pathname: '/shops/[shopId]/wheels/[wheelId]', params: { shopId, wheelId } } as const);
}
