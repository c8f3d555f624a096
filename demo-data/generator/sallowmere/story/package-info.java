/** What arrives from outside in the demo's stories. */
package sallowmere.story;
