/** Which entry this tab has open on a sheet: outlasts a reload, and a crash where the browser restores its tabs. */
export interface Session {
  read(): string | null;
  write(id: string | null): void;
}

export function tabSession(sheet: string): Session {
  const key = `ferrule-open-${sheet}`;
  return {
    read: () => {
      try {
        return sessionStorage.getItem(key);
      } catch {
        return null;
      }
    },
    write: (id) => {
      try {
        if (id === null) sessionStorage.removeItem(key);
        else sessionStorage.setItem(key, id);
      } catch {
        // Then a reload finds the draft as the last one of its sheet.
      }
    },
  };
}
