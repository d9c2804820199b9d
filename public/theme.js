// Puts the chosen theme on the page before it is painted; without a choice the device decides.
(() => {
  try {
    const theme = localStorage.getItem("bookmatch-theme");
    if (theme === "light" || theme === "dark") document.documentElement.dataset.theme = theme;
  } catch {
    // storage is closed to this page: the device's theme stands
  }
})();
