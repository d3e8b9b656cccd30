import { describe, expect, it } from 'vitest';
import { createRoute, hashOf, places } from '../../../web/state/route';
import { fakePage } from './support';

describe('the route', () => {
  it('starts at the place in the address', () => {
    for (const place of places) expect(createRoute(fakePage(hashOf(place))).place.value).toBe(place);
  });

  it('starts at Size for an address that names no place', () => {
    for (const hash of ['', '#', '#/', '#/nowhere', '#/drift/more', '#drift', '#/Size']) {
      expect(createRoute(fakePage(hash)).place.value).toBe('size');
    }
  });

  it('writes the address, and follows it back and forth', () => {
    const page = fakePage('#/size');
    const route = createRoute(page);
    route.go('book');
    expect(page.location.hash).toBe('#/book');
    page.goTo('#/book');
    expect(route.place.value).toBe('book');
    page.goTo('#/size');
    expect(route.place.value).toBe('size');
  });
});
