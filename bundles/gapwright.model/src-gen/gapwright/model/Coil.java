/**
 */
package gapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Coil</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Turns round one leg. Not reversed, a positive current drives flux from from to to of its leg.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.Coil#getLeg <em>Leg</em>}</li>
 *   <li>{@link gapwright.model.Coil#getTurns <em>Turns</em>}</li>
 *   <li>{@link gapwright.model.Coil#isReversed <em>Reversed</em>}</li>
 *   <li>{@link gapwright.model.Coil#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @see gapwright.model.GapwrightPackage#getCoil()
 * @model
 * @generated
 */
public interface Coil extends Element {
	/**
	 * Returns the value of the '<em><b>Leg</b></em>' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @return the value of the '<em>Leg</em>' reference.
	 * @see #setLeg(Leg)
	 * @see gapwright.model.GapwrightPackage#getCoil_Leg()
	 * @model resolveProxies="false" required="true"
	 * @generated
	 */
	Leg getLeg();

	/**
	 * Sets the value of the '{@link gapwright.model.Coil#getLeg <em>Leg</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Leg</em>' reference.
	 * @see #getLeg()
	 * @generated
	 */
	void setLeg(Leg value);

	/**
	 * Returns the value of the '<em><b>Turns</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Whole, 1 or more.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Turns</em>' attribute.
	 * @see #setTurns(int)
	 * @see gapwright.model.GapwrightPackage#getCoil_Turns()
	 * @model required="true"
	 * @generated
	 */
	int getTurns();

	/**
	 * Sets the value of the '{@link gapwright.model.Coil#getTurns <em>Turns</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Turns</em>' attribute.
	 * @see #getTurns()
	 * @generated
	 */
	void setTurns(int value);

	/**
	 * Returns the value of the '<em><b>Reversed</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Wound in the opposing sense.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reversed</em>' attribute.
	 * @see #setReversed(boolean)
	 * @see gapwright.model.GapwrightPackage#getCoil_Reversed()
	 * @model
	 * @generated
	 */
	boolean isReversed();

	/**
	 * Sets the value of the '{@link gapwright.model.Coil#isReversed <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reversed</em>' attribute.
	 * @see #isReversed()
	 * @generated
	 */
	void setReversed(boolean value);

	/**
	 * Returns the value of the '<em><b>Position</b></em>' attribute.
	 * The default value is <code>"0.5"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Place of its middle along the leg, as a fraction of the leg's length from its from joint.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Position</em>' attribute.
	 * @see #setPosition(double)
	 * @see gapwright.model.GapwrightPackage#getCoil_Position()
	 * @model default="0.5"
	 * @generated
	 */
	double getPosition();

	/**
	 * Sets the value of the '{@link gapwright.model.Coil#getPosition <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Position</em>' attribute.
	 * @see #getPosition()
	 * @generated
	 */
	void setPosition(double value);

} // Coil
