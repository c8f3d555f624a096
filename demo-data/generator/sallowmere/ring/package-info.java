/** The headend, the huts and the three trunks that join them into a ring. */
package sallowmere.ring;
