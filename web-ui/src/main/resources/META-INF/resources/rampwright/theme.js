/* Light or dark: what was chosen last on this machine, else what the system asks for. */
const KEY = 'rampwright-shade';

function apply(shade) {
  document.documentElement.setAttribute('theme', shade === 'dark' ? 'dark' : '');
}

function current() {
  const system = window.matchMedia('(prefers-color-scheme: dark)').matches ? 'dark' : 'light';
  return localStorage.getItem(KEY) ?? system;
}

window.rampwrightShade = () => {
  localStorage.setItem(KEY, current() === 'dark' ? 'light' : 'dark');
  apply(current());
};

apply(current());
