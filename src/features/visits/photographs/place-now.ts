type Place = [longitude: number, latitude: number];

const PATIENCE_MS = 20_000;

/** Where this phone is, to about a metre; null where it does not say. Asks the person, once. */
export function placeNow(): Promise<Place | null> {
  return new Promise((resolve) => {
    navigator.geolocation.getCurrentPosition(
      ({ coords }) => {
        const [longitude, latitude] = [coords.longitude, coords.latitude];
        resolve([Number(longitude.toFixed(5)), Number(latitude.toFixed(5))]);
      },
      () => {
        resolve(null);
      },
      { enableHighAccuracy: true, timeout: PATIENCE_MS, maximumAge: 0 },
    );
  });
}
