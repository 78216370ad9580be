/** Everything that version 1.0 of the contract holds, used once; all of it invented for a test. */
package invented.contract.sample;
