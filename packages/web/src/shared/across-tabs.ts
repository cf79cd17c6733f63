interface Persisted {
  persist: { getOptions: () => { name?: string | undefined }; rehydrate: () => unknown };
}

/** Two tabs share what a store keeps on this device: each goes on from what the other has kept. */
export function shareAcrossTabs({ persist }: Persisted): void {
  window.addEventListener('storage', ({ key }) => {
    if (key !== null && key === persist.getOptions().name) void persist.rehydrate();
  });
}
