/**
 * Relations that hold for several families or for any. {@link
 * stirwright.general.GeneralRelations} is the service that the workbench finds.
 */
package stirwright.general;
