/** Streets, and the cabinets, laterals, distribution cables and terminals along them. */
package sallowmere.town;
