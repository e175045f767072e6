/** Measurements that are too long for the test run: started by hand, see each class. */
package clipramp.bench;
