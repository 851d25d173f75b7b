/**
 */
package gapwright.model;

import gapwright.model.quantity.Quantity;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Joint</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A point where legs meet; magnetically one potential.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Joint#getX <em>X</em>}</li>
 *   <li>{@link gapwright.model.Joint#getY <em>Y</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getJoint()
 * @model
 * @generated
 */
public interface Joint extends Element {
	/**
	 * Returns the value of the '<em><b>X</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Position on the page, rightwards.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>X</em>' attribute.
	 * @see #setX(Quantity)
	 * @see gapwright.model.GapwrightPackage#getJoint_X()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getX();

	/**
	 * Sets the value of the '{@link gapwright.model.Joint#getX <em>X</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>X</em>' attribute.
	 * @see #getX()
	 * @generated
	 */
	void setX(Quantity value);

	/**
	 * Returns the value of the '<em><b>Y</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Position on the page, downwards.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Y</em>' attribute.
	 * @see #setY(Quantity)
	 * @see gapwright.model.GapwrightPackage#getJoint_Y()
	 * @model dataType="gapwright.model.Length" required="true"
	 * @generated
	 */
	Quantity getY();

	/**
	 * Sets the value of the '{@link gapwright.model.Joint#getY <em>Y</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Y</em>' attribute.
	 * @see #getY()
	 * @generated
	 */
	void setY(Quantity value);

} // Joint
