import js from "@eslint/js";
import { importX } from "eslint-plugin-import-x";
import globals from "globals";

/** What the pages and their tests are held to. */
export default [
  { ignores: ["node_modules/"] },
  js.configs.recommended,
  {
    languageOptions: { ecmaVersion: 2022, sourceType: "module", globals: globals.browser },
    linterOptions: { reportUnusedDisableDirectives: "error" },
    plugins: { "import-x": importX },
    rules: {
      complexity: ["error", 12],
      "max-depth": ["error", 4],
      "max-lines": ["error", 300],
      "max-lines-per-function": ["error", 50],
      "import-x/no-cycle": "error",
      "import-x/no-self-import": "error",
      "import-x/no-duplicates": "error",
      "import-x/extensions": ["error", "ignorePackages"],
      "no-warning-comments": ["error", { terms: ["todo", "fixme", "xxx"], location: "anywhere" }],
      eqeqeq: "error",
      "no-eval": "error",
      "no-implied-eval": "error",
      "no-var": "error",
      "prefer-const": "error",
    },
  },
  {
    files: ["test/**", "eslint.config.js"],
    languageOptions: { globals: globals.node },
  },
];
