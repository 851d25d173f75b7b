/**
 */
package gapwright.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Winding Connection</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Windings joined to one pair of terminals.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.WindingConnection#getKind <em>Kind</em>}</li>
 *   <li>{@link gapwright.model.WindingConnection#getMembers <em>Members</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getWindingConnection()
 * @model
 * @generated
 */
public interface WindingConnection extends Element {
	/**
	 * Returns the value of the '<em><b>Kind</b></em>' attribute.
	 * The literals are from the enumeration {@link gapwright.model.ConnectionKind}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Kind</em>' attribute.
	 * @see gapwright.model.ConnectionKind
	 * @see #setKind(ConnectionKind)
	 * @see gapwright.model.GapwrightPackage#getWindingConnection_Kind()
	 * @model
	 * @generated
	 */
	ConnectionKind getKind();

	/**
	 * Sets the value of the '{@link gapwright.model.WindingConnection#getKind <em>Kind</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Kind</em>' attribute.
	 * @see gapwright.model.ConnectionKind
	 * @see #getKind()
	 * @generated
	 */
	void setKind(ConnectionKind value);

	/**
	 * Returns the value of the '<em><b>Members</b></em>' containment reference list.
	 * The list contents are of type {@link gapwright.model.ConnectedWinding}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Members</em>' containment reference list.
	 * @see gapwright.model.GapwrightPackage#getWindingConnection_Members()
	 * @model containment="true"
	 * @generated
	 */
	EList<ConnectedWinding> getMembers();

} // WindingConnection
